/** The prepared path of a moment's weather. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import type { Kelvins, Pascals } from "../units.js";
import { blendPaths } from "./_blendPaths.js";
import type { PreparedPath } from "./preparedPath.js";
import type { WeatherPaths } from "./prepareWeatherPaths.js";

/**
 * The prepared path at a pressure and temperature, drawn from paths prepared for a range of weather.
 *
 * Model: every number of the path is interpolated between the grid's nine paths, by parabolas in pressure and in one over
 * temperature.
 * Validity: within the ranges given to `prepareWeatherPaths`, enforced: nothing is extrapolated.
 * Accuracy: against `refractedPath` in the same weather, for ranges of 4 kPa and 20 K at sea level: 2e-6 relative in the masses
 * and 5e-4 arcsec in refraction to 88 degrees, 5e-6 and 0.015 arcsec at 90 degrees (masses at true angles twice that); for
 * 8 kPa and 40 K ten times as much. Takes about 0.1 ms.
 * Source: as `refractedPath`; the interpolation is our own.
 *
 * @param weather - `pressurePa` and `temperatureK` at the observer
 * @param paths - prepared paths from `prepareWeatherPaths`
 * @returns the prepared path
 * @throws TypeError if an argument is of the wrong kind; RangeError if the weather is outside the paths' ranges
 * @example
 * import { airMassOnTruePath, pathInWeather, prepareWeatherPaths, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 101325,
 *   temperatureK: 288.15,
 *   relativeHumidity: 0.6,
 *   altitudeM: 0,
 *   co2Ppm: 425,
 * });
 * const paths = prepareWeatherPaths({
 *   profile,
 *   altitudeM: 0,
 *   wavelengthNm: 550,
 *   earthRadiusM: 6371000,
 *   pressureRangePa: [99000, 103000],
 *   temperatureRangeK: [275, 295],
 * });
 * const noon = pathInWeather({ pressurePa: 101300, temperatureK: 291 }, paths);
 * airMassOnTruePath(85, noon); // => 10.04998
 */
export function pathInWeather<Key extends string>(
  weather: { readonly pressurePa: Pascals; readonly temperatureK: Kelvins },
  paths: WeatherPaths<Key>,
): PreparedPath<Key> {
  const name = "pathInWeather";
  checkRecord(weather, "weather", name);
  if (!Array.isArray(paths?.paths)) {
    refuse(paths, "made by prepareWeatherPaths(...)", "", "paths", name);
  }
  const { pressuresPa, temperaturesK } = paths;
  const { pressurePa, temperatureK } = weather;
  checkNumber(pressurePa, pressuresPa[0]!, pressuresPa[2]!, "Pa", "pressurePa", name);
  checkNumber(temperatureK, temperaturesK[0]!, temperaturesK[2]!, "K", "temperatureK", name);
  const byPressure = parabolaWeights(pressuresPa, pressurePa);
  const inverses = temperaturesK.map((t) => 1 / t);
  const byTemperature = parabolaWeights(inverses, 1 / temperatureK);
  const weights = byPressure.flatMap((p) => byTemperature.map((t) => p * t));
  return blendPaths(paths.paths, weights);
}

/** Lagrange's weights of three points. */
function parabolaWeights(points: readonly number[], x: number): number[] {
  const [a, b, c] = points as [number, number, number];
  return [
    ((x - b) * (x - c)) / ((a - b) * (a - c)),
    ((x - a) * (x - c)) / ((b - a) * (b - c)),
    ((x - a) * (x - b)) / ((c - a) * (c - b)),
  ];
}

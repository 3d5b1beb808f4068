/** The prepared path of a moment's weather. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import type { Kelvins, Pascals } from "../units.js";
import type { DippingFit, PathFit, PreparedPath } from "./preparedPath.js";
import type { WeatherPaths } from "./prepareWeatherPaths.js";

/**
 * The prepared path at a pressure and temperature, drawn from paths prepared for a range of weather.
 *
 * Model: every number of the path is interpolated between the grid's nine paths, by parabolas in pressure and in one over
 * temperature.
 * Validity: within the ranges given to `prepareWeatherPaths`, enforced: nothing is extrapolated.
 * Accuracy: against `preparePath` in the same weather, for ranges of 4 kPa and 20 K: @ACC@. Takes a few microseconds.
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
 * airMassOnTruePath(85, noon); // => @@
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
  return blend(paths.paths, weights);
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

function blend<Key extends string>(
  paths: readonly PreparedPath<Key>[],
  weights: readonly number[],
): PreparedPath<Key> {
  const mix = (of: (path: PreparedPath<Key>) => number): number =>
    weights.reduce((sum, weight, i) => sum + weight * of(paths[i]!), 0);
  const mixFit = (of: (path: PreparedPath<Key>) => PathFit): PathFit => ({
    pieces: of(paths[0]!).pieces,
    coefficients: mixTables(
      paths.map((path) => of(path).coefficients),
      weights,
    ),
  });
  return {
    ...paths[0]!,
    horizonApparentZenithDeg: 90 + mix((path) => path.horizonApparentZenithDeg - 90),
    horizonTrueZenithDeg: mix((path) => path.horizonTrueZenithDeg),
    levelRefractionDeg: mix((path) => path.levelRefractionDeg),
    rising: mixFit((path) => path.rising),
    risingTrue: mixFit((path) => path.risingTrue),
    dipping: paths[0]!.dipping.map(
      (_, i): DippingFit => ({
        ...mixFit((path) => path.dipping[i]!),
        topDeg: mix((path) => path.dipping[i]!.topDeg),
        bottomDeg: mix((path) => path.dipping[i]!.bottomDeg),
      }),
    ),
  };
}

function mixTables(
  tables: readonly (readonly Float64Array[])[],
  weights: readonly number[],
): Float64Array[] {
  return tables[0]!.map((first, q) => {
    const mixed = new Float64Array(first.length);
    for (const [i, weight] of weights.entries()) {
      const table = tables[i]![q]!;
      for (let k = 0; k < mixed.length; k++) mixed[k]! += weight * table[k]!;
    }
    return mixed;
  });
}

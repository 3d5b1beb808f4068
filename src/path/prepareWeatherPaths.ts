/** Paths for a range of weather, from which that of any moment is drawn. */
import { checkList, checkNumber } from "../_check.js";
import { shiftedProfile } from "../air/_shiftedProfile.js";
import type { Kelvins, Pascals } from "../units.js";
import { checkPathInput, constituentsOf } from "./_checkPathInput.js";
import { fitPath } from "./_fitPath.js";
import type { PathInput } from "./pathInput.js";
import type { PreparedPath } from "./preparedPath.js";

/** Input of a path and the weather that it is to serve. */
export interface WeatherPathInput<Key extends string = never> extends PathInput<Key> {
  /** Lowest and highest pressure at the observer, Pa. */
  readonly pressureRangePa: readonly [low: Pascals, high: Pascals];
  /** Lowest and highest temperature at the observer, K. */
  readonly temperatureRangeK: readonly [low: Kelvins, high: Kelvins];
}

/** Prepared paths on a grid of weather; make it with `prepareWeatherPaths`. */
export interface WeatherPaths<Key extends string = never> {
  /** The grid's pressures, Pa: low, middle, high. */
  readonly pressuresPa: readonly Pascals[];
  /** The grid's temperatures, K: low, middle, high. */
  readonly temperaturesK: readonly Kelvins[];
  /** The paths, pressure by pressure. */
  readonly paths: readonly PreparedPath<Key>[];
}

/**
 * Prepared paths for a range of pressure and temperature at the observer, so that `pathInWeather` can follow a day in a fraction of a millisecond each.
 *
 * Model: `preparePath` on a grid of three pressures and three temperatures over the ranges. The profile keeps its shape: one
 * offset to all its temperatures, pressure integrated anew from the observer's, and the mole fraction of vapour as it was.
 * Validity: as `preparePath`; ranges of at most 10 kPa and 40 K, within 10 to 140 kPa and 180 to 380 K, enforced.
 * Accuracy: see `pathInWeather`. Takes nine times as long as `preparePath`.
 * Source: as `refractedPath`.
 *
 * @param input - as in `preparePath`, and `pressureRangePa` and `temperatureRangeK`, each `[low, high]`, at the observer
 * @returns the paths, plain data
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range, a range is empty or too wide
 * @example
 * import { pathInWeather, prepareWeatherPaths, refractionOnPath, standardProfile } from "airlight";
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
 * const morning = pathInWeather({ pressurePa: 101800, temperatureK: 278.4 }, paths);
 * refractionOnPath(80, morning) * 3600; // => 325.8606
 */
export function prepareWeatherPaths<Key extends string = never>(
  input: WeatherPathInput<Key>,
): WeatherPaths<Key> {
  const name = "prepareWeatherPaths";
  checkPathInput(input, name);
  const { pressureRangePa, temperatureRangeK, altitudeM } = input;
  const pressuresPa = threeOf(pressureRangePa, 10_000, 140_000, 10_000, "pressureRangePa", "Pa");
  const temperaturesK = threeOf(temperatureRangeK, 180, 380, 40, "temperatureRangeK", "K");
  const keys = Object.keys(constituentsOf(input, name)) as Key[];
  const pathIn = (pressurePa: number, temperatureK: number, like?: PreparedPath<Key>) => {
    const profile = shiftedProfile(input.profile, altitudeM, pressurePa, temperatureK);
    return fitPath(checkPathInput({ ...input, profile }, name), keys, name, like);
  };
  const middle = pathIn(pressuresPa[1]!, temperaturesK[1]!);
  const paths = pressuresPa.flatMap((p) => temperaturesK.map((t) => pathIn(p, t, middle)));
  return { pressuresPa, temperaturesK, paths };
}

function threeOf(
  range: readonly [number, number],
  low: number,
  high: number,
  widest: number,
  argument: string,
  unit: string,
): number[] {
  const name = "prepareWeatherPaths";
  checkList(range, 2, argument, name);
  checkNumber(range[0], low, high, unit, `${argument}[0]`, name);
  checkNumber(range[1], low, high, unit, `${argument}[1]`, name);
  checkNumber(range[1] - range[0], 1e-3, widest, unit, `width of ${argument}`, name);
  return [range[0], (range[0] + range[1]) / 2, range[1]];
}

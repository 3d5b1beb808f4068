/** Air mass of a constituent at many true zenith angles, from a prepared path. */
import type { Degrees } from "../units.js";
import { outOf, quantityOf } from "./_checkPreparedPath.js";
import { fillTrue } from "./_fillPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Air mass of a constituent at many true zenith angles, from a prepared path.
 *
 * Model: as for apparent angles, fitted over the true elevation counted from that of the level ray; below it the apparent angle
 * is found first, which takes longer. Where bent rays show a thing twice (mirage), one of its images.
 * Validity: 0 to `path.horizonTrueZenithDeg`, enforced. NaN in the angles gives NaN in its place.
 * Accuracy: 1e-9 relative against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param trueZenithsDeg - true zenith angles, degrees
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param key - the constituent, one of `path.keys`
 * @param out - array to fill, at least as long; a new one if left out
 * @returns `out`, each value the mass of the constituent over its column above the observer, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is beyond the horizon (the
 *   message names its place) or `out` is short
 * @example
 * import { constituentMassesOnTruePath, gaussianLayer, preparePath, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 101325,
 *   temperatureK: 288.15,
 *   relativeHumidity: 0,
 *   altitudeM: 0,
 *   co2Ppm: 450,
 * });
 * const path = preparePath({
 *   profile,
 *   altitudeM: 0,
 *   wavelengthNm: 550,
 *   earthRadiusM: 6371000,
 *   constituents: { ozone: gaussianLayer({ heightM: 22000, standardDeviationM: 5000 }) },
 * });
 * constituentMassesOnTruePath([0, 75, 90], path, "ozone")[1]; // => 3.691002
 */
export function constituentMassesOnTruePath<Key extends string>(
  trueZenithsDeg: ArrayLike<Degrees>,
  path: PreparedPath<Key>,
  key: Key,
  out?: Float64Array,
): Float64Array {
  const quantity = quantityOf(key, path, "constituentMassesOnTruePath");
  const filled = outOf(trueZenithsDeg, out, "trueZenithsDeg", "constituentMassesOnTruePath");
  return fillTrue(path, trueZenithsDeg, quantity, filled, "constituentMassesOnTruePath");
}

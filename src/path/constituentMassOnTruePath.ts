/** Air mass of a constituent at a true zenith angle, from a prepared path. */
import type { Degrees, Dimensionless } from "../units.js";
import { massAtTrue } from "./_atElevation.js";
import { quantityOf, trueElevationOf } from "./_checkPreparedPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Air mass of a constituent at a true zenith angle, from a prepared path.
 *
 * Model: as for apparent angles, fitted over the true elevation counted from that of the level ray; below it the apparent angle
 * is found first, which takes longer. Where bent rays show a thing twice (mirage), one of its images.
 * Validity: 0 to `path.horizonTrueZenithDeg`, enforced.
 * Accuracy: 1e-9 relative against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param trueZenithDeg - true zenith angle, degrees, 0 to the horizon
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param key - the constituent, one of `path.keys`
 * @returns mass of the constituent over its column above the observer, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { constituentMassOnTruePath, gaussianLayer, preparePath, standardProfile } from "airlight";
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
 * constituentMassOnTruePath(75, path, "ozone"); // => 3.691002
 */
export function constituentMassOnTruePath<Key extends string>(
  trueZenithDeg: Degrees,
  path: PreparedPath<Key>,
  key: Key,
): Dimensionless {
  const quantity = quantityOf(key, path, "constituentMassOnTruePath");
  const elevation = trueElevationOf(trueZenithDeg, path, "constituentMassOnTruePath");
  return massAtTrue(path, elevation, quantity);
}

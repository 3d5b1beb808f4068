/** Air mass of a constituent at an apparent zenith angle, from a prepared path. */
import type { Degrees, Dimensionless } from "../units.js";
import { massAt } from "./_atElevation.js";
import { apparentElevationOf, quantityOf } from "./_checkPreparedPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Air mass of a constituent at an apparent zenith angle, from a prepared path.
 *
 * Model: polynomials of degree 7 on equal pieces of c / (c + 0.08), c the near-sine of the elevation; below the horizontal on
 * pieces of the root of the dip.
 * Validity: 0 to `path.horizonApparentZenithDeg`, enforced.
 * Accuracy: 1e-9 relative against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param apparentZenithDeg - apparent zenith angle, degrees, 0 to the horizon
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param key - the constituent, one of `path.keys`
 * @returns mass of the constituent over its column above the observer, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { constituentMassOnPath, gaussianLayer, preparePath, standardProfile } from "airlight";
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
 * constituentMassOnPath(75, path, "ozone"); // => 3.703775
 */
export function constituentMassOnPath<Key extends string>(
  apparentZenithDeg: Degrees,
  path: PreparedPath<Key>,
  key: Key,
): Dimensionless {
  const quantity = quantityOf(key, path, "constituentMassOnPath");
  const elevation = apparentElevationOf(apparentZenithDeg, path, "constituentMassOnPath");
  return massAt(path, elevation, quantity);
}

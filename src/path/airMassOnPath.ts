/** Air mass at an apparent zenith angle, from a prepared path. */
import type { Degrees, Dimensionless } from "../units.js";
import { massAt } from "./_atElevation.js";
import { apparentElevationOf } from "./_checkPreparedPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Air mass at an apparent zenith angle, from a prepared path.
 *
 * Model: polynomials of degree 7 on equal pieces of c / (c + 0.08), c the near-sine of the elevation; below the horizontal on
 * pieces of the root of the dip.
 * Validity: 0 to `path.horizonApparentZenithDeg`, enforced.
 * Accuracy: 1e-9 relative against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param apparentZenithDeg - apparent zenith angle, degrees, 0 to the horizon
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @returns air mass, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { airMassOnPath, preparePath, standardProfile } from "airlight";
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
 * });
 * airMassOnPath(75, path); // => 3.810648
 */
export function airMassOnPath(
  apparentZenithDeg: Degrees,
  path: PreparedPath<string>,
): Dimensionless {
  const elevation = apparentElevationOf(apparentZenithDeg, path, "airMassOnPath");
  return massAt(path, elevation, 1);
}

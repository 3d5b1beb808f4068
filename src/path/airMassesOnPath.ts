/** Air mass at many apparent zenith angles, from a prepared path. */
import { checkPrepared } from "../_check.js";
import type { Degrees } from "../units.js";
import { outOf } from "./_checkPreparedPath.js";
import { fillApparent } from "./_fillPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Air mass at many apparent zenith angles, from a prepared path.
 *
 * Model: polynomials of degree 7 on equal pieces of c / (c + 0.08), c the near-sine of the elevation; below the horizontal on
 * pieces of the root of the dip.
 * Validity: 0 to `path.horizonApparentZenithDeg`, enforced. NaN in the angles gives NaN in its place.
 * Accuracy: 1e-9 relative against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param apparentZenithsDeg - apparent zenith angles, degrees
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param out - array to fill, at least as long; a new one if left out
 * @returns `out`, each value the air mass, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is beyond the horizon (the
 *   message names its place) or `out` is short
 * @example
 * import { airMassesOnPath, preparePath, standardProfile } from "airlight";
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
 * airMassesOnPath([0, 75, 90], path)[1]; // => 3.810648
 */
export function airMassesOnPath(
  apparentZenithsDeg: ArrayLike<Degrees>,
  path: PreparedPath<string>,
  out?: Float64Array,
): Float64Array {
  checkPrepared(
    path?.levelRefractionDeg,
    "preparePath or pathInWeather",
    "path",
    "airMassesOnPath",
  );
  const filled = outOf(apparentZenithsDeg, out, "apparentZenithsDeg", "airMassesOnPath");
  return fillApparent(path, apparentZenithsDeg, 1, filled, "airMassesOnPath");
}

/** Refraction at many apparent zenith angles, from a prepared path. */
import { checkPrepared } from "../_check.js";
import type { Degrees } from "../units.js";
import { outOf } from "./_checkPreparedPath.js";
import { fillApparent } from "./_fillPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Refraction at many apparent zenith angles, from a prepared path.
 *
 * Model: polynomials of degree 7 on equal pieces of c / (c + 0.08), c the near-sine of the elevation; below the horizontal on
 * pieces of the root of the dip.
 * Validity: 0 to `path.horizonApparentZenithDeg`, enforced. NaN in the angles gives NaN in its place.
 * Accuracy: 1e-5 arcsec against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param apparentZenithsDeg - apparent zenith angles, degrees
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param out - array to fill, at least as long; a new one if left out
 * @returns `out`, each value the true less apparent zenith angle, degrees
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is beyond the horizon (the
 *   message names its place) or `out` is short
 * @example
 * import { preparePath, refractionsOnPath, standardProfile } from "airlight";
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
 * refractionsOnPath([0, 75, 90], path)[1]; // => 0.05839483
 */
export function refractionsOnPath(
  apparentZenithsDeg: ArrayLike<Degrees>,
  path: PreparedPath<string>,
  out?: Float64Array,
): Float64Array {
  checkPrepared(
    path?.levelRefractionDeg,
    "preparePath or pathInWeather",
    "path",
    "refractionsOnPath",
  );
  const filled = outOf(apparentZenithsDeg, out, "apparentZenithsDeg", "refractionsOnPath");
  return fillApparent(path, apparentZenithsDeg, 0, filled, "refractionsOnPath");
}

/** Refraction at many true zenith angles, from a prepared path. */
import { checkPrepared } from "../_check.js";
import type { Degrees } from "../units.js";
import { outOf } from "./_checkPreparedPath.js";
import { fillTrue } from "./_fillPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Refraction at many true zenith angles, from a prepared path.
 *
 * Model: as for apparent angles, fitted over the true elevation counted from that of the level ray; below it the apparent angle
 * is found first, which takes longer. Where bent rays show a thing twice (mirage), one of its images.
 * Validity: 0 to `path.horizonTrueZenithDeg`, enforced. NaN in the angles gives NaN in its place.
 * Accuracy: 1e-5 arcsec against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param trueZenithsDeg - true zenith angles, degrees
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @param out - array to fill, at least as long; a new one if left out
 * @returns `out`, each value the true less apparent zenith angle, degrees
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is beyond the horizon (the
 *   message names its place) or `out` is short
 * @example
 * import { preparePath, refractionsOnTruePath, standardProfile } from "airlight";
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
 * refractionsOnTruePath([0, 75, 90], path)[1]; // => 0.05816583
 */
export function refractionsOnTruePath(
  trueZenithsDeg: ArrayLike<Degrees>,
  path: PreparedPath<string>,
  out?: Float64Array,
): Float64Array {
  checkPrepared(
    path?.levelRefractionDeg,
    "preparePath or pathInWeather",
    "path",
    "refractionsOnTruePath",
  );
  const filled = outOf(trueZenithsDeg, out, "trueZenithsDeg", "refractionsOnTruePath");
  return fillTrue(path, trueZenithsDeg, 0, filled, "refractionsOnTruePath");
}

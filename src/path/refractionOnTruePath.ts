/** Refraction at a true zenith angle, from a prepared path. */
import type { Degrees } from "../units.js";
import { refractionAtTrue } from "./_atElevation.js";
import { trueElevationOf } from "./_checkPreparedPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Refraction at a true zenith angle, from a prepared path.
 *
 * Model: as for apparent angles, fitted over the true elevation counted from that of the level ray; below it the apparent angle
 * is found first, which takes longer. Where bent rays show a thing twice (mirage), one of its images.
 * Validity: 0 to `path.horizonTrueZenithDeg`, enforced.
 * Accuracy: 1e-5 arcsec against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param trueZenithDeg - true zenith angle, degrees, 0 to the horizon
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @returns true less apparent zenith angle, degrees
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { preparePath, refractionOnTruePath, standardProfile } from "airlight";
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
 * refractionOnTruePath(75, path); // => 0.05816583
 */
export function refractionOnTruePath(trueZenithDeg: Degrees, path: PreparedPath<string>): Degrees {
  const elevation = trueElevationOf(trueZenithDeg, path, "refractionOnTruePath");
  return refractionAtTrue(path, elevation);
}

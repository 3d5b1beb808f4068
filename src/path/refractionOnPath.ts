/** Refraction at an apparent zenith angle, from a prepared path. */
import type { Degrees } from "../units.js";
import { refractionAt } from "./_atElevation.js";
import { apparentElevationOf } from "./_checkPreparedPath.js";
import type { PreparedPath } from "./preparedPath.js";

/**
 * Refraction at an apparent zenith angle, from a prepared path.
 *
 * Model: polynomials of degree 7 on equal pieces of c / (c + 0.08), c the near-sine of the elevation; below the horizontal on
 * pieces of the root of the dip.
 * Validity: 0 to `path.horizonApparentZenithDeg`, enforced.
 * Accuracy: 1e-5 arcsec against `refractedPath`, from the zenith to the horizon and below.
 * Source: as `refractedPath`; the fit is our own.
 *
 * @param apparentZenithDeg - apparent zenith angle, degrees, 0 to the horizon
 * @param path - prepared path from `preparePath` or `pathInWeather`
 * @returns true less apparent zenith angle, degrees
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { preparePath, refractionOnPath, standardProfile } from "airlight";
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
 * refractionOnPath(75, path); // => 0.05839483
 */
export function refractionOnPath(apparentZenithDeg: Degrees, path: PreparedPath<string>): Degrees {
  const elevation = apparentElevationOf(apparentZenithDeg, path, "refractionOnPath");
  return refractionAt(path, elevation);
}

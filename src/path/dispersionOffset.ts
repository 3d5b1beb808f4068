/** The shift of a wavelength along and across a slit. */
import { checkNumber } from "../_check.js";
import { cos, sin } from "../_numeric.js";
import { type Arcseconds, type Degrees, type Nanometres, RADIANS_PER_DEGREE } from "../units.js";
import type { DispersionInput } from "./differentialRefraction.js";
import { liftOf } from "./_liftOf.js";

/**
 * Where the light of a wavelength falls against that of the guiding wavelength, as a vector on the sky.
 *
 * Model: `differentialRefraction` laid along the vertical, turned by the angle between an axis and the direction to the zenith.
 * Validity: as `differentialRefraction`; angle -360 to 360 degrees, enforced. For small fields: the vertical is one direction.
 * Accuracy: as `differentialRefraction`.
 * Source: Filippenko 1982, Publ. Astron. Soc. Pac. 94, 715.
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param star - as in `differentialRefraction`
 * @param zenithAngleDeg - angle from the chosen axis (a slit, or north) to the direction of the zenith, degrees; from north
 *   through east it is the parallactic angle
 * @returns `[along, across]`, arcsec: along the axis, and along the axis turned by +90 degrees in the same sense (from north:
 *   north and east)
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { dispersionOffset, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 79993,
 *   temperatureK: 280.15,
 *   relativeHumidity: 0.8,
 *   altitudeM: 2000,
 *   co2Ppm: 425,
 * });
 * const star = {
 *   guideWavelengthNm: 500,
 *   trueZenithDeg: 48.19,
 *   profile,
 *   altitudeM: 2000,
 *   earthRadiusM: 6371000,
 * };
 * dispersionOffset(400, star, 30)[0]; // => 0.61354
 */
export function dispersionOffset(
  wavelengthNm: Nanometres,
  star: DispersionInput,
  zenithAngleDeg: Degrees,
): [along: Arcseconds, across: Arcseconds] {
  checkNumber(zenithAngleDeg, -360, 360, "degrees", "zenithAngleDeg", "dispersionOffset");
  const lift = liftOf(wavelengthNm, star, "dispersionOffset");
  const angle = zenithAngleDeg * RADIANS_PER_DEGREE;
  return [lift * cos(angle), lift * sin(angle)];
}

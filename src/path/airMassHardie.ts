/** Air mass from the secant, for stars well up. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.0018167;
const B = 0.002875;
const C = 0.0008083;

/**
 * Relative air mass from the apparent zenith angle, the polynomial long used in stellar photometry.
 *
 * Model: cubic in sec z - 1, fitted to the table of Bemporad 1904.
 * Validity: apparent zenith angle 0 to 85°, enforced: beyond that the cubic falls, and at 88° it is half of the truth.
 * Accuracy: against the refracted ray through dry standard air (15 °C, 101 325 Pa, 550 nm, Earth 6371 km):
 * within 0.08 % to 70°, +0.24 % at 80°, -0.2 % at 84°, -1.06 % at 85°.
 * Source: Hardie 1962, in Astronomical Techniques (ed. Hiltner), chapter 8 (coefficients from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 85°
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassHardie } from "airlight";
 * airMassHardie(70); // => 2.903914
 */
export function airMassHardie(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 85, "degrees", "apparentZenithDeg", "airMassHardie");
  const s = 1 / cos(apparentZenithDeg * RADIANS_PER_DEGREE) - 1;
  return 1 + s - s * (A + s * (B + s * C));
}

/** Air mass by a cosine with an exponential. */
import { checkNumber } from "../_check.js";
import { cos, exp } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.025;
const B = 11;

/**
 * Relative air mass from the apparent zenith angle, short and without a power.
 *
 * Model: 1 / (cos z + 0.025 exp(-11 cos z)): 40 at the horizon.
 * Validity: apparent zenith angle 0 to 90°, enforced.
 * Accuracy: against the refracted ray through dry standard air (15 °C, 101 325 Pa, 550 nm, Earth 6371 km):
 * within 1.0 % to 89°, +4.8 % at the horizon. Read as a true angle it is 2.8 % off at 85°, 16 % at 89°.
 * Source: Rozenberg 1966, Twilight, p. 160 (from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassRozenberg } from "airlight";
 * airMassRozenberg(85); // => 10.33694
 */
export function airMassRozenberg(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "airMassRozenberg");
  const c = cos(apparentZenithDeg * RADIANS_PER_DEGREE);
  return 1 / (c + A * exp(-B * c));
}

/** Air mass from the true zenith angle. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const N2 = 1.002432;
const N1 = 0.148386;
const N0 = 0.0096467;
const D2 = 0.149864;
const D1 = 0.0102963;
const D0 = 0.000303978;

/**
 * Relative air mass of clean air from the true zenith angle (what an ephemeris without refraction gives).
 *
 * Model: quotient of polynomials in cos z, fitted to rays through a standard atmosphere.
 * Validity: true zenith angle 0 to 90°, enforced; sea level; air only.
 * Accuracy: within 0.06 % over the whole range against `refractedPath` (dry standard air, 550 nm, Earth 6371 km).
 * The author gives 0.0037 air masses at worst, at the horizon; 0.07 % against `airMassKastenYoung` at the refracted angle to
 * 80°, 0.2 % at 85°.
 * Source: Young 1994, Appl. Opt. 33, 1108, equation 5 (coefficients from memory).
 *
 * @param trueZenithDeg - true (geometric) zenith angle, 0 to 90°
 * @returns air mass, without unit
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassYoung } from "airlight";
 * airMassYoung(90); // => 31.735
 */
export function airMassYoung(trueZenithDeg: Degrees): Dimensionless {
  checkNumber(trueZenithDeg, 0, 90, "degrees", "trueZenithDeg", "airMassYoung");
  const c = cos(trueZenithDeg * RADIANS_PER_DEGREE);
  return (N0 + c * (N1 + c * N2)) / (D0 + c * (D1 + c * (D2 + c)));
}

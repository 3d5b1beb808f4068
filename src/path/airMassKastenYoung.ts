/** Air mass from the apparent zenith angle. */
import { checkNumber } from "../_check.js";
import { cos, pow } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.50572;
const B = 6.07995; // degrees
const C = -1.6364;

/**
 * Relative air mass of clean air from the apparent zenith angle (where you see the sun).
 *
 * Model: 1 / (cos z + a (b + elevation)^c), fitted to a table integrated through the ISO standard atmosphere of 1972.
 * Validity: apparent zenith angle 0 to 90°, enforced; sea level, 700 nm; air only, not ozone (21 % too much at 85°) nor aerosol.
 * Accuracy: within 0.17 % to 89.5° and -0.63 % at the horizon against `refractedPath` (dry standard air, 550 nm, Earth 6371 km);
 * against the authors' own table -0.44 % at the horizon (37.92 for 38.087), +0.19 % at 1° elevation, 0.11 % from 3° up.
 * Source: Kasten & Young 1989, Appl. Opt. 28, 4735, equation 3 and table 2.
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°; a true angle here is wrong by 19 % at the horizon
 * @returns air mass, without unit, 1 at the zenith
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassKastenYoung } from "airlight";
 * airMassKastenYoung(60); // => 1.9943
 */
export function airMassKastenYoung(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "airMassKastenYoung");
  const elevation = 90 - apparentZenithDeg;
  return 1 / (cos(apparentZenithDeg * RADIANS_PER_DEGREE) + A * pow(elevation + B, C));
}

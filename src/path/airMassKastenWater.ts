/** Air mass of what lies near the ground: water vapour and aerosol. */
import { checkNumber } from "../_check.js";
import { cos, pow } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

const A = 0.0548;
const B = 92.65; // degrees
const C = -1.452;

/**
 * Relative air mass of water vapour, used for aerosol too, from the apparent zenith angle.
 *
 * Model: 1 / (cos z + a (b - z)^c).
 * Validity: apparent zenith angle 0 to 90°, enforced; a constituent that thins with height over about 2 km.
 * Accuracy: within 0.06 % to 85°, -0.2 % at 89°, -2.9 % at the horizon against `refractedPath` through an exponential layer of
 * 2 km (dry standard air, 550 nm, Earth 6371 km). Against a straight ray at
 * the same apparent angle through a layer of 2 km scale height +0.1 % at 75°, +0.5 % at
 * 85°, +3.8 % at 89°; most of it is refraction, which the straight ray lacks.
 * Source: Kasten 1965, Arch. Meteorol. Geophys. Bioklimatol. B 14, 206 (from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°
 * @returns air mass, without unit
 * @throws TypeError if the angle is not a number; RangeError if it is out of range
 * @example
 * import { airMassKastenWater } from "airlight";
 * airMassKastenWater(85); // => 11.1097
 */
export function airMassKastenWater(apparentZenithDeg: Degrees): Dimensionless {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "airMassKastenWater");
  return 1 / (cos(apparentZenithDeg * RADIANS_PER_DEGREE) + A * pow(B - apparentZenithDeg, C));
}

/** Normal gravity of WGS 84, unguarded: used inside column integrals. */
import { sin, sqrt } from "../_numeric.js";
import { RADIANS_PER_DEGREE } from "../units.js";

/** WGS 84 (NIMA TR8350.2, from memory): equatorial gravity, m s-2; Somigliana's constant; first eccentricity squared. */
const EQUATOR = 9.7803253359;
const SOMIGLIANA = 0.00193185265241;
const ECCENTRICITY2 = 0.00669437999014;
/** Equatorial radius, m; flattening; ratio of centrifugal to gravitational acceleration at the equator. */
const EQUATOR_RADIUS_M = 6378137;
const FLATTENING = 0.0033528106647475; // 1 / 298.257223563
const ROTATION = 0.00344978650684;

/** Normal gravity, m s-2, at a geodetic latitude and a height above the ellipsoid. */
export function normalGravity(latitudeDeg: number, altitudeM: number): number {
  const sine = sin(latitudeDeg * RADIANS_PER_DEGREE);
  const s2 = sine * sine;
  const surface = (EQUATOR * (1 + SOMIGLIANA * s2)) / sqrt(1 - ECCENTRICITY2 * s2);
  const x = altitudeM / EQUATOR_RADIUS_M;
  return surface * (1 - 2 * (1 + FLATTENING + ROTATION - 2 * FLATTENING * s2) * x + 3 * x * x);
}

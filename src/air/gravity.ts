/** Acceleration of gravity at a place. */
import { checkNumber } from "../_check.js";
import type { Degrees, Metres } from "../units.js";
import { normalGravity } from "./_gravity.js";

/**
 * Normal gravity at a latitude and height.
 *
 * Model: Somigliana's closed form on the WGS 84 ellipsoid, free air to second order in height.
 * Validity: -5 to 86 km, enforced; height above sea level taken for height above the ellipsoid (up to 100 m apart, 3e-5).
 * Real gravity differs by local anomalies of some 1e-5 to 3e-4 (from memory).
 * Accuracy: 1.5e-10 m s⁻² against the ellipsoid's own equator and pole values; 1.2e-5 relative against the field of mass, bulge and
 * spin at the equator, to 86 km.
 * Source: WGS 84 (NIMA TR8350.2, third edition, equations 4-1 to 4-3, from memory).
 *
 * @param latitudeDeg - geodetic latitude, -90 to 90°
 * @param altitudeM - height, -5000 to 86 000 m
 * @returns acceleration, m s⁻²
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { gravity } from "airlight";
 * gravity(45, 0); // => 9.80619777
 */
export function gravity(latitudeDeg: Degrees, altitudeM: Metres): number {
  checkNumber(latitudeDeg, -90, 90, "degrees", "latitudeDeg", "gravity");
  checkNumber(altitudeM, -5000, 86_000, "m", "altitudeM", "gravity");
  return normalGravity(latitudeDeg, altitudeM);
}

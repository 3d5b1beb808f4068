/** Refraction from the true zenith angle. */
import { checkNumber } from "../_check.js";
import { tan } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { checkSurface, type SurfaceAir } from "./_checkSurface.js";

/** Arcminutes at 101 kPa and 283 K: 1.02 cot(h + 10.3 / (h + 5.11)), h the true elevation in degrees. */
const SCALE_ARCMIN = 1.02;
const A = 10.3; // degrees squared
const B = 5.11; // degrees
const PRESSURE_PA = 101_000;
const TEMPERATURE_K = 283;

/**
 * Refraction from the true zenith angle: how much higher a star appears than it is.
 *
 * Model: cotangent of a shifted elevation, in proportion to pressure over temperature.
 * Validity: true zenith angle 0 to 90.6° (the apparent horizon), enforced; yellow light, weather near standard.
 * Accuracy: within 9.7″ (0.16′) to 88° against `refractedPath` in its own weather (101 kPa, 283 K, humidity 0.5, 575 nm), +11″ at
 * 89°, +31″ at 90°. 0.07′ against `refractionBennett` at the refracted angle (its author states
 * 0.1′); -0.1″ at the zenith, where 0 is right; refraction at the horizon varies by several arcminutes with the weather near
 * the ground, which no such formula knows.
 * Source: Sæmundsson 1986, Sky & Telescope 72, 70; printed in Meeus, Astronomical Algorithms, chapter 16 (from memory).
 *
 * @param trueZenithDeg - true (geometric) zenith angle, 0 to 90.6°
 * @param surface - `pressurePa` 10 000 to 140 000 Pa; `temperatureK` 180 to 380 K at the observer
 * @returns refraction, degrees: apparent zenith angle = true zenith angle - refraction
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { refractionSaemundsson } from "airlight";
 * refractionSaemundsson(90, { pressurePa: 101000, temperatureK: 283 }); // => 0.48303
 */
export function refractionSaemundsson(trueZenithDeg: Degrees, surface: SurfaceAir): Degrees {
  checkNumber(trueZenithDeg, 0, 90.6, "degrees", "trueZenithDeg", "refractionSaemundsson");
  checkSurface(surface, "refractionSaemundsson");
  const h = 90 - trueZenithDeg;
  const arcmin = SCALE_ARCMIN / tan((h + A / (h + B)) * RADIANS_PER_DEGREE);
  return (
    ((arcmin / 60) * surface.pressurePa * TEMPERATURE_K) / (PRESSURE_PA * surface.temperatureK)
  );
}

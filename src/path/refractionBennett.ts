/** Refraction from the apparent zenith angle. */
import { checkNumber } from "../_check.js";
import { tan } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { checkSurface, type SurfaceAir } from "./_checkSurface.js";

/** Arcminutes at 101 kPa and 283 K: cot(h + 7.31 / (h + 4.4)), h the apparent elevation in degrees. */
const A = 7.31; // degrees squared
const B = 4.4; // degrees
const PRESSURE_PA = 101_000;
const TEMPERATURE_K = 283;

/**
 * Refraction from the apparent zenith angle: how much higher a star appears than it is.
 *
 * Model: cotangent of a shifted elevation, in proportion to pressure over temperature.
 * Validity: apparent zenith angle 0 to 90°, enforced; yellow light, weather near standard.
 * Accuracy: within 6.1″ (0.10′) to 87° against `refractedPath` in its own weather (101 kPa, 283 K, humidity 0.5, 575 nm), +20″ at
 * 89°, +44″ at the horizon. Its author states 0.07′ over the whole range. -0.08″ at the zenith, where 0 is
 * right; 34.5′ at the horizon, where the weather near the ground moves the truth by several arcminutes.
 * Source: Bennett 1982, J. Navigation 35, 255, formula G; printed in Meeus, Astronomical Algorithms, chapter 16 (from memory).
 *
 * @param apparentZenithDeg - apparent (refracted) zenith angle, 0 to 90°
 * @param surface - `pressurePa` 10 000 to 140 000 Pa; `temperatureK` 180 to 380 K at the observer
 * @returns refraction, degrees: true zenith angle = apparent zenith angle + refraction
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { refractionBennett } from "airlight";
 * refractionBennett(90, { pressurePa: 101000, temperatureK: 283 }); // => 0.574626
 */
export function refractionBennett(apparentZenithDeg: Degrees, surface: SurfaceAir): Degrees {
  checkNumber(apparentZenithDeg, 0, 90, "degrees", "apparentZenithDeg", "refractionBennett");
  checkSurface(surface, "refractionBennett");
  const h = 90 - apparentZenithDeg;
  const arcmin = 1 / tan((h + A / (h + B)) * RADIANS_PER_DEGREE);
  return (
    ((arcmin / 60) * surface.pressurePa * TEMPERATURE_K) / (PRESSURE_PA * surface.temperatureK)
  );
}

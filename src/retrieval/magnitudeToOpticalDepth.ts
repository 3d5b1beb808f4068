/** From the magnitudes of photometry to optical depth. */
import { checkNumber } from "../_check.js";
import type { Dimensionless } from "../units.js";

/** Optical depth of one magnitude: ln 10 / 2.5, derived, rounded to double precision. */
const DEPTH_PER_MAGNITUDE = 0.9210340371976183;

/**
 * Optical depth from an extinction in magnitudes (vertical, from magnitudes per air mass).
 *
 * Model: magnitudes times ln 10 / 2.5. The inverse of `opticalDepthToMagnitude`.
 * Validity: -100 to 100.
 * Accuracy: 1e-15 relative.
 * Source: definition of the magnitude (Pogson).
 *
 * @param magnitude - magnitudes, or magnitudes per air mass, -100 to 100
 * @returns optical depth
 * @throws TypeError if the magnitude is not a number; RangeError if it is out of range
 * @example
 * import { magnitudeToOpticalDepth } from "airlight";
 * magnitudeToOpticalDepth(0.12); // => 0.110524
 */
export function magnitudeToOpticalDepth(magnitude: number): Dimensionless {
  checkNumber(magnitude, -100, 100, "", "magnitude", "magnitudeToOpticalDepth");
  return DEPTH_PER_MAGNITUDE * magnitude;
}

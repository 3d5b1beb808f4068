/** From optical depth to the magnitudes of photometry. */
import { checkNumber } from "../_check.js";
import type { Dimensionless } from "../units.js";

/** Magnitudes in one unit of optical depth: 2.5 / ln 10, derived, rounded to double precision. */
const MAGNITUDES_PER_DEPTH = 1.0857362047581296;

/**
 * Extinction in magnitudes (per air mass, from a vertical optical depth).
 *
 * Model: 2.5 log10 e times the optical depth.
 * Validity: -100 to 100; monochromatic light or a depth averaged over the band.
 * Accuracy: 1e-15 relative.
 * Source: definition of the magnitude (Pogson).
 *
 * @param opticalDepth - optical depth, -100 to 100
 * @returns magnitudes
 * @throws TypeError if the depth is not a number; RangeError if it is out of range
 * @example
 * import { opticalDepthToMagnitude } from "airlight";
 * opticalDepthToMagnitude(0.1); // => 0.108574
 */
export function opticalDepthToMagnitude(opticalDepth: Dimensionless): number {
  checkNumber(opticalDepth, -100, 100, "", "opticalDepth", "opticalDepthToMagnitude");
  return MAGNITUDES_PER_DEPTH * opticalDepth;
}

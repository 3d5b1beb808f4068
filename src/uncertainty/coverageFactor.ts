/** From a standard to an expanded uncertainty. */
import { checkNumber } from "../_check.js";
import { studentQuantile } from "../_studentQuantile.js";
import type { Dimensionless, Fraction } from "../units.js";

/**
 * Factor k by which a standard uncertainty is multiplied to cover the truth with a wanted probability.
 *
 * Model: two-sided quantile of Student's t; the normal distribution where the degrees of freedom are infinite.
 * Validity: probability 1e-6 to 1 - 1e-12, degrees of freedom from 1, whole or not, both enforced.
 * Accuracy: 1e-12 relative against 20-digit values of the t distribution at probabilities 0.95 to 0.9999, 5e-12 from 0.001 up, 1 to 1e6
 * degrees of freedom; 1e-10 at 1e-6, and 1e-4 at 1 - 1e-12, where 1 less the probability keeps few digits.
 * Source: GUM 2008 (JCGM 100), G.3 and G.4; continued fraction of Abramowitz & Stegun 1964, 26.5.8.
 *
 * @param probability - probability of the interval, 1e-6 to 1 - 1e-12 (0.95 for the usual one)
 * @param degreesOfFreedom - of the standard uncertainty, 1 to Infinity; `propagate` gives them
 * @returns k, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { coverageFactor } from "airlight";
 * coverageFactor(0.99, 16); // => 2.92
 * coverageFactor(0.95, Infinity); // => 1.96
 */
export function coverageFactor(probability: Fraction, degreesOfFreedom: number): Dimensionless {
  checkNumber(probability, 1e-6, 1 - 1e-12, "fraction", "probability", "coverageFactor");
  checkNumber(degreesOfFreedom, 1, Infinity, "", "degreesOfFreedom", "coverageFactor");
  return studentQuantile(probability, degreesOfFreedom);
}

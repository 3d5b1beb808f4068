/** How two results of the same inputs go together. */
import { checkRecord, refuse } from "../_check.js";
import type { Dimensionless } from "../units.js";
import type { Propagation } from "./propagate.js";

/**
 * Correlation coefficient of two results propagated from the same inputs.
 *
 * Model: covariance = sum over all pairs of inputs of the first's sensitivity times their covariance times the second's.
 * Validity: both from `propagate` with the same inputs and correlations, enforced by name; first order, as `propagate`.
 * Accuracy: GUM H.2 to its printed digits.
 * Source: GUM 2008 (JCGM 100), H.2.3, equation H.9 (equation number from memory).
 *
 * @param first - result of `propagate`
 * @param second - another result of `propagate` from the same inputs
 * @returns correlation coefficient, -1 to 1; 0 where either result has no uncertainty
 * @throws TypeError if an argument is not a result of `propagate` or their inputs differ
 * @example
 * import { propagate, propagatedCorrelation } from "airlight";
 * const inputs = { a: { value: 3, standardUncertainty: 0.1 }, b: { value: 4, standardUncertainty: 0.1 } };
 * const sum = propagate(({ a, b }) => a + b, inputs);
 * const product = propagate(({ a, b }) => a * b, inputs);
 * propagatedCorrelation(sum, product); // => 0.98995
 */
export function propagatedCorrelation(first: Propagation, second: Propagation): Dimensionless {
  for (const result of [first, second]) {
    checkRecord(result, "result", "propagatedCorrelation");
    if (result.inputCorrelation instanceof Float64Array) continue;
    refuse(result, "made by propagate(...)", "", "result", "propagatedCorrelation");
  }
  const [rows, others] = [first.budget, second.budget];
  const same =
    rows.length === others.length && rows.every((row, i) => row.input === others[i]?.input);
  if (!same) refuse(second, "made from the same inputs", "", "second", "propagatedCorrelation");
  const scale = first.standardUncertainty * second.standardUncertainty;
  if (scale === 0) return 0;
  let covariance = 0;
  rows.forEach((row, i) => {
    const step = row.sensitivity * row.standardUncertainty;
    others.forEach((other, j) => {
      const r = first.inputCorrelation[i * rows.length + j]!;
      covariance += step * r * other.sensitivity * other.standardUncertainty;
    });
  });
  return Math.min(1, Math.max(-1, covariance / scale));
}

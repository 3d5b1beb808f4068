/** The sums of the law of propagation. */
import type { BudgetRow } from "../budget.js";
import { refuse } from "../_check.js";

/** Variance and rows from signed sensitivities and the correlation matrix. */
export function combine(
  parts: readonly Pick<BudgetRow, "input" | "standardUncertainty" | "sensitivity">[],
  matrix: Float64Array,
): { variance: number; budget: BudgetRow[] } {
  const steps = parts.map((part) => part.standardUncertainty * part.sensitivity);
  const joint = steps.map((step, i) => {
    let sum = 0;
    for (let j = 0; j < steps.length; j++) sum += matrix[i * steps.length + j]! * steps[j]!;
    return step * sum;
  });
  const variance = joint.reduce((sum, term) => sum + term, 0);
  const scale = steps.reduce((sum, step) => sum + step * step, 0);
  if (variance < -1e-12 * scale) {
    refuse(variance, "correlations that inputs can have together", "", "the variance", "propagate");
  }
  const budget = parts.map((part, i) => ({
    ...part,
    contribution: Math.abs(steps[i]!),
    share: variance > 0 ? joint[i]! / variance : 0,
  }));
  return { variance: Math.max(0, variance), budget };
}

/** Welch-Satterthwaite: u⁴ over the sum of contributions⁴ over their degrees of freedom. */
export function effectiveDegrees(
  degrees: readonly number[],
  budget: readonly BudgetRow[],
  matrix: Float64Array,
): number {
  const n = degrees.length;
  let [variance, sum] = [0, 0];
  for (let i = 0; i < n; i++) {
    const square = budget[i]!.contribution * budget[i]!.contribution;
    variance += square;
    sum += (square * square) / degrees[i]!;
    for (let j = 0; j < n; j++) {
      if (i !== j && matrix[i * n + j] !== 0 && degrees[i]! < Infinity) return Number.NaN;
    }
  }
  return sum > 0 ? (variance * variance) / sum : Number.POSITIVE_INFINITY;
}

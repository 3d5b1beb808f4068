/** A fit to values that scatter by more than their own errors say. */
import { type LinearFit, leastSquares } from "./_leastSquares.js";
import { dot } from "./_smallMatrices.js";

/** A fit and the scatter it needed. */
export interface RandomEffectsFit extends LinearFit {
  /** Variance added to every value's own so that chi-square equals the degrees of freedom; 0 if none was needed. */
  readonly addedVariance: number;
}

/**
 * Least squares with weights 1 / (variance + added), the added variance the one at which chi-square meets the degrees of
 * freedom (Paule & Mandel 1982, J. Res. Natl. Bur. Stand. 87, 377, from memory), by bisection.
 */
export function randomEffectsFit(
  columns: readonly Float64Array[],
  data: Float64Array,
  variances: Float64Array,
): RandomEffectsFit | undefined {
  const degrees = data.length - columns.length;
  const fitWith = (added: number): LinearFit | undefined =>
    leastSquares(
      columns,
      data,
      variances.map((variance) => 1 / (variance + added)),
    );
  const first = fitWith(0);
  if (first === undefined) return undefined;
  if (!(first.chiSquare > degrees)) return { ...first, addedVariance: 0 };
  let [low, high] = [0, dot(first.residuals, first.residuals)];
  for (let step = 0; step < 60; step++) {
    const middle = 0.5 * (low + high);
    if (fitWith(middle)!.chiSquare > degrees) low = middle;
    else high = middle;
  }
  return { ...fitWith(high)!, addedVariance: high };
}

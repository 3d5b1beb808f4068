/** Least squares for data whose errors are correlated. */
import { choleskyRoot } from "../_choleskyRoot.js";
import { type LinearFit, leastSquares } from "./_leastSquares.js";

/**
 * Least (y - A x)ᵀ C⁻¹ (y - A x): data and columns are divided by the lower root of C, then fitted with weights 1. The
 * residuals are the divided ones. Undefined where C is not positive definite or a column follows from the others.
 */
export function correlatedLeastSquares(
  columns: readonly Float64Array[],
  data: Float64Array,
  covariance: Float64Array,
): LinearFit | undefined {
  const root = choleskyRoot(covariance, data.length);
  if (root === undefined) return undefined;
  // where some of the data follow wholly from the others a zero on the diagonal divides: no column has a finite length then
  const divided = columns.map((column) => forward(root, column));
  return leastSquares(divided, forward(root, data), new Float64Array(data.length).fill(1));
}

/** Solves root × result = vector. */
function forward(root: Float64Array, vector: Float64Array): Float64Array {
  const n = vector.length;
  const result = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    let sum = vector[i]!;
    for (let k = 0; k < i; k++) sum -= root[i * n + k]! * result[k]!;
    result[i] = sum / root[i * n + i]!;
  }
  return result;
}

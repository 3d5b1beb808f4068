/** Least squares for data whose errors are correlated. */
import { sqrt } from "../_numeric.js";
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
  const divided = columns.map((column) => forward(root, column));
  return leastSquares(divided, forward(root, data), new Float64Array(data.length).fill(1));
}

/** Lower triangular root of a symmetric matrix, undefined where it is not positive definite. */
function choleskyRoot(matrix: Float64Array, n: number): Float64Array | undefined {
  const root = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j]!;
      for (let k = 0; k < j; k++) sum -= root[i * n + k]! * root[j * n + k]!;
      if (i === j && !(sum > 1e-14 * matrix[i * n + i]!)) return undefined;
      root[i * n + j] = i === j ? sqrt(sum) : sum / root[j * n + j]!;
    }
  }
  return root;
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

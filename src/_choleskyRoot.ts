/** The root of a covariance or correlation matrix. */
import { sqrt } from "./_numeric.js";

/**
 * Lower triangular root of a symmetric matrix of n rows. A row that follows wholly from the ones before it (what is left of its
 * variance is below 1e-14 of it) gets a zero on the diagonal; undefined where a variance would be negative beyond 1e-9.
 */
export function choleskyRoot(matrix: Float64Array, n: number): Float64Array | undefined {
  const root = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    const variance = matrix[i * n + i]!;
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j]!;
      for (let k = 0; k < j; k++) sum -= root[i * n + k]! * root[j * n + k]!;
      const pivot = root[j * n + j]!;
      if (i !== j) root[i * n + j] = pivot > 0 ? sum / pivot : 0;
      else if (!(sum >= -1e-9 * variance)) return undefined;
      else root[i * n + i] = sum > 1e-14 * variance ? sqrt(sum) : 0;
    }
  }
  return root;
}

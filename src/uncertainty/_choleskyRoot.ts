/** The root of a correlation matrix. */
import { refuse } from "../_check.js";
import { sqrt } from "../_numeric.js";

/** Lower triangular root of a correlation matrix; inputs that follow wholly from earlier ones get a zero column. */
export function choleskyRoot(matrix: Float64Array, n: number): Float64Array {
  const root = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j]!;
      for (let k = 0; k < j; k++) sum -= root[i * n + k]! * root[j * n + k]!;
      const pivot = root[j * n + j]!;
      if (i === j && sum < -1e-9) {
        refuse(sum, "coefficients that can hold together", "", "correlations", "monteCarlo");
      }
      root[i * n + j] = i === j ? sqrt(Math.max(0, sum)) : pivot > 1e-7 ? sum / pivot : 0;
    }
  }
  return root;
}

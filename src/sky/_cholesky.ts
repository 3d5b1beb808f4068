/** Symmetric positive definite systems, row by row in flat arrays. */
import type { Zeros } from "./_zeros.js";

/** Lower Cholesky factor of `matrix` plus `diagonal`; its diagonal holds reciprocals. */
export function choleskyFactor(
  zeros: Zeros,
  matrix: Float64Array,
  diagonal: Float64Array,
  size: number,
): Float64Array {
  const factor = zeros(size * size);
  for (let i = 0; i < size; i++) {
    const row = i * size;
    for (let j = 0; j < i; j++) {
      let sum = matrix[row + j]!;
      const other = j * size;
      for (let k = 0; k < j; k++) sum -= factor[row + k]! * factor[other + k]!;
      factor[row + j] = sum * factor[other + j]!;
    }
    let square = matrix[row + i]! + diagonal[i]!;
    for (let k = 0; k < i; k++) square -= factor[row + k]! * factor[row + k]!;
    factor[row + i] = 1 / Math.sqrt(square);
  }
  return factor;
}

/** Solves in place with the factor of `choleskyFactor`. */
export function choleskySolve(factor: Float64Array, vector: Float64Array): Float64Array {
  const size = vector.length;
  for (let i = 0; i < size; i++) {
    let sum = vector[i]!;
    for (let k = 0; k < i; k++) sum -= factor[i * size + k]! * vector[k]!;
    vector[i] = sum * factor[i * size + i]!;
  }
  for (let i = size - 1; i >= 0; i--) {
    const value = vector[i]! * factor[i * size + i]!;
    vector[i] = value;
    for (let k = 0; k < i; k++) vector[k]! -= factor[i * size + k]! * value;
  }
  return vector;
}

/** Square matrices in flat arrays, row by row. */
import { copyOf, type Zeros } from "./_zeros.js";

/** The unit matrix. */
export function identity(zeros: Zeros, size: number): Float64Array {
  const matrix = zeros(size * size);
  for (let i = 0; i < size; i++) matrix[i * size + i] = 1;
  return matrix;
}

/** Product of two matrices. */
export function product(
  zeros: Zeros,
  left: Float64Array,
  right: Float64Array,
  size: number,
): Float64Array {
  const result = zeros(size * size);
  for (let i = 0; i < size; i++) {
    for (let k = 0; k < size; k++) {
      const part = left[i * size + k]!;
      for (let j = 0; j < size; j++) result[i * size + j]! += part * right[k * size + j]!;
    }
  }
  return result;
}

/** Matrix times vector, added to `start` where one is given. */
export function apply(
  zeros: Zeros,
  matrix: Float64Array,
  vector: Float64Array,
  start?: Float64Array,
): Float64Array {
  const size = vector.length;
  const result = zeros(size);
  for (let i = 0; i < size; i++) {
    let sum = start === undefined ? 0 : start[i]!;
    for (let j = 0; j < size; j++) sum += matrix[i * size + j]! * vector[j]!;
    result[i] = sum;
  }
  return result;
}

/**
 * Inverse by elimination without exchange of rows: for matrices near the unit matrix (1 less a reflection of norm below 1).
 * Columns already eliminated are left as they are in `work`; those not yet reached are still zero in the result.
 */
export function inverse(zeros: Zeros, matrix: Float64Array, size: number): Float64Array {
  const work = copyOf(zeros, matrix);
  const result = identity(zeros, size);
  for (let p = 0; p < size; p++) {
    const pivot = p * size;
    const scale = 1 / work[pivot + p]!;
    for (let j = p + 1; j < size; j++) work[pivot + j]! *= scale;
    for (let j = 0; j <= p; j++) result[pivot + j]! *= scale;
    for (let i = 0; i < size; i++) {
      if (i === p) continue;
      const row = i * size;
      const part = work[row + p]!;
      for (let j = p + 1; j < size; j++) work[row + j]! -= part * work[pivot + j]!;
      for (let j = 0; j <= p; j++) result[row + j]! -= part * result[pivot + j]!;
    }
  }
  return result;
}

/** `left` plus `scale` times `right`, number by number. */
export function plus(
  zeros: Zeros,
  left: Float64Array,
  scale: number,
  right: Float64Array,
): Float64Array {
  const result = copyOf(zeros, left);
  for (let i = 0; i < result.length; i++) result[i]! += scale * right[i]!;
  return result;
}

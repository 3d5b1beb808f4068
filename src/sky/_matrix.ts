/** Square matrices in flat arrays, row by row. */

/** The unit matrix. */
export function identity(size: number): Float64Array {
  const matrix = new Float64Array(size * size);
  for (let i = 0; i < size; i++) matrix[i * size + i] = 1;
  return matrix;
}

/** Product of two matrices. */
export function product(left: Float64Array, right: Float64Array, size: number): Float64Array {
  const result = new Float64Array(size * size);
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
  matrix: Float64Array,
  vector: Float64Array,
  start?: Float64Array,
): Float64Array {
  const size = vector.length;
  const result = new Float64Array(size);
  for (let i = 0; i < size; i++) {
    let sum = start === undefined ? 0 : start[i]!;
    for (let j = 0; j < size; j++) sum += matrix[i * size + j]! * vector[j]!;
    result[i] = sum;
  }
  return result;
}

/** Inverse by elimination without exchange of rows: for matrices near the unit matrix (1 less a reflection of norm below 1). */
export function inverse(matrix: Float64Array, size: number): Float64Array {
  const work = matrix.slice();
  const result = identity(size);
  for (let p = 0; p < size; p++) {
    const scale = 1 / work[p * size + p]!;
    for (let j = 0; j < size; j++) {
      work[p * size + j]! *= scale;
      result[p * size + j]! *= scale;
    }
    for (let i = 0; i < size; i++) {
      if (i === p) continue;
      const part = work[i * size + p]!;
      for (let j = 0; j < size; j++) {
        work[i * size + j]! -= part * work[p * size + j]!;
        result[i * size + j]! -= part * result[p * size + j]!;
      }
    }
  }
  return result;
}

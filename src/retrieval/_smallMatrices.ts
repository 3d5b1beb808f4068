/** Products and inverses of a handful of rows. */

/** Sum of products. */
export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

/** Inverse of an upper triangular matrix, row by row. */
export function invertUpper(upper: Float64Array, n: number): Float64Array {
  const inverse = new Float64Array(n * n);
  for (let j = 0; j < n; j++) {
    inverse[j * n + j] = 1 / upper[j * n + j]!;
    for (let i = j - 1; i >= 0; i--) {
      let sum = 0;
      for (let k = i + 1; k <= j; k++) sum += upper[i * n + k]! * inverse[k * n + j]!;
      inverse[i * n + j] = -sum / upper[i * n + i]!;
    }
  }
  return inverse;
}

/** A matrix times its own transpose. */
export function timesTranspose(matrix: Float64Array, n: number): Float64Array {
  const product = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j < n; j++) {
      product[i * n + j] = dot(
        matrix.subarray(i * n, i * n + n),
        matrix.subarray(j * n, j * n + n),
      );
    }
  }
  return product;
}

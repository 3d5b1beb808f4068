/** Weighted least squares for a handful of unknowns. */
import { sqrt } from "../_numeric.js";
import { dot, invertUpper, timesTranspose } from "./_smallMatrices.js";

/** What a fit gives. */
export interface LinearFit {
  /** The unknowns, in the order of the columns. */
  readonly unknowns: Float64Array;
  /** Their covariance for weights that are inverse variances, row by row. */
  readonly covariance: Float64Array;
  /** Row by row, data minus fit. */
  readonly residuals: Float64Array;
  /** Sum of weighted squared residuals. */
  readonly chiSquare: number;
}

/**
 * Least Σ w (y - A x)², `columns` holding A column by column. Columns are orthogonalised (modified Gram-Schmidt, Björck 1967),
 * which keeps the digits that normal equations lose. Undefined where a column follows from the ones before it to 1e-10.
 */
export function leastSquares(
  columns: readonly Float64Array[],
  data: Float64Array,
  weights: Float64Array,
): LinearFit | undefined {
  const n = columns.length;
  const roots = weights.map(sqrt);
  const basis = columns.map((column) => column.map((value, i) => value * roots[i]!));
  const rest = data.map((value, i) => value * roots[i]!);
  const upper = new Float64Array(n * n);
  const projections = new Float64Array(n);
  const lengths = basis.map((column) => sqrt(dot(column, column)));
  for (let j = 0; j < n; j++) {
    const q = basis[j]!;
    const length = sqrt(dot(q, q));
    if (!(length > 1e-10 * lengths[j]!)) return undefined;
    for (let i = 0; i < q.length; i++) q[i]! /= length;
    upper[j * n + j] = length;
    for (let k = j + 1; k < n; k++) upper[j * n + k] = remove(q, basis[k]!);
    projections[j] = remove(q, rest);
  }
  const inverse = invertUpper(upper, n);
  const residuals = rest.map((value, i) => (roots[i]! > 0 ? value / roots[i]! : Number.NaN));
  return {
    unknowns: Float64Array.from(columns, (_, j) =>
      dot(inverse.subarray(j * n, j * n + n), projections),
    ),
    covariance: timesTranspose(inverse, n),
    residuals,
    chiSquare: dot(rest, rest),
  };
}

/** Takes the part along the unit vector `q` out of `vector` and returns its length. */
function remove(q: Float64Array, vector: Float64Array): number {
  const along = dot(q, vector);
  for (let i = 0; i < q.length; i++) vector[i]! -= along * q[i]!;
  return along;
}

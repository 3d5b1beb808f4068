/** A least-squares fit of several unknowns to the points that belong to it. */
import { sqrt } from "../_numeric.js";
import { type LinearFit, leastSquares } from "./_leastSquares.js";
import { median } from "./_median.js";

/** Median absolute deviation to standard deviation of a normal scatter: 1 / 0.67449. */
const NORMAL_MEDIAN = 1.482602;
/** Scatter below this (in units of the data) counts as this much: rounding is no ground for rejection. */
const LEAST_SCALE = 1e-9;
/** Rounds of reweighting towards least absolute deviations, and the residual (in units of the data) that counts as none. */
const ABSOLUTE_ROUNDS = 60;
const SMALL = 1e-7;
/** The set of kept points settles in a few rounds; one that swings to and fro is stopped. */
const MOST_ROUNDS = 30;

/** What `cleanedPlane` returns. */
export interface CleanedPlane {
  /** Fit through the kept points, in their order; covariance for the given weights. */
  readonly fit: LinearFit;
  /** Places of the kept points. */
  readonly kept: readonly number[];
  /** Distance of every point from the fit over the robust scale, signed, weighted. */
  readonly scores: Float64Array;
}

/**
 * Least absolute deviations by iterated reweighting; then, in rounds until nothing changes, the points within `limit`
 * scales (1.4826 n / (n - unknowns) times the median distance of the kept) are fitted by weighted least squares.
 * Undefined where the columns do not tell the unknowns apart.
 */
export function cleanedPlane(
  columns: readonly Float64Array[],
  data: Float64Array,
  weights: Float64Array,
  limit: number,
): CleanedPlane | undefined {
  const meanWeight = weights.reduce((sum, weight) => sum + weight) / weights.length;
  const roots = weights.map((weight) => sqrt(weight / meanWeight));
  let fit = leastAbsolute(columns, data, roots);
  let kept = Array.from(data.keys());
  for (let round = 0; fit !== undefined; round++) {
    const { unknowns } = fit;
    const off = data.map((value, i) => {
      return (
        roots[i]! * (value - columns.reduce((sum, column, k) => sum + unknowns[k]! * column[i]!, 0))
      );
    });
    const distances = Float64Array.from(kept, (i) => Math.abs(off[i]!));
    const scale =
      (NORMAL_MEDIAN * median(distances) * kept.length) / (kept.length - columns.length);
    const scores = off.map((value) => value / Math.max(LEAST_SCALE, scale));
    const near = Array.from(data.keys()).filter((i) => Math.abs(scores[i]!) <= limit);
    if (near.length <= columns.length) return undefined;
    const pick = (list: Float64Array): Float64Array => Float64Array.from(near, (i) => list[i]!);
    fit = leastSquares(columns.map(pick), pick(data), pick(weights));
    const settled = round > 0 && near.length === kept.length && near.every((i, k) => i === kept[k]);
    kept = near;
    if (fit !== undefined && (settled || round >= MOST_ROUNDS)) return { fit, kept, scores };
  }
  return undefined;
}

/** Fit of least absolute deviations: each round weights a point by its weight's root over its last distance. */
function leastAbsolute(
  columns: readonly Float64Array[],
  data: Float64Array,
  roots: Float64Array,
): LinearFit | undefined {
  let fit = leastSquares(
    columns,
    data,
    roots.map((root) => root * root),
  );
  for (let round = 0; fit !== undefined && round < ABSOLUTE_ROUNDS; round++) {
    const { residuals } = fit;
    const reweighted = roots.map((root, i) => root / Math.max(SMALL, Math.abs(residuals[i]!)));
    fit = leastSquares(columns, data, reweighted);
  }
  return fit;
}

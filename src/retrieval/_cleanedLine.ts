/** A least-squares line through the points that belong to it: robust start, stated rule of rejection, weighted fit. */
import { sqrt } from "../_numeric.js";
import { median } from "./_median.js";
import { repeatedMedianLine } from "./_repeatedMedianLine.js";
import { type FittedLine, weightedLine } from "./_weightedLine.js";

/** A point is rejected beyond this many scales from the line. */
export const REJECTION_SCALES = 3;
/** Median absolute deviation to standard deviation of a normal scatter: 1 / 0.67449. */
const NORMAL_MEDIAN = 1.482602;
/** Scatter below this counts as this much: rounding of the readings is no ground for rejection. */
const LEAST_SCALE = 1e-9;
/** The set of kept points settles in 3 to 6 rounds; one that swings to and fro is stopped. */
const MOST_ROUNDS = 30;

/** What `cleanedLine` returns. */
export interface CleanedLine {
  /** Least-squares line through the kept points, undefined if fewer than three are kept. */
  readonly line: FittedLine | undefined;
  /** Distance of each point from the line over the scale, signed, weighted; beyond ±REJECTION_SCALES it was rejected. */
  readonly scores: Float64Array;
}

/**
 * Repeated-median line; then in rounds until nothing changes: scale = 1.4826 (1 + 5 / (n - 2)) times the median distance
 * of the n kept points (Rousseeuw & Leroy 1987, from memory), keep the points within 3 scales, fit them by least squares.
 */
export function cleanedLine(x: Float64Array, y: Float64Array, weights: Float64Array): CleanedLine {
  const roots = weights.map((weight) => sqrt((weight * weights.length) / total(weights)));
  let guess: { intercept: number; slope: number } = repeatedMedianLine(x, y);
  let kept: readonly number[] = Array.from(x.keys());
  for (let round = 1; ; round++) {
    const off = y.map((value, i) => roots[i]! * (value - guess.intercept - guess.slope * x[i]!));
    const scale = scaleOf(Float64Array.from(kept, (i) => Math.abs(off[i]!)));
    const scores = off.map((value) => value / scale);
    const near = Array.from(x.keys()).filter((i) => Math.abs(scores[i]!) <= REJECTION_SCALES);
    if (near.length < 3) return { line: undefined, scores };
    const [nearX, nearY, nearW] = [x, y, weights].map((all) =>
      Float64Array.from(near, (i) => all[i]!),
    );
    const line = weightedLine(nearX!, nearY!, nearW!);
    const settled = round > 1 && near.length === kept.length && near.every((i, k) => i === kept[k]);
    if (settled || round >= MOST_ROUNDS) return { line, scores };
    guess = line;
    kept = near;
  }
}

function scaleOf(distances: Float64Array): number {
  const small = 1 + 5 / Math.max(1, distances.length - 2);
  return Math.max(LEAST_SCALE, NORMAL_MEDIAN * small * median(distances));
}

function total(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value);
}

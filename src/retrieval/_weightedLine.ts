/** The weighted least-squares line with its covariance. */

/** Covariance matrix of two fitted numbers, in their order. */
export type Covariance2 = readonly [readonly [number, number], readonly [number, number]];

/** A fitted line y = intercept + slope x. */
export interface FittedLine {
  /** Value at x = 0, in the unit of y. */
  readonly intercept: number;
  /** Change of y for one unit of x. */
  readonly slope: number;
  /** Covariance of intercept and slope, scaled by the scatter of the points about the line. */
  readonly covariance: Covariance2;
}

/** Line of least Σ w (y - line)² through at least three points; `w` need only be right up to a common factor. */
export function weightedLine(x: Float64Array, y: Float64Array, w: Float64Array): FittedLine {
  const total = sum(w);
  const meanX = sum(x.map((value, i) => w[i]! * value)) / total;
  const meanY = sum(y.map((value, i) => w[i]! * value)) / total;
  const sxx = sum(x.map((value, i) => w[i]! * (value - meanX) * (value - meanX)));
  const slope = sum(x.map((value, i) => w[i]! * (value - meanX) * (y[i]! - meanY))) / sxx;
  const scatter = y.map((value, i) => {
    const off = value - meanY - slope * (x[i]! - meanX);
    return w[i]! * off * off;
  });
  const variance = sum(scatter) / (x.length - 2);
  const shared = (-variance * meanX) / sxx;
  return {
    intercept: meanY - slope * meanX,
    slope,
    covariance: [
      [variance * (1 / total + (meanX * meanX) / sxx), shared],
      [shared, variance / sxx],
    ],
  };
}

function sum(values: Float64Array): number {
  let total = 0;
  for (const value of values) total += value;
  return total;
}

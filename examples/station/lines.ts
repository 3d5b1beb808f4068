/** Medians and straight lines through a few dozen points. */

/** A line: its value at x = 0 and its slope. */
export interface Line {
  readonly level: number;
  readonly slope: number;
}

/** Median of a list that is not empty. */
export function median(values: readonly number[]): number {
  const sorted = Float64Array.from(values).sort();
  const half = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2;
}

/** Mean of a list that is not empty. */
export function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** Median of the median slopes from each point to the others; level through fewer than three points. */
export function repeatedMedianLine(x: readonly number[], y: readonly number[]): Line {
  if (x.length < 3) return { level: median(y), slope: 0 };
  const slopes = x.map((xi, i) =>
    median(x.flatMap((xj, j) => (j === i ? [] : [(y[j]! - y[i]!) / (xj - xi)]))),
  );
  const slope = median(slopes);
  return { level: median(y.map((value, i) => value - slope * x[i]!)), slope };
}

/** The median of numbers. */

/** Median of `values` (mean of the middle two when even in number); `values` is left as it was; NaN for none. */
export function median(values: Float64Array): number {
  const sorted = values.slice().sort();
  const half = sorted.length >> 1;
  if (sorted.length % 2 === 1) return sorted[half]!;
  return (sorted[half - 1]! + sorted[half]!) / 2;
}

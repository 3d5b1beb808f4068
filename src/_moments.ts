/** Mean and standard deviation. */
import { sqrt } from "./_numeric.js";

/** Mean and standard deviation (n - 1), by sums of deviations from the first value; NaN where there are too few. */
export function moments(values: ArrayLike<number>): { mean: number; standardDeviation: number } {
  const origin = values[0] ?? Number.NaN;
  let [sum, squares] = [0, 0];
  for (let i = 0; i < values.length; i++) {
    const step = values[i]! - origin;
    sum += step;
    squares += step * step;
  }
  const mean = sum / values.length;
  const variance = (squares - sum * mean) / (values.length - 1);
  return { mean: origin + mean, standardDeviation: sqrt(Math.max(0, variance)) };
}

/** A straight line that up to half of the points cannot move far: Siegel 1982, Biometrika 69, 242 (from memory). */
import { median } from "./_median.js";

/** Intercept and slope. The slope is the median over points of the median slope from each to the others; work grows as n² log n. */
export function repeatedMedianLine(
  x: Float64Array,
  y: Float64Array,
): { intercept: number; slope: number } {
  const slope = median(x.map((_, i) => median(slopesFrom(i, x, y))));
  return { intercept: median(y.map((value, i) => value - slope * x[i]!)), slope };
}

/** Slopes from point `i` to every point with another x. */
function slopesFrom(i: number, x: Float64Array, y: Float64Array): Float64Array {
  const slopes = new Float64Array(x.length);
  let count = 0;
  for (let j = 0; j < x.length; j++) {
    if (x[j] !== x[i]) slopes[count++] = (y[j]! - y[i]!) / (x[j]! - x[i]!);
  }
  return slopes.subarray(0, count);
}

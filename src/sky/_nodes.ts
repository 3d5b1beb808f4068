/** Quadrature over (0, 1), such as the cosines of one hemisphere. */
import { cos } from "../_numeric.js";

/** Points in (0, 1) and the weights that integrate over them. */
export interface Nodes {
  readonly cosines: Float64Array;
  readonly weights: Float64Array;
}

/** Gauss-Legendre points on (0, 1), largest first, and their weights. */
export function gaussNodes(count: number): Nodes {
  const cosines = new Float64Array(count);
  const weights = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const { point, weight } = gaussPoint(count, i);
    cosines[i] = 0.5 * (1 + point);
    weights[i] = 0.5 * weight;
  }
  return { cosines, weights };
}

/**
 * Gauss-Legendre points crowded towards the horizon, where the field varies as exp(-depth / cosine): cosine = x³ with x
 * Gaussian on (0, 1). Largest cosine first. Exact for polynomials in the cosine up to degree (2 count - 3) / 3.
 */
export function halfRangeNodes(count: number): Nodes {
  const { cosines, weights } = gaussNodes(count);
  for (let i = 0; i < count; i++) {
    const x = cosines[i]!;
    cosines[i] = x * x * x;
    weights[i]! *= 3 * x * x;
  }
  return { cosines, weights };
}

/** The i-th root of the Legendre polynomial of degree `count`, largest first, by Newton's method, and its weight on (-1, 1). */
function gaussPoint(count: number, i: number): { point: number; weight: number } {
  let point = cos((Math.PI * (i + 0.75)) / (count + 0.5));
  let slope = 1;
  for (let step = 0; step < 6; step++) {
    let before = 1;
    let value = point;
    for (let k = 2; k <= count; k++) {
      const next = ((2 * k - 1) * point * value - (k - 1) * before) / k;
      before = value;
      value = next;
    }
    slope = (count * (point * value - before)) / (point * point - 1);
    const move = value / slope;
    point -= move;
    if (Math.abs(move) < 1e-15) break;
  }
  return { point, weight: 2 / ((1 - point * point) * slope * slope) };
}

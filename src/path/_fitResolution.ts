/** How finely a path is fitted, and the form its values are fitted in. */
import type { PathFit } from "./preparedPath.js";

/** Error allowed in refraction times reach over sine, degrees: 5e-6 arcsec at the horizon, less above. */
export const RISING_TOLERANCE = 1e-10;

/** Pieces and tolerance to begin with: those of another fit exactly, or as many as it takes. */
export function resolution(
  like: PathFit | undefined,
  fewest: number,
  tolerance: number,
): [number, number] {
  return like ? [like.pieces, Number.POSITIVE_INFINITY] : [fewest, tolerance];
}

/** What is smooth for rising rays: everything times reach, refraction over the sine as well. */
export function scaled(values: Float64Array, reach: number, sine: number): Float64Array {
  values[0]! /= sine;
  for (let q = 0; q < values.length; q++) values[q]! *= reach;
  return values;
}

/** Polynomials of degree 7 over equal pieces: from values at Chebyshev nodes, and their evaluation. */
import { cos } from "../_numeric.js";

/** Nodes a piece, one more than the degree. */
export const NODES = 8;

/** The Chebyshev node `k` of the piece, on [-1, 1]. */
export function chebyshevNode(k: number): number {
  return cos((Math.PI * (k + 0.5)) / NODES);
}

/** Powers of Chebyshev's polynomials T0 to T7, rising. */
const CHEBYSHEV: readonly (readonly number[])[] = [
  [1],
  [0, 1],
  [-1, 0, 2],
  [0, -3, 0, 4],
  [1, 0, -8, 0, 8],
  [0, 5, 0, -20, 0, 16],
  [-1, 0, 18, 0, -48, 0, 32],
  [0, -7, 0, 56, 0, -112, 0, 64],
];

/** Coefficients of the polynomials through `values` at the nodes of every piece in turn. */
export function piecesThrough(values: Float64Array): Float64Array {
  const coefficients = new Float64Array(values.length);
  for (let start = 0; start < values.length; start += NODES) {
    for (let order = 0; order < NODES; order++) {
      let sum = 0;
      for (let k = 0; k < NODES; k++) {
        sum += values[start + k]! * cos((Math.PI * order * (k + 0.5)) / NODES);
      }
      const share = (order === 0 ? 1 : 2) * (sum / NODES);
      for (const [power, factor] of CHEBYSHEV[order]!.entries()) {
        coefficients[start + power]! += share * factor;
      }
    }
  }
  return coefficients;
}

/** Value of the polynomials at `x`, which runs from 0 to the number of pieces (Estrin's form: short chains of products). */
export function atPiece(coefficients: Float64Array, pieces: number, x: number): number {
  const piece = Math.min(x | 0, pieces - 1);
  const t = 2 * (x - piece) - 1;
  const i = 8 * piece; // NODES as a literal: reading an exported constant costs more
  const t2 = t * t;
  const low = coefficients[i]! + t * coefficients[i + 1]!;
  const low2 = coefficients[i + 2]! + t * coefficients[i + 3]!;
  const high = coefficients[i + 4]! + t * coefficients[i + 5]!;
  const high2 = coefficients[i + 6]! + t * coefficients[i + 7]!;
  return low + t2 * low2 + t2 * t2 * (high + t2 * high2);
}

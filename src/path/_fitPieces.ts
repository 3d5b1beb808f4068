/** Fits several quantities at once by polynomials over equal pieces, with as many pieces as the tolerance asks for. */
import { atPiece, chebyshevNode, NODES, piecesThrough } from "./_pieces.js";
import type { PathFit } from "./preparedPath.js";

/** Relative tolerance of the masses. */
const MASS_TOLERANCE = 5e-10;
/** Most pieces. */
const MOST_PIECES = 512;

/** Gives the quantities, refraction first, at a place from 0 to `pieces`. */
export type Sample = (place: number, pieces: number) => ArrayLike<number>;

/** `refractionTolerance` is absolute, in the unit of the first quantity; Infinity keeps to the fewest pieces. */
export function fitPieces(
  quantities: number,
  fewest: number,
  refractionTolerance: number,
  sample: Sample,
): PathFit {
  for (let pieces = fewest; ; pieces *= 2) {
    const fit = fitThrough(quantities, pieces, sample);
    if (refractionTolerance === Number.POSITIVE_INFINITY || pieces >= MOST_PIECES) return fit;
    if (isClose(fit, refractionTolerance, sample)) return fit;
  }
}

function fitThrough(quantities: number, pieces: number, sample: Sample): PathFit {
  const values = Array.from({ length: quantities }, () => new Float64Array(pieces * NODES));
  for (let node = 0; node < pieces * NODES; node++) {
    const place = Math.floor(node / NODES) + (1 + chebyshevNode(node % NODES)) / 2;
    const here = sample(place, pieces);
    for (let q = 0; q < quantities; q++) values[q]![node] = here[q]!;
  }
  return { pieces, coefficients: values.map(piecesThrough) };
}

/** In the middle of a piece the error of a fit through Chebyshev's nodes is greatest, to first order. */
function isClose(
  { pieces, coefficients }: PathFit,
  refractionTolerance: number,
  sample: Sample,
): boolean {
  for (let piece = 0; piece < pieces; piece++) {
    const exact = sample(piece + 0.5, pieces);
    for (let q = 0; q < coefficients.length; q++) {
      const off = Math.abs(atPiece(coefficients[q]!, pieces, piece + 0.5) - exact[q]!);
      if (off > (q === 0 ? refractionTolerance : MASS_TOLERANCE * exact[q]!)) return false;
    }
  }
  return true;
}

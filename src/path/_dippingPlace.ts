/** The variable in which fits of dipping rays are polynomials: the root takes the kink at their upper end away. */
import { sqrt } from "../_numeric.js";

/** Place on the pieces, 0 to `pieces`, of an elevation between two dips. */
export function dippingPlace(
  elevationDeg: number,
  topDeg: number,
  bottomDeg: number,
  pieces: number,
): number {
  return pieces * sqrt(Math.max(0, topDeg - elevationDeg) / (topDeg - bottomDeg));
}

/** The elevation at a place between two dips. */
export function dippingElevation(
  place: number,
  topDeg: number,
  bottomDeg: number,
  pieces: number,
): number {
  const share = place / pieces;
  return topDeg - share * share * (topDeg - bottomDeg);
}

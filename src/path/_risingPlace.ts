/** The variable in which fits of rising rays are polynomials, the way back, and the loop that needs both to be fast. */
import { sqrt } from "../_numeric.js";
import { atPiece } from "./_pieces.js";
import type { PathFit } from "./preparedPath.js";

// near the sine of the elevation: minimax of sin e / y on y = e (2 S - e) / S², 2.6e-9; being even about the zenith S it
// costs no trigonometry, and what it lacks of the sine falls out
const Q0 = 0.7853981642640032;
const Q1 = 0.1963494975172256;
const Q2 = 0.0174296042247985;
const Q3 = 0.0007991321026736771;
const Q4 = 2.360101668185013e-5;
const S0 = 1.5707963267681446;
const S1 = -0.6459640955780664;
const S2 = 0.0796926037170901;
const S3 = -0.004681657795484792;
const S4 = 0.000160254691016072;
const S5 = -3.431829294044766e-6;
/** Where the sine is as large as this, near-horizontal rays end. */
const BEND = 0.08;

/** Near-sine of an elevation from 0 to `spanDeg`, the zenith, plus the bend; `perSquare` is 1 / spanDeg², worked out before. */
export function risingReach(elevationDeg: number, spanDeg: number, perSquare: number): number {
  const y = elevationDeg * (2 * spanDeg - elevationDeg) * perSquare;
  const y2 = y * y;
  return BEND + y * Q0 + y2 * (Q1 + y * Q2 + y2 * (Q3 + y * Q4));
}

/** Near-sine of a zenith angle up to `spanDeg`: minimax of sin / t in t², t = z / S, 2.7e-11. */
export function nearSine(zenithDeg: number, spanDeg: number): number {
  const t = zenithDeg / spanDeg;
  const s = t * t;
  return t * (S0 + s * (S1 + s * (S2 + s * (S3 + s * (S4 + s * S5)))));
}

/** Place on the pieces, 0 to `pieces`, of one over a reach. */
export function risingPlace(inverseReach: number, pieces: number): number {
  const scale = pieces * (1 + BEND);
  return scale - scale * BEND * inverseReach;
}

/** The elevation at a place on the pieces. */
export function risingElevation(place: number, spanDeg: number, pieces: number): number {
  const scale = pieces * (1 + BEND);
  const sine = (scale * BEND) / (scale - place) - BEND;
  let y = sine;
  // the slope in y runs from 0.79 to 1.23: this contracts by a quarter each time
  for (let i = 0; i < 40; i++) {
    y -= y * (Q0 + y * (Q1 + y * (Q2 + y * (Q3 + y * Q4)))) - sine;
  }
  return (spanDeg * y) / (1 + sqrt(Math.max(0, 1 - y)));
}

/**
 * Masses of the rays among `zenithsDeg` that rise; true if that is all of them. Here because constants of this file read from
 * another cost half as much again.
 */
export function fillRising(
  { pieces, coefficients }: PathFit,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  levelDeg: number,
  out: Float64Array,
): boolean {
  const table = coefficients[quantity]!;
  const span = 90 + levelDeg;
  const perSquare = 1 / (span * span);
  const scale = pieces * (1 + BEND);
  const slope = scale * BEND;
  let all = true;
  for (let i = 0; i < zenithsDeg.length; i++) {
    const above = 90 - zenithsDeg[i]! + levelDeg;
    if (above >= 0 && above <= span) {
      const inverse = 1 / risingReach(above, span, perSquare);
      out[i] = atPiece(table, pieces, scale - slope * inverse) * inverse;
    } else all = false;
  }
  return all;
}

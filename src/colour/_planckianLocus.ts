/** The curve of black bodies in the CIE 1960 diagram, straight from Planck's law: no table of temperatures. */
import { exp } from "../_numeric.js";
import { SECOND_RADIATION_CONSTANT } from "../constants.js";
import { cie1931Observer } from "./cie1931Observer.js";

/** u and v of a black body with their first and second derivatives by reciprocal temperature. */
export interface LocusPoint {
  readonly u: number;
  readonly v: number;
  readonly u1: number;
  readonly v1: number;
  readonly u2: number;
  readonly v2: number;
}

/** Point of the locus at a reciprocal temperature in mired (1e6 K⁻¹). */
export function planckianLocus(mired: number): LocusPoint {
  const { startNm, stepNm, x, y, z } = cie1931Observer;
  // sums of 4 X, 6 Y and X + 15 Y + 3 Z, so that u = a / d and v = b / d, and their derivatives
  let [a, b, d, a1, b1, d1, a2, b2, d2] = [0, 0, 0, 0, 0, 0, 0, 0, 0];
  for (let i = 0; i < x.length; i++) {
    const wavelengthNm = startNm + i * stepNm;
    const rate = (SECOND_RADIATION_CONSTANT * 1e3) / wavelengthNm; // exponent per mired
    const w = 500 / wavelengthNm;
    const q = 1 / (exp(rate * mired) - 1);
    const p = w * w * w * w * w * q;
    const p1 = -rate * p * (1 + q);
    const p2 = -rate * p1 * (1 + 2 * q);
    const four = 4 * x[i]!;
    const six = 6 * y[i]!;
    const all = x[i]! + 15 * y[i]! + 3 * z[i]!;
    a += p * four;
    b += p * six;
    d += p * all;
    a1 += p1 * four;
    b1 += p1 * six;
    d1 += p1 * all;
    a2 += p2 * four;
    b2 += p2 * six;
    d2 += p2 * all;
  }
  const u = a / d;
  const v = b / d;
  const u1 = (a1 - u * d1) / d;
  const v1 = (b1 - v * d1) / d;
  return { u, v, u1, v1, u2: (a2 - 2 * u1 * d1 - u * d2) / d, v2: (b2 - 2 * v1 * d1 - v * d2) / d };
}

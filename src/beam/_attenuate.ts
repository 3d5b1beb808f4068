/**
 * e^-depth over a whole list in half the time of one call a value: depths come in units of ln 2 / 256, so that the argument needs
 * no reduction, and the powers of two in an array the loop can hold on to.
 */
import { exp } from "../_numeric.js";

/** Units in a depth of 1: 256 / ln 2. */
export const UNITS_PER_DEPTH = 369.3299304675746;
/** (ln 2 / 256)^n / n!, n = 1 to 4, rounded; the fifth term is below 4e-17. */
const C1 = 0.0027076061740622863;
const C2 = 3.6655655969101062e-6;
const C3 = 3.3083026805413713e-9;
const C4 = 2.239395190875157e-12;
/** 2^(-k/256), k = 0 to 255, then 2^-k, k = 0 to 1075, the last of which is 0. */
const STEPS = 256;
const OCTAVES = 1076;
/** 1.5 * 2^52: adding and subtracting it rounds to the nearest integer. */
const ROUNDER = 6755399441055744;
/** Depth at which nothing is left: 256 times 1075. */
const OPAQUE = 275200;

/** The two tables in one array. */
export function attenuationPowers(): Float64Array {
  const powers = new Float64Array(STEPS + OCTAVES);
  for (let k = 0; k < STEPS; k++) powers[k] = exp(-k / UNITS_PER_DEPTH);
  powers[STEPS] = 1;
  for (let k = 1; k < OCTAVES; k++) powers[STEPS + k] = 0.5 * powers[STEPS + k - 1]!;
  return powers;
}

/** Turns the first `count` depths, in units and not negative, into transmittances. */
export function attenuate(values: Float64Array, count: number, powers: Float64Array): void {
  for (let i = 0; i < count; i++) {
    const given = values[i]!;
    // biome-ignore lint/complexity/useMathMinMax: a comparison takes 0.9 of the time of Math.min here, which looks for NaN and -0
    const depth = given < OPAQUE ? given : OPAQUE;
    const rounded = depth + ROUNDER - ROUNDER;
    const k = rounded | 0;
    const rest = rounded - depth;
    const power = powers[k & 255]! * powers[(k >> 8) + STEPS]!;
    const square = rest * rest;
    values[i] = power + power * (rest * C1 + square * (C2 + rest * C3 + square * C4));
  }
}

/** Exponentials in optical depth integrated along a line of sight. */
import { exp, expm1 } from "../_numeric.js";
import type { Stack } from "./_stack.js";

/** Relative distance in squared secants below which a beam and an eigenmode count as alike. */
const ALIKE = 3e-6;
/** Relative step to either side taken instead; its square is the relative error. */
const STEP = 7e-6;

/**
 * Secants that stand for `secant`: itself, or two a little to either side of it, each with half the weight, where it is so
 * near an eigenvalue of some layer that the formulas would lose digits (error below 1e-10 either way).
 */
export function safeSecants(stacks: readonly Stack[], secant: number): readonly number[] {
  const square = secant * secant;
  const margin = ALIKE * square;
  for (const { layers } of stacks) {
    for (const { squares } of layers) {
      for (let m = 0; m < squares.length; m++) {
        if (Math.abs(squares[m]! - square) < margin)
          return [secant * (1 - STEP), secant * (1 + STEP)];
      }
    }
  }
  return [secant];
}

/** Integral from the side the beam enters to where the line of sight ends beyond: (exp(-s t) - exp(-v t)) / (v - s), exact also where v = s. */
export function passedOn(view: number, sun: number, depth: number): number {
  const apart = (view - sun) * depth;
  if (Math.abs(apart) < 1e-300) return depth * exp(-sun * depth);
  if (apart > 0) return (-exp(-sun * depth) * expm1(-apart)) / (view - sun);
  return (exp(-view * depth) * expm1(apart)) / (view - sun);
}

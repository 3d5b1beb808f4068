/** The ground's light and the flux through a level, in the scaled fields of mode 0. */
import type { ModeKernel } from "./_kernel.js";
import { plus } from "./_matrix.js";
import type { Zeros } from "./_zeros.js";

/** Field of a surface of radiance 1, the same in all directions and unpolarised. */
export function evenGlow(zeros: Zeros, kernel: ModeKernel): Float64Array {
  const [c11, c21, c22] = kernel.mixing;
  const u1 = 0.5 / c11;
  const u2 = (0.5 - c21 * u1) / c22;
  return plus(zeros, plus(zeros, zeros(kernel.size), u1, kernel.first), u2, kernel.second);
}

/** Flux through a horizontal unit area of a field travelling up or down; `glow` is the field of `evenGlow`. */
export function fieldFlux(field: Float64Array, glow: Float64Array, secants: Float64Array): number {
  let sum = 0;
  for (let j = 0; j < field.length; j++) sum += (glow[j]! * field[j]!) / secants[j]!;
  return ((16 * Math.PI) / 3) * sum;
}

/** Entries of the twilight matrix. */
import { COMPONENTS } from "./_emission.js";
import type { Probe } from "./_probe.js";
import { ANGLES, type GridPlace, UNKNOWNS } from "./_twilightGrid.js";

/** Adds a field of `a` along e1, `b` along e2 and `g` between them to the four rows of a tensor. */
export function spreadTensor(
  kernel: Float64Array,
  at: number,
  place: GridPlace,
  p: Probe,
  a: number,
  b: number,
  g: number,
): void {
  spread(kernel, at, place, a * p.x1 * p.x1 + b * p.x2 * p.x2 + 2 * g * p.x1 * p.x2);
  spread(kernel, at + UNKNOWNS, place, a * p.y1 * p.y1 + b * p.y2 * p.y2 + 2 * g * p.y1 * p.y2);
  spread(kernel, at + 2 * UNKNOWNS, place, a * p.z1 * p.z1);
  spread(kernel, at + 3 * UNKNOWNS, place, (a * p.x1 + g * p.x2) * p.z1);
}

/** Adds `value` to one row, shared among the four grid points of a place. */
export function spread(kernel: Float64Array, at: number, place: GridPlace, value: number): void {
  kernel[at]! += place.s00 * value;
  kernel[at + COMPONENTS]! += place.s01 * value;
  kernel[at + COMPONENTS * ANGLES]! += place.s10 * value;
  kernel[at + COMPONENTS * (ANGLES + 1)]! += place.s11 * value;
}

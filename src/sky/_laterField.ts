/** How the light at every point of the twilight grid feeds the light at every other. */
import { exp } from "../_numeric.js";
import { COMPONENTS, emission } from "./_emission.js";
import type { Probe } from "./_probe.js";
import { spread, spreadTensor } from "./_spread.js";
import {
  ANGLES,
  findPlace,
  type GridPlace,
  gridColumn,
  lnBetween,
  TENSORS,
  UNKNOWNS,
} from "./_twilightGrid.js";

/** The matrix to fill, its unknowns relative to references, and the air and ground it stands for. */
export interface LaterTarget {
  readonly dipole: number;
  readonly albedo: number;
  readonly lnReference: Float64Array;
  readonly lnGround: Float64Array;
  readonly kernel: Float64Array;
}

/** Adds what one ray brings a grid point of the light at all others. */
export function addLater(p: Probe, target: LaterTarget): void {
  const { dipole, lnReference, lnGround, kernel } = target;
  const here = p.row * ANGLES + p.column;
  const lnHere = lnReference[here]!;
  const { paths, heights, weights } = p.ray;
  const parts = new Float64Array(3 * COMPONENTS);
  const place: GridPlace = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
  const tensor = COMPONENTS * here * UNKNOWNS;
  const onGround = p.row === 0 && p.view > 0 ? p.view * exp(lnHere - lnGround[p.column]!) : 0;
  const irradiance = (TENSORS + p.column) * UNKNOWNS;
  for (let k = 0; k < paths.length; k++) {
    const radius = p.groundM + heights[k]!;
    const sun = (p.radius * p.sun + paths[k]! * p.between) / radius;
    emission(p.sun1, p.sun2, (p.z1 * p.radius) / radius, sun, dipole, parts);
    findPlace(heights[k]!, sun, lnReference, place);
    const scale = weights[k]! * p.solid * exp(place.ln - lnHere);
    for (let c = 0; c < COMPONENTS; c++) {
      const a = scale * parts[c]!;
      const b = scale * parts[COMPONENTS + c]!;
      const g = scale * parts[2 * COMPONENTS + c]!;
      const at = COMPONENTS * place.node + c;
      spreadTensor(kernel, tensor + at, place, p, a, b, g);
      if (onGround !== 0) spread(kernel, irradiance + at, place, onGround * (a + b));
    }
  }
  if (p.ray.groundPath >= 0 && target.albedo !== 0) addGround(p, target, tensor, lnHere);
}

/** The same for the ground's diffuse light. */
function addGround(p: Probe, target: LaterTarget, tensor: number, lnHere: number): void {
  const { albedo, lnGround, kernel } = target;
  const { groundPath, fromGround } = p.ray;
  const column = gridColumn((p.radius * p.sun + groundPath * p.between) / p.groundM);
  const j = Math.floor(column);
  const u = column - j;
  const ln = lnBetween(j, u, lnGround[j]!, lnGround[j + 1]!) - lnHere;
  const lit = (0.5 * albedo * fromGround * p.solid * exp(ln)) / Math.PI;
  for (let step = 0; step < 2; step++) {
    const part = (step === 0 ? 1 - u : u) * lit;
    const at = tensor + TENSORS + j + step;
    kernel[at]! += part * (p.x1 * p.x1 + p.x2 * p.x2);
    kernel[at + UNKNOWNS]! += part * (p.y1 * p.y1 + p.y2 * p.y2);
    kernel[at + 2 * UNKNOWNS]! += part * p.z1 * p.z1;
    kernel[at + 3 * UNKNOWNS]! += part * p.x1 * p.z1;
  }
}

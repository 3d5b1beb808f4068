/** Light scattered more than once in shells of air: successive orders on a grid of height and sun angle. */
import { exp, log } from "../_numeric.js";
import { COMPONENTS, emission } from "./_emission.js";
import { type Probe, visitRays } from "./_probes.js";
import type { ShellSky } from "./_rays.js";
import { sunlightAt } from "./_slantDepth.js";
import { ANGLES, findPlace, type GridPlace, gridColumn, HEIGHTS } from "./_twilightGrid.js";

const NODES = HEIGHTS * ANGLES;
/** Unknowns: tensor components at each grid point, then the diffuse irradiance of the ground under each sun. */
const TENSORS = NODES * COMPONENTS;
const SIZE = TENSORS + ANGLES;
/** Points to a stretch of ray: for sunlight, which the Earth's shadow cuts off, and for the smooth light after it. */
const SUN_POINTS = 24;
const LATER_POINTS = 8;

/** Field tensors of all light but the sunbeam. */
export interface HigherOrders {
  /** Logarithm of the reference at each grid point: about the trace of the tensor of light scattered once. */
  readonly lnReference: Float64Array;
  /** Tensor components over the reference, four to a grid point. */
  readonly tensors: Float64Array;
}

/** Solves for the light of all orders in air of which the share `dipole` scatters as dipoles do, over a ground of albedo `albedo`. */
export function higherOrders(sky: ShellSky, dipole: number, albedo: number): HigherOrders {
  const first = new Float64Array(SIZE);
  visitRays(sky, SUN_POINTS, (probe) => addSunlit(sky, probe, dipole, albedo, first));
  const traces = new Float64Array(NODES);
  for (let g = 0; g < NODES; g++) {
    const at = COMPONENTS * g;
    traces[g] = first[at]! + first[at + 1]! + first[at + 2]!;
  }
  const lnReference = reference(traces);
  const lnGround = reference(first.subarray(TENSORS));
  for (let k = 0; k < TENSORS; k++) first[k]! *= exp(-lnReference[Math.floor(k / COMPONENTS)]!);
  for (let j = 0; j < ANGLES; j++) first[TENSORS + j]! *= exp(-lnGround[j]!);
  const kernel = new Float64Array(SIZE * SIZE);
  visitRays(sky, LATER_POINTS, (probe) =>
    addLater(probe, dipole, albedo, lnReference, lnGround, kernel),
  );
  return { lnReference, tensors: sumOrders(first, kernel).slice(0, TENSORS) };
}

/** Logarithms of `values`, rows of ANGLES, made to fall by no more than a factor e² to the next sun angle. */
function reference(values: Float64Array): Float64Array {
  const ln = new Float64Array(values.length);
  for (let g = 0; g < values.length; g++) {
    const own = log(Math.max(values[g]!, 1e-300));
    ln[g] = g % ANGLES === 0 ? own : Math.max(own, ln[g - 1]! - 2);
  }
  return ln;
}

/** first + kernel first + kernel² first + ..., until an order adds less than 1e-5 anywhere. */
function sumOrders(first: Float64Array, kernel: Float64Array): Float64Array {
  const total = first.slice();
  let order = first;
  for (let n = 0; n < 300; n++) {
    const next = new Float64Array(SIZE);
    let most = 0;
    for (let r = 0; r < SIZE; r++) {
      let a = 0;
      let b = 0;
      const row = r * SIZE;
      for (let c = 0; c < SIZE; c += 2) {
        a += kernel[row + c]! * order[c]!;
        b += kernel[row + c + 1]! * order[c + 1]!;
      }
      next[r] = a + b;
      total[r]! += a + b;
      most = Math.max(most, Math.abs(a + b) / Math.max(Math.abs(total[r]!), 1e-3));
    }
    order = next;
    if (most < 1e-5) break;
  }
  return total;
}

/** Adds to a grid point what one ray brings of sunlight scattered once or reflected by the ground. */
function addSunlit(
  sky: ShellSky,
  p: Probe,
  dipole: number,
  albedo: number,
  out: Float64Array,
): void {
  const { paths, heights, weights, groundPath, fromGround } = p.ray;
  let sum = 0;
  for (let k = 0; k < paths.length; k++) {
    const cosine = (p.radius * p.sun + paths[k]! * p.between) / (p.groundM + heights[k]!);
    sum += weights[k]! * sunlightAt(sky.table, heights[k]!, cosine);
  }
  const scale = 0.375 * sum * p.solid;
  const even = (1 - dipole) / 3;
  let a = scale * (0.5 * dipole * (1 - p.sun1 * p.sun1) + even);
  let b = scale * (0.5 * dipole * (1 - p.sun2 * p.sun2) + even);
  const g = -scale * 0.5 * dipole * p.sun1 * p.sun2;
  if (groundPath >= 0 && albedo > 0) {
    const cosine = (p.radius * p.sun + groundPath * p.between) / p.groundM;
    const sunlit = cosine > 0 ? cosine * sunlightAt(sky.table, 0, cosine) : 0;
    const lit = 0.5 * albedo * sunlit * fromGround * p.solid;
    a += lit;
    b += lit;
  }
  const at = COMPONENTS * (p.row * ANGLES + p.column);
  out[at]! += a * p.x1 * p.x1 + b * p.x2 * p.x2 + 2 * g * p.x1 * p.x2;
  out[at + 1]! += a * p.y1 * p.y1 + b * p.y2 * p.y2 + 2 * g * p.y1 * p.y2;
  out[at + 2]! += a * p.z1 * p.z1;
  out[at + 3]! += (a * p.x1 + g * p.x2) * p.z1;
  if (p.row === 0 && p.view > 0) out[TENSORS + p.column]! += p.view * (a + b);
}

/** Adds what one ray brings a grid point of the light at all others, relative to the references of both. */
function addLater(
  p: Probe,
  dipole: number,
  albedo: number,
  lnReference: Float64Array,
  lnGround: Float64Array,
  kernel: Float64Array,
): void {
  const here = p.row * ANGLES + p.column;
  const lnHere = lnReference[here]!;
  const { paths, heights, weights, groundPath, fromGround } = p.ray;
  const parts = new Float64Array(3 * COMPONENTS);
  const place: GridPlace = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
  const tensor = COMPONENTS * here * SIZE;
  const onGround = p.row === 0 && p.view > 0 ? p.view * exp(lnHere - lnGround[p.column]!) : 0;
  const irradiance = (TENSORS + p.column) * SIZE;
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
      const source = COMPONENTS * place.node + c;
      spread(
        kernel,
        tensor + source,
        place,
        a * p.x1 * p.x1 + b * p.x2 * p.x2 + 2 * g * p.x1 * p.x2,
      );
      spread(
        kernel,
        tensor + SIZE + source,
        place,
        a * p.y1 * p.y1 + b * p.y2 * p.y2 + 2 * g * p.y1 * p.y2,
      );
      spread(kernel, tensor + 2 * SIZE + source, place, a * p.z1 * p.z1);
      spread(kernel, tensor + 3 * SIZE + source, place, (a * p.x1 + g * p.x2) * p.z1);
      if (onGround > 0) spread(kernel, irradiance + source, place, onGround * (a + b));
    }
  }
  if (groundPath >= 0 && albedo > 0) {
    const column = gridColumn((p.radius * p.sun + groundPath * p.between) / p.groundM);
    const j = Math.floor(column);
    const u = column - j;
    const ln = (1 - u) * lnGround[j]! + u * lnGround[j + 1]! - lnHere;
    const lit = (0.5 * albedo * fromGround * p.solid * exp(ln)) / Math.PI;
    for (const [source, part] of [
      [TENSORS + j, (1 - u) * lit],
      [TENSORS + j + 1, u * lit],
    ] as const) {
      kernel[tensor + source]! += part * (p.x1 * p.x1 + p.x2 * p.x2);
      kernel[tensor + SIZE + source]! += part * (p.y1 * p.y1 + p.y2 * p.y2);
      kernel[tensor + 2 * SIZE + source]! += part * p.z1 * p.z1;
      kernel[tensor + 3 * SIZE + source]! += part * p.x1 * p.z1;
    }
  }
}

/** Adds `value` to one row of the kernel, shared among the four grid points of a place. */
function spread(kernel: Float64Array, at: number, place: GridPlace, value: number): void {
  kernel[at]! += place.s00 * value;
  kernel[at + COMPONENTS]! += place.s01 * value;
  kernel[at + COMPONENTS * ANGLES]! += place.s10 * value;
  kernel[at + COMPONENTS * (ANGLES + 1)]! += place.s11 * value;
}

/** Light scattered more than once in shells of air: successive orders on a grid of height and sun angle. */
import { exp, log } from "../_numeric.js";
import { COMPONENTS } from "./_emission.js";
import { addLater } from "./_laterField.js";
import { visitRays } from "./_probes.js";
import type { ShellSky } from "./_rays.js";
import { sumOrders } from "./_sumOrders.js";
import { addSunlit } from "./_sunlitField.js";
import { ANGLES, NODES, TENSORS, UNKNOWNS } from "./_twilightGrid.js";

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
  const first = new Float64Array(UNKNOWNS);
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
  const target = {
    dipole,
    albedo,
    lnReference,
    lnGround,
    kernel: new Float64Array(UNKNOWNS * UNKNOWNS),
  };
  visitRays(sky, LATER_POINTS, (probe) => addLater(probe, target));
  return { lnReference, tensors: sumOrders(first, target.kernel).slice(0, TENSORS) };
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

/** Light of higher orders along a line of sight from the ground. */
import { exp } from "../_numeric.js";
import { COMPONENTS, emission } from "./_emission.js";
import type { HigherOrders } from "./_higherOrders.js";
import type { Nodes } from "./_nodes.js";
import { type ShellSky, sightRay } from "./_rays.js";
import { ANGLES, findPlace, type GridPlace } from "./_twilightGrid.js";

/** A line of sight and two unit vectors square to it; `theta` in its vertical plane, `phi` horizontal. */
export interface Sight {
  /** Cosines: sun from the vertical, sight from the vertical, sight from the sun. */
  readonly sun: number;
  readonly view: number;
  readonly between: number;
  /** Cosines of the two vectors from the sun. */
  readonly theta: number;
  readonly phi: number;
}

/** Intensities along the two vectors and their correlation: [theta, phi, both]. */
export function higherAlong(
  sky: ShellSky,
  orders: HigherOrders,
  dipole: number,
  sight: Sight,
  nodes: Nodes,
): [number, number, number] {
  const { groundM } = sky.air;
  const { paths, heights, weights } = sightRay(sky, sight.view, nodes, 0);
  const level = -Math.sqrt(1 - sight.view * sight.view);
  const parts = new Float64Array(3 * COMPONENTS);
  const place: GridPlace = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
  const { tensors, lnReference } = orders;
  let [a, b, g] = [0, 0, 0];
  for (let k = 0; k < paths.length; k++) {
    const radius = groundM + heights[k]!;
    const sun = (groundM * sight.sun + paths[k]! * sight.between) / radius;
    emission(sight.theta, sight.phi, (level * groundM) / radius, sun, dipole, parts);
    findPlace(heights[k]!, sun, lnReference, place);
    const scale = weights[k]! * exp(place.ln);
    for (let c = 0; c < COMPONENTS; c++) {
      const at = COMPONENTS * place.node + c;
      const below = place.s00 * tensors[at]! + place.s01 * tensors[at + COMPONENTS]!;
      const next = at + COMPONENTS * ANGLES;
      const above = place.s10 * tensors[next]! + place.s11 * tensors[next + COMPONENTS]!;
      const field = scale * (below + above);
      a += field * parts[c]!;
      b += field * parts[COMPONENTS + c]!;
      g += field * parts[2 * COMPONENTS + c]!;
    }
  }
  return [a, b, g];
}

/** Light of higher orders along a line of sight from the ground. */
import { exp } from "../_numeric.js";
import { ANGLES, emission, gridColumn, gridRow, type HigherOrders } from "./_higherOrders.js";
import { ray, type ShellSky } from "./_rays.js";

/** Points of the integral. */
const POINTS = 32;

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
): [number, number, number] {
  const { groundM } = sky.air;
  const { paths, heights, weights } = ray(sky, 0, sight.view, POINTS);
  const level = -Math.sqrt(1 - sight.view * sight.view);
  const parts = new Float64Array(12);
  let [a, b, g] = [0, 0, 0];
  for (let k = 0; k < paths.length; k++) {
    const radius = groundM + heights[k]!;
    const sun = (groundM * sight.sun + paths[k]! * sight.between) / radius;
    emission(sight.theta, sight.phi, (level * groundM) / radius, sun, dipole, parts);
    const row = gridRow(heights[k]!);
    const column = gridColumn(sun);
    const [i, j] = [Math.floor(row), Math.floor(column)];
    const [v, u] = [row - i, column - j];
    const node = i * ANGLES + j;
    const nodes = [node, node + 1, node + ANGLES, node + ANGLES + 1];
    const shares = [(1 - v) * (1 - u), (1 - v) * u, v * (1 - u), v * u];
    let ln = 0;
    for (let n = 0; n < 4; n++) ln += shares[n]! * orders.lnReference[nodes[n]!]!;
    const scale = weights[k]! * exp(ln);
    for (let n = 0; n < 4; n++) {
      for (let c = 0; c < 4; c++) {
        const f = scale * shares[n]! * orders.tensors[4 * nodes[n]! + c]!;
        a += f * parts[c]!;
        b += f * parts[4 + c]!;
        g += f * parts[8 + c]!;
      }
    }
  }
  return [a, b, g];
}

/** Sunlight scattered once along a line of sight from the ground. */
import type { Nodes } from "./_nodes.js";
import { type ShellSky, sightRay } from "./_rays.js";
import { sunlightAt } from "./_slantDepth.js";

/**
 * Integral of scattering coefficient times what comes through from the sun and to the eye.
 * `sun`, `view` and `between` are the cosines of the sun and the line of sight from the vertical and of the angle between them;
 * `nodes` the points of the integral.
 */
export function onceScattered(
  sky: ShellSky,
  sun: number,
  view: number,
  between: number,
  nodes: Nodes,
): number {
  const { groundM } = sky.air;
  const { paths, heights, weights } = sightRay(
    sky,
    view,
    nodes,
    shadowEnd(groundM, sun, view, between),
  );
  let sum = 0;
  for (let k = 0; k < paths.length; k++) {
    const cosine = (groundM * sun + paths[k]! * between) / (groundM + heights[k]!);
    sum += weights[k]! * sunlightAt(sky.table, heights[k]!, cosine);
  }
  return sum;
}

/** Distance along the line of sight at which it leaves the Earth's shadow, a cylinder; 0 while the sun is up. */
function shadowEnd(groundM: number, sun: number, view: number, between: number): number {
  if (sun >= 0) return 0;
  const half = view - sun * between;
  const root = Math.sqrt(half * half + (1 - between * between) * sun * sun);
  return (groundM * sun * sun) / (half + root); // root of (1 - between²) s² + 2 half s = sun², in Earth radii
}

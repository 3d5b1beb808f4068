/** Sunlight scattered once or reflected by the ground, as it meets the points of the twilight grid. */
import { COMPONENTS } from "./_emission.js";
import type { Probe } from "./_probe.js";
import type { ShellSky } from "./_rays.js";
import { sunlightAt } from "./_slantDepth.js";
import { ANGLES, TENSORS } from "./_twilightGrid.js";

/** Adds to a grid point's tensor, and on the ground to its irradiance, what one ray brings. */
export function addSunlit(
  sky: ShellSky,
  p: Probe,
  dipole: number,
  albedo: number,
  out: Float64Array,
): void {
  const scale = 0.375 * sunlitSum(sky, p) * p.solid;
  const even = (1 - dipole) / 3;
  const ground = albedo > 0 ? 0.5 * albedo * sunlitGround(sky, p) * p.solid : 0;
  const a = scale * (0.5 * dipole * (1 - p.sun1 * p.sun1) + even) + ground;
  const b = scale * (0.5 * dipole * (1 - p.sun2 * p.sun2) + even) + ground;
  const g = -scale * 0.5 * dipole * p.sun1 * p.sun2;
  const at = COMPONENTS * (p.row * ANGLES + p.column);
  out[at]! += a * p.x1 * p.x1 + b * p.x2 * p.x2 + 2 * g * p.x1 * p.x2;
  out[at + 1]! += a * p.y1 * p.y1 + b * p.y2 * p.y2 + 2 * g * p.y1 * p.y2;
  out[at + 2]! += a * p.z1 * p.z1;
  out[at + 3]! += (a * p.x1 + g * p.x2) * p.z1;
  if (p.row === 0 && p.view > 0) out[TENSORS + p.column]! += p.view * (a + b);
}

/** Scattering along a ray, each point lit by the sun it has. */
function sunlitSum(sky: ShellSky, p: Probe): number {
  const { paths, heights, weights } = p.ray;
  let sum = 0;
  for (let k = 0; k < paths.length; k++) {
    const cosine = (p.radius * p.sun + paths[k]! * p.between) / (p.groundM + heights[k]!);
    sum += weights[k]! * sunlightAt(sky.table, heights[k]!, cosine);
  }
  return sum;
}

/** Irradiance by the sun, over π, of the ground a ray ends on, times what gets from there. */
function sunlitGround(sky: ShellSky, p: Probe): number {
  const { groundPath, fromGround } = p.ray;
  if (groundPath < 0) return 0;
  const cosine = (p.radius * p.sun + groundPath * p.between) / p.groundM;
  return cosine > 0 ? cosine * sunlightAt(sky.table, 0, cosine) * fromGround : 0;
}

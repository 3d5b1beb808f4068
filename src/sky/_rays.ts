/** Straight rays through shells of air, seen from where they start. */
import { exp } from "../_numeric.js";
import type { Nodes } from "./_nodes.js";
import { coefficientAt, type ShellAir } from "./_shellAir.js";
import { outward, type SlantTable } from "./_slantDepth.js";

/** Height above the ground where rays end, m: what lies above it is less than 1e-7 of the air. */
export const RAY_TOP_M = 116_000;

/** Ground distance of rays that miss it. */
const MISSES = -1;

/** Air at one wavelength with the depths of its rays. */
export interface ShellSky {
  readonly air: ShellAir;
  readonly table: SlantTable;
}

/** Points along one ray. */
export interface Ray {
  /** Distances from the start, m. */
  readonly paths: Float64Array;
  /** Heights above the ground, m. */
  readonly heights: Float64Array;
  /** Scattering coefficient times step times the share of light that gets from the point to the start. */
  readonly weights: Float64Array;
  /** Share of light that gets from the ground to the start; 0 for a ray that misses it. */
  readonly fromGround: number;
  /** Distance to the ground, m; -1 for a ray that misses it. */
  readonly groundPath: number;
}

/** A ray from `heightM` at `cosine` from the vertical, with points `nodes` on each stretch. */
export function ray(sky: ShellSky, heightM: number, cosine: number, nodes: Nodes): Ray {
  const { groundM } = sky.air;
  const radius = groundM + heightM;
  const fall = radius * cosine;
  const lowest = radius * Math.sqrt(Math.max(0, 1 - cosine * cosine)) - groundM;
  const top = pathToHeight(radius, fall, groundM + RAY_TOP_M);
  let parts: readonly Stretch[] = [{ start: 0, length: top, crowded: true }];
  let groundPath = MISSES;
  if (cosine < 0 && lowest < 0) {
    const reach = (radius - groundM) * (radius + groundM);
    groundPath = reach / (-fall + Math.sqrt(Math.max(0, fall * fall - reach)));
    parts = [{ start: 0, length: groundPath, crowded: false }];
  } else if (cosine < 0) {
    parts = [
      { start: 0, length: -fall, crowded: false },
      { start: -fall, length: top + fall, crowded: true },
    ];
  }
  return fillRay(sky, heightM, cosine, parts, nodes, groundPath);
}

/** A line of sight from the ground upward, from distance `from` on, in stretches that end where the air's gradient changes. */
export function sightRay(sky: ShellSky, cosine: number, nodes: Nodes, from: number): Ray {
  const { groundM, kinks } = sky.air;
  const parts: Stretch[] = [];
  let start = from;
  for (const heightM of [...kinks, RAY_TOP_M]) {
    const stop = pathToHeight(groundM, groundM * cosine, groundM + heightM);
    if (stop <= start) continue;
    parts.push({ start, length: stop - start, crowded: false });
    start = stop;
  }
  return fillRay(sky, 0, cosine, parts, nodes, MISSES);
}

/** Distance at which a ray that ends upward reaches the radius `target`. */
function pathToHeight(radius: number, fall: number, target: number): number {
  const reach = (target - radius) * (target + radius);
  return Math.sqrt(fall * fall + reach) - fall;
}

/** A stretch of a ray; its points may crowd towards its start. */
interface Stretch {
  readonly start: number;
  readonly length: number;
  readonly crowded: boolean;
}

function fillRay(
  sky: ShellSky,
  heightM: number,
  cosine: number,
  parts: readonly Stretch[],
  nodes: Nodes,
  groundPath: number,
): Ray {
  const radius = sky.air.groundM + heightM;
  const depthTo = depthAlong(sky, heightM, cosine);
  const count = nodes.cosines.length;
  const paths = new Float64Array(parts.length * count);
  const heights = new Float64Array(parts.length * count);
  const weights = new Float64Array(parts.length * count);
  let k = 0;
  for (const { start, length, crowded } of parts) {
    for (let q = 0; q < count; q++, k++) {
      const x = nodes.cosines[q]!;
      const path = start + length * (crowded ? x * x : x);
      const gained = path * (path + 2 * radius * cosine);
      const height = heightM + gained / (Math.sqrt(radius * radius + gained) + radius);
      const step = nodes.weights[q]! * length * (crowded ? 2 * x : 1);
      paths[k] = path;
      heights[k] = height;
      weights[k] = step * coefficientAt(sky.air.lnScattering, height) * exp(-depthTo(path, height));
    }
  }
  const fromGround = groundPath >= 0 ? exp(-depthTo(groundPath, 0)) : 0;
  return { paths, heights, weights, groundPath, fromGround };
}

/** Optical depth from the start of a ray to a point on it. */
function depthAlong(
  sky: ShellSky,
  heightM: number,
  cosine: number,
): (path: number, height: number) => number {
  const { table } = sky;
  const radius = sky.air.groundM + heightM;
  const start = outward(table, heightM, Math.abs(cosine));
  const lowest = radius * Math.sqrt(Math.max(0, 1 - cosine * cosine)) - sky.air.groundM;
  const whole = cosine < 0 && lowest >= 0 ? 2 * outward(table, lowest, 0) - start : start;
  return (path, height) => {
    const local = (path + radius * cosine) / (sky.air.groundM + height);
    const depth =
      local < 0 ? outward(table, height, -local) - start : whole - outward(table, height, local);
    return Math.max(0, depth);
  };
}

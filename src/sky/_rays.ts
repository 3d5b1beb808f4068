/** Straight rays through shells of air, seen from where they start. */
import { fillRay, type Stretch } from "./_fillRay.js";
import type { Nodes } from "./_nodes.js";
import type { ShellAir } from "./_shellAir.js";
import type { SlantTable } from "./_slantDepth.js";

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

/** Straight rays through shells of air, seen from where they start. */
import { exp } from "../_numeric.js";
import { gaussPoint } from "./_nodes.js";
import { coefficientAt, type ShellAir } from "./_shellAir.js";
import { outward, type SlantTable } from "./_slantDepth.js";

/** Height above the ground where rays end, m: what scatters above it is less than 1e-6 of the air. */
export const RAY_TOP_M = 100_000;

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

const MISSES = -1;

/** A ray from `heightM` at `cosine` from the vertical, its points `count` to a stretch, beginning at distance `from`. */
export function ray(sky: ShellSky, heightM: number, cosine: number, count: number, from = 0): Ray {
  const { groundM } = sky.air;
  const radius = groundM + heightM;
  const fall = radius * cosine;
  const lowest = radius * Math.sqrt(Math.max(0, 1 - cosine * cosine)) - groundM;
  const top = pathToHeight(radius, fall, groundM + RAY_TOP_M);
  if (cosine >= 0) {
    return stretch(sky, heightM, cosine, [[from, top - from, true]], count, MISSES);
  }
  if (lowest < 0) {
    const reach = (radius - groundM) * (radius + groundM);
    const path = reach / (-fall + Math.sqrt(Math.max(0, fall * fall - reach)));
    return stretch(sky, heightM, cosine, [[0, path, false]], count, path);
  }
  return stretch(sky, heightM, cosine, [[0, -fall, false], [-fall, top + fall, true]], count, MISSES);
}

/** Distance at which a ray that ends upward reaches the radius `target`. */
function pathToHeight(radius: number, fall: number, target: number): number {
  const reach = (target - radius) * (target + radius);
  return Math.sqrt(fall * fall + reach) - fall;
}

/** A stretch of a ray: start, length, and whether its points crowd towards its start. */
type Stretch = readonly [number, number, boolean];

function stretch(
  sky: ShellSky,
  heightM: number,
  cosine: number,
  parts: readonly Stretch[],
  count: number,
  groundPath: number,
): Ray {
  const { groundM, lnScattering } = sky.air;
  const radius = groundM + heightM;
  const depthTo = depthAlong(sky, heightM, cosine);
  const size = parts.length * count;
  const paths = new Float64Array(size);
  const heights = new Float64Array(size);
  const weights = new Float64Array(size);
  let k = 0;
  for (const [start, length, crowded] of parts) {
    for (let q = 0; q < count; q++, k++) {
      const { point, weight } = gaussPoint(count, count - 1 - q);
      const x = 0.5 * (1 + point);
      const path = start + length * (crowded ? x * x : x);
      const gained = path * (path + 2 * radius * cosine);
      const height = heightM + gained / (Math.sqrt(radius * radius + gained) + radius);
      paths[k] = path;
      heights[k] = height;
      const step = 0.5 * weight * length * (crowded ? 2 * x : 1);
      weights[k] = step * coefficientAt(lnScattering, height) * exp(-depthTo(path, height));
    }
  }
  return { paths, heights, weights, groundPath, fromGround: groundPath >= 0 ? exp(-depthTo(groundPath, 0)) : 0 };
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
    const depth = local < 0 ? outward(table, height, -local) - start : whole - outward(table, height, local);
    return Math.max(0, depth);
  };
}

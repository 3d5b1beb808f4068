/** Points and weights along a ray. */
import { exp } from "../_numeric.js";
import type { Nodes } from "./_nodes.js";
import type { Ray, ShellSky } from "./_rays.js";
import { coefficientAt } from "./_shellAir.js";
import { outward } from "./_slantDepth.js";

/** A stretch of a ray; its points may crowd towards its start. */
export interface Stretch {
  readonly start: number;
  readonly length: number;
  readonly crowded: boolean;
}

/** Fills a ray that is cut into stretches. */
export function fillRay(
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

/** Zenith angles to look along from a point in the air. */
import { gaussNodes, type Nodes } from "./_nodes.js";
import { type Ray, ray, type ShellSky } from "./_rays.js";

/** Zenith angles above the horizontal, between it and the Earth's limb, and onto the ground. */
const ABOVE = 6;
const BETWEEN = 4;
const BELOW = 4;

/** A direction to look in from a grid point, without azimuth. */
export interface Polar {
  readonly cosine: number;
  readonly weight: number;
  readonly ray: Ray;
}

/** Directions around a point at `heightM`, crowded towards its horizontal and the Earth's limb. */
export function polarDirections(sky: ShellSky, heightM: number, nodes: Nodes): Polar[] {
  const ratio = sky.air.groundM / (sky.air.groundM + heightM);
  const limb = -Math.sqrt(1 - ratio * ratio);
  const parts: readonly [number, number, number][] = [
    [0, 1, ABOVE],
    [limb, 0, limb < 0 ? BETWEEN : 0],
    [limb, -1, BELOW],
  ];
  return parts.flatMap(([from, to, count]) => {
    const { cosines, weights } = gaussNodes(count);
    return Array.from(cosines, (x, k) => {
      const cosine = from + (to - from) * x * x;
      const weight = 2 * weights[k]! * x * Math.abs(to - from);
      return { cosine, weight, ray: ray(sky, heightM, cosine, nodes) };
    });
  });
}

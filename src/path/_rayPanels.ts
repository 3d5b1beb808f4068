/** Where the quadrature along a ray is cut, and what its variable is made for. */
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";

/** A panel reaches at most this many times as high above the start as it begins. */
const WIDENING = 16;
/** Height of the first panel, m: rays a hundredth of a degree off the horizontal need it. */
const FIRST_PANEL_M = 50;
/** Smallest growth of the squared cosine with height that the variable is made for, as a share of a straight ray's. */
const LEAST_GROWTH = 0.05;

/** d(cos²)/dh of a horizontal ray: 2 (1/r + n'/n), n' by a one-sided difference of second order; kept above a small positive number. */
export function squaredCosineGrowth(
  air: RayAir,
  startM: number,
  radius: number,
  start: number,
  state: Float64Array,
): number {
  const step = 0.125; // m
  const layer = layerAt(air, startM);
  const near = refractivityAt(air, layer, startM + step, state) - start;
  const far = refractivityAt(air, layer, startM + 2 * step, state) - start;
  const slope = (4 * near - far) / (2 * step);
  return Math.max(2 / radius + (2 * slope) / (1 + start), (2 * LEAST_GROWTH) / radius);
}

/** Ends of the quadrature's panels, rising, the last `endM`. */
export function panelEnds({ breaksM }: RayAir, startM: number, endM: number): number[] {
  const climbs = breaksM.filter((m) => m > startM && m < endM).map((m) => m - startM);
  climbs.push(endM - startM);
  const ends: number[] = [];
  let from = 0;
  for (const climb of climbs) {
    while (climb > WIDENING * Math.max(from, FIRST_PANEL_M / WIDENING)) {
      from = from === 0 ? FIRST_PANEL_M : WIDENING * from;
      ends.push(startM + from);
    }
    from = climb;
    ends.push(startM + climb);
  }
  return ends;
}

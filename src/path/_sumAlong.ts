/** Quadrature along a ray that rises from one height to another. */
import { sqrt } from "../_numeric.js";
import { GAUSS_NODES, GAUSS_WEIGHTS } from "./_gaussRule.js";
import { addConstituents, airDensityIn, layerAt, type RayAir, refractivityAt } from "./_rayAir.js";

/** A panel reaches at most this many times as high above the start as it begins. */
const WIDENING = 16;
/** Height of the first panel, m: rays a hundredth of a degree off the horizontal need it. */
const FIRST_PANEL_M = 50;
/** Smallest growth of the squared cosine with height that the variable is made for, as a share of a straight ray's. */
const LEAST_GROWTH = 0.05;

/**
 * Adds to `sums` what a ray collects from `startM`, where it rises at the angle of given cosine and sine, up to `endM`:
 * [0] the angle at the Earth's centre, radians, [1] air, [2...] constituents. False if the ray turns back on its way.
 *
 * The variable w = sqrt(c² + k h) - c, with k the growth of the squared cosine at the start, makes the integrand smooth for
 * every cosine c from 0 to 1: the root at a horizontal start cancels. 1 - sin² is written so that nothing cancels.
 */
export function sumAlong(
  air: RayAir,
  startM: number,
  cosine: number,
  sine: number,
  endM: number,
  sums: Float64Array,
): boolean {
  const state = new Float64Array(3);
  const startRadius = air.earthRadiusM + startM;
  const start = refractivityAt(air, layerAt(air, startM), startM, state);
  const growth = squaredCosineGrowth(air, startM, startRadius, start, state);
  const variable = (heightM: number): number => {
    const grown = growth * (heightM - startM);
    return grown / (sqrt(cosine * cosine + grown) + cosine);
  };
  let fromM = startM;
  let from = 0;
  for (const toM of panelEnds(air, startM, endM)) {
    const layer = layerAt(air, (fromM + toM) / 2);
    const to = variable(toM);
    const half = (to - from) / 2;
    for (let i = 0; i < 16; i++) {
      const node = i < 8 ? -GAUSS_NODES[7 - i]! : GAUSS_NODES[i - 8]!;
      const w = from + half * (1 + node);
      const climb = (w * (2 * cosine + w)) / growth;
      const here = refractivityAt(air, layer, startM + climb, state);
      const radius = startRadius + climb;
      // 1 - (n r at the start) / (n r here), which is what the sine loses
      const loss = ((1 + here) * climb + startRadius * (here - start)) / ((1 + here) * radius);
      const squared = cosine * cosine + sine * sine * loss * (2 - loss);
      if (!(squared > 0)) return false;
      const weight = half * (i < 8 ? GAUSS_WEIGHTS[7 - i]! : GAUSS_WEIGHTS[i - 8]!);
      const length = (weight * 2 * (cosine + w)) / (growth * sqrt(squared));
      sums[0]! += (length * sine * (1 - loss)) / radius;
      sums[1]! += length * airDensityIn(state);
      addConstituents(air, startM + climb, length, sums);
    }
    fromM = toM;
    from = to;
  }
  return true;
}

/** The same from the lowest point to a height less than a millimetre above it, where the ray's cosine is given. */
export function sumLevel(air: RayAir, heightM: number, cosine: number, sums: Float64Array): void {
  const state = new Float64Array(3);
  const radius = air.earthRadiusM + heightM;
  const here = refractivityAt(air, layerAt(air, heightM), heightM, state);
  const length = (2 * cosine) / squaredCosineGrowth(air, heightM, radius, here, state);
  refractivityAt(air, layerAt(air, heightM), heightM, state);
  sums[0]! += length / radius;
  sums[1]! += length * airDensityIn(state);
  addConstituents(air, heightM, length, sums);
}

/** d(cos²)/dh of a horizontal ray: 2 (1/r + n'/n), n' by a one-sided difference of second order; kept above a small positive number. */
function squaredCosineGrowth(
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
function panelEnds({ breaksM }: RayAir, startM: number, endM: number): number[] {
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

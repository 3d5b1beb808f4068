/** Quadrature along a ray that rises from one height to another. */
import { sqrt } from "../_numeric.js";
import type { AirLayer } from "../air/airProfile.js";
import { GAUSS_NODES, GAUSS_WEIGHTS } from "./_gaussRule.js";
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";
import { addConstituents, airDensityIn } from "./_rayDensities.js";
import { panelEnds, squaredCosineGrowth } from "./_rayPanels.js";

/** A ray where it starts: height, radius and refractivity there, cosine and sine of its angle, growth of the squared cosine. */
interface Start {
  readonly heightM: number;
  readonly radiusM: number;
  readonly refractivity: number;
  readonly cosine: number;
  readonly sine: number;
  readonly growth: number;
}

/**
 * Adds to `sums` what a ray collects from `heightM`, where it rises at the angle of given cosine and sine, up to `endM`:
 * [0] the angle at the Earth's centre, radians, [1] air, [2...] constituents. False if the ray turns back on its way.
 *
 * The variable w = sqrt(c² + k h) - c, with k the growth of the squared cosine at the start, makes the integrand smooth for
 * every cosine c from 0 to 1: the root at a horizontal start cancels.
 */
export function sumAlong(
  air: RayAir,
  heightM: number,
  cosine: number,
  sine: number,
  endM: number,
  sums: Float64Array,
): boolean {
  const state = new Float64Array(3);
  const radiusM = air.earthRadiusM + heightM;
  const refractivity = refractivityAt(air, layerAt(air, heightM), heightM, state);
  const growth = squaredCosineGrowth(air, heightM, radiusM, refractivity, state);
  const start = { heightM, radiusM, refractivity, cosine, sine, growth };
  let fromM = heightM;
  let from = 0;
  for (const toM of panelEnds(air, heightM, endM)) {
    const grown = growth * (toM - heightM);
    const to = grown / (sqrt(cosine * cosine + grown) + cosine);
    const layer = layerAt(air, (fromM + toM) / 2);
    if (!sumPanel(air, layer, start, from, to, state, sums)) return false;
    fromM = toM;
    from = to;
  }
  return true;
}

/** One panel, between two values of the variable. 1 - sin² is written so that nothing cancels. */
function sumPanel(
  air: RayAir,
  layer: AirLayer,
  { heightM, radiusM, refractivity, cosine, sine, growth }: Start,
  from: number,
  to: number,
  state: Float64Array,
  sums: Float64Array,
): boolean {
  const half = (to - from) / 2;
  for (let i = -8; i < 8; i++) {
    const rule = i < 0 ? -1 - i : i;
    const w = from + half * (i < 0 ? 1 - GAUSS_NODES[rule]! : 1 + GAUSS_NODES[rule]!);
    const climb = (w * (2 * cosine + w)) / growth;
    const here = refractivityAt(air, layer, heightM + climb, state);
    const radius = radiusM + climb;
    // 1 - (n r at the start) / (n r here), which is what the sine loses
    const loss = ((1 + here) * climb + radiusM * (here - refractivity)) / ((1 + here) * radius);
    const squared = cosine * cosine + sine * sine * loss * (2 - loss);
    if (!(squared > 0)) return false;
    const length = (half * GAUSS_WEIGHTS[rule]! * 2 * (cosine + w)) / (growth * sqrt(squared));
    sums[0]! += (length * sine * (1 - loss)) / radius;
    sums[1]! += length * airDensityIn(state);
    addConstituents(air, heightM + climb, length, sums);
  }
  return true;
}

/** The last piece of a ray above its lowest point, where it is a parabola. */
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";
import { addConstituents, airDensityIn } from "./_rayDensities.js";
import { squaredCosineGrowth } from "./_rayPanels.js";

/** Adds to `sums`, as `sumAlong` does, what a ray collects on the last millimetre from its lowest point, up to a given cosine. */
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

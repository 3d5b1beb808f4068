/** The last piece of a ray above its lowest point, where it is a parabola. */
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";
import { addConstituents, airDensityIn } from "./_rayDensities.js";
import { squaredCosineGrowth } from "./_rayPanels.js";

/** Adds to `sums`, as `sumAlong` does, what a ray collects from its lowest point to a height less than a millimetre above it, where the ray's cosine is given. */
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

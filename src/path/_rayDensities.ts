/** Densities along a ray. */
import { layerDensity } from "../air/_layerDensity.js";
import { VAPOUR_LIGHTNESS } from "../air/_profileState.js";
import type { RayAir } from "./_rayAir.js";

/** Mass density of moist air in a unit of its own, from a state. */
export function airDensityIn(state: Float64Array): number {
  return (state[1]! * (1 - VAPOUR_LIGHTNESS * state[2]!)) / state[0]!;
}

/** Adds `length` times the density of each constituent at a height to `sums`, from place 2 on. */
export function addConstituents(
  { constituents }: RayAir,
  heightM: number,
  length: number,
  sums: Float64Array,
): void {
  for (let i = 0; i < constituents.length; i++) {
    sums[i + 2]! += length * layerDensity(constituents[i]!, heightM);
  }
}

/** The layers of a sky that have any depth. */
import type { SkyLayer } from "./prepareSky.js";

/** The layers that are there: their depths and albedos, and which of their boundaries stands for each boundary given. */
export function solvable(layers: readonly SkyLayer[]): {
  depths: number[];
  albedos: number[];
  solvedBoundaries: number[];
  boundaryDepths: Float64Array;
} {
  const depths: number[] = [];
  const albedos: number[] = [];
  const solvedBoundaries = [0];
  const boundaryDepths = new Float64Array(layers.length + 1);
  for (const [l, { rayleighDepth, absorptionDepth }] of layers.entries()) {
    const depth = rayleighDepth + absorptionDepth;
    boundaryDepths[l + 1] = boundaryDepths[l]! + depth;
    if (depth > 0) {
      depths.push(depth);
      albedos.push(rayleighDepth / depth);
    }
    solvedBoundaries.push(depths.length);
  }
  return { depths, albedos, solvedBoundaries, boundaryDepths };
}

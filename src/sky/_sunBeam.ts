/** The sunbeam as a source of one azimuth mode. */
import { exp } from "../_numeric.js";
import type { LayerModes } from "./_layerModes.js";
import type { Amplitudes, Stack } from "./_stack.js";

/** The part of a layer's source that falls off with the sunbeam: exp(-secant depth) times two components. */
export interface BeamSource {
  readonly secant: number;
  readonly first: number;
  readonly second: number;
}

/** Source components the sunbeam makes where it is whole, before the albedo. */
export function sunSource(stack: Stack, cosine: number): [number, number] {
  const { order, dipole, mixing } = stack.kernel;
  const square = cosine * cosine;
  if (order === 1) return [0.1875 * dipole * cosine * Math.sqrt(1 - square), 0];
  if (order === 2) return [-0.09375 * dipole * (1 - square), 0];
  const [c11, c21, c22] = mixing;
  const horizontal = 0.1875 * (1 + square);
  const vertical = 0.1875 * (1 - square);
  return [c11 * horizontal + c21 * vertical, c22 * vertical];
}

/** Adds the right-hand sides a beam makes in a layer (a particular solution that vanishes at both faces). */
export function addBeam(layer: LayerModes, source: Amplitudes, beam: BeamSource): void {
  const { secant } = beam;
  const left = exp(-secant * layer.depth);
  for (let m = 0; m < layer.squares.length; m++) {
    const drive = layer.first[m]! * beam.first + layer.second[m]! * beam.second;
    const over = drive / (secant * secant - layer.squares[m]!);
    source.even[m]! += over * (secant * (1 - left) - layer.even[m]! * (1 + left));
    source.odd[m]! += over * (secant * (1 + left) - layer.odd[m]! * (1 - left));
  }
}

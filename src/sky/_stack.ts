/** Amplitudes of all layers of a stack over a black ground, in one azimuth mode. */
import { type Join, joinLayers } from "./_adding.js";
import type { ModeKernel } from "./_kernel.js";
import type { LayerModes } from "./_layerModes.js";
import { layerModes } from "./_layerModes.js";
import type { Zeros } from "./_zeros.js";

/** One azimuth mode of a prepared stack. */
export interface Stack {
  readonly kernel: ModeKernel;
  readonly layers: readonly LayerModes[];
  /** How each layer meets its neighbours; empty for a single layer. */
  readonly joins: readonly Join[];
}

/** Even and odd amplitudes of one layer. */
export interface Amplitudes {
  readonly even: Float64Array;
  readonly odd: Float64Array;
}

/** Solution of a stack: amplitudes layer by layer and the scaled fields at its boundaries, counted from the top. */
export interface StackField {
  readonly amplitudes: readonly Amplitudes[];
  /** Field travelling down at each boundary; the first is zero. The one at the bottom is left to `bottomField`. */
  readonly down: readonly Float64Array[];
  /** Field travelling up at boundary 1 and on; the last is what was given. The one at the top is left to `topField`. */
  readonly up: readonly Float64Array[];
}

/** Solves every layer and joins them. */
export function prepareStack(
  zeros: Zeros,
  kernel: ModeKernel,
  depths: readonly number[],
  albedos: readonly number[],
): Stack {
  const layers = depths.map((depth, l) => layerModes(zeros, kernel, depth, albedos[l]!));
  return {
    kernel,
    layers,
    joins: layers.length > 1 ? joinLayers(zeros, layers, kernel.secants) : [],
  };
}

/** Right-hand sides of layers without sources. */
export function darkSources(zeros: Zeros, stack: Stack): Amplitudes[] {
  const { size } = stack.kernel;
  return stack.layers.map(() => ({ even: zeros(size), odd: zeros(size) }));
}

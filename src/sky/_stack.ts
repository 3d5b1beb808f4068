/** Amplitudes of all layers of a stack over a black ground, in one azimuth mode. */
import { type Join, joinLayers } from "./_adding.js";
import type { ModeKernel } from "./_kernel.js";
import type { LayerModes } from "./_layerModes.js";
import { layerModes } from "./_layerModes.js";
import { solveLayer, sweep } from "./_sweep.js";
import { zeros } from "./_zeros.js";

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
  kernel: ModeKernel,
  depths: readonly number[],
  albedos: readonly number[],
): Stack {
  const layers = depths.map((depth, l) => layerModes(kernel, depth, albedos[l]!));
  return { kernel, layers, joins: layers.length > 1 ? joinLayers(layers, kernel.secants) : [] };
}

/**
 * Finishes a solution. `sources` holds for each layer the right-hand sides its own sources make (overwritten);
 * `fromBelow` is the scaled field that enters at the bottom.
 */
export function solveStack(
  stack: Stack,
  sources: readonly Amplitudes[],
  fromBelow: Float64Array,
): StackField {
  const { layers, joins, kernel } = stack;
  const last = layers.length - 1;
  const down: Float64Array[] = [zeros(kernel.size)];
  const up: Float64Array[] = [];
  if (joins.length === 0) {
    up.push(fromBelow);
  } else {
    sweep(stack, sources, fromBelow, down, up);
  }
  for (let l = 0; l <= last; l++) addIncoming(layers[l]!, sources[l]!, down[l]!, up[l]!);
  for (let l = 0; l <= last; l++) solveLayer(layers[l]!, sources[l]!);
  return { amplitudes: sources, down, up };
}

/** Adds to a layer's right-hand sides the fields that enter it: their sum to the even, their difference to the odd. */
function addIncoming(
  layer: LayerModes,
  source: Amplitudes,
  top: Float64Array,
  bottom: Float64Array,
): void {
  const size = top.length;
  for (let m = 0; m < size; m++) {
    let sum = 0;
    let difference = 0;
    for (let j = 0; j < size; j++) {
      const part = layer.vectors[m * size + j]!;
      sum += part * (top[j]! + bottom[j]!);
      difference += part * (top[j]! - bottom[j]!);
    }
    source.even[m]! += sum;
    source.odd[m]! += difference;
  }
}

/** Right-hand sides of layers without sources. */
export function darkSources(stack: Stack): Amplitudes[] {
  const { size } = stack.kernel;
  return stack.layers.map(() => ({ even: zeros(size), odd: zeros(size) }));
}

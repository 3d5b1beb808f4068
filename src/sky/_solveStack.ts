/** Amplitudes and fields of a prepared stack for given sources. */
import type { LayerModes } from "./_layerModes.js";
import type { Amplitudes, Stack, StackField } from "./_stack.js";
import { solveLayer, sweep } from "./_sweep.js";
import type { Zeros } from "./_zeros.js";

/**
 * Finishes a solution. `sources` holds for each layer the right-hand sides its own sources make (overwritten);
 * `fromBelow` is the scaled field that enters at the bottom.
 */
export function solveStack(
  zeros: Zeros,
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
    sweep(zeros, stack, sources, fromBelow, down, up);
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

/** The fields between the layers of a stack. */
import { choleskySolve } from "./_cholesky.js";
import type { LayerModes } from "./_layerModes.js";
import { apply, plus } from "./_matrix.js";
import type { Amplitudes, Stack } from "./_stack.js";
import { copyOf, type Zeros } from "./_zeros.js";

/** Fields at the inner boundaries: from the bottom up what leaves each pile of layers, then down again what enters them. */
export function sweep(
  zeros: Zeros,
  stack: Stack,
  sources: readonly Amplitudes[],
  fromBelow: Float64Array,
  down: Float64Array[],
  up: Float64Array[],
): void {
  const { layers, joins, kernel } = stack;
  const leave = (l: number, own: Amplitudes, side: 1 | -1): Float64Array =>
    leaving(zeros, layers[l]!, own, side, kernel.secants);
  let rising = fromBelow;
  const lit: Float64Array[] = [];
  const risen: Float64Array[] = [];
  for (let l = layers.length - 1; l >= 0; l--) {
    const { reflection, transmission, below, bounces } = joins[l]!;
    const { even, odd } = sources[l]!;
    const own = solveLayer(layers[l]!, { even: copyOf(zeros, even), odd: copyOf(zeros, odd) });
    let falling = apply(zeros, reflection, rising, leave(l, own, -1));
    if (bounces.length > 0) falling = apply(zeros, bounces, falling);
    lit[l] = falling;
    risen[l] = rising;
    const turned = below.length > 0 ? apply(zeros, below, falling, rising) : rising;
    rising = apply(zeros, transmission, turned, leave(l, own, 1));
  }
  for (let l = 0; l < layers.length; l++) {
    const { transmission, below, bounces } = joins[l]!;
    let through = apply(zeros, transmission, down[l]!);
    if (bounces.length > 0) through = apply(zeros, bounces, through);
    const falling = plus(zeros, through, 1, lit[l]!);
    if (l + 1 < layers.length) down.push(falling);
    up.push(below.length > 0 ? apply(zeros, below, falling, risen[l]!) : risen[l]!);
  }
}

/** Solves a layer in place for the right-hand sides given. */
export function solveLayer(layer: LayerModes, source: Amplitudes): Amplitudes {
  choleskySolve(layer.evenFactor, source.even);
  choleskySolve(layer.oddFactor, source.odd);
  return source;
}

/** Scaled field that leaves a layer nothing enters: at its top for `side` 1, at its bottom for -1. */
export function leaving(
  zeros: Zeros,
  layer: LayerModes,
  amplitudes: Amplitudes,
  side: 1 | -1,
  secants: Float64Array,
): Float64Array {
  const size = secants.length;
  const field = zeros(size);
  for (let m = 0; m < size; m++) {
    const part = amplitudes.even[m]! + side * amplitudes.odd[m]!;
    for (let j = 0; j < size; j++) field[j]! += part * layer.vectors[m * size + j]!;
  }
  for (let j = 0; j < size; j++) field[j]! *= secants[j]!;
  return field;
}

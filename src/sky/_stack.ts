/** Amplitudes of all layers of a stack over a black ground, in one azimuth mode. */
import { type Join, joinLayers } from "./_adding.js";
import { choleskySolve } from "./_cholesky.js";
import type { ModeKernel } from "./_kernel.js";
import type { LayerModes } from "./_layerModes.js";
import { layerModes } from "./_layerModes.js";
import { apply } from "./_matrix.js";

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
  const down: Float64Array[] = [new Float64Array(kernel.size)];
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

/** Fields at the inner boundaries: from the bottom up what leaves each pile of layers, then down again what enters them. */
function sweep(
  stack: Stack,
  sources: readonly Amplitudes[],
  fromBelow: Float64Array,
  down: Float64Array[],
  up: Float64Array[],
): void {
  const { layers, joins, kernel } = stack;
  let rising = fromBelow;
  const lit: Float64Array[] = [];
  const risen: Float64Array[] = [];
  for (let l = layers.length - 1; l >= 0; l--) {
    const { reflection, transmission, below, bounces } = joins[l]!;
    const own = solveLayer(layers[l]!, {
      even: sources[l]!.even.slice(),
      odd: sources[l]!.odd.slice(),
    });
    let falling = apply(reflection, rising, leaving(layers[l]!, own, -1, kernel.secants));
    if (bounces.length > 0) falling = apply(bounces, falling);
    lit[l] = falling;
    risen[l] = rising;
    const turned = below.length > 0 ? apply(below, falling, rising) : rising;
    rising = apply(transmission, turned, leaving(layers[l]!, own, 1, kernel.secants));
  }
  for (let l = 0; l < layers.length; l++) {
    const { transmission, below, bounces } = joins[l]!;
    let through = apply(transmission, down[l]!);
    if (bounces.length > 0) through = apply(bounces, through);
    const falling = through.map((part, i) => part + lit[l]![i]!);
    if (l + 1 < layers.length) down.push(falling);
    up.push(below.length > 0 ? apply(below, falling, risen[l]!) : risen[l]!);
  }
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

function solveLayer(layer: LayerModes, source: Amplitudes): Amplitudes {
  choleskySolve(layer.evenFactor, source.even);
  choleskySolve(layer.oddFactor, source.odd);
  return source;
}

/** Scaled field that leaves a layer nothing enters: at its top for `side` 1, at its bottom for -1. */
function leaving(
  layer: LayerModes,
  amplitudes: Amplitudes,
  side: 1 | -1,
  secants: Float64Array,
): Float64Array {
  const size = secants.length;
  const field = new Float64Array(size);
  for (let m = 0; m < size; m++) {
    const part = amplitudes.even[m]! + side * amplitudes.odd[m]!;
    for (let j = 0; j < size; j++) field[j]! += part * layer.vectors[m * size + j]!;
  }
  for (let j = 0; j < size; j++) field[j]! *= secants[j]!;
  return field;
}

/** Field that leaves the top of the stack. */
export function topField(stack: Stack, field: StackField): Float64Array {
  return leaving(stack.layers[0]!, field.amplitudes[0]!, 1, stack.kernel.secants);
}

/** Diffuse field that reaches the bottom of the stack. */
export function bottomField(stack: Stack, field: StackField): Float64Array {
  const last = stack.layers.length - 1;
  const total = leaving(stack.layers[last]!, field.amplitudes[last]!, -1, stack.kernel.secants);
  return total.map((both, j) => both - field.up[last]![j]!);
}

/** Right-hand sides of layers without sources. */
export function darkSources(stack: Stack): Amplitudes[] {
  const { size } = stack.kernel;
  return stack.layers.map(() => ({ even: new Float64Array(size), odd: new Float64Array(size) }));
}

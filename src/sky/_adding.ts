/** Layers put together by their reflection and transmission at the nodes (the adding method). */
import { inverse, plus, product } from "./_matrix.js";
import type { LayerModes } from "./_layerModes.js";
import { responses } from "./_responses.js";
import type { Zeros } from "./_zeros.js";

/** A layer between what lies above and below it. All matrices act on the scaled fields at the nodes, row by row. */
export interface Join {
  /** Reflection of the layer. */
  readonly reflection: Float64Array;
  /** Transmission of the layer, diffuse and direct. */
  readonly transmission: Float64Array;
  /** Reflection of everything below the layer; empty where there is nothing. */
  readonly below: Float64Array;
  /** (1 - reflection below)⁻¹: all bounces between the layer and what lies below; empty where there are none. */
  readonly bounces: Float64Array;
}

/** Joins the layers from the bottom up, over a black ground. */
export function joinLayers(
  zeros: Zeros,
  layers: readonly LayerModes[],
  secants: Float64Array,
): Join[] {
  const size = secants.length;
  const joins: Join[] = [];
  let below: Float64Array = zeros(0);
  for (let l = layers.length - 1; l >= 0; l--) {
    const { reflection, transmission } = responses(zeros, layers[l]!, secants);
    const bounces = below.length > 0 ? allBounces(zeros, reflection, below, size) : below;
    const join = { reflection, transmission, below, bounces };
    joins.unshift(join);
    if (l > 0) below = pileReflection(zeros, join, size); // nothing lies on the uppermost
  }
  return joins;
}

/** (1 - reflection below)⁻¹. */
function allBounces(
  zeros: Zeros,
  reflection: Float64Array,
  below: Float64Array,
  size: number,
): Float64Array {
  const left = product(zeros, reflection, below, size);
  for (let i = 0; i < left.length; i++) left[i] = -left[i]!;
  for (let i = 0; i < size; i++) left[i * size + i]! += 1;
  return inverse(zeros, left, size);
}

/** Reflection of a layer and everything below it. */
function pileReflection(
  zeros: Zeros,
  { reflection, transmission, below, bounces }: Join,
  size: number,
): Float64Array {
  if (below.length === 0) return reflection;
  const through = product(zeros, bounces, transmission, size);
  const back = product(zeros, product(zeros, transmission, below, size), through, size);
  return plus(zeros, reflection, 1, back);
}

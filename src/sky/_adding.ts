/** Layers put together by their reflection and transmission at the nodes (the adding method). */
import { identity, inverse, product } from "./_matrix.js";
import type { LayerModes } from "./_layerModes.js";

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
export function joinLayers(layers: readonly LayerModes[], secants: Float64Array): Join[] {
  const size = secants.length;
  const joins: Join[] = [];
  let below: Float64Array = new Float64Array(0);
  for (let l = layers.length - 1; l >= 0; l--) {
    const { reflection, transmission } = responses(layers[l]!, secants);
    let bounces: Float64Array = new Float64Array(0);
    let whole = reflection;
    if (below.length > 0) {
      const once = product(reflection, below, size);
      bounces = inverse(
        identity(size).map((one, i) => one - once[i]!),
        size,
      );
      const back = product(
        product(transmission, below, size),
        product(bounces, transmission, size),
        size,
      );
      whole = reflection.map((own, i) => own + back[i]!);
    }
    joins.unshift({ reflection, transmission, below, bounces });
    below = whole;
  }
  return joins;
}

/** A layer's reflection and transmission: the sum and difference of its answers to even and odd illumination. */
function responses(
  layer: LayerModes,
  secants: Float64Array,
): { reflection: Float64Array; transmission: Float64Array } {
  const size = secants.length;
  const even = answer(layer.evenFactor, layer.vectors, secants);
  const odd = answer(layer.oddFactor, layer.vectors, secants);
  const reflection = new Float64Array(size * size);
  const transmission = new Float64Array(size * size);
  for (let i = 0; i < size * size; i++) {
    reflection[i] = even[i]! + odd[i]!;
    transmission[i] = even[i]! - odd[i]!;
  }
  for (let i = 0; i < size; i++) reflection[i * size + i]! -= 1;
  return { reflection, transmission };
}

/** Secants times Z (factor factorᵀ)⁻¹ Zᵀ, Z the eigenvectors as columns. */
function answer(factor: Float64Array, vectors: Float64Array, secants: Float64Array): Float64Array {
  const size = secants.length;
  const half = vectors.slice(); // factor⁻¹ Zᵀ
  for (let m = 0; m < size; m++) {
    for (let k = 0; k < m; k++) {
      const part = factor[m * size + k]!;
      for (let j = 0; j < size; j++) half[m * size + j]! -= part * half[k * size + j]!;
    }
    const scale = factor[m * size + m]!;
    for (let j = 0; j < size; j++) half[m * size + j]! *= scale;
  }
  const whole = new Float64Array(size * size);
  for (let m = 0; m < size; m++) {
    for (let i = 0; i < size; i++) {
      const part = half[m * size + i]! * secants[i]!;
      for (let j = 0; j < size; j++) whole[i * size + j]! += part * half[m * size + j]!;
    }
  }
  return whole;
}

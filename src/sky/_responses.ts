/** How a layer answers light at its faces, from its eigenmodes. */
import type { LayerModes } from "./_layerModes.js";
import { copyOf, type Zeros } from "./_zeros.js";

/** A layer's reflection and transmission: the sum and difference of its answers to even and odd illumination. */
export function responses(
  zeros: Zeros,
  layer: LayerModes,
  secants: Float64Array,
): { reflection: Float64Array; transmission: Float64Array } {
  const size = secants.length;
  const even = answer(zeros, layer.evenFactor, layer.vectors, secants);
  const odd = answer(zeros, layer.oddFactor, layer.vectors, secants);
  const reflection = zeros(size * size);
  const transmission = zeros(size * size);
  for (let i = 0; i < size * size; i++) {
    reflection[i] = even[i]! + odd[i]!;
    transmission[i] = even[i]! - odd[i]!;
  }
  for (let i = 0; i < size; i++) reflection[i * size + i]! -= 1;
  return { reflection, transmission };
}

/** Secants times Z (factor factorᵀ)⁻¹ Zᵀ, Z the eigenvectors as columns. */
function answer(
  zeros: Zeros,
  factor: Float64Array,
  vectors: Float64Array,
  secants: Float64Array,
): Float64Array {
  const size = secants.length;
  const half = copyOf(zeros, vectors); // factor⁻¹ Zᵀ
  for (let m = 0; m < size; m++) {
    for (let k = 0; k < m; k++) {
      const part = factor[m * size + k]!;
      for (let j = 0; j < size; j++) half[m * size + j]! -= part * half[k * size + j]!;
    }
    const scale = factor[m * size + m]!;
    for (let j = 0; j < size; j++) half[m * size + j]! *= scale;
  }
  const whole = zeros(size * size);
  for (let i = 0; i < size; i++) {
    for (let m = 0; m < size; m++) {
      const part = half[m * size + i]!;
      for (let j = 0; j <= i; j++) whole[i * size + j]! += part * half[m * size + j]!;
    }
    for (let j = 0; j < i; j++) {
      whole[j * size + i] = whole[i * size + j]! * secants[j]!;
      whole[i * size + j]! *= secants[i]!;
    }
    whole[i * size + i]! *= secants[i]!;
  }
  return whole;
}

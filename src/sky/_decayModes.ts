/** Decay rates and patterns of the light in a homogeneous layer, in one azimuth mode. */
import type { ModeKernel } from "./_kernel.js";
import { secondDowndate } from "./_secondDowndate.js";
import { rankOneDowndate } from "./_secular.js";
import type { Zeros } from "./_zeros.js";

/** What the eigenproblem of a layer gives. */
export interface DecayModes {
  readonly values: Float64Array;
  readonly vectors: Float64Array;
  readonly first: Float64Array;
  readonly second: Float64Array;
}

/** Eigensystem of diag(1 / cosine²) - 2 albedo (first firstᵀ + second secondᵀ) / cosines: one outer product after the other. */
export function decayModes(zeros: Zeros, kernel: ModeKernel, albedo: number): DecayModes {
  const { size, secants, rank } = kernel;
  if (albedo === 0) return darkModes(zeros, secants);
  const count = size / rank;
  const scale = Math.sqrt(2 * albedo);
  const poles = zeros(count);
  const vector = zeros(count);
  for (let i = 0; i < count; i++) {
    poles[i] = secants[i]! * secants[i]!;
    vector[i] = scale * kernel.first[i]! * secants[i]!;
  }
  const { values, vectors, couplings } = rankOneDowndate(zeros, poles, vector);
  for (let i = 0; i < count; i++) couplings[i]! /= scale;
  const once = { values, vectors, first: couplings, second: zeros(count) };
  return rank === 1 ? once : secondDowndate(zeros, kernel, scale, poles, once);
}

/** Without scattering every node is a mode of its own, and what it would give a source does not matter. */
function darkModes(zeros: Zeros, secants: Float64Array): DecayModes {
  const size = secants.length;
  const none = zeros(size);
  const vectors = zeros(size * size);
  for (let i = 0; i < size; i++) vectors[i * size + i] = 1;
  return { values: secants.map((secant) => secant * secant), vectors, first: none, second: none };
}

/** The eigenmodes of one homogeneous layer in one azimuth mode. */
import { expm1 } from "../_numeric.js";
import { choleskyFactor } from "./_cholesky.js";
import { decayModes } from "./_decayModes.js";
import type { ModeKernel } from "./_kernel.js";
import type { Zeros } from "./_zeros.js";

/** Single-scattering albedos up to this count as none: what they scatter is below every stated accuracy. */
const DARK = 1e-10;

/** A layer solved in one azimuth mode; modes are even or odd about the layer's middle, 1 or ±1 at its faces. */
export interface LayerModes {
  /** Optical depth of the layer, scattering and absorption together. */
  readonly depth: number;
  /** Squares k² of the decay rates, ascending; 0 for the first of mode 0 without absorption. */
  readonly squares: Float64Array;
  /** k tanh(k depth / 2): slope at the faces of the even modes. */
  readonly even: Float64Array;
  /** k coth(k depth / 2): slope at the faces of the odd modes. */
  readonly odd: Float64Array;
  /** What each mode gives the first source component, before the albedo. */
  readonly first: Float64Array;
  /** What each mode gives the second source component. */
  readonly second: Float64Array;
  /** Single-scattering albedo. */
  readonly albedo: number;
  /** Eigenvectors, mode by mode. */
  readonly vectors: Float64Array;
  /** Cholesky factor for the even amplitudes. */
  readonly evenFactor: Float64Array;
  /** Cholesky factor for the odd amplitudes. */
  readonly oddFactor: Float64Array;
}

/** Solves a layer of optical depth `depth` > 0 and single-scattering albedo `albedo`. */
export function layerModes(
  zeros: Zeros,
  kernel: ModeKernel,
  depth: number,
  albedo: number,
): LayerModes {
  const { size, secants } = kernel;
  const scattering = albedo > DARK ? albedo : 0;
  const { values, vectors, first, second } = decayModes(zeros, kernel, scattering);
  const even = zeros(size);
  const odd = zeros(size);
  const squares = zeros(size);
  for (let m = 0; m < size; m++) {
    squares[m] = Math.max(0, values[m]!);
    const k = Math.sqrt(squares[m]!);
    const lost = -expm1(-k * depth);
    even[m] = (k * lost) / (2 - lost);
    odd[m] = k * depth > 1e-9 ? (k * (2 - lost)) / lost : 2 / depth;
  }
  const overlap = secantMatrix(zeros, vectors, secants);
  return {
    depth,
    squares,
    even,
    odd,
    first,
    second,
    albedo: scattering,
    vectors,
    evenFactor: choleskyFactor(zeros, overlap, even, size),
    oddFactor: choleskyFactor(zeros, overlap, odd, size),
  };
}

/** Eigenvectors' overlaps weighted by 1 / cosine; the lower triangle is filled. */
function secantMatrix(zeros: Zeros, vectors: Float64Array, secants: Float64Array): Float64Array {
  const size = secants.length;
  const matrix = zeros(size * size);
  const weighted = zeros(size);
  for (let a = 0; a < size; a++) {
    for (let j = 0; j < size; j++) weighted[j] = vectors[a * size + j]! * secants[j]!;
    for (let b = 0; b <= a; b++) {
      let sum = 0;
      for (let j = 0; j < size; j++) sum += weighted[j]! * vectors[b * size + j]!;
      matrix[a * size + b] = sum;
    }
  }
  return matrix;
}

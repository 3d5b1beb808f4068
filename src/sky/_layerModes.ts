/** The eigenmodes of one homogeneous layer in one azimuth mode. */
import { expm1 } from "../_numeric.js";
import { choleskyFactor } from "./_cholesky.js";
import type { ModeKernel } from "./_kernel.js";
import { rankOneDowndate } from "./_secular.js";

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
export function layerModes(kernel: ModeKernel, depth: number, albedo: number): LayerModes {
  const { size, secants } = kernel;
  const scattering = albedo > DARK ? albedo : 0;
  const { values, vectors, first, second } = decayModes(kernel, scattering);
  const even = new Float64Array(size);
  const odd = new Float64Array(size);
  const squares = new Float64Array(size);
  for (let m = 0; m < size; m++) {
    squares[m] = Math.max(0, values[m]!);
    const k = Math.sqrt(squares[m]!);
    const lost = -expm1(-k * depth);
    even[m] = (k * lost) / (2 - lost);
    odd[m] = k * depth > 1e-9 ? (k * (2 - lost)) / lost : 2 / depth;
  }
  const overlap = secantMatrix(vectors, secants);
  return {
    depth,
    squares,
    even,
    odd,
    first,
    second,
    albedo: scattering,
    vectors,
    evenFactor: choleskyFactor(overlap, even, size),
    oddFactor: choleskyFactor(overlap, odd, size),
  };
}

/** What the eigenproblem of a layer gives. */
interface DecayModes {
  readonly values: Float64Array;
  readonly vectors: Float64Array;
  readonly first: Float64Array;
  readonly second: Float64Array;
}

/** Eigensystem of diag(1 / cosine²) - 2 albedo (first firstᵀ + second secondᵀ) / cosines: one outer product after the other. */
function decayModes(kernel: ModeKernel, albedo: number): DecayModes {
  const { size, secants, rank } = kernel;
  if (albedo === 0) return darkModes(secants);
  const count = size / rank;
  const scale = Math.sqrt(2 * albedo);
  const poles = new Float64Array(count);
  const vector = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    poles[i] = secants[i]! * secants[i]!;
    vector[i] = scale * kernel.first[i]! * secants[i]!;
  }
  const { values, vectors, couplings } = rankOneDowndate(poles, vector);
  for (let i = 0; i < count; i++) couplings[i]! /= scale;
  const once = { values, vectors, first: couplings, second: new Float64Array(count) };
  return rank === 1 ? once : secondDowndate(kernel, scale, poles, once);
}

/** The second outer product of mode 0, in the basis the first one left: its vectors, and the bare second components between them. */
function secondDowndate(
  kernel: ModeKernel,
  scale: number,
  nodePoles: Float64Array,
  before: DecayModes,
): DecayModes {
  const { size, secants } = kernel;
  const count = size / 2;
  const poles = new Float64Array(size);
  const vector = new Float64Array(size);
  for (let i = 0; i < count; i++) {
    poles[2 * i] = before.values[i]!;
    poles[2 * i + 1] = nodePoles[i]!;
    let sum = 0;
    for (let j = 0; j < count; j++) {
      sum += before.vectors[i * count + j]! * kernel.second[j]! * secants[j]!;
    }
    vector[2 * i] = scale * sum;
    vector[2 * i + 1] = scale * kernel.second[count + i]! * secants[i]!;
  }
  const { values, vectors: turned, couplings } = rankOneDowndate(poles, vector);
  const vectors = new Float64Array(size * size);
  const first = new Float64Array(size);
  const second = new Float64Array(size);
  for (let m = 0; m < size; m++) {
    const row = m * size;
    second[m] = couplings[m]! / scale;
    for (let i = 0; i < count; i++) {
      const part = turned[row + 2 * i]!;
      first[m]! += part * before.first[i]!;
      for (let j = 0; j < count; j++) vectors[row + j]! += part * before.vectors[i * count + j]!;
      vectors[row + count + i] = turned[row + 2 * i + 1]!;
    }
  }
  return { values, vectors, first, second };
}

/** Without scattering every node is a mode of its own, and what it would give a source does not matter. */
function darkModes(secants: Float64Array): DecayModes {
  const size = secants.length;
  const none = new Float64Array(size);
  const vectors = new Float64Array(size * size);
  for (let i = 0; i < size; i++) vectors[i * size + i] = 1;
  return { values: secants.map((secant) => secant * secant), vectors, first: none, second: none };
}

/** Eigenvectors' overlaps weighted by 1 / cosine; the lower triangle is filled. */
function secantMatrix(vectors: Float64Array, secants: Float64Array): Float64Array {
  const size = secants.length;
  const matrix = new Float64Array(size * size);
  const weighted = new Float64Array(size);
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

/** Eigenvalues and eigenvectors of a diagonal matrix less one outer product, in a number of steps that grows as the square of its size. */
import { reducedSecular, secularRoot } from "./_secularRoot.js";
import type { Zeros } from "./_zeros.js";

/** What `rankOneDowndate` finds. */
export interface Eigensystem {
  /** Eigenvalues, ascending. */
  readonly values: Float64Array;
  /** Orthonormal eigenvectors: component j of vector m at m * size + j. */
  readonly vectors: Float64Array;
  /** Products of the eigenvectors with the vector of the outer product, each to full relative accuracy. */
  readonly couplings: Float64Array;
}

/**
 * Eigensystem of diag(poles) - vector vectorᵀ; poles strictly ascending, no component of the vector zero.
 * Each eigenvalue lies between two poles and is found there as its distance from the nearer one; the vector is then
 * recomputed from the eigenvalues so that the eigenvectors come out orthogonal (Gu & Eisenstat 1994, SIAM J. Matrix Anal. Appl. 15, 1266).
 */
export function rankOneDowndate(
  zeros: Zeros,
  poles: Float64Array,
  vector: Float64Array,
): Eigensystem {
  const size = poles.length;
  const values = zeros(size);
  const gaps = zeros(size * size); // pole j less value m, at m * size + j
  for (let m = 0; m < size; m++) {
    const middle =
      m === 0 ? -1 : reducedSecular(poles, vector, m, m, 0.5 * (poles[m - 1]! - poles[m]!)).value;
    const origin = middle > 0 || m === 0 ? m : m - 1;
    const shift = secularRoot(poles, vector, m, origin);
    values[m] = poles[origin]! + shift;
    for (let j = 0; j < size; j++) gaps[m * size + j] = poles[j]! - poles[origin]! - shift;
  }
  const exact = consistentVector(zeros, poles, gaps);
  const couplings = zeros(size);
  for (let m = 0; m < size; m++) {
    let square = 0;
    for (let j = 0; j < size; j++) {
      const component = exact[j]! / gaps[m * size + j]!;
      gaps[m * size + j] = component;
      square += component * component;
    }
    const scale = 1 / Math.sqrt(square);
    couplings[m] = scale; // times the sum of vector² / gap, which is 1 at an eigenvalue
    for (let j = 0; j < size; j++) gaps[m * size + j]! *= scale;
  }
  for (let m = 0; m < size; m++) {
    for (let j = 0; j < size; j++) if (vector[j]! < 0) gaps[m * size + j] = -gaps[m * size + j]!;
  }
  return { values, vectors: gaps, couplings };
}

/** The vector, without signs, of which the computed eigenvalues are exact. */
function consistentVector(zeros: Zeros, poles: Float64Array, gaps: Float64Array): Float64Array {
  const size = poles.length;
  const exact = zeros(size);
  for (let j = 0; j < size; j++) {
    let square = gaps[j * size + j]!;
    for (let m = 0; m < size; m++) {
      if (m !== j) square *= gaps[m * size + j]! / (poles[j]! - poles[m]!);
    }
    exact[j] = Math.sqrt(Math.abs(square));
  }
  return exact;
}

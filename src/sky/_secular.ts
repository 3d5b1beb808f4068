/** Eigenvalues and eigenvectors of a diagonal matrix less one outer product, in a number of steps that grows as the square of its size. */

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
export function rankOneDowndate(poles: Float64Array, vector: Float64Array): Eigensystem {
  const size = poles.length;
  const values = new Float64Array(size);
  const gaps = new Float64Array(size * size); // pole j less value m, at m * size + j
  for (let m = 0; m < size; m++) {
    const middle =
      m === 0 ? -1 : reducedSecular(poles, vector, m, m, 0.5 * (poles[m - 1]! - poles[m]!)).value;
    const origin = middle > 0 || m === 0 ? m : m - 1;
    const shift = secularRoot(poles, vector, m, origin);
    values[m] = poles[origin]! + shift;
    for (let j = 0; j < size; j++) gaps[m * size + j] = poles[j]! - poles[origin]! - shift;
  }
  const exact = consistentVector(poles, gaps);
  const couplings = new Float64Array(size);
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

/** The root between poles m - 1 and m as its distance from pole `origin`, one of the two: Newton's steps kept between shrinking bounds. */
function secularRoot(poles: Float64Array, vector: Float64Array, m: number, origin: number): number {
  const own = vector[origin]! * vector[origin]!;
  let width = 0;
  if (m > 0) width = 0.5 * (poles[m]! - poles[m - 1]!);
  else for (const component of vector) width += component * component;
  let low = origin === m ? -width : 0;
  let high = origin === m ? 0 : width;
  let shift = origin === m ? Math.max(-own, 0.75 * low) : Math.min(own, 0.75 * high);
  for (let step = 0; step < 80; step++) {
    const { value, slope } = reducedSecular(poles, vector, m, origin, shift);
    if (value > 0) low = shift;
    else high = shift;
    let next = shift - value / slope;
    if (!(next >= low && next <= high)) next = 0.5 * (low + high);
    const move = Math.abs(next - shift);
    shift = next;
    if (move <= 3e-16 * Math.abs(shift)) break;
  }
  return shift;
}

/** (1 - sum of vector² / (pole - x)) times the distances from x to the two poles around it, which removes its infinities; and its slope. */
function reducedSecular(
  poles: Float64Array,
  vector: Float64Array,
  m: number,
  origin: number,
  shift: number,
): { value: number; slope: number } {
  const base = poles[origin]!;
  let sum = 1;
  let slope = 0;
  for (let j = 0; j < poles.length; j++) {
    if (j === m || j === m - 1) continue;
    const over = vector[j]! / (poles[j]! - base - shift);
    sum -= over * vector[j]!;
    slope -= over * over;
  }
  const above = poles[m]! - base - shift;
  const own = vector[m]! * vector[m]!;
  if (m === 0) return { value: above * sum - own, slope: above * slope - sum };
  const below = shift - (poles[m - 1]! - base);
  const other = vector[m - 1]! * vector[m - 1]!;
  return {
    value: below * above * sum - own * below + other * above,
    slope: (above - below) * sum + below * above * slope - own - other,
  };
}

/** The vector, without signs, of which the computed eigenvalues are exact. */
function consistentVector(poles: Float64Array, gaps: Float64Array): Float64Array {
  const size = poles.length;
  const exact = new Float64Array(size);
  for (let j = 0; j < size; j++) {
    let square = gaps[j * size + j]!;
    for (let m = 0; m < size; m++) {
      if (m !== j) square *= gaps[m * size + j]! / (poles[j]! - poles[m]!);
    }
    exact[j] = Math.sqrt(Math.abs(square));
  }
  return exact;
}

/**
 * Rayleigh scattering in three azimuth modes of small rank.
 *
 * What a volume of air emits is set by the symmetric tensor of the field that meets it. In mode 0 the tensor has two
 * components A (horizontal) and B (vertical), seen at cosine c as I_l = c² A + (1 - c²) B, I_r = A; in mode 1 one
 * component d, seen as I_l = -2 s c d cos(az), U = 2 s d sin(az) with s the sine; in mode 2 one component e, seen as
 * I_l = c² e cos(2 az), I_r = -e cos(2 az), U = -2 c e sin(2 az). Depolarisation mixes A and B and weakens d and e.
 */
import type { Nodes } from "./_nodes.js";
import type { Zeros } from "./_zeros.js";

/** One azimuth mode on the nodes, before any layer is known. */
export interface ModeKernel {
  /** Azimuth order, 0 to 2. */
  readonly order: 0 | 1 | 2;
  /** Number of source components: 2 in mode 0, else 1. */
  readonly rank: 1 | 2;
  /** Number of unknowns: nodes times rank, component by component. */
  readonly size: number;
  /** 1 / cosine of each unknown. */
  readonly secants: Float64Array;
  /** Coupling of the first source component to the unknowns: sqrt(weight) times a factor of the kernel. */
  readonly first: Float64Array;
  /** Coupling of the second source component; all zero in modes 1 and 2. */
  readonly second: Float64Array;
  /** Share of scattering that keeps the pattern of a small dipole. */
  readonly dipole: number;
  /** Lower Cholesky factor of the matrix that makes (A, B) from the field: c11, c21, c22. */
  readonly mixing: readonly [number, number, number];
}

/** Share of scattering that is a dipole's, the rest being isotropic: (1 - δ) / (1 + δ / 2) (Hansen & Travis 1974, equation 2.16). */
export function dipoleShare(depolarisation: number): number {
  return (1 - depolarisation) / (1 + 0.5 * depolarisation);
}

/** Mode 0: kernel 3/4 Cᵀ [[1 + c⁴, c² s²], [c² s², s⁴]] C, factored at each node. */
export function meanKernel(zeros: Zeros, nodes: Nodes, dipole: number): ModeKernel {
  const count = nodes.cosines.length;
  const isotropic = (1 - dipole) / 3;
  const c11 = Math.sqrt(0.5 * dipole + isotropic);
  const c21 = isotropic / c11;
  const c22 = Math.sqrt(dipole + isotropic - c21 * c21);
  const secants = zeros(2 * count);
  const first = zeros(2 * count);
  const second = zeros(2 * count);
  for (let i = 0; i < count; i++) {
    const c2 = nodes.cosines[i]! * nodes.cosines[i]!;
    const s2 = 1 - c2;
    const [g11, g12, g22] = [0.75 * (1 + c2 * c2), 0.75 * c2 * s2, 0.75 * s2 * s2];
    const k11 = c11 * (c11 * g11 + 2 * c21 * g12) + c21 * c21 * g22;
    const k12 = c22 * (c11 * g12 + c21 * g22);
    const b11 = Math.sqrt(k11);
    // determinant of the kernel: (3/4 c11 c22 s²)²
    const b22 = (0.75 * c11 * c22 * s2) / b11;
    const root = Math.sqrt(nodes.weights[i]!);
    secants[i] = secants[count + i] = 1 / nodes.cosines[i]!;
    first[i] = root * b11;
    second[i] = (root * k12) / b11;
    second[count + i] = root * b22;
  }
  return {
    order: 0,
    rank: 2,
    size: 2 * count,
    secants,
    first,
    second,
    dipole,
    mixing: [c11, c21, c22],
  };
}

/** Modes 1 and 2: kernels 3/8 s² (1 + 2 c²) and 3/16 (1 + c²)², times the dipole share. */
export function wavyKernel(zeros: Zeros, order: 1 | 2, nodes: Nodes, dipole: number): ModeKernel {
  const size = nodes.cosines.length;
  const first = zeros(size);
  const secants = zeros(size);
  for (let i = 0; i < size; i++) {
    const c2 = nodes.cosines[i]! * nodes.cosines[i]!;
    const kernel = order === 1 ? 0.375 * (1 - c2) * (1 + 2 * c2) : 0.1875 * (1 + c2) * (1 + c2);
    first[i] = Math.sqrt(dipole * nodes.weights[i]! * kernel);
    secants[i] = 1 / nodes.cosines[i]!;
  }
  const second = zeros(size);
  return { order, rank: 1, size, secants, first, second, dipole, mixing: [1, 0, 0] };
}

/**
 * Polarised multiple scattering by doubling and adding full 3 x 3 Stokes blocks, written from the textbook (Hansen & Travis
 * 1974, section 3) and sharing nothing with src but the azimuth modes of the phase matrix, which have tests of their own.
 */
import { rayleighPhaseMode } from "../../src/index.js";

/** Half-range quadrature with directions of no weight appended, so that they come out exactly. */
export interface Directions {
  mu: number[];
  w: number[];
}

/** Gauss-Legendre points on (0, 1) by bisection of the Legendre polynomial, in x with mu = x³. */
export function directions(count: number, extra: number[]): Directions {
  const legendre = (x: number): [number, number] => {
    let [p, q] = [1, x];
    for (let k = 2; k <= count; k++) [p, q] = [q, ((2 * k - 1) * x * q - (k - 1) * p) / k];
    return [q, (count * (x * q - p)) / (x * x - 1)];
  };
  const mu: number[] = [];
  const w: number[] = [];
  const steps = 20 * count;
  for (let s = 0; s < steps; s++) {
    let [lo, hi] = [-1 + (2 * s) / steps + 1e-9, -1 + (2 * (s + 1)) / steps + 1e-9];
    if (s === steps - 1) hi = 1 - 1e-9;
    if (legendre(lo)[0] * legendre(hi)[0] > 0) continue;
    for (let i = 0; i < 60; i++) {
      const mid = (lo + hi) / 2;
      if (legendre(lo)[0] * legendre(mid)[0] <= 0) hi = mid;
      else lo = mid;
    }
    const x = (1 + lo) / 2;
    mu.push(x ** 3);
    w.push((3 * x * x) / ((1 - lo * lo) * legendre(lo)[1] ** 2));
  }
  return { mu: [...mu, ...extra], w: [...w, ...extra.map(() => 0)] };
}

type M = Float64Array[];
/** Reflection and transmission of light from above (r, t) and from below (rs, ts), and what passes straight through. */
export interface Slab {
  r: M;
  t: M;
  rs: M;
  ts: M;
  straight: number[];
  depth: number;
}

const zero = (n: number): M => Array.from({ length: n }, () => new Float64Array(n));
const sum = (...ms: M[]): M =>
  ms[0]!.map((row, i) => row.map((_, j) => ms.reduce((s, m) => s + m[i]![j]!, 0)));
const rows = (m: M, f: number[]): M => m.map((row, i) => row.map((x) => x * f[i]!));
const columns = (m: M, f: number[]): M => m.map((row) => row.map((x, j) => x * f[j]!));

/** What works on slabs of one azimuth mode. */
export interface Doubling {
  layer: (depth: number, albedo: number) => Slab;
  add: (above: Slab, below: Slab) => Slab;
  ground: (albedo: number) => Slab;
}

export function doublingMode(order: 0 | 1 | 2, dirs: Directions, depolarisation: number): Doubling {
  const n = 3 * dirs.mu.length;
  const c = (1 + (order === 0 ? 1 : 0)) * 1;
  const weight = Array.from({ length: n }, (_, k) => {
    const i = Math.floor(k / 3);
    return c * dirs.w[i]! * dirs.mu[i]!;
  });
  const times = (a: M, b: M): M => {
    const out = zero(n);
    for (let i = 0; i < n; i++)
      for (let k = 0; k < n; k++) {
        const f = a[i]![k]! * weight[k]!;
        if (f !== 0) for (let j = 0; j < n; j++) out[i]![j]! += f * b[k]![j]!;
      }
    return out;
  };
  /** Light scattered once in a slab so thin that more does not matter. */
  const thin = (depth: number, albedo: number): Slab => {
    const slab: Slab = { r: zero(n), t: zero(n), rs: zero(n), ts: zero(n), straight: [], depth };
    dirs.mu.forEach((m, i) => {
      for (let k = 0; k < 3; k++) slab.straight.push(Math.exp(-depth / m));
      dirs.mu.forEach((m0, j) => {
        const back = (-albedo * Math.expm1(-depth * (1 / m + 1 / m0))) / (4 * (m + m0));
        const on =
          Math.abs(m - m0) < 1e-12
            ? (albedo * depth * Math.exp(-depth / m)) / (4 * m * m)
            : (albedo * Math.exp(-depth / m0) * Math.expm1(depth * (1 / m0 - 1 / m))) /
              (4 * (m - m0));
        const cases: [M, number, number, number][] = [
          [slab.r, m, -m0, back],
          [slab.t, -m, -m0, on],
          [slab.rs, -m, m0, back],
          [slab.ts, m, m0, on],
        ];
        for (const [target, out, from, f] of cases) {
          const p = rayleighPhaseMode(order, out, from, depolarisation);
          // sin times sin gives minus cos: the elements from U to I and Q carry the sign
          for (let a = 0; a < 3; a++)
            for (let b = 0; b < 3; b++)
              target[3 * i + a]![3 * j + b] = f * p[3 * a + b]! * (b === 2 && a < 2 ? -1 : 1);
        }
      });
    });
    return slab;
  };
  const bounce = (q: M, start: M): M => {
    // (1 + q + q² + ...) start, until a term no longer counts in any element
    let total = start;
    let term = start;
    for (let k = 0; k < 200; k++) {
      term = times(q, term);
      total = sum(total, term);
      const counts = term.some((row, i) =>
        row.some((x, j) => Math.abs(x) > 1e-17 * Math.abs(total[i]![j]!) + 1e-40),
      );
      if (!counts) break;
    }
    return total;
  };
  const add = (a: Slab, b: Slab): Slab => {
    const q = times(a.rs, b.r);
    const down = bounce(q, sum(a.t, columns(q, a.straight)));
    const up = sum(times(b.r, down), columns(b.r, a.straight));
    const qs = times(b.r, a.rs);
    const upStar = bounce(qs, sum(b.ts, columns(qs, b.straight)));
    const downStar = sum(times(a.rs, upStar), columns(a.rs, b.straight));
    return {
      r: sum(a.r, rows(up, a.straight), times(a.ts, up)),
      t: sum(rows(down, b.straight), columns(b.t, a.straight), times(b.t, down)),
      rs: sum(b.rs, rows(downStar, b.straight), times(b.t, downStar)),
      ts: sum(rows(upStar, a.straight), columns(a.ts, b.straight), times(a.ts, upStar)),
      // from the depth itself: squaring 1 - 1e-10 again and again would double its rounding every time
      straight: a.straight.map((_, i) =>
        Math.exp(-(a.depth + b.depth) / dirs.mu[Math.floor(i / 3)]!),
      ),
      depth: a.depth + b.depth,
    };
  };
  const layer = (depth: number, albedo: number): Slab => {
    const doublings = Math.max(0, Math.ceil(Math.log2(depth / 1e-10)));
    let slab = thin(depth / 2 ** doublings, albedo);
    for (let k = 0; k < doublings; k++) slab = add(slab, slab);
    return slab;
  };
  const ground = (albedo: number): Slab => {
    const slab: Slab = {
      r: zero(n),
      t: zero(n),
      rs: zero(n),
      ts: zero(n),
      straight: new Array(n).fill(0),
      depth: Number.POSITIVE_INFINITY,
    };
    if (order === 0)
      for (let i = 0; i < n; i += 3) for (let j = 0; j < n; j += 3) slab.r[i]![j] = albedo;
    return slab;
  };
  return { layer, add, ground };
}

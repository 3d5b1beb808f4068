/** Air in shells for the twilight tests: the same profile written anew, rays summed step by step, photons followed in three dimensions. */
import { standardAtmosphere } from "../../src/index.js";

export const EARTH = 6_371_000;
const TOP = 120_000;

/** Scattering and absorption per metre at a height above sea level, tables of 50 m, for a ground at sea level. */
export function profile(
  rayleighDepth: number,
  ozoneDepth: number,
): (heightM: number) => [number, number] {
  const step = 50;
  const count = TOP / step + 1;
  const density: number[] = [];
  for (let k = 0; k < count; k++) {
    const h = k * step;
    if (h <= 86_000) density.push(standardAtmosphere(h).numberDensityM3);
    else density.push(density.at(-1)! ** 2 / density.at(-2)!); // the last ratio again and again
  }
  const trapezoid = (f: (k: number) => number): number => {
    let sum = 0;
    for (let k = 0; k + 1 < count; k++) sum += 0.5 * step * (f(k) + f(k + 1));
    return sum;
  };
  const layer = (h: number): number => 1 / Math.cosh((h - 20_000) / 10_000) ** 2; // derivative of 1 / (1 + exp(x / 5 km))
  const s = rayleighDepth / trapezoid((k) => density[k]!);
  const a = ozoneDepth / trapezoid((k) => layer(k * step));
  const scattering = Float64Array.from(density, (n) => s * n);
  const absorption = Float64Array.from(density, (_, k) => a * layer(k * step));
  const out: [number, number] = [0, 0];
  return (h) => {
    const place = Math.min(Math.max(h / step, 0), count - 1.001);
    const k = Math.floor(place);
    const f = place - k;
    // geometric between rows
    out[0] = scattering[k]! * (1 + f * (scattering[k + 1]! / scattering[k]! - 1));
    out[1] = absorption[k]! + f * (absorption[k + 1]! - absorption[k]!);
    return out;
  };
}

export type V = [number, number, number];
export const dot = (a: V, b: V): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const along = (p: V, d: V, s: number): V => [
  p[0] + s * d[0],
  p[1] + s * d[1],
  p[2] + s * d[2],
];

/** Where a ray from `p` along `d` ends: distance, and whether on the ground. */
export function end(p: V, d: V): { length: number; ground: boolean } {
  const b = dot(p, d);
  const c = dot(p, p);
  const ground = b * b - c + EARTH * EARTH;
  if (b < 0 && ground > 0) {
    const s = -b - Math.sqrt(ground);
    if (s > -1e-3) return { length: Math.max(s, 0), ground: true };
  }
  return { length: -b + Math.sqrt(b * b - c + (EARTH + TOP) ** 2), ground: false };
}

/** Optical depth from `p` along `d` over `length`, midpoint steps even in the square root of the distance from the lowest point. */
export function depthOver(
  air: (h: number) => [number, number],
  p: V,
  d: V,
  length: number,
  steps: number,
): number {
  const b = dot(p, d);
  const lowest = Math.min(Math.max(-b, 0), length);
  let sum = 0;
  for (const [from, to] of [
    [lowest, 0],
    [lowest, length],
  ] as const) {
    const span = to - from;
    if (span === 0) continue;
    for (let k = 0; k < steps; k++) {
      const x = (k + 0.5) / steps;
      const q = along(p, d, from + span * x * x);
      const [s, a] = air(Math.sqrt(dot(q, q)) - EARTH);
      sum += (Math.abs(span) * 2 * x * (s + a)) / steps;
    }
  }
  return sum;
}

/** Sunlight left at `p`; `sun` points to the sun. */
export function sunlight(
  air: (h: number) => [number, number],
  p: V,
  sun: V,
  steps: number,
): number {
  const { ground, length } = end(p, sun);
  return ground ? 0 : Math.exp(-depthOver(air, p, sun, length, steps));
}

/** What a line of sight gathers, apart from azimuth, and the Stokes parameters made of it. */
import { exp } from "../_numeric.js";
import { safeSecants } from "./_beam.js";
import type { LitSky } from "./illuminateSky.js";
import { sightComponents } from "./_sight.js";

/** Number of values `sightAmplitudes` adds: A, B of mode 0, d of mode 1, e of mode 2 (see the kernel's file). */
export const AMPLITUDES = 4;

/** Adds A, B, d, e of the light seen along a line of sight at `cosine` > 0 to `out`, from `start` on. */
export function sightAmplitudes(
  lit: LitSky,
  cosine: number,
  upward: boolean,
  out: Float64Array,
  start: number,
): void {
  const [c11, c21, c22] = lit.sky.stacks[0].kernel.mixing;
  const views = safeSecants(lit.sky.stacks, 1 / cosine);
  const share = 1 / views.length;
  const pair = new Float64Array(2);
  for (const view of views) {
    sightComponents(lit.modes[0], view, upward, pair);
    out[start]! += share * c11 * pair[0]!;
    out[start + 1]! += share * (c21 * pair[0]! + c22 * pair[1]!);
    sightComponents(lit.modes[1], view, upward, pair);
    out[start + 2]! += share * pair[0]!;
    sightComponents(lit.modes[2], view, upward, pair);
    out[start + 3]! += share * pair[0]!;
  }
  if (upward && lit.groundRadiance > 0) {
    const depth = lit.sky.boundaryDepths[lit.sky.boundaryDepths.length - 1]!;
    const glow = 0.5 * lit.groundRadiance * exp(-depth / cosine);
    out[start]! += glow;
    out[start + 1]! += glow;
  }
}

/** Writes I, Q, U at `to` of `out` from A, B, d, e at `from` of `amplitudes`; `travel` is the cosine of the seen light's way from upward. */
export function amplitudesToStokes(
  amplitudes: Float64Array,
  from: number,
  travel: number,
  cosAzimuth: number,
  sinAzimuth: number,
  out: Float64Array | number[],
  to: number,
): void {
  const c2 = travel * travel;
  const s2 = 1 - c2;
  const s = Math.sqrt(s2);
  const a = amplitudes[from]!;
  const b = amplitudes[from + 1]!;
  const d = 2 * s * amplitudes[from + 2]!;
  const e = amplitudes[from + 3]!;
  const cosTwice = cosAzimuth * cosAzimuth - sinAzimuth * sinAzimuth;
  const left = c2 * a + s2 * b - travel * d * cosAzimuth + c2 * e * cosTwice;
  const right = a - e * cosTwice;
  out[to] = left + right;
  out[to + 1] = left - right;
  out[to + 2] = d * sinAzimuth - 4 * travel * e * sinAzimuth * cosAzimuth;
}

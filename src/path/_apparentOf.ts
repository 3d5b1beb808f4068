/** Apparent zenith angle of a true one, by tracing rays. */
import { refuse } from "../_check.js";
import { DEGREES_PER_RADIAN } from "../units.js";
import type { RayAir } from "./_rayAir.js";
import { rootBetween } from "./_rootBetween.js";
import { apparentHorizonDeg, traceRay } from "./_traceRay.js";

/** Wider than any refraction that lets a ray through, degrees. */
const WIDEST_DEG = 10;
/** Rounding of an angle near 90 degrees. */
const TOLERANCE_DEG = 2e-13;

export function apparentOf(air: RayAir, trueZenithDeg: number, name: string): number {
  const refraction = (z: number): number => traceRay(air, z, name)[0]! * DEGREES_PER_RADIAN;
  const excess = (z: number): number => z - trueZenithDeg + refraction(z);
  const horizon = apparentHorizonDeg(air);
  const upper = Math.min(trueZenithDeg, horizon);
  const high = excess(upper);
  if (high < -TOLERANCE_DEG) {
    const range = `0 to ${horizon + refraction(horizon)} degrees (beyond that the ground hides it)`;
    refuse(trueZenithDeg, range, "", "trueZenithDeg", name);
  }
  if (high <= TOLERANCE_DEG) return upper;
  // refraction grows with zenith angle, so this is too high in the sky, but for odd layers
  let lower = upper - high;
  let low = excess(lower);
  if (low > 0) {
    lower = Math.max(0, trueZenithDeg - WIDEST_DEG);
    low = excess(lower);
  }
  return rootBetween(excess, lower, low, upper, high, TOLERANCE_DEG);
}

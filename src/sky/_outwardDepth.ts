/** Optical depth along one straight ray through shells of air. */
import { coefficientAt, type ShellAir, TOP_M } from "./_shellAir.js";

/** Panels of the integral; each takes Gauss's two points. */
const PANELS = 60;
const GAUSS = 0.28867513459481287; // half of 1 / sqrt 3

/** Optical depth from a point to the top of the air, integrated over the square root of the distance. */
export function outwardDepth(air: ShellAir, heightM: number, cosine: number): number {
  const radius = air.groundM + heightM;
  const climb = TOP_M - heightM;
  const fall = radius * cosine;
  // distance to the top: the longer root of s² + 2 s radius cosine = climb (climb + 2 radius)
  const reach = climb * (climb + 2 * radius);
  const length = reach / (fall + Math.sqrt(fall * fall + reach));
  const step = 1 / PANELS;
  let sum = 0;
  for (let p = 0; p < 2 * PANELS; p++) {
    const x = (0.5 * p + 0.25 + (p % 2 === 0 ? 0.25 - GAUSS : GAUSS - 0.25)) * step;
    const path = length * x * x;
    const gained =
      (path * (path + 2 * fall)) / (Math.sqrt(radius * radius + path * (path + 2 * fall)) + radius);
    sum += x * coefficientAt(air.lnExtinction, heightM + gained);
  }
  return sum * step * length;
}

/** Compressibility factor of moist air (CIPM-2007, equation A1.4; the same in Ciddor 1996, equation 12). */
import { KELVINS_AT_ZERO_CELSIUS } from "../units.js";

const A0 = 1.58123e-6; // K Pa-1
const A1 = -2.9331e-8; // Pa-1
const A2 = 1.1043e-10; // K-1 Pa-1
const B0 = 5.707e-6; // K Pa-1
const B1 = -2.051e-8; // Pa-1
const C0 = 1.9898e-4; // K Pa-1
const C1 = -2.376e-6; // Pa-1
const D = 1.83e-11; // K2 Pa-2
const E = -0.765e-8; // K2 Pa-2

export function compressibility(
  pressurePa: number,
  temperatureK: number,
  waterMoleFraction: number,
): number {
  const t = temperatureK - KELVINS_AT_ZERO_CELSIUS;
  const x = waterMoleFraction;
  const ratio = pressurePa / temperatureK;
  const first = A0 + A1 * t + A2 * t * t + (B0 + B1 * t) * x + (C0 + C1 * t) * x * x;
  return 1 - ratio * first + ratio * ratio * (D + E * x * x);
}

/** How much more vapour saturated air holds than vapour alone: alpha + beta p + gamma t² (CIPM-2007, equation A1.2). */
import { KELVINS_AT_ZERO_CELSIUS } from "../units.js";

const ALPHA = 1.00062;
const BETA = 3.14e-8; // Pa-1
const GAMMA = 5.6e-7; // °C-2

export function enhancementFactor(pressurePa: number, temperatureK: number): number {
  const t = temperatureK - KELVINS_AT_ZERO_CELSIUS;
  return ALPHA + BETA * pressurePa + GAMMA * t * t;
}

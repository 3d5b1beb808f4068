/** The standard atmosphere's layers with every temperature raised alike and the pressure re-integrated from a measured one. */
import {
  BASE_K,
  BASE_M,
  GRADIENT,
  HYDROSTATIC_K_PER_M,
  pressureAfterClimb,
  standardLayer,
} from "./_standardLayers.js";
import type { AirLayer } from "./airProfile.js";

/** The seven layers through a point of given geopotential height and pressure, in hydrostatic balance (vapour aside). */
export function raisedStandard(
  geopotentialM: number,
  pressurePa: number,
  offsetK: number,
): AirLayer[] {
  const here = standardLayer(geopotentialM);
  const pressures: number[] = [];
  const hereK = temperatureIn(here, geopotentialM) + offsetK;
  const down = BASE_M[here]! - geopotentialM;
  pressures[here] = pressureAfterClimb(pressurePa, hereK, GRADIENT[here]!, down);
  for (let i = here; i < BASE_M.length - 1; i++) {
    const climb = BASE_M[i + 1]! - BASE_M[i]!;
    pressures[i + 1] = pressureAfterClimb(pressures[i]!, BASE_K[i]! + offsetK, GRADIENT[i]!, climb);
  }
  for (let i = here - 1; i >= 0; i--) {
    const topK = temperatureIn(i, BASE_M[i + 1]!) + offsetK;
    const climb = BASE_M[i]! - BASE_M[i + 1]!;
    pressures[i] = pressureAfterClimb(pressures[i + 1]!, topK, GRADIENT[i]!, climb);
  }
  return pressures.map((basePa, i) => ({
    baseM: BASE_M[i]!,
    baseK: BASE_K[i]! + offsetK,
    gradient: GRADIENT[i]!,
    basePa,
    hydrostaticKPerM: HYDROSTATIC_K_PER_M,
    baseWater: 0,
    waterGradient: 0,
  }));
}

function temperatureIn(layer: number, geopotentialM: number): number {
  return BASE_K[layer]! + GRADIENT[layer]! * (geopotentialM - BASE_M[layer]!);
}

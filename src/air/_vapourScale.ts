/** Scale height of the mole fraction of vapour over temperature that gives its density one of 2 km at the station. */
import { VAPOUR_LIGHTNESS } from "./_profileState.js";
import { HYDROSTATIC_K_PER_M } from "./_standardLayers.js";

/** Scale height of the vapour's density at the station, m (common practice). */
const VAPOUR_SCALE_M = 2000;

export function vapourScale(temperatureK: number, waterMoleFraction: number): number {
  const weight = HYDROSTATIC_K_PER_M * (1 - VAPOUR_LIGHTNESS * waterMoleFraction);
  return 1 / (1 / VAPOUR_SCALE_M - weight / temperatureK);
}

/** State of a profile at a height, unguarded (for use along a ray). */
import { exp, log1p } from "../_numeric.js";
import { geopotentialHeight } from "./_standardLayers.js";
import type { AirLayer, AirProfile } from "./airProfile.js";

/** What a mole of vapour lacks of a mole of air's weight: 1 - 18.015 / 28.9644 (molar masses: CIPM-2007; USSA 1976). */
export const VAPOUR_LIGHTNESS = 0.378029581;

/** Index of the layer that holds a geopotential height. */
export function profileLayer(profile: AirProfile, geopotentialM: number): number {
  const { layers } = profile;
  let low = 0;
  let high = layers.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (geopotentialM >= layers[middle]!.baseM) low = middle;
    else high = middle;
  }
  return low;
}

/** Fills `out` with temperature K, pressure Pa and mole fraction of vapour at a geometric height in a known layer. */
export function fillState(
  profile: AirProfile,
  layer: AirLayer,
  altitudeM: number,
  out: Float64Array,
): void {
  const h = geopotentialHeight(altitudeM);
  const climb = h - layer.baseM;
  const temperature = layer.baseK + layer.gradient * climb;
  let logPressure =
    layer.gradient === 0
      ? (-layer.hydrostaticKPerM * climb) / layer.baseK
      : (-layer.hydrostaticKPerM / layer.gradient) * log1p((layer.gradient * climb) / layer.baseK);
  let water = layer.baseWater + layer.waterGradient * climb;
  if (profile.waterPerK > 0) {
    const fall = exp((profile.waterOriginM - h) / profile.waterScaleM);
    water = profile.waterPerK * temperature * fall;
    logPressure += vapourRelief(profile, layer.hydrostaticKPerM, fall);
  }
  out[0] = temperature;
  out[1] = layer.basePa * exp(logPressure);
  out[2] = water;
}

/** ln of pressure over that at the layer's base after a climb in geopotential metres, the vapour's relief apart. */
export function logPressureAfter(layer: AirLayer, climb: number): number {
  return layer.gradient === 0
    ? (-layer.hydrostaticKPerM * climb) / layer.baseK
    : (-layer.hydrostaticKPerM / layer.gradient) * log1p((layer.gradient * climb) / layer.baseK);
}

/** By how much ln(pressure) exceeds that of dry air since the station: vapour is lighter (exact for exponential x / T). */
function vapourRelief(profile: AirProfile, hydrostaticKPerM: number, fall: number): number {
  const weight = VAPOUR_LIGHTNESS * hydrostaticKPerM * profile.waterPerK * profile.waterScaleM;
  return weight * (1 - fall);
}

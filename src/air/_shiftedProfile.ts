/** A profile in other weather: every temperature shifted alike, pressure re-integrated, mole fractions of vapour kept. */
import { exp } from "../_numeric.js";
import { fillState, logPressureAfter, profileLayer } from "./_profileState.js";
import { GEOPOTENTIAL_RADIUS_M, geopotentialHeight } from "./_standardLayers.js";
import { vapourScale } from "./_vapourScale.js";
import type { AirLayer, AirProfile } from "./airProfile.js";

/** The profile through a pressure and a temperature at a geometric height. */
export function shiftedProfile(
  profile: AirProfile,
  altitudeM: number,
  pressurePa: number,
  temperatureK: number,
): AirProfile {
  const here = profileLayer(profile, geopotentialHeight(altitudeM));
  const offsetK = temperatureK - stateAt(profile, altitudeM, here)[0]!;
  const layers = profile.layers.map((l) => ({ ...l, baseK: l.baseK + offsetK }));
  const shifted = { ...profile, ...shiftedVapour(profile, offsetK), layers };
  const factor = pressurePa / stateAt(shifted, altitudeM, here)[1]!;
  layers[here] = { ...layers[here]!, basePa: layers[here]!.basePa * factor };
  for (let i = here; i < layers.length - 1; i++) {
    layers[i + 1] = { ...layers[i + 1]!, basePa: layers[i]!.basePa * ratio(layers, i) };
  }
  for (let i = here - 1; i >= 0; i--) {
    layers[i] = { ...layers[i]!, basePa: layers[i + 1]!.basePa / ratio(layers, i) };
  }
  return shifted;
}

/** Pressure at the top of a layer over that at its base. */
function ratio(layers: readonly AirLayer[], i: number): number {
  return exp(logPressureAfter(layers[i]!, layers[i + 1]!.baseM - layers[i]!.baseM));
}

function stateAt(profile: AirProfile, altitudeM: number, layer: number): Float64Array {
  const state = new Float64Array(3);
  fillState(profile, profile.layers[layer]!, altitudeM, state);
  return state;
}

function shiftedVapour(
  profile: AirProfile,
  offsetK: number,
): Pick<AirProfile, "waterPerK" | "waterScaleM"> {
  const { waterPerK, waterScaleM, waterOriginM } = profile;
  if (waterPerK === 0) return { waterPerK, waterScaleM };
  const altitudeM = (GEOPOTENTIAL_RADIUS_M * waterOriginM) / (GEOPOTENTIAL_RADIUS_M - waterOriginM);
  const [temperature, , water] = stateAt(profile, altitudeM, profileLayer(profile, waterOriginM));
  const shifted = temperature! + offsetK;
  return { waterPerK: water! / shifted, waterScaleM: vapourScale(shifted, water!) };
}

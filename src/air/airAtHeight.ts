/** The air of a profile at one height. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { Fraction, Kelvins, Metres, Pascals } from "../units.js";
import { fillState, profileLayer } from "./_profileState.js";
import { geopotentialHeight } from "./_standardLayers.js";
import type { AirProfile } from "./airProfile.js";

/** Temperature, pressure and vapour of a profile at one height. */
export interface AirAtHeight {
  /** Temperature, K (molecular-scale temperature above 80 km). */
  readonly temperatureK: Kelvins;
  /** Pressure, Pa. */
  readonly pressurePa: Pascals;
  /** Mole fraction of water vapour. */
  readonly waterMoleFraction: Fraction;
}

/**
 * Temperature, pressure and water vapour of a prepared profile at a height.
 *
 * Model: as the profile's maker says.
 * Validity: from the profile's lowest to its highest height, enforced.
 * Accuracy: see `standardProfile` and `tabulatedProfile`.
 * Source: as the profile's maker.
 *
 * @param altitudeM - geometric height above mean sea level, m, within the profile
 * @param profile - prepared profile from `standardProfile` or `tabulatedProfile`
 * @returns `temperatureK` K, `pressurePa` Pa, `waterMoleFraction` 0 to 1
 * @throws TypeError if an argument is of the wrong kind; RangeError if the height is outside the profile
 * @example
 * import { airAtHeight, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 95000,
 *   temperatureK: 283.15,
 *   relativeHumidity: 0.6,
 *   altitudeM: 540,
 *   co2Ppm: 425,
 * });
 * airAtHeight(3000, profile).temperatureK; // => 267.17
 */
export function airAtHeight(altitudeM: Metres, profile: AirProfile): AirAtHeight {
  const maker = "standardProfile or tabulatedProfile";
  checkPrepared(profile?.waterPerK, maker, "profile", "airAtHeight");
  checkNumber(altitudeM, profile.lowestM, profile.highestM, "m", "altitudeM", "airAtHeight");
  const state = new Float64Array(3);
  const layer = profile.layers[profileLayer(profile, geopotentialHeight(altitudeM))]!;
  fillState(profile, layer, altitudeM, state);
  return { temperatureK: state[0]!, pressurePa: state[1]!, waterMoleFraction: state[2]! };
}

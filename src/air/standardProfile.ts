/** The standard atmosphere made to pass through a station's readings. */
import { checkNumber } from "../_check.js";
import type { Metres } from "../units.js";
import { moistState } from "./_moistState.js";
import { raisedStandard } from "./_raisedStandard.js";
import { geopotentialHeight, standardMolecularTemperature } from "./_standardLayers.js";
import { vapourScale } from "./_vapourScale.js";
import type { AirProfile } from "./airProfile.js";
import type { MoistAirInput } from "./moistAir.js";

/** What `standardProfile` takes: the surface state at the station. */
export interface StandardProfileInput extends MoistAirInput {
  /** Height of the station above mean sea level, m. */
  readonly altitudeM: Metres;
}

/**
 * Profile of moist air to 86 km from the state measured at a station, over the standard atmosphere's shape.
 *
 * Model: one offset added to the standard's temperature at all heights so that it meets the measured one; pressure
 * integrated up and down from the measured value in hydrostatic balance with that temperature and the vapour's lightness;
 * mole fraction of vapour over temperature falls exponentially, so that the vapour's density has a scale height of 2 km at
 * the station and 1.9 km in the upper troposphere; CO2 the same everywhere. The ground is at sea level, or at a station
 * below it. Temperatures above 80 km are molecular-scale ones (0.04 % above the kinetic at 86 km).
 * Validity: state as `moistAir`; altitude -1000 to 20 000 m, enforced. A mean shape: inversions and fronts need `tabulatedProfile`.
 * Accuracy: 1e-9 relative in pressure against hydrostatic balance integrated by Runge and Kutta; 1e-12 against
 * `standardAtmosphere` in its own state.
 * Source: US Standard Atmosphere 1976 (NOAA, NASA, USAF), section 1.2-1.3, for the shape; Picard et al. 2008 for the vapour
 * at the station; the 2 km are common practice.
 *
 * @param station - `pressurePa` at the station (not reduced to sea level), 10 000 to 140 000 Pa; `temperatureK` 180 to 380 K;
 *   `relativeHumidity` 0 to 1 (over water); `altitudeM` -1000 to 20 000 m above mean sea level; `co2Ppm` 0 to 2000 µmol/mol
 * @returns the prepared profile
 * @throws TypeError if a value is not a number; RangeError if it is outside its range
 * @example
 * import { airAtHeight, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 101325,
 *   temperatureK: 303.15,
 *   relativeHumidity: 0.5,
 *   altitudeM: 0,
 *   co2Ppm: 425,
 * });
 * airAtHeight(5000, profile).pressurePa; // => 55968
 */
export function standardProfile(station: StandardProfileInput): AirProfile {
  const air = moistState(station, "station", "standardProfile");
  const { altitudeM } = station;
  checkNumber(altitudeM, -1000, 20_000, "m", "altitudeM", "standardProfile");
  const waterOriginM = geopotentialHeight(altitudeM);
  const offsetK = air.temperatureK - standardMolecularTemperature(altitudeM);
  return {
    lowestM: Math.min(0, altitudeM),
    highestM: 86_000,
    co2Ppm: air.co2Ppm,
    layers: raisedStandard(waterOriginM, air.pressurePa, offsetK),
    waterOriginM,
    waterPerK: air.waterMoleFraction / air.temperatureK,
    waterScaleM: vapourScale(air.temperatureK, air.waterMoleFraction),
  };
}

/** The standard atmosphere at a height. */
import { checkNumber } from "../_check.js";
import type { Kelvins, Metres, Pascals } from "../units.js";
import { standardState } from "./_standardLayers.js";

/** State of the standard atmosphere at one height. */
export interface StandardState {
  /** Kinetic temperature, K. */
  readonly temperatureK: Kelvins;
  /** Pressure, Pa. */
  readonly pressurePa: Pascals;
  /** Mass density, kg m⁻³. */
  readonly densityKgM3: number;
  /** Number density of molecules, m⁻³. */
  readonly numberDensityM3: number;
}

/**
 * Temperature, pressure and density of the US Standard Atmosphere 1976 at a geometric height.
 *
 * Model: seven layers of constant gradient of molecular-scale temperature in geopotential height, hydrostatic; above 80 km
 * the kinetic temperature is lower by the ratio of molar masses. A dry, mid-latitude annual mean, not today's weather.
 * Validity: geometric height -5 to 86 km, enforced.
 * Accuracy: the standard's printed rows to their five digits, up to 5e-5 relative; 1e-9 against the hydrostatic integral.
 * Source: US Standard Atmosphere 1976 (NOAA, NASA, USAF), sections 1.2-1.3, tables 4 and 8 (constants from memory).
 *
 * @param altitudeM - geometric height above mean sea level, -5000 to 86 000 m
 * @returns `temperatureK` K, `pressurePa` Pa, `densityKgM3` kg m⁻³, `numberDensityM3` m⁻³
 * @throws TypeError if the height is not a number; RangeError if it is out of range
 * @example
 * import { standardAtmosphere } from "airlight";
 * standardAtmosphere(10000).pressurePa; // => 26499.9
 */
export function standardAtmosphere(altitudeM: Metres): StandardState {
  checkNumber(altitudeM, -5000, 86_000, "m", "altitudeM", "standardAtmosphere");
  return standardState(altitudeM);
}

/** Molecules above a site, by integrating gravity through the profile. */
import { AVOGADRO_CONSTANT } from "../constants.js";
import type { Degrees, Metres, PartsPerMillion, Pascals } from "../units.js";
import { checkAirColumn } from "./_checkAirColumn.js";
import { dryMolarMass } from "./_dryMolarMass.js";
import { meanGravity } from "./_meanGravity.js";

/** What `airColumn` takes. */
export interface AirColumnInput {
  /** Pressure at the site (not reduced to sea level), Pa. */
  readonly pressurePa: Pascals;
  /** Height of the site above sea level, m. */
  readonly altitudeM: Metres;
  /** Geodetic latitude, degrees. */
  readonly latitudeDeg: Degrees;
  /** Carbon dioxide, µmol/mol. */
  readonly co2Ppm: PartsPerMillion;
}

/** Prepared vertical column of air above a site; make it with `airColumn` or `airColumnBodhaine`. */
export interface AirColumn extends AirColumnInput {
  /** Molecules of air above one square metre. */
  readonly moleculesPerM2: number;
}

/**
 * Column of air above a site: the molecules that make its Rayleigh optical depth.
 *
 * Model: pressure over mean gravity gives the mass, molar mass the molecules; gravity is averaged by mass through the standard
 * atmosphere above the site, its density scaled until it weighs the measured pressure.
 * Validity: pressure 10 to 140 kPa, height -500 to 20 000 m, latitude -90 to 90°, CO2 0 to 2000 ppm, enforced. Vapour is
 * counted as air by its weight (2 cm of water: some 0.07 % too few molecules, which scatter less).
 * Accuracy: 1e-6 against a fine sum through the profile; 5.7e-4 above `airColumnBodhaine` at sea level.
 * Source: hydrostatic balance; US Standard Atmosphere 1976; WGS 84 gravity; molar mass Bodhaine et al. 1999, equation 17.
 *
 * @param site - `pressurePa` at the site 10 000 to 140 000 Pa; `altitudeM` -500 to 20 000 m; `latitudeDeg` -90 to 90°;
 *   `co2Ppm` 0 to 2000 µmol/mol
 * @returns the prepared column, with `moleculesPerM2`
 * @throws TypeError if a value is not a number; RangeError if it is out of range
 * @example
 * import { airColumn } from "airlight";
 * airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 360 }).moleculesPerM2; // => 2.15327e29
 */
export function airColumn(site: AirColumnInput): AirColumn {
  checkAirColumn(site, "airColumn");
  const { pressurePa, altitudeM, latitudeDeg, co2Ppm } = site;
  const perKilogram = AVOGADRO_CONSTANT / dryMolarMass(co2Ppm);
  const moleculesPerM2 = (pressurePa / meanGravity(latitudeDeg, altitudeM)) * perKilogram;
  return { pressurePa, altitudeM, latitudeDeg, co2Ppm, moleculesPerM2 };
}

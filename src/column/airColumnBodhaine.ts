/** Molecules above a site by the published shortcut. */
import { cos } from "../_numeric.js";
import { RADIANS_PER_DEGREE } from "../units.js";
import { checkAirColumn } from "./_checkAirColumn.js";
import { dryMolarMass } from "./_dryMolarMass.js";
import type { AirColumn, AirColumnInput } from "./airColumn.js";

/** Mass-weighted mean height of the air above a site, m: 0.73737 z + 5517.56 (equation 26). */
const HEIGHT_SLOPE = 0.73737;
const HEIGHT_M = 5517.56;
/** Avogadro constant of the paper, 1/mol. */
const AVOGADRO = 6.0221367e23;

/**
 * Column of air above a site by the shortcut most photometry papers use; `airColumn` is the recommended one.
 *
 * Model: pressure over gravity at one mass-weighted mean height, gravity by the series of the Smithsonian tables.
 * Validity: pressure 10 to 140 kPa, height -500 to 20 000 m, latitude -90 to 90°, CO2 0 to 2000 ppm, enforced.
 * Accuracy: reproduces the paper's closing fit at sea level, 45°, 360 ppm to 1e-4 (250-850 nm); below `airColumn` by 5.7e-4 at sea
 * level and 1.0e-3 at 9 km, because its mean height is some 1.8 km too low.
 * Source: Bodhaine, Wood, Dutton & Slusser 1999, J. Atmos. Ocean. Technol. 16, 1854, equations 10, 11, 17, 25, 26.
 *
 * @param site - `pressurePa` at the site 10 000 to 140 000 Pa; `altitudeM` -500 to 20 000 m; `latitudeDeg` -90 to 90°;
 *   `co2Ppm` 0 to 2000 µmol/mol
 * @returns the prepared column, with `moleculesPerM2`
 * @throws TypeError if a value is not a number; RangeError if it is out of range
 * @example
 * import { airColumnBodhaine } from "airlight";
 * airColumnBodhaine({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 360 }).moleculesPerM2; // => 2.15204e29
 */
export function airColumnBodhaine(site: AirColumnInput): AirColumn {
  checkAirColumn(site, "airColumnBodhaine");
  const { pressurePa, altitudeM, latitudeDeg, co2Ppm } = site;
  const gravity = smithsonianGravity(latitudeDeg, HEIGHT_SLOPE * altitudeM + HEIGHT_M);
  const moleculesPerM2 = (pressurePa * AVOGADRO) / (dryMolarMass(co2Ppm) * gravity);
  return { pressurePa, altitudeM, latitudeDeg, co2Ppm, moleculesPerM2 };
}

/** Gravity, m s⁻² (equations 10 and 11, printed there in cm s⁻²; after List 1968). */
function smithsonianGravity(latitudeDeg: number, heightM: number): number {
  const c = cos(2 * latitudeDeg * RADIANS_PER_DEGREE);
  const z = heightM;
  const surface = 980.616 * (1 - 0.0026373 * c + 0.0000059 * c * c);
  const linear = 3.085462e-4 + 2.27e-7 * c;
  const quadratic = 7.254e-11 + 1e-13 * c;
  const cubic = 1.517e-17 + 6e-20 * c;
  return 0.01 * (surface - z * (linear - z * (quadratic - z * cubic)));
}

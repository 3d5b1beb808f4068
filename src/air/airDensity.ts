/** Mass density of moist air. */
import { checkPrepared } from "../_check.js";
import type { MoistAir } from "./moistAir.js";

/** Molar mass of dry air at 400 ppm CO2 and of water, kg/mol, and its slope with CO2 (CIPM-2007, equation 3 and table 1). */
const DRY_MOLAR_MASS = 28.96546e-3;
const DRY_MOLAR_MASS_PER_CO2 = 12.011e-3;
const CO2_REFERENCE = 400e-6;
const VAPOUR_MOLAR_MASS = 18.01528e-3;
/** CODATA 2006 gas constant that the formula was published with, J/(mol K). */
const GAS_CONSTANT = 8.314472;

/**
 * Mass density of moist air.
 *
 * Model: p M / (Z R T) with the molar mass of the mixture and the virial compressibility of `moistAir`.
 * Validity: state as `moistAir`; published for 15 to 27 °C and 60 to 110 kPa, where its relative uncertainty is 2.2e-5;
 * used wider here with no stated uncertainty.
 * Accuracy: 4e-7 relative against the worked value 1.199314 kg m⁻³ (its digits); 1e-10 to the formula written apart.
 * Source: Picard, Davis, Gläser & Fujii 2008, Metrologia 45, 149 (CIPM-2007), equation 1.
 *
 * @param air - prepared state from `moistAir`
 * @returns density, kg m⁻³
 * @throws TypeError if `air` was not made by `moistAir`
 * @example
 * import { airDensity, moistAir } from "airlight";
 * airDensity(moistAir({ pressurePa: 101325, temperatureK: 293.15, relativeHumidity: 0.5, co2Ppm: 400 })); // => 1.199314
 */
export function airDensity(air: MoistAir): number {
  checkPrepared(air?.compressibility, "moistAir", "air", "airDensity");
  const dry = DRY_MOLAR_MASS + DRY_MOLAR_MASS_PER_CO2 * (air.co2Ppm * 1e-6 - CO2_REFERENCE);
  const molarMass = dry * (1 - air.waterMoleFraction * (1 - VAPOUR_MOLAR_MASS / dry));
  return (air.pressurePa * molarMass) / (air.compressibility * GAS_CONSTANT * air.temperatureK);
}

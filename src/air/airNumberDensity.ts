/** Molecules in a volume of moist air. */
import { checkPrepared } from "../_check.js";
import { BOLTZMANN_CONSTANT } from "../constants.js";
import type { MoistAir } from "./moistAir.js";

/**
 * Number of molecules (dry air and vapour) per cubic metre.
 *
 * Model: p / (Z k T) with the virial compressibility of `moistAir`.
 * Validity: state as `moistAir`.
 * Accuracy: 1e-12 relative to the ideal-gas value once Z is divided out; Z itself is good to about 2e-5 (CIPM-2007).
 * Source: gas law; Picard et al. 2008, Metrologia 45, 149, equation A1.4 for Z.
 *
 * @param air - prepared state from `moistAir`
 * @returns number density, m⁻³
 * @throws TypeError if `air` was not made by `moistAir`
 * @example
 * import { airNumberDensity, moistAir } from "airlight";
 * airNumberDensity(moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 400 })); // => 2.547956e25
 */
export function airNumberDensity(air: MoistAir): number {
  checkPrepared(air?.compressibility, "moistAir", "air", "airNumberDensity");
  return air.pressurePa / (air.compressibility * BOLTZMANN_CONSTANT * air.temperatureK);
}

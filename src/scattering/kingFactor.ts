/** King factor of dry air. */
import type { Dimensionless, Nanometres, PartsPerMillion } from "../units.js";
import { kingFactorOf } from "./_bodhaine.js";
import { checkGas } from "./_checkGas.js";

/**
 * King factor of dry air: how much the molecules' anisotropy raises their scattering, (6 + 3 ρ) / (6 - 7 ρ).
 *
 * Model: the gases' own factors averaged by volume.
 * Validity: 230-1690 nm (enforced; published to 230 nm); CO2 0 to 2000 ppm.
 * Accuracy: 5e-4 against the table of Bates 1984 at 400, 500, 550 and 700 nm (its digits); 1e-12 against the formula written apart.
 * Source: Bodhaine, Wood, Dutton & Slusser 1999, J. Atmos. Ocean. Technol. 16, 1854, equations 5, 6 and 23; after Bates 1984.
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @param co2Ppm - carbon dioxide, 0 to 2000 µmol/mol
 * @returns King factor, without unit, about 1.05
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { kingFactor } from "airlight";
 * kingFactor(550, 360); // => 1.04882
 */
export function kingFactor(wavelengthNm: Nanometres, co2Ppm: PartsPerMillion): Dimensionless {
  checkGas(wavelengthNm, co2Ppm, "kingFactor");
  return kingFactorOf(1e6 / (wavelengthNm * wavelengthNm), co2Ppm);
}

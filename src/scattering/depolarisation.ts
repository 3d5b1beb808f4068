/** Depolarisation factor of dry air for natural light. */
import type { Dimensionless, Nanometres, PartsPerMillion } from "../units.js";
import { kingFactorOf } from "./_bodhaine.js";
import { checkGas } from "./_checkGas.js";

/**
 * Depolarisation factor of dry air for natural (unpolarised) incident light: weak over strong component at 90°.
 *
 * Model: King factor F solved for ρ = 6 (F - 1) / (3 + 7 F).
 * Validity: 230-1690 nm, CO2 0 to 2000 ppm, enforced.
 * Accuracy: 1e-14 as the inverse of the King relation; 0.0279 at 700 nm and 0.0297 at 400 nm to 1e-4 (Young 1981; Bates 1984, from memory).
 * Source: Bodhaine et al. 1999, J. Atmos. Ocean. Technol. 16, 1854, equations 5, 6, 23; Young 1981, Appl. Opt. 20, 533.
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @param co2Ppm - carbon dioxide, 0 to 2000 µmol/mol
 * @returns depolarisation factor, without unit, about 0.028
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { depolarisation } from "airlight";
 * depolarisation(550, 360); // => 0.02832
 */
export function depolarisation(wavelengthNm: Nanometres, co2Ppm: PartsPerMillion): Dimensionless {
  checkGas(wavelengthNm, co2Ppm, "depolarisation");
  const king = kingFactorOf(1e6 / (wavelengthNm * wavelengthNm), co2Ppm);
  return (6 * (king - 1)) / (3 + 7 * king);
}

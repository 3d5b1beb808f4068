/** Rayleigh scattering cross-section of air. */
import type { Nanometres, PartsPerMillion, SquareMetres } from "../units.js";
import { crossSectionOf } from "./_bodhaine.js";
import { checkGas } from "./_checkGas.js";

/**
 * Rayleigh scattering cross-section of one molecule of dry air.
 *
 * Model: Lorentz-Lorenz polarisability from the index of standard air, with the King factor of the mixture.
 * Validity: 230-1690 nm, CO2 0 to 2000 ppm, enforced; free of pressure, temperature and (to 1 % of the vapour's share) humidity.
 * Accuracy: 8e-5 against the paper's closing fit over 250-850 nm; 0.1 % against Bates 1984 at 400, 500, 550 and 700 nm.
 * Source: Bodhaine, Wood, Dutton & Slusser 1999, J. Atmos. Ocean. Technol. 16, 1854, equation 22; index Peck & Reeder 1972.
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @param co2Ppm - carbon dioxide, 0 to 2000 µmol/mol
 * @returns cross-section, m² per molecule
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { rayleighCrossSection } from "airlight";
 * rayleighCrossSection(550, 425); // => 4.511e-31
 */
export function rayleighCrossSection(
  wavelengthNm: Nanometres,
  co2Ppm: PartsPerMillion,
): SquareMetres {
  checkGas(wavelengthNm, co2Ppm, "rayleighCrossSection");
  return crossSectionOf(wavelengthNm, co2Ppm);
}

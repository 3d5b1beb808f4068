/** Scattering coefficient of air at a point. */
import { checkNumber, checkPrepared } from "../_check.js";
import { airNumberDensity } from "../air/airNumberDensity.js";
import type { MoistAir } from "../air/moistAir.js";
import type { Nanometres } from "../units.js";
import { crossSectionOf } from "./_bodhaine.js";

/**
 * Molecular scattering coefficient of air: the share of a beam scattered per metre.
 *
 * Model: cross-section of dry air times the number of molecules per m³; vapour molecules are counted as air.
 * Validity: 230-1690 nm, enforced; state as `moistAir`. Vapour scatters about a quarter less per molecule than air, so 2 % of
 * vapour makes the result some 0.5 % high (from memory).
 * Accuracy: 1e-12 as the product of `rayleighCrossSection` and `airNumberDensity`; 0.1 % against Bates 1984 times 2.547e25 m⁻³ in standard air.
 * Source: Bodhaine et al. 1999, J. Atmos. Ocean. Technol. 16, 1854, equation 22; gas law with compressibility (CIPM-2007).
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @param air - prepared state from `moistAir`
 * @returns scattering coefficient, m⁻¹
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { moistAir, rayleighScatteringCoefficient } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 425 });
 * rayleighScatteringCoefficient(550, air); // => 1.1494e-5
 */
export function rayleighScatteringCoefficient(wavelengthNm: Nanometres, air: MoistAir): number {
  checkNumber(wavelengthNm, 230, 1690, "nm", "wavelengthNm", "rayleighScatteringCoefficient");
  checkPrepared(air?.compressibility, "moistAir", "air", "rayleighScatteringCoefficient");
  return crossSectionOf(wavelengthNm, air.co2Ppm) * airNumberDensity(air);
}

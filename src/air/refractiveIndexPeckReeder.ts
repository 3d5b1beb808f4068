/** Refractive index of standard dry air after Peck and Reeder. */
import { checkNumber } from "../_check.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { peckReederRefractivity } from "./_peckReeder.js";

/**
 * Phase refractive index of dry air at 15 °C and 1013.25 hPa, the index on which the Rayleigh cross-section stands.
 *
 * Model: four-term dispersion formula.
 * Validity: 230-1690 nm, enforced, as published; dry air, 288.15 K, 101 325 Pa, 300 ppm CO2 only: use
 * `refractiveIndexCiddor` for any other state.
 * Accuracy: within 1.1e-8 of `refractiveIndexCiddor` in that state, 300-1690 nm.
 * Source: Peck & Reeder 1972, J. Opt. Soc. Am. 62, 958, equation 3; as equation 4 in Bodhaine et al. 1999.
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @returns n, without unit
 * @throws TypeError if the wavelength is not a number; RangeError if it is out of range
 * @example
 * import { refractiveIndexPeckReeder } from "airlight";
 * refractiveIndexPeckReeder(550); // => 1.000277823
 */
export function refractiveIndexPeckReeder(wavelengthNm: Nanometres): Dimensionless {
  checkNumber(wavelengthNm, 230, 1690, "nm", "wavelengthNm", "refractiveIndexPeckReeder");
  return 1 + peckReederRefractivity(1e6 / (wavelengthNm * wavelengthNm));
}

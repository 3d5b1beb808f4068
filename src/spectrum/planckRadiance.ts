/** Planck's law. */
import { checkNumber } from "../_check.js";
import { expm1 } from "../_numeric.js";
import { FIRST_RADIATION_CONSTANT_RADIANCE, SECOND_RADIATION_CONSTANT } from "../constants.js";
import type { Kelvins, Nanometres, SpectralRadiance } from "../units.js";

/**
 * Spectral radiance of a black body in vacuum.
 *
 * Model: 2 h c² / λ⁵ / (exp(h c / (λ k T)) - 1).
 * Validity: 1 to 1e9 nm and 1 to 1e8 K, enforced; the law itself has no such limits. Far below the peak, where the true
 * value is under 1e-300, the result loses digits and ends at 0.
 * Accuracy: 5e-14 relative where the exponent is below 100 (against 40-digit decimals, tested); constants of the 2019 SI, exact.
 * Source: Planck's law; constants CODATA 2018.
 *
 * @param wavelengthNm - vacuum wavelength, 1 to 1e9 nm
 * @param temperatureK - 1 to 1e8 K
 * @returns radiance, W m⁻² sr⁻¹ nm⁻¹
 * @throws TypeError if an argument is not a number; RangeError if it is outside its range
 * @example
 * import { planckRadiance } from "airlight";
 * planckRadiance(500, 5772); // => 26238.54
 */
export function planckRadiance(wavelengthNm: Nanometres, temperatureK: Kelvins): SpectralRadiance {
  checkNumber(wavelengthNm, 1, 1e9, "nm", "wavelengthNm", "planckRadiance");
  checkNumber(temperatureK, 1, 1e8, "K", "temperatureK", "planckRadiance");
  const lambda = wavelengthNm * 1e-9; // m
  const fifth = lambda * lambda * lambda * lambda * lambda;
  const perMetre =
    FIRST_RADIATION_CONSTANT_RADIANCE /
    (fifth * expm1(SECOND_RADIATION_CONSTANT / (lambda * temperatureK)));
  return perMetre * 1e-9;
}

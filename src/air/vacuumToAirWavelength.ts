/** Vacuum wavelength to wavelength in air. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { Nanometres } from "../units.js";
import type { MoistAir } from "./moistAir.js";
import { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";

/**
 * Wavelength in air of light with the given vacuum wavelength.
 *
 * Model: vacuum wavelength over `refractiveIndexCiddor`.
 * Validity: 300-1690 nm, enforced; state as `moistAir`.
 * Accuracy: that of the index: 5e-8 relative, 3e-5 nm at 500 nm; the way back returns within 1e-12 relative.
 * Source: definition of the refractive index; Ciddor 1996, Appl. Opt. 35, 1566.
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param air - prepared state from `moistAir`
 * @returns wavelength in that air, nm
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { moistAir, vacuumToAirWavelength } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 450 });
 * vacuumToAirWavelength(500, air); // => 499.86055
 */
export function vacuumToAirWavelength(wavelengthNm: Nanometres, air: MoistAir): Nanometres {
  checkNumber(wavelengthNm, 300, 1690, "nm", "wavelengthNm", "vacuumToAirWavelength");
  checkPrepared(air?.dryFactor, "moistAir", "air", "vacuumToAirWavelength");
  return wavelengthNm / refractiveIndexCiddor(wavelengthNm, air);
}

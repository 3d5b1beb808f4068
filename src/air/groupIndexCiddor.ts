/** Group refractive index of moist air. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { dryGroupDispersion, vapourGroupDispersion } from "./_ciddorDispersion.js";
import type { MoistAir } from "./moistAir.js";

/**
 * Group refractive index of moist air: what a light pulse or a distance meter feels; n - wavelength dn/dwavelength.
 *
 * Model: exact derivative of `refractiveIndexCiddor` with respect to wavenumber.
 * Validity: 300-1690 nm, enforced; state as `moistAir`.
 * Accuracy: 1e-11 against central differences of the phase index; the phase index in its place is 1.1e-5 low at 550 nm.
 * Source: Ciddor 1996, Appl. Opt. 35, 1566, equations 1-5; group form as in Ciddor & Hill 1999, Appl. Opt. 38, 1663.
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param air - prepared state from `moistAir`
 * @returns group index, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { groupIndexCiddor, moistAir } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 450 });
 * groupIndexCiddor(550, air); // => 1.000288588
 */
export function groupIndexCiddor(wavelengthNm: Nanometres, air: MoistAir): Dimensionless {
  checkNumber(wavelengthNm, 300, 1690, "nm", "wavelengthNm", "groupIndexCiddor");
  checkPrepared(air?.dryFactor, "moistAir", "air", "groupIndexCiddor");
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  const dry = air.dryFactor * dryGroupDispersion(s);
  return 1 + 1e-8 * (dry + air.vapourFactor * vapourGroupDispersion(s));
}

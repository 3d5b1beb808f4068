/** Phase refractive index of moist air, the recommended formula. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { dryDispersion, vapourDispersion } from "./_ciddorDispersion.js";
import type { MoistAir } from "./moistAir.js";

/**
 * Phase refractive index n of moist air; the one to use of the library's index formulas.
 *
 * Model: densities of dry air and vapour times their dispersions, added (density-proportional mixing; the Lorentz-Lorenz
 * form differs by up to 0.97e-8).
 * Validity: 300-1690 nm, enforced; state as `moistAir`. Published for -40 to 100 °C, 80 to 120 kPa, CO2 0 to 2000 ppm.
 * Accuracy: 5e-10 of n against the paper's table (half of its last digit), 1e-11 against the formula by absolute densities; the author states an uncertainty of 2 to 5e-8.
 * Source: Ciddor 1996, Appl. Opt. 35, 1566, equations 1-5.
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param air - prepared state from `moistAir`
 * @returns n, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { moistAir, refractiveIndexCiddor } from "airlight";
 * const air = moistAir({ pressurePa: 100000, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
 * refractiveIndexCiddor(633, air); // => 1.000268244
 */
export function refractiveIndexCiddor(wavelengthNm: Nanometres, air: MoistAir): Dimensionless {
  checkNumber(wavelengthNm, 300, 1690, "nm", "wavelengthNm", "refractiveIndexCiddor");
  checkPrepared(air?.dryFactor, "moistAir", "air", "refractiveIndexCiddor");
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  return 1 + 1e-8 * (air.dryFactor * dryDispersion(s) + air.vapourFactor * vapourDispersion(s));
}

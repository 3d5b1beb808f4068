/** Absorption cross-section of nitrogen dioxide. */
import { checkNumber } from "../_check.js";
import type { Kelvins, Nanometres, SquareMetres } from "../units.js";
import { nitrogenDioxideOf } from "./_nitrogenDioxide.js";

/**
 * Absorption cross-section of one molecule of nitrogen dioxide, base e.
 *
 * Model: means over bands of 5 nm, straight lines between their centres and in temperature: between 220 and 298 K to 495 nm;
 * from 500 nm one temperature, 294 K. Between 495 and 500 nm the influence of temperature fades out along the same straight line.
 * Validity: 280-660 nm and 200-298 K (below 220 K the line in temperature goes on), enforced. For light broader than 5 nm: the
 * gas has structure of tens of per cent at 1 nm and below.
 * Accuracy: the tables' values at their centres; the two recommendations differ by -0.1 to +3.5 % where both exist (400-495 nm).
 * Source: IUPAC recommendation after Vandaele et al. 1998 (220, 298 K); Burkholder et al. 2020, JPL Publication 19-5 (294 K).
 *
 * @param wavelengthNm - vacuum wavelength, 280 to 660 nm
 * @param temperatureK - temperature of the gas, 200 to 298 K
 * @returns cross-section, m² per molecule
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { nitrogenDioxideCrossSection } from "airlight";
 * nitrogenDioxideCrossSection(400, 220); // => 6.32e-23
 */
export function nitrogenDioxideCrossSection(
  wavelengthNm: Nanometres,
  temperatureK: Kelvins,
): SquareMetres {
  checkNumber(wavelengthNm, 280, 660, "nm", "wavelengthNm", "nitrogenDioxideCrossSection");
  checkNumber(temperatureK, 200, 298, "K", "temperatureK", "nitrogenDioxideCrossSection");
  return nitrogenDioxideOf(wavelengthNm, temperatureK);
}

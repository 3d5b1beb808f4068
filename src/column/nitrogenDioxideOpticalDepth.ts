/** Optical depth of a nitrogen dioxide column. */
import { checkNumber } from "../_check.js";
import type { Dimensionless, DobsonUnits, Kelvins, Nanometres } from "../units.js";
import { nitrogenDioxideDepthOf } from "./_gasDepth.js";

/**
 * Vertical optical depth of a column of nitrogen dioxide.
 *
 * Model: cross-section times molecules per square metre, one temperature for the whole column.
 * Validity: 280-660 nm, 0 to 50 DU, 200-298 K, enforced. Clean air holds 0.1 to 0.2 DU, a city's some ten times more (from
 * memory).
 * Accuracy: as `nitrogenDioxideCrossSection`.
 * Source: see `nitrogenDioxideCrossSection`.
 *
 * @param wavelengthNm - vacuum wavelength, 280 to 660 nm
 * @param columnDu - column, 0 to 50 Dobson units (1 DU = 2.6868e16 molecules per cm²)
 * @param temperatureK - temperature of the gas, 200 to 298 K
 * @returns optical depth at the zenith, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { nitrogenDioxideOpticalDepth } from "airlight";
 * nitrogenDioxideOpticalDepth(400, 0.1, 220); // => 0.00169805
 */
export function nitrogenDioxideOpticalDepth(
  wavelengthNm: Nanometres,
  columnDu: DobsonUnits,
  temperatureK: Kelvins,
): Dimensionless {
  checkNumber(wavelengthNm, 280, 660, "nm", "wavelengthNm", "nitrogenDioxideOpticalDepth");
  checkNumber(columnDu, 0, 50, "DU", "columnDu", "nitrogenDioxideOpticalDepth");
  checkNumber(temperatureK, 200, 298, "K", "temperatureK", "nitrogenDioxideOpticalDepth");
  return nitrogenDioxideDepthOf(wavelengthNm, columnDu, temperatureK);
}

/** Optical depth of an ozone column. */
import { checkNumber } from "../_check.js";
import type { Dimensionless, DobsonUnits, Kelvins, Nanometres } from "../units.js";
import { ozoneDepthOf } from "./_gasDepth.js";

/**
 * Vertical optical depth of a column of ozone.
 *
 * Model: cross-section times molecules per square metre, one temperature for the whole column.
 * Validity: 186-1098 nm, 0 to 1000 DU, 200-298 K, enforced.
 * Accuracy: as `ozoneCrossSection`; 300 DU give 0.042 at 602 nm.
 * Source: see `ozoneCrossSection`.
 *
 * @param wavelengthNm - vacuum wavelength, 186 to 1098 nm
 * @param ozoneDu - column, 0 to 1000 Dobson units
 * @param temperatureK - temperature of the ozone, 200 to 298 K; about 225 K for the ozone layer
 * @returns optical depth at the zenith, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { ozoneOpticalDepth } from "airlight";
 * ozoneOpticalDepth(602, 300, 225); // => 0.0425305
 */
export function ozoneOpticalDepth(
  wavelengthNm: Nanometres,
  ozoneDu: DobsonUnits,
  temperatureK: Kelvins,
): Dimensionless {
  checkNumber(wavelengthNm, 186, 1098, "nm", "wavelengthNm", "ozoneOpticalDepth");
  checkNumber(ozoneDu, 0, 1000, "DU", "ozoneDu", "ozoneOpticalDepth");
  checkNumber(temperatureK, 200, 298, "K", "temperatureK", "ozoneOpticalDepth");
  return ozoneDepthOf(wavelengthNm, ozoneDu, temperatureK);
}

/** Rayleigh optical depth of the air above a site. */
import { checkNumber, checkPrepared } from "../_check.js";
import { crossSectionOf } from "../scattering/_bodhaine.js";
import type { Dimensionless, Nanometres } from "../units.js";
import type { AirColumn } from "./airColumn.js";

/**
 * Vertical Rayleigh (molecular scattering) optical depth above a site.
 *
 * Model: cross-section of one molecule times the molecules above one square metre.
 * Validity: 230-1690 nm, enforced; column as `airColumn`.
 * Accuracy: 1e-4 on `airColumnBodhaine` against the paper's fit; scale about 0.1 % (King factor and index).
 * Source: Bodhaine, Wood, Dutton & Slusser 1999, J. Atmos. Ocean. Technol. 16, 1854, equations 22 and 27.
 *
 * @param wavelengthNm - vacuum wavelength, 230 to 1690 nm
 * @param column - prepared column from `airColumn` or `airColumnBodhaine`
 * @returns optical depth at the zenith, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { airColumn, rayleighOpticalDepth } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * rayleighOpticalDepth(500, column); // => 0.143443
 */
export function rayleighOpticalDepth(wavelengthNm: Nanometres, column: AirColumn): Dimensionless {
  checkNumber(wavelengthNm, 230, 1690, "nm", "wavelengthNm", "rayleighOpticalDepth");
  checkPrepared(column?.moleculesPerM2, "airColumn", "column", "rayleighOpticalDepth");
  return crossSectionOf(wavelengthNm, column.co2Ppm) * column.moleculesPerM2;
}

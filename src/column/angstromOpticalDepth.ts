/** Ångström's law of aerosol optical depth. */
import { checkNumber } from "../_check.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { angstromOf, checkAngstrom } from "./_angstrom.js";

/** Aerosol above a site by its optical depth at one wavelength and Ångström's exponent. */
export interface AngstromAerosol {
  /** Vertical optical depth at the reference wavelength, 0 to 20. */
  readonly opticalDepth: Dimensionless;
  /** Reference wavelength, 186 to 4000 nm. */
  readonly referenceNm: Nanometres;
  /** Ångström's exponent, -2 to 5; about 1.3 for continental haze, near 0 for coarse dust. */
  readonly exponent: Dimensionless;
}

/**
 * Vertical optical depth of aerosol by Ångström's law.
 *
 * Model: depth at the reference wavelength times (wavelength / reference) to the power of minus the exponent.
 * Validity: 186-4000 nm, depth 0 to 20, exponent -2 to 5, enforced. A description, not a law of nature: real aerosol curves on a
 * double logarithmic plot, more so the further from the reference.
 * Accuracy: 1e-14 of the formula.
 * Source: Ångström 1929, Geogr. Ann. 11, 156.
 *
 * @param wavelengthNm - wavelength, 186 to 4000 nm
 * @param aerosol - `opticalDepth` 0 to 20 at `referenceNm` 186 to 4000 nm; `exponent` -2 to 5
 * @returns optical depth at the zenith, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { angstromOpticalDepth } from "airlight";
 * angstromOpticalDepth(1000, { opticalDepth: 0.2, referenceNm: 500, exponent: 1 }); // => 0.1
 */
export function angstromOpticalDepth(
  wavelengthNm: Nanometres,
  aerosol: AngstromAerosol,
): Dimensionless {
  checkNumber(wavelengthNm, 186, 4000, "nm", "wavelengthNm", "angstromOpticalDepth");
  checkAngstrom(aerosol, "angstromOpticalDepth");
  return angstromOf(wavelengthNm, aerosol);
}

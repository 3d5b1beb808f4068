/** Ångström's law without guards, and the guard of its record. */
import { checkNumber, checkRecord } from "../_check.js";
import { pow } from "../_numeric.js";
import type { AngstromAerosol } from "./angstromOpticalDepth.js";

export function angstromOf(wavelengthNm: number, aerosol: AngstromAerosol): number {
  return aerosol.opticalDepth * pow(wavelengthNm / aerosol.referenceNm, -aerosol.exponent);
}

/** Throws unless the record holds a depth, a reference wavelength and an exponent that can be. */
export function checkAngstrom(aerosol: AngstromAerosol, functionName: string): void {
  checkRecord(aerosol, "aerosol", functionName);
  checkNumber(aerosol.opticalDepth, 0, 20, "", "aerosol.opticalDepth", functionName);
  checkNumber(aerosol.referenceNm, 186, 4000, "nm", "aerosol.referenceNm", functionName);
  checkNumber(aerosol.exponent, -2, 5, "", "aerosol.exponent", functionName);
}

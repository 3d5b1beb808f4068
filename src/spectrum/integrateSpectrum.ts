/** The area under a spectrum. */
import { checkNumber } from "../_check.js";
import type { Nanometres } from "../units.js";
import { checkCover, checkSpectrum } from "./_checkSpectrum.js";
import { segmentFrom, valueInSegment } from "./_valueAt.js";
import type { Spectrum } from "./spectrum.js";

/**
 * Integral of a spectrum between two wavelengths.
 *
 * Model: the exact area under the straight lines between samples (the trapezium rule with interpolated ends).
 * Validity: the limits must lie within the spectrum. A NaN sample between the limits, or next to one that falls between
 * samples, gives NaN.
 * Accuracy: 1e-13 relative for straight lines (tested); for a curve the error is that of the sampling.
 * Source: arithmetic.
 *
 * @param spectrum - samples of any quantity
 * @param fromNm - lower limit, nm, within the spectrum
 * @param toNm - upper limit, nm, not below `fromNm`
 * @returns the integral, in the spectrum's unit times nm (W m⁻² for irradiance)
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths do not rise or a limit lies outside
 * @example
 * import { integrateSpectrum, solarIrradiance, tabulate, wavelengthGrid } from "airlight";
 * const sun = tabulate(solarIrradiance, wavelengthGrid(280, 4000, 1));
 * integrateSpectrum(sun, 400, 700); // => 528.04
 */
export function integrateSpectrum(
  spectrum: Spectrum,
  fromNm: Nanometres,
  toNm: Nanometres,
): number {
  checkSpectrum(spectrum, "spectrum", "integrateSpectrum");
  checkNumber(fromNm, 0, 1e9, "nm", "fromNm", "integrateSpectrum");
  checkNumber(toNm, fromNm, 1e9, "nm", "toNm", "integrateSpectrum");
  checkCover(spectrum, fromNm, toNm, "spectrum", "integrateSpectrum");
  const { wavelengthsNm, values } = spectrum;
  let i = segmentFrom(wavelengthsNm, fromNm, 0);
  let left = fromNm;
  let leftValue = valueInSegment(wavelengthsNm, values, i, fromNm);
  let twice = 0;
  while (left < toNm) {
    const right = Math.min(wavelengthsNm[i + 1]!, toNm);
    const rightValue = valueInSegment(wavelengthsNm, values, i, right);
    twice += (right - left) * (leftValue + rightValue);
    left = right;
    leftValue = rightValue;
    i++;
  }
  return twice / 2;
}

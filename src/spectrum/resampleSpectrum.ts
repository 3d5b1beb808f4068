/** A spectrum at other wavelengths. */
import { checkCover, checkRising, checkSpectrum } from "./_checkSpectrum.js";
import { segmentFrom, valueInSegment } from "./_valueAt.js";
import type { Spectrum } from "./spectrum.js";

/**
 * The same spectrum at other wavelengths.
 *
 * Model: straight lines between the samples. A coarser grid picks points and averages nothing: for means over a
 * passband use `bandMean`.
 * Validity: the wavelengths must lie within the spectrum; nothing is extrapolated. A NaN sample gives NaN at its own
 * wavelength and up to its neighbours'.
 * Accuracy: 1e-15 relative for straight lines (tested); samples at shared wavelengths are kept to the last bit.
 * Source: arithmetic.
 *
 * @param spectrum - samples of any quantity
 * @param wavelengthsNm - strictly rising, nm, within the spectrum; a Float64Array is kept in the result, not copied
 * @returns the spectrum at those wavelengths, in the same unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths do not rise or lie outside
 * @example
 * import { resampleSpectrum } from "airlight";
 * const coarse = { wavelengthsNm: Float64Array.of(400, 500), values: Float64Array.of(1, 2) };
 * resampleSpectrum(coarse, [425, 450]).values[0]; // => 1.25
 */
export function resampleSpectrum(spectrum: Spectrum, wavelengthsNm: ArrayLike<number>): Spectrum {
  checkSpectrum(spectrum, "spectrum", "resampleSpectrum");
  checkRising(wavelengthsNm, 1, "wavelengthsNm", "resampleSpectrum");
  const last = wavelengthsNm.length - 1;
  checkCover(spectrum, wavelengthsNm[0]!, wavelengthsNm[last]!, "spectrum", "resampleSpectrum");
  const grid =
    wavelengthsNm instanceof Float64Array ? wavelengthsNm : Float64Array.from(wavelengthsNm);
  const values = new Float64Array(grid.length);
  let i = 0;
  for (let k = 0; k < grid.length; k++) {
    i = segmentFrom(spectrum.wavelengthsNm, grid[k]!, i);
    values[k] = valueInSegment(spectrum.wavelengthsNm, spectrum.values, i, grid[k]!);
  }
  return { wavelengthsNm: grid, values };
}

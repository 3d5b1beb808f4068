/** From a spectrum to what the eye's three receptors make of it. */
import { PEAK_LUMINOUS_EFFICACY } from "../constants.js";
import type { Spectrum } from "../spectrum/spectrum.js";
import type { Observer } from "./observer.js";
import type { Xyz } from "./triples.js";

/**
 * Tristimulus values X, Y, Z of a spectrum.
 *
 * Model: 683.002 lm/W times the sum, over the observer's own wavelengths, of the spectrum (straight lines between its
 * samples) times the colour-matching functions times the observer's step. The spectrum's wavelengths are taken on the
 * observer's printed scale, which is that of standard air: the shift to vacuum, at most 1e-4 in x and y, is left out.
 * Validity: the spectrum must cover 400 to 700 nm; what is missing beyond its ends counts as zero. A NaN among the
 * samples that are used gives NaN. A table of one's own works as an observer; its contents are not looked at.
 * Accuracy: white points A, D50 and D65 to 1e-5 in x and y: by the 5 nm sum of 380-780 nm (D65 0.31272, 0.32903, as
 * the CIE prints it) and by the 1 nm sum of 360-830 nm (0.31273, 0.32902) (tested). Fastest when the spectrum's wavelengths are the observer's own; for many spectra on one grid take `spectraToXyz`.
 * Source: CIE 15, tristimulus values; 683.002 lm/W from CIE 018.
 *
 * @param spectrum - irradiance (W m⁻² nm⁻¹), radiance (W m⁻² sr⁻¹ nm⁻¹) or a relative spectrum
 * @param observer - `cie1931Observer`, `cie1931Observer5nm` or `cie1964Observer`
 * @returns [X, Y, Z]; with the 1931 observer an irradiance gives Y in lx, a radiance in cd m⁻²
 * @throws TypeError if an argument is of the wrong kind; RangeError if the spectrum's wavelengths do not rise or do not
 *   cover 400 to 700 nm
 * @example
 * import { cie1931Observer, solarIrradiance, spectrumToXyz, tabulate, wavelengthGrid } from "airlight";
 * const sun = tabulate(solarIrradiance, wavelengthGrid(360, 830, 1));
 * const [X, Y, Z] = spectrumToXyz(sun, cie1931Observer);
 * Y; // => 132715
 */
export function spectrumToXyz(spectrum: Spectrum, observer: Observer): Xyz {
  const { wavelengthsNm, values } = spectrum ?? {};
  const last = wavelengthsNm?.length - 1;
  if (!(values?.length === last + 1 && observer?.stepNm > 0)) {
    throw new TypeError("spectrumToXyz: needs a spectrum and an observer");
  }
  if (!(wavelengthsNm[0]! <= 400 && wavelengthsNm[last]! >= 700)) {
    throw new RangeError(
      `spectrumToXyz: spectrum must cover 400 to 700 nm, got ${wavelengthsNm[0]} to ${wavelengthsNm[last]}`,
    );
  }
  return sumOnGrid(wavelengthsNm, values, observer) ?? sumBetween(wavelengthsNm, values, observer);
}

/** The sums when the samples stand at the observer's wavelengths, otherwise undefined. */
function sumOnGrid(
  wavelengthsNm: Float64Array,
  values: Float64Array,
  { startNm, stepNm, x, y, z }: Observer,
): Xyz | undefined {
  const shift = Math.round((wavelengthsNm[0]! - startNm) / stepNm); // row of the first sample
  const end = Math.min(x.length, values.length + shift);
  let row = Math.max(0, shift);
  let sumX = 0;
  let sumY = 0;
  let sumZ = 0;
  for (let i = row - shift; row < end; i++) {
    if (wavelengthsNm[i] !== startNm + row * stepNm) return;
    const value = values[i]!;
    sumX += value * x[row]!;
    sumY += value * y[row]!;
    sumZ += value * z[row]!;
    row++;
  }
  const scale = PEAK_LUMINOUS_EFFICACY * stepNm;
  return [scale * sumX, scale * sumY, scale * sumZ];
}

/** The sums with the spectrum drawn as straight lines between its samples. */
function sumBetween(
  wavelengthsNm: Float64Array,
  values: Float64Array,
  { startNm, stepNm, x, y, z }: Observer,
): Xyz {
  const sums: Xyz = [0, 0, 0];
  let i = 1;
  for (let row = 0; row < x.length; row++) {
    const here = startNm + row * stepNm;
    if (here < wavelengthsNm[0]! || here > wavelengthsNm[values.length - 1]!) continue;
    for (; ; i++) {
      if (!(wavelengthsNm[i]! > wavelengthsNm[i - 1]!)) {
        throw new RangeError("spectrumToXyz: wavelengthsNm must rise");
      }
      if (wavelengthsNm[i]! >= here) break;
    }
    const share = (here - wavelengthsNm[i - 1]!) / (wavelengthsNm[i]! - wavelengthsNm[i - 1]!);
    const drawn = values[i - 1]! * (1 - share) + values[i]! * share;
    const value = PEAK_LUMINOUS_EFFICACY * stepNm * drawn;
    sums[0] += value * x[row]!;
    sums[1] += value * y[row]!;
    sums[2] += value * z[row]!;
  }
  return sums;
}

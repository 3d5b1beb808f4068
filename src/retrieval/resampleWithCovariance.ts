/** A spectrum at other wavelengths, with its uncertainty and the correlation that resampling brings. */
import { checkList } from "../_check.js";
import { checkCover, checkRising, checkSpectrum } from "../spectrum/_checkSpectrum.js";
import { segmentFrom } from "../spectrum/_valueAt.js";
import type { Spectrum } from "../spectrum/spectrum.js";
import type { Nanometres } from "../units.js";

const NAME = "resampleWithCovariance";

/** A spectrum that knows how its errors go together. */
export interface UncertainSpectrum extends Spectrum {
  /** Covariance matrix of the values, row by row, in the square of their unit. */
  readonly covariance: Float64Array;
}

/**
 * The same spectrum at other wavelengths, its covariance carried along.
 *
 * Model: straight lines between the samples, as `resampleSpectrum`; covariance = weights × covariance × weights transposed.
 * Values between the same two samples come out correlated, and less uncertain than the samples: their mean is.
 * Validity: the wavelengths must lie within the spectrum. It knows nothing of the error of the straight line itself. A NaN of
 * value or covariance spreads to where its sample counts.
 * Accuracy: 1e-14 relative against the full matrix product; standard deviations of 4000 simulated spectra within 5 %.
 * Source: GUM 2008 Supplement 2 (JCGM 102), 6.2 (from memory).
 *
 * @param spectrum - `wavelengthsNm`, `values` and their `covariance`, row by row
 * @param wavelengthsNm - strictly rising, nm, within the spectrum
 * @returns values and covariance at those wavelengths, in the same unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths do not rise or lie outside, or the
 *   covariance has not the square of the number of values
 * @example
 * import { resampleWithCovariance } from "airlight";
 * const measured = { wavelengthsNm: Float64Array.of(400, 500), values: Float64Array.of(1, 2), covariance: Float64Array.of(0.04, 0, 0, 0.04) };
 * const between = resampleWithCovariance(measured, [450, 475]);
 * between.covariance[0]; // => 0.020
 * between.covariance[1]; // => 0.020
 */
export function resampleWithCovariance(
  spectrum: UncertainSpectrum,
  wavelengthsNm: ArrayLike<Nanometres>,
): UncertainSpectrum {
  checkSpectrum(spectrum, "spectrum", NAME);
  checkRising(wavelengthsNm, 1, "wavelengthsNm", NAME);
  checkCover(
    spectrum,
    wavelengthsNm[0]!,
    wavelengthsNm[wavelengthsNm.length - 1]!,
    "spectrum",
    NAME,
  );
  checkCovariance(spectrum);
  const [from, share] = weightsOf(spectrum.wavelengthsNm, wavelengthsNm);
  const count = wavelengthsNm.length;
  const n = spectrum.values.length;
  /** Share-weighted mean of `list` about target k; a sample of no weight is not looked at. */
  const mix = (k: number, list: (i: number) => number): number => {
    const [i, s] = [from[k]!, share[k]!];
    return (s < 1 ? (1 - s) * list(i) : 0) + (s > 0 ? s * list(i + 1) : 0);
  };
  const covariance = new Float64Array(count * count);
  for (let k = 0; k < count; k++) {
    for (let l = 0; l <= k; l++) {
      const value = mix(k, (i) => mix(l, (j) => spectrum.covariance[i * n + j]!));
      covariance[k * count + l] = value;
      covariance[l * count + k] = value;
    }
  }
  return {
    wavelengthsNm: Float64Array.from(wavelengthsNm),
    values: Float64Array.from(wavelengthsNm, (_, k) => mix(k, (i) => spectrum.values[i]!)),
    covariance,
  };
}

/** Sample below each wavelength, and the share of the one above. */
function weightsOf(
  grid: Float64Array,
  wavelengthsNm: ArrayLike<number>,
): [Int32Array, Float64Array] {
  const from = new Int32Array(wavelengthsNm.length);
  let i = 0;
  const share = Float64Array.from(wavelengthsNm, (nm, k) => {
    i = segmentFrom(grid, nm, i);
    from[k] = i;
    return (nm - grid[i]!) / (grid[i + 1]! - grid[i]!);
  });
  return [from, share];
}

function checkCovariance({ values, covariance }: UncertainSpectrum): void {
  checkList(covariance, 0, "spectrum.covariance", NAME);
  const wanted = values.length * values.length;
  if (covariance.length === wanted) return;
  throw new RangeError(
    `${NAME}: spectrum.covariance must have the square of the number of values, ${wanted}, got ${covariance.length}`,
  );
}

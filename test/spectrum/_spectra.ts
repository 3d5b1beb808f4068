/** Spectra that tests are made of. */
import fc from "fast-check";
import type { Spectrum } from "../../src/index.js";
import { between } from "../_generators.js";

/** A spectrum from two plain lists. */
export function spectrumOf(wavelengthsNm: number[], values: number[]): Spectrum {
  return {
    wavelengthsNm: Float64Array.from(wavelengthsNm),
    values: Float64Array.from(values),
  };
}

/** Spectra of 2 to 30 unevenly spaced points from 300 nm upwards, values 0.1 to 2. */
export const anySpectrum: fc.Arbitrary<Spectrum> = fc
  .array(fc.tuple(between(0.1, 40), between(0.1, 2)), { minLength: 2, maxLength: 30 })
  .map((points) => {
    let wavelengthNm = 300;
    return spectrumOf(
      points.map(([gap]) => {
        wavelengthNm += gap;
        return wavelengthNm;
      }),
      points.map(([, value]) => value),
    );
  });

/** First and last wavelength. */
export function endsOf(spectrum: Spectrum): [number, number] {
  return [spectrum.wavelengthsNm[0]!, spectrum.wavelengthsNm.at(-1)!];
}

/** Straight lines between samples, written as a sum of hat functions: slow and unlike src. */
export function hatSum(spectrum: Spectrum, wavelengthNm: number): number {
  const w = [...spectrum.wavelengthsNm];
  return w.reduce((sum, centre, i) => {
    const rise =
      i === 0 ? Number.POSITIVE_INFINITY : (wavelengthNm - w[i - 1]!) / (centre - w[i - 1]!);
    const fall =
      i === w.length - 1
        ? Number.POSITIVE_INFINITY
        : (w[i + 1]! - wavelengthNm) / (w[i + 1]! - centre);
    return sum + spectrum.values[i]! * Math.max(0, Math.min(1, rise, fall));
  }, 0);
}

/** Guards of sampled spectra and of lists of wavelengths. */
import { checkList, refuse } from "../_check.js";
import type { Spectrum } from "./spectrum.js";

/** Throws unless `spectrum` holds two lists of the same length, two points or more, with wavelengths that rise. */
export function checkSpectrum(spectrum: Spectrum, argument: string, functionName: string): void {
  checkSamples(spectrum, argument, functionName);
  checkRising(spectrum.wavelengthsNm, 2, `${argument}.wavelengthsNm`, functionName);
}

/** Throws unless `spectrum` holds two Float64Arrays of one length, two points or more; does not look at the points. */
export function checkSamples(spectrum: Spectrum, argument: string, functionName: string): void {
  const { wavelengthsNm, values } = spectrum ?? {};
  const arrays = wavelengthsNm instanceof Float64Array && values instanceof Float64Array;
  if (arrays && values.length > 1 && values.length === wavelengthsNm.length) return;
  throw new TypeError(
    `${functionName}: ${argument} must hold wavelengthsNm and values, Float64Arrays of one length from 2`,
  );
}

/** Throws unless `wavelengthsNm` is a list of at least `least` positive numbers, each greater than the one before. */
export function checkRising(
  wavelengthsNm: ArrayLike<number>,
  least: number,
  argument: string,
  functionName: string,
): void {
  checkList(wavelengthsNm, least, argument, functionName);
  let before = 0;
  for (let i = 0; i < wavelengthsNm.length; i++) {
    const here = wavelengthsNm[i]!;
    if (!(typeof here === "number" && here > before && here < Number.POSITIVE_INFINITY)) {
      const range = i === 0 ? "above 0 nm" : `above the one before it, ${before} nm`;
      refuse(here, range, "", `${argument}[${i}]`, functionName);
    }
    before = here;
  }
}

/** Throws unless the spectrum, looked at already, reaches from `fromNm` to `toNm`. */
export function checkCover(
  spectrum: Spectrum,
  fromNm: number,
  toNm: number,
  argument: string,
  functionName: string,
): void {
  const { wavelengthsNm } = spectrum;
  const first = wavelengthsNm[0]!;
  const last = wavelengthsNm[wavelengthsNm.length - 1]!;
  if (first <= fromNm && last >= toNm) return;
  throw new RangeError(
    `${functionName}: ${argument} must cover ${fromNm} to ${toNm} nm, got ${first} to ${last} nm`,
  );
}

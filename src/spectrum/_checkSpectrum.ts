/** Guards of sampled spectra and of lists of wavelengths. */
import { checkList, checkRecord, refuse } from "../_check.js";
import type { Spectrum } from "./spectrum.js";

/** Throws unless `spectrum` holds two lists of the same length, two points or more, with wavelengths that rise. */
export function checkSpectrum(spectrum: Spectrum, argument: string, functionName: string): void {
  checkRecord(spectrum, argument, functionName);
  const { wavelengthsNm, values } = spectrum;
  checkRising(wavelengthsNm, 2, `${argument}.wavelengthsNm`, functionName);
  checkList(values, 2, `${argument}.values`, functionName);
  if (values.length === wavelengthsNm.length) return;
  throw new RangeError(
    `${functionName}: ${argument}.values must be as many as its wavelengths (${wavelengthsNm.length}), got ${values.length}`,
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

/** Straight lines between the points of a spectrum; no guards. */

/** Index of the last wavelength at or below `wavelengthNm`, but never the last of all, searched upwards from `from`. */
export function segmentFrom(
  wavelengthsNm: ArrayLike<number>,
  wavelengthNm: number,
  from: number,
): number {
  let i = from;
  while (i < wavelengthsNm.length - 2 && wavelengthsNm[i + 1]! <= wavelengthNm) i++;
  return i;
}

/** Value at `wavelengthNm` in segment i; a sample itself where one stands, so that a NaN beside it does no harm. */
export function valueInSegment(
  wavelengthsNm: ArrayLike<number>,
  values: ArrayLike<number>,
  i: number,
  wavelengthNm: number,
): number {
  const low = wavelengthsNm[i]!;
  const high = wavelengthsNm[i + 1]!;
  if (wavelengthNm === low) return values[i]!;
  if (wavelengthNm === high) return values[i + 1]!;
  const share = (wavelengthNm - low) / (high - low);
  return values[i]! * (1 - share) + values[i + 1]! * share;
}

/** Nitrogen dioxide cross-section without guards. */
import {
  NITROGEN_DIOXIDE_220K,
  NITROGEN_DIOXIDE_298K,
  NITROGEN_DIOXIDE_BEYOND,
} from "./_nitrogenDioxideTable.js";

const FROM_NM = 280;
const TO_NM = 660;
const STEP_NM = 5;
const LOWER_K = 220;
const UPPER_K = 298;
/** Unit of the table, m². */
const UNIT = 1e-24;
/** Bands that have two temperatures: 280 to 495 nm. */
const TWO_TEMPERATURES = 44;

/** Cross-section, m², 0 outside 280 to 660 nm: straight lines between the centres of the bands. */
export function nitrogenDioxideOf(wavelengthNm: number, temperatureK: number): number {
  if (wavelengthNm < FROM_NM || wavelengthNm > TO_NM) return 0;
  const place = (wavelengthNm - FROM_NM) / STEP_NM;
  const i = Math.min(Math.floor(place), (TO_NM - FROM_NM) / STEP_NM - 1);
  const t = place - i;
  return UNIT * (band(i, temperatureK) * (1 - t) + band(i + 1, temperatureK) * t);
}

/** Value of a band in the table's unit: a straight line in temperature to 495 nm, constant beyond. */
function band(i: number, temperatureK: number): number {
  if (i >= TWO_TEMPERATURES) return NITROGEN_DIOXIDE_BEYOND[i - TWO_TEMPERATURES]!;
  const lower = NITROGEN_DIOXIDE_220K[i]!;
  const share = (temperatureK - LOWER_K) / (UPPER_K - LOWER_K);
  return lower + (NITROGEN_DIOXIDE_298K[i]! - lower) * share;
}

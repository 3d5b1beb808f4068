/** Ozone cross-section without guards. */
import { exp, log } from "../_numeric.js";
import { lastBelow } from "./_lastBelow.js";
import { FIRST_COLD_BAND, OZONE_293K, OZONE_CENTRES_NM, OZONE_LOWER } from "./_ozoneUltraviolet.js";
import { OZONE_COLD, OZONE_WARM_OVER_COLD } from "./_ozoneVisible.js";

/** The cold table is raised by this to meet JPL at 500-650 nm, where temperature hardly matters (mean ratio of the bands there). */
const COLD_SCALE = 1.026;
const COLD_K = 200;
const LOWER_K = 218;
const WARM_K = 293;
/** First wavelength of the fine table, nm, and last of the whole. */
const FINE_FROM_NM = 425;
const FINE_TO_NM = 1098;
/** Units of the tables, m². */
const COARSE_UNIT = 1e-24;
const FINE_UNIT = 1e-28;

/** Cross-section, m², 0 beyond 1098 nm; 186 nm upwards. */
export function ozoneOf(wavelengthNm: number, temperatureK: number): number {
  if (wavelengthNm > FINE_TO_NM) return 0;
  if (wavelengthNm >= FINE_FROM_NM) return fine(wavelengthNm, temperatureK);
  const i = lastBelow(OZONE_CENTRES_NM, wavelengthNm);
  const from = OZONE_CENTRES_NM[i]!;
  const share = Math.max(0, wavelengthNm - from) / (OZONE_CENTRES_NM[i + 1]! - from);
  const low = node(i, temperatureK);
  return low * exp(share * log(node(i + 1, temperatureK) / low));
}

/** Value at a band centre up to 425 nm, m²: a straight line in temperature. */
function node(i: number, temperatureK: number): number {
  if (i === OZONE_293K.length) return fine(FINE_FROM_NM, temperatureK);
  const isCold = i >= FIRST_COLD_BAND;
  const lowerK = isCold ? COLD_K : LOWER_K;
  const lower = isCold ? COLD_SCALE * OZONE_LOWER[i]! : OZONE_LOWER[i]!;
  const share = (temperatureK - lowerK) / (WARM_K - lowerK);
  return COARSE_UNIT * (lower + (OZONE_293K[i]! - lower) * share);
}

/** 425 to 1098 nm, m²: straight lines between bands of 1 nm, warmed by the smooth ratio of the 5 nm bands. */
function fine(wavelengthNm: number, temperatureK: number): number {
  const i = Math.min(Math.floor(wavelengthNm), FINE_TO_NM - 1) - FINE_FROM_NM;
  const t = wavelengthNm - FINE_FROM_NM - i;
  const cold = OZONE_COLD[i]! * (1 - t) + OZONE_COLD[i + 1]! * t;
  const warming = (warmOverCold(wavelengthNm) - COLD_SCALE) / (WARM_K - COLD_K);
  return FINE_UNIT * cold * (COLD_SCALE + warming * (temperatureK - COLD_K));
}

/** 293 K over the cold table; beyond 825 nm it fades within 5 nm to the scale of the cold table, which then stands alone. */
function warmOverCold(wavelengthNm: number): number {
  const place = (wavelengthNm - FINE_FROM_NM) / 5;
  const j = Math.floor(place);
  const low = OZONE_WARM_OVER_COLD[j] ?? COLD_SCALE;
  const high = OZONE_WARM_OVER_COLD[j + 1] ?? COLD_SCALE;
  return low + (high - low) * (place - j);
}

/** Optical depth of saturating bands, Bird & Riordan 1986 (formulas from memory), without guards. */
import { exp, log } from "../_numeric.js";
import {
  BAND_WAVELENGTHS_NM,
  MIXED_GAS_COEFFICIENTS,
  WATER_COEFFICIENTS,
} from "./_birdRiordanTable.js";
import { lastBelow } from "./_lastBelow.js";

/** Depth = linear x / (1 + saturation x)^0.45, x = coefficient times amount. */
const WATER_LINEAR = 0.2385;
const WATER_SATURATION = 20.07;
const MIXED_LINEAR = 1.41;
const MIXED_SATURATION = 118.93;
const EXPONENT = -0.45;

/** Coefficient of water vapour, per cm; straight lines between the table's wavelengths; 0 below 300 nm too, where both first rows are 0. */
export function waterCoefficientOf(wavelengthNm: number): number {
  return between(WATER_COEFFICIENTS, wavelengthNm);
}

/** Coefficient of the uniformly mixed gases, per air mass. */
export function mixedGasCoefficientOf(wavelengthNm: number): number {
  return between(MIXED_GAS_COEFFICIENTS, wavelengthNm);
}

/** Slant depth of water vapour; x is coefficient times slant water in cm. */
export function waterDepthOf(x: number): number {
  return WATER_LINEAR * x * exp(EXPONENT * log(1 + WATER_SATURATION * x));
}

/** Slant depth of mixed gases; x is coefficient times pressure-corrected air mass. */
export function mixedGasDepthOf(x: number): number {
  return MIXED_LINEAR * x * exp(EXPONENT * log(1 + MIXED_SATURATION * x));
}

function between(table: readonly number[], wavelengthNm: number): number {
  const i = lastBelow(BAND_WAVELENGTHS_NM, wavelengthNm);
  const low = BAND_WAVELENGTHS_NM[i]!;
  const t = (wavelengthNm - low) / (BAND_WAVELENGTHS_NM[i + 1]! - low);
  return table[i]! * (1 - t) + table[i + 1]! * t;
}

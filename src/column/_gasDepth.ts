/** Optical depths of columns in Dobson units, without guards. */
import { nitrogenDioxideOf } from "../absorption/_nitrogenDioxide.js";
import { ozoneOf } from "../absorption/_ozone.js";
import { MOLECULES_PER_DOBSON_UNIT } from "../constants.js";

/** 0 beyond 1098 nm. */
export function ozoneDepthOf(wavelengthNm: number, ozoneDu: number, temperatureK: number): number {
  return ozoneOf(wavelengthNm, temperatureK) * ozoneDu * MOLECULES_PER_DOBSON_UNIT;
}

/** 0 outside 280 to 660 nm. */
export function nitrogenDioxideDepthOf(
  wavelengthNm: number,
  columnDu: number,
  temperatureK: number,
): number {
  return nitrogenDioxideOf(wavelengthNm, temperatureK) * columnDu * MOLECULES_PER_DOBSON_UNIT;
}

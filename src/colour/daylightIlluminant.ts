/** Standard daylight. */
import { checkNumber } from "../_check.js";
import type { Spectrum } from "../spectrum/spectrum.js";
import type { Kelvins } from "../units.js";
import { FIRST_COMPONENT, MEAN_COMPONENT, SECOND_COMPONENT } from "./_daylightComponents.js";

/**
 * Relative spectrum of the CIE daylight phase of a given correlated colour temperature.
 *
 * Model: S0 + M1 S1 + M2 S2 with M1 and M2 from the chromaticity of the daylight locus, rounded to 3 decimals as the CIE
 * prescribes, so that the named illuminants come out as printed. The rounding makes steps of about 2 K near 6500 K.
 * Validity: 4000-25 000 K, enforced; 300 to 830 nm every 5 nm. A measured or computed sky is not bound to follow it.
 * Accuracy: within 0.0009 of the printed D65, whose largest value is 117.8; its own colour temperature is
 * within 5e-4 of the one asked for to 20 000 K, 1e-3 to 25 000 K (tested).
 * Source: CIE 15:2004, equations of the daylight phase (section 3.1) and table T.2 (both numbers from memory).
 *
 * @param temperatureK - correlated colour temperature on today's scale, 4000 to 25 000 K. The named illuminants lie at
 *   their nominal temperature times 1.4388 / 1.4380: D65 at 6503.6 K
 * @returns relative power, 100 at 560 nm, 107 points
 * @throws TypeError if the temperature is not a number; RangeError if it is out of range
 * @example
 * import { daylightIlluminant } from "airlight";
 * const d65 = daylightIlluminant((6500 * 1.4388) / 1.438);
 * d65.values[20]; // => 82.75
 */
export function daylightIlluminant(temperatureK: Kelvins): Spectrum {
  checkNumber(temperatureK, 4000, 25_000, "K", "temperatureK", "daylightIlluminant");
  const x = daylightX(1000 / temperatureK);
  const y = -3 * x * x + 2.87 * x - 0.275;
  const m = 0.0241 + 0.2562 * x - 0.7341 * y;
  const m1 = roundedTo3((-1.3515 - 1.7703 * x + 5.9114 * y) / m);
  const m2 = roundedTo3((0.03 - 31.4424 * x + 30.0717 * y) / m);
  const wavelengthsNm = new Float64Array(MEAN_COMPONENT.length);
  const values = new Float64Array(MEAN_COMPONENT.length);
  for (let i = 0; i < values.length; i++) {
    wavelengthsNm[i] = 300 + 5 * i;
    values[i] = MEAN_COMPONENT[i]! + m1 * FIRST_COMPONENT[i]! + m2 * SECOND_COMPONENT[i]!;
  }
  return { wavelengthsNm, values };
}

function roundedTo3(value: number): number {
  return Math.round(1000 * value) / 1000;
}

/** Chromaticity x on the daylight locus; r is 1000 K over the temperature. */
function daylightX(r: number): number {
  return r >= 1 / 7
    ? 0.244063 + r * (0.09911 + r * (2.9678 - r * 4.607))
    : 0.23704 + r * (0.24748 + r * (1.9018 - r * 2.0064));
}

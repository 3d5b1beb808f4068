/** A channel with the bell-shaped response that filters are usually described by. */
import { checkNumber } from "../_check.js";
import { exp } from "../_numeric.js";
import type { Nanometres } from "../units.js";
import type { Passband } from "./spectrum.js";

/** 4 ln 2: exp(-4 ln 2 (x / width)²) is one half at x = width / 2. */
const FOUR_LN_TWO = 2.772588722239781;
/** Half of the number of steps, and steps per full width at half maximum: the bell is cut 2.5 widths from its centre, at 3e-8. */
const HALF_STEPS = 125;
const STEPS_PER_WIDTH = 50;

/**
 * Passband of Gaussian shape, peak 1.
 *
 * Model: exp(-4 ln 2 ((λ - centre) / width)²), sampled 50 times per full width at half maximum, cut 2.5 widths from the centre.
 * Validity: any centre and width whose ends stay above 0 nm. Real filters have squarer tops and longer feet; where a
 * maker prints the curve, use that.
 * Accuracy: mean within 1e-11 nm of the centre (to 2000 nm); variance 4e-4 relative above that of the true bell, which is what the
 * straight lines between the samples add (tested).
 * Source: definition of the Gaussian function.
 *
 * @param centreNm - wavelength of the peak, 10 to 1e6 nm
 * @param fullWidthHalfMaximumNm - full width at half maximum, 1e-3 nm up to a third of the centre wavelength
 * @returns the passband, 251 points, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is outside its range
 * @example
 * import { gaussianPassband } from "airlight";
 * const channel = gaussianPassband(500, 10);
 * channel.wavelengthsNm[150]; // => 505
 * channel.values[150]; // => 0.5
 */
export function gaussianPassband(
  centreNm: Nanometres,
  fullWidthHalfMaximumNm: Nanometres,
): Passband {
  const width = fullWidthHalfMaximumNm;
  checkNumber(centreNm, 10, 1e6, "nm", "centreNm", "gaussianPassband");
  checkNumber(width, 1e-3, centreNm / 3, "nm", "fullWidthHalfMaximumNm", "gaussianPassband");
  const wavelengthsNm = new Float64Array(2 * HALF_STEPS + 1);
  const values = new Float64Array(2 * HALF_STEPS + 1);
  for (let i = 0; i <= 2 * HALF_STEPS; i++) {
    const widths = (i - HALF_STEPS) / STEPS_PER_WIDTH;
    wavelengthsNm[i] = centreNm + widths * width;
    values[i] = exp(-FOUR_LN_TWO * widths * widths);
  }
  return { wavelengthsNm, values };
}

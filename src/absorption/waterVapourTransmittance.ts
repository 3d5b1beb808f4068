/** Transmittance of water vapour. */
import { checkNumber } from "../_check.js";
import { exp } from "../_numeric.js";
import type { Centimetres, Fraction, Nanometres } from "../units.js";
import { waterCoefficientOf, waterDepthOf } from "./_bandDepth.js";

/**
 * Transmittance of the water vapour along a slant path.
 *
 * Model: exp(-0.2385 x / (1 + 20.07 x)^0.45), x the band coefficient times the slant water. The bands saturate: twice the
 * water absorbs less than twice as much, so the law of Bouguer does not hold.
 * Validity: 300-4000 nm, slant water 0 to 2000 cm, enforced. The coefficients stand at 122 wavelengths with straight lines between
 * them, which spreads the edge of a band over the window beside it (570-610 and 656-690 nm, for instance).
 * Accuracy: 1e-12 of the formula. The formula itself: some per cent of transmittance in the bands (0.05 rms over all rows against
 * the direct spectrum of ASTM G173, found when the table was compiled); coefficients below 0.01 are plausible only.
 * Source: Bird & Riordan 1986, J. Clim. Appl. Meteorol. 25, 87 (from memory).
 *
 * @param wavelengthNm - wavelength, 300 to 4000 nm
 * @param slantWaterCm - water vapour along the path as depth of liquid, 0 to 2000 cm: vertical water times its air mass
 * @returns transmittance, 0 to 1
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { waterVapourTransmittance } from "airlight";
 * waterVapourTransmittance(937, 2); // => 0.44026
 */
export function waterVapourTransmittance(
  wavelengthNm: Nanometres,
  slantWaterCm: Centimetres,
): Fraction {
  checkNumber(wavelengthNm, 300, 4000, "nm", "wavelengthNm", "waterVapourTransmittance");
  checkNumber(slantWaterCm, 0, 2000, "cm", "slantWaterCm", "waterVapourTransmittance");
  return exp(-waterDepthOf(waterCoefficientOf(wavelengthNm) * slantWaterCm));
}

/** Transmittance of oxygen and carbon dioxide. */
import { checkNumber } from "../_check.js";
import { exp } from "../_numeric.js";
import type { Dimensionless, Fraction, Nanometres } from "../units.js";
import { mixedGasCoefficientOf, mixedGasDepthOf } from "./_bandDepth.js";

/**
 * Transmittance of the uniformly mixed gases (oxygen, carbon dioxide) along a slant path.
 *
 * Model: exp(-1.41 x / (1 + 118.93 x)^0.45), x the band coefficient times the pressure-corrected air mass. The bands saturate.
 * Validity: 300-4000 nm, air mass 0 to 100, enforced; carbon dioxide of the year of the paper (about 345 ppm, common
 * knowledge). The coefficients stand at 122 wavelengths with straight lines between them: oxygen's narrow band at 760 nm reaches from
 * 757.5 to 780 nm so, where its true edge is near 770 nm.
 * Accuracy: 1e-12 of the formula. The formula itself, found when the table was compiled: 0.24 above the direct spectrum of ASTM G173
 * at the centre of the 760 nm band, elsewhere some per cent; 0.03 of false depth at 778 nm at air mass 1, where the air is clear.
 * Source: Bird & Riordan 1986, J. Clim. Appl. Meteorol. 25, 87, after Leckner 1978 (from memory).
 *
 * @param wavelengthNm - wavelength, 300 to 4000 nm
 * @param pressureAirMass - air mass of air times pressure over 101 325 Pa, 0 to 100
 * @returns transmittance, 0 to 1
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { mixedGasTransmittance } from "airlight";
 * mixedGasTransmittance(762.5, 1.5); // => 0.6443
 */
export function mixedGasTransmittance(
  wavelengthNm: Nanometres,
  pressureAirMass: Dimensionless,
): Fraction {
  checkNumber(wavelengthNm, 300, 4000, "nm", "wavelengthNm", "mixedGasTransmittance");
  checkNumber(pressureAirMass, 0, 100, "", "pressureAirMass", "mixedGasTransmittance");
  return exp(-mixedGasDepthOf(mixedGasCoefficientOf(wavelengthNm) * pressureAirMass));
}

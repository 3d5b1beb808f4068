/** Absorption cross-section of ozone. */
import { checkNumber } from "../_check.js";
import type { Kelvins, Nanometres, SquareMetres } from "../units.js";
import { ozoneOf } from "./_ozone.js";

/**
 * Absorption cross-section of one molecule of ozone, base e: Hartley, Huggins, Chappuis and Wulf bands.
 *
 * Model: means over bands, straight lines in temperature. Up to 340 nm between 218 and 293 K, logarithm linear between band
 * centres (1.7 to 4.3 nm apart to 299 nm, 1 nm to 321 nm, then 2 and 5 nm). From 345 nm between a cold table near 200 K, raised by
 * 1.026 to meet the other at 500-650 nm, and 293 K: 5 nm bands to 420 nm; from 425 nm linear on the cold table's 1 nm
 * bands, times the ratio of the 5 nm bands of both. Beyond 830 nm the cold table alone, without temperature.
 * Validity: 186-1098 nm (the bands of the table reach so far; below 197 nm without temperature) and 200-298 K (the two data
 * temperatures and a little beyond, linearly), enforced.
 * Accuracy: the JPL bands themselves at 218 and 293 K to 340 nm and at 293 K to 420 nm; means of its 5 nm bands at 293 K within
 * 0.3 % at 500-650 nm, 2.1 % at 425 and 825 nm, 1.1 % between. Differences the Dobson network uses (226.9 K): 305.5 less 325.4 nm +2.4 %,
 * 311.45 less 332.4 nm -1.7 %, 317.6 less 339.8 nm -5.9 %. The two sources agree within about 3 % where absorption is strong.
 * Structure inside the bands is lost: against the 1 nm cold table up to 2.4 % at 284-296 nm (straight lines in place of
 * logarithms 5.4 %), a factor 2.8 at 336-345 nm, 0.03 in optical depth for 300 DU at 324 nm. From 425 nm straight lines between the 5 nm
 * bands would have cost 26 % at 437 nm and 4.3 % at 500-650 nm, which the 1 nm table avoids.
 * Source: Burkholder et al. 2020, JPL Publication 19-5 (218, 293 K); Heays, Bosman & van Dishoeck 2017, A&A 602, A105 (cold).
 *
 * @param wavelengthNm - vacuum wavelength, 186 to 1098 nm
 * @param temperatureK - temperature of the ozone, 200 to 298 K; about 225 K for the ozone layer
 * @returns cross-section, m² per molecule
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { ozoneCrossSection } from "airlight";
 * ozoneCrossSection(602, 225); // => 5.2765e-25
 */
export function ozoneCrossSection(wavelengthNm: Nanometres, temperatureK: Kelvins): SquareMetres {
  checkNumber(wavelengthNm, 186, 1098, "nm", "wavelengthNm", "ozoneCrossSection");
  checkNumber(temperatureK, 200, 298, "K", "temperatureK", "ozoneCrossSection");
  return ozoneOf(wavelengthNm, temperatureK);
}

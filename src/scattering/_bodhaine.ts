/** Pieces of the Rayleigh cross-section of Bodhaine et al. 1999, unguarded. */
import { peckReederRefractivity } from "../air/_peckReeder.js";

/** King factors of nitrogen and oxygen (Bates 1984) and carbon dioxide; argon's is 1 (Bodhaine et al. 1999, equations 5, 6, text). */
const N2_0 = 1.034;
const N2_1 = 3.17e-4; // µm2
const O2_0 = 1.096;
const O2_1 = 1.385e-3; // µm2
const O2_2 = 1.448e-4; // µm4
const CO2 = 1.15;
/** Parts per hundred by volume (equation 23). */
const SHARE_N2 = 78.084;
const SHARE_O2 = 20.946;
const SHARE_ARGON = 0.934;
/** CO2 effect on (n - 1), per unit mole fraction away from 300 ppm (equation 19). */
const CO2_INDEX = 0.54;
const CO2_REFERENCE = 300e-6;
/** Molecules per m³ at 288.15 K and 1013.25 hPa that goes with the index (2.546899e19 cm-3). */
const NUMBER_DENSITY = 2.546899e25;
/** 24 π³ */
const GEOMETRY = 744.1506403271956;

/** King factor of dry air at squared wavenumber s in µm-2. */
export function kingFactorOf(s: number, co2Ppm: number): number {
  const co2Percent = co2Ppm * 1e-4;
  const n2 = SHARE_N2 * (N2_0 + N2_1 * s);
  const o2 = SHARE_O2 * (O2_0 + s * (O2_1 + s * O2_2));
  const rest = SHARE_ARGON + co2Percent * CO2;
  return (n2 + o2 + rest) / (SHARE_N2 + SHARE_O2 + SHARE_ARGON + co2Percent);
}

/** Cross-section, m², of one molecule of dry air at a vacuum wavelength (equation 22). */
export function crossSectionOf(wavelengthNm: number, co2Ppm: number): number {
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  const n = 1 + peckReederRefractivity(s) * (1 + CO2_INDEX * (co2Ppm * 1e-6 - CO2_REFERENCE));
  const n2 = n * n;
  const ratio = (n2 - 1) / (n2 + 2);
  const perDensity = (ratio * s * 1e12) / NUMBER_DENSITY; // s in m-2
  return GEOMETRY * perDensity * perDensity * kingFactorOf(s, co2Ppm);
}

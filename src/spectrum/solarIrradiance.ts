/** Sunlight outside the air. */
import { checkNumber } from "../_check.js";
import type { Nanometres, SpectralIrradiance } from "../units.js";
import { SOLAR_BAND_MEANS } from "./_solarBandMeans.js";

/** Bands before 1000 nm (5 nm wide), before 2500 nm (20 nm wide) and altogether (the last are 100 nm wide). */
const NARROW = 144;
const MIDDLE = 219;
const BANDS = 234;

/**
 * Spectral irradiance of the sun outside the air at 1 au, on a plane facing it.
 *
 * Model: derivative of a smooth rising curve (piecewise cubic) through the cumulative energies of bands 5 nm wide up to
 * 1000 nm, 20 nm to 2500 nm, 100 nm to 4000 nm: a continuous parabola in each band that keeps the band's mean. Lines
 * narrower than a band are smoothed away.
 * Validity: 280-4000 nm, enforced. Scaled so that the whole Sun gives 1361 W m⁻², of which 1342.75 W m⁻² lie in this range.
 * The sources do not say whether their wavelengths are those of air or vacuum (0.1 to 0.3 nm apart from 350 to 1000 nm).
 * Accuracy: every band keeps its mean to 1e-12; sums over 20 nm from 403 to 903 nm within 0.7 % of ASTM G173-03 and 1.1 %
 * of ASTM E490-00a, both scaled to the same total; 3.5 % below 383 nm and 1.8 % beyond 2450 nm, where those two differ
 * by twice as much (tested).
 * Illuminance 132.7 klx, chromaticity x 0.3235, y 0.3326, colour temperature 5928 K (tested).
 * Source: mean of ASTM G173-03 and ASTM E490-00a in bands; total IAU 2015 resolution B3.
 *
 * @param wavelengthNm - wavelength, 280 to 4000 nm
 * @returns irradiance at 1 au, W m⁻² nm⁻¹
 * @throws TypeError if the wavelength is not a number; RangeError if it is out of range
 * @example
 * import { solarIrradiance } from "airlight";
 * solarIrradiance(500); // => 1.91214
 */
export function solarIrradiance(wavelengthNm: Nanometres): SpectralIrradiance {
  checkNumber(wavelengthNm, 280, 4000, "nm", "wavelengthNm", "solarIrradiance");
  if (wavelengthNm < 1000) return inBand(0, (wavelengthNm - 280) / 5);
  if (wavelengthNm < 2500) return inBand(NARROW, (wavelengthNm - 1000) / 20);
  return inBand(MIDDLE, (wavelengthNm - 2500) / 100);
}

/** The parabola of a band, `place` band widths after the start of band `first`. */
function inBand(first: number, place: number): number {
  const band = Math.min(first + Math.floor(place), BANDS - 1);
  const t = place - (band - first);
  const mean = SOLAR_BAND_MEANS[band]!;
  const low = band > 0 ? edge(band) : 2 * mean - edge(1);
  const high = band < BANDS - 1 ? edge(band + 1) : 2 * mean - edge(band);
  return low + t * (6 * mean - 4 * low - 2 * high + t * 3 * (low + high - 2 * mean));
}

/** Irradiance at the lower edge of a band: the line through the means at the centres of the bands that meet there. */
function edge(band: number): number {
  const below = widthOf(band - 1);
  const above = widthOf(band);
  return (above * SOLAR_BAND_MEANS[band - 1]! + below * SOLAR_BAND_MEANS[band]!) / (below + above);
}

function widthOf(band: number): number {
  if (band < NARROW) return 5;
  return band < MIDDLE ? 20 : 100;
}

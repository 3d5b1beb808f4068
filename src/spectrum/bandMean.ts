/** What a channel sees of a spectrum. */
import { checkCover, checkSpectrum } from "./_checkSpectrum.js";
import { segmentFrom, valueInSegment } from "./_valueAt.js";
import type { Passband, Spectrum } from "./spectrum.js";

/**
 * Mean of a spectrum weighted with a passband: ∫ S P dλ / ∫ P dλ.
 *
 * Model: both are straight lines between their own samples; the product is integrated exactly over the wavelengths of
 * both, so neither needs the grid of the other. The height of the passband drops out.
 * Validity: the spectrum must cover every wavelength where the passband is not zero; the passband's area must be
 * positive. A NaN of the spectrum within the passband gives NaN; a NaN in the passband is refused.
 * Accuracy: 1e-13 relative for straight lines (tested); for curves the error is that of the sampling.
 * Source: arithmetic (exact integral of the product of two straight lines).
 *
 * @param spectrum - samples of any quantity
 * @param passband - relative response of the channel
 * @returns the mean, in the spectrum's unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths do not rise, the spectrum does not
 *   cover the passband, or the passband has no positive area
 * @example
 * import { bandMean, gaussianPassband, solarIrradiance, tabulate, wavelengthGrid } from "airlight";
 * const sun = tabulate(solarIrradiance, wavelengthGrid(300, 1100, 1));
 * bandMean(sun, gaussianPassband(500, 10)); // => 1.9171
 */
export function bandMean(spectrum: Spectrum, passband: Passband): number {
  checkSpectrum(spectrum, "spectrum", "bandMean");
  checkSpectrum(passband, "passband", "bandMean");
  const grid = passband.wavelengthsNm;
  const [first, last] = support(passband.values);
  checkCover(spectrum, grid[first]!, grid[last]!, "spectrum", "bandMean");
  let i = 0;
  let sum = 0; // six times the integrals: the exact rule for a product of straight lines has a divisor of 6
  let area = 0;
  for (let j = first; j < last; j++) {
    const stop = grid[j + 1]!;
    const endResponse = passband.values[j + 1]!;
    let left = grid[j]!;
    let response = passband.values[j]!;
    area += 3 * (stop - left) * (response + endResponse);
    while (left < stop) {
      i = segmentFrom(spectrum.wavelengthsNm, left, i);
      const right = Math.min(spectrum.wavelengthsNm[i + 1]!, stop);
      const next = right === stop ? endResponse : valueInSegment(grid, passband.values, j, right);
      const a = valueInSegment(spectrum.wavelengthsNm, spectrum.values, i, left);
      const b = valueInSegment(spectrum.wavelengthsNm, spectrum.values, i, right);
      sum += (right - left) * (a * (2 * response + next) + b * (response + 2 * next));
      left = right;
      response = next;
    }
  }
  if (area > 0) return sum / area;
  throw new RangeError(`bandMean: passband must have a positive area, got ${area / 6} nm`);
}

/** First and last index between which the passband is not zero, the zeros that end its slopes included. */
function support(values: Float64Array): [number, number] {
  let first = 0;
  let last = values.length - 1;
  while (first < last && values[first] === 0 && values[first + 1] === 0) first++;
  while (last > first && values[last] === 0 && values[last - 1] === 0) last--;
  return [first, last];
}

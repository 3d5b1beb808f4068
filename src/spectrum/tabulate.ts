/** From a quantity of wavelength to its samples. */
import type { QuantityOfWavelength } from "../units.js";
import { checkRising } from "./_checkSpectrum.js";
import type { Spectrum } from "./spectrum.js";

/**
 * Samples of a quantity at given wavelengths.
 *
 * Model: calls the quantity once at each wavelength, in order.
 * Validity: that of the quantity, which throws outside it.
 * Accuracy: exact at the samples; between them a spectrum is taken as straight lines.
 * Source: arithmetic.
 *
 * @param quantity - any function of wavelength in nm; what it returns is kept as it is, NaN included
 * @param wavelengthsNm - strictly rising, nm; a Float64Array is kept in the spectrum, not copied
 * @returns the spectrum, in the unit of the quantity
 * @throws TypeError if `quantity` is not a function or the wavelengths are not a list; RangeError if they do not rise
 * @example
 * import { solarIrradiance, tabulate, wavelengthGrid } from "airlight";
 * const sun = tabulate(solarIrradiance, wavelengthGrid(380, 780, 5));
 * sun.values[24]; // => 1.91214
 */
export function tabulate(
  quantity: QuantityOfWavelength,
  wavelengthsNm: ArrayLike<number>,
): Spectrum {
  if (typeof quantity !== "function") {
    throw new TypeError("tabulate: quantity must be a function of wavelength in nm");
  }
  checkRising(wavelengthsNm, 1, "wavelengthsNm", "tabulate");
  const grid =
    wavelengthsNm instanceof Float64Array ? wavelengthsNm : Float64Array.from(wavelengthsNm);
  const values = new Float64Array(grid.length);
  for (let i = 0; i < grid.length; i++) values[i] = quantity(grid[i]!);
  return { wavelengthsNm: grid, values };
}

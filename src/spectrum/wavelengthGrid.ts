/** Evenly spaced wavelengths. */
import { checkNumber, refuse } from "../_check.js";
import type { Nanometres } from "../units.js";

/**
 * Evenly spaced wavelengths, both ends included.
 *
 * Model: start + i step, so that rounding does not add up; the stop belongs to the grid when it lies on it to a billionth
 * of a step, otherwise the last wavelength is the last one below it.
 * Validity: 1 to 1e9 nm, at most 10 million wavelengths, enforced.
 * Accuracy: each wavelength is start + i step rounded once or twice (1 ulp, tested);
 * a last one that meets the stop may be a billionth of a step short.
 * Source: arithmetic.
 *
 * @param startNm - first wavelength, 1 to 1e9 nm
 * @param stopNm - end of the grid, startNm to 1e9 nm
 * @param stepNm - distance of neighbours, nm, greater than 0
 * @returns the wavelengths, nm
 * @throws TypeError if an argument is not a number; RangeError if it is outside its range or the grid would be too long
 * @example
 * import { wavelengthGrid } from "airlight";
 * const grid = wavelengthGrid(380, 780, 5);
 * grid.length; // => 81
 * grid[80]; // => 780
 */
export function wavelengthGrid(
  startNm: Nanometres,
  stopNm: Nanometres,
  stepNm: Nanometres,
): Float64Array {
  checkNumber(startNm, 1, 1e9, "nm", "startNm", "wavelengthGrid");
  checkNumber(stopNm, startNm, 1e9, "nm", "stopNm", "wavelengthGrid");
  if (!(typeof stepNm === "number" && stepNm > 0 && stepNm < Number.POSITIVE_INFINITY)) {
    refuse(stepNm, "greater than 0 nm", "", "stepNm", "wavelengthGrid");
  }
  const steps = Math.floor((stopNm - startNm) / stepNm + 1e-9);
  if (steps >= 1e7) {
    const least = `at least ${(stopNm - startNm) / 1e7} nm here (10 million wavelengths)`;
    refuse(stepNm, least, "", "stepNm", "wavelengthGrid");
  }
  const grid = new Float64Array(steps + 1);
  for (let i = 0; i <= steps; i++) grid[i] = Math.min(startNm + i * stepNm, stopNm);
  return grid;
}

/** A constituent given by a table. */
import { checkNumber } from "../_check.js";
import type { Metres } from "../units.js";
import { checkTable } from "./_checkProfileRows.js";
import type { TabulatedLayer } from "./constituentLayer.js";

/**
 * Layer whose density is given at heights, as an ozone sounding or a lidar profile gives it.
 *
 * Model: linear between rows, nothing below the first or above the last.
 * Validity: heights -1 to 86 km, rising; densities finite, 0 or more, not all 0; enforced.
 * Accuracy: passes through its rows exactly.
 * Source: definition.
 *
 * @param rows - at least two rows `{ heightM, density }`: m above mean sea level, and density per volume (not mixing ratio)
 *   in any unit
 * @returns the layer, for `refractedPath` and `preparePath`
 * @throws TypeError if a row or value is of the wrong kind; RangeError if a value is out of range (NaN too), heights do not
 *   rise, or every density is 0; the message names the row
 * @example
 * import { tabulatedLayer } from "airlight";
 * const smoke = tabulatedLayer([
 *   { heightM: 15000, density: 0 },
 *   { heightM: 18000, density: 1 },
 *   { heightM: 21000, density: 0 },
 * ]);
 * smoke.heightsM.length; // => 3
 */
export function tabulatedLayer(
  rows: readonly { readonly heightM: Metres; readonly density: number }[],
): TabulatedLayer {
  const name = "tabulatedLayer";
  checkTable(rows, name);
  for (const [i, { heightM, density }] of rows.entries()) {
    checkNumber(heightM, -1000, 86_000, "m", `rows[${i}].heightM`, name);
    checkNumber(density, 0, Number.MAX_VALUE, "", `rows[${i}].density`, name);
    if (i > 0 && !(heightM > rows[i - 1]!.heightM)) {
      const before = rows[i - 1]!.heightM;
      throw new RangeError(
        `${name}: rows[${i}].heightM must be above the row before (${before} m), got ${heightM}`,
      );
    }
  }
  if (rows.every(({ density }) => density === 0)) {
    throw new RangeError(`${name}: rows must hold a density above 0, got 0 in every row`);
  }
  return {
    shape: "tabulated",
    heightsM: rows.map(({ heightM }) => heightM),
    densities: rows.map(({ density }) => density),
  };
}

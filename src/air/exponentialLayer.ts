/** A constituent that thins out upwards. */
import { checkNumber, checkRecord } from "../_check.js";
import type { Metres } from "../units.js";
import type { ExponentialLayer } from "./constituentLayer.js";

/**
 * Layer whose density falls exponentially with height, as water vapour's (about 2 km) and aerosol's (1 to 2 km) roughly do
 * (common practice).
 *
 * Model: density proportional to exp(-h / scaleHeight), cut off at the top of the profile it is used with.
 * Validity: scale height 100 m to 100 km, enforced.
 * Accuracy: exact by definition.
 * Source: definition.
 *
 * @param layer - `scaleHeightM` 100 to 100 000 m
 * @returns the layer, for `refractedPath` and `preparePath`
 * @throws TypeError if the value is not a number; RangeError if it is outside its range
 * @example
 * import { exponentialLayer } from "airlight";
 * const water = exponentialLayer({ scaleHeightM: 2000 });
 * water.scaleHeightM; // => 2000
 */
export function exponentialLayer(layer: { readonly scaleHeightM: Metres }): ExponentialLayer {
  checkRecord(layer, "layer", "exponentialLayer");
  checkNumber(layer.scaleHeightM, 100, 100_000, "m", "scaleHeightM", "exponentialLayer");
  return { shape: "exponential", scaleHeightM: layer.scaleHeightM };
}

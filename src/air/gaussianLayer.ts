/** A constituent spread about a height. */
import { checkNumber, checkRecord } from "../_check.js";
import type { Metres } from "../units.js";
import type { GaussianLayer } from "./constituentLayer.js";

/**
 * Layer whose density is a Gaussian of height, as ozone's roughly is (common practice: 22 km, 5 km).
 *
 * Model: density proportional to exp(-(h - height)² / (2 standardDeviation²)), cut off at the top of the profile it is used with.
 * Validity: height -1 to 86 km, standard deviation 100 m to 30 km, enforced.
 * Accuracy: exact by definition.
 * Source: definition.
 *
 * @param layer - `heightM` of the peak above mean sea level, -1000 to 86 000 m; `standardDeviationM` 100 to 30 000 m
 * @returns the layer, for `refractedPath` and `preparePath`
 * @throws TypeError if a value is not a number; RangeError if it is outside its range
 * @example
 * import { gaussianLayer } from "airlight";
 * const ozone = gaussianLayer({ heightM: 22000, standardDeviationM: 5000 });
 * ozone.heightM; // => 22000
 */
export function gaussianLayer(layer: {
  readonly heightM: Metres;
  readonly standardDeviationM: Metres;
}): GaussianLayer {
  checkRecord(layer, "layer", "gaussianLayer");
  const { heightM, standardDeviationM } = layer;
  checkNumber(heightM, -1000, 86_000, "m", "heightM", "gaussianLayer");
  checkNumber(standardDeviationM, 100, 30_000, "m", "standardDeviationM", "gaussianLayer");
  return { shape: "gaussian", heightM, standardDeviationM };
}

/** Colour without brightness. */
import { refuse } from "../_check.js";
import { checkTriple } from "./_checkTriple.js";
import type { Chromaticity, Xyz } from "./triples.js";

/**
 * Chromaticity coordinates of tristimulus values.
 *
 * Model: x = X / (X + Y + Z), y = Y / (X + Y + Z).
 * Validity: the sum must be positive: black has no chromaticity. NaN among X, Y, Z gives NaN.
 * Accuracy: 1e-15, rounding of a sum and a division (tested).
 * Source: CIE 15, chromaticity coordinates.
 *
 * @param xyz - [X, Y, Z] in any common unit
 * @returns [x, y]
 * @throws TypeError if `xyz` is not three numbers; RangeError if their sum is not positive
 * @example
 * import { chromaticity } from "airlight";
 * chromaticity([0.95047, 1, 1.08883])[0]; // => 0.31273
 */
export function chromaticity(xyz: Readonly<Xyz>): Chromaticity {
  checkTriple(xyz, "xyz", "chromaticity");
  const sum = xyz[0] + xyz[1] + xyz[2];
  if (sum <= 0)
    refuse(sum, "of positive sum (black has no chromaticity)", "", "xyz", "chromaticity");
  return [xyz[0] / sum, xyz[1] / sum];
}

/** From tristimulus values to the lights of a display. */
import { checkTriple } from "./_checkTriple.js";
import type { Rgb, Xyz } from "./triples.js";

/**
 * Linear red, green and blue of sRGB.
 *
 * Model: the matrix that the primaries of Rec. 709 and the white (0.3127, 0.3290) fix, in exact fractions rounded once.
 * No adaptation: sunlight at Y = 1 comes out yellowish against the display's white, as it is.
 * Validity: any numbers; colours outside the display's range have negative parts or parts above 1 (see `fitToDisplay`).
 * NaN among X, Y, Z gives NaN.
 * Accuracy: 1e-12 against two independent colour libraries; there and back within 1e-14 (tested).
 * Source: IEC 61966-2-1 (primaries and white); matrix derived from them in rational arithmetic.
 *
 * @param xyz - [X, Y, Z] of the 1931 observer, scaled so that Y = 1 is the display's white
 * @returns [red, green, blue], linear, 0 to 1 on the display
 * @throws TypeError if `xyz` is not three numbers
 * @example
 * import { xyzToLinearSrgb } from "airlight";
 * xyzToLinearSrgb([0.4124, 0.2126, 0.0193])[0]; // => 1.000105
 */
export function xyzToLinearSrgb(xyz: Readonly<Xyz>): Rgb {
  checkTriple(xyz, "xyz", "xyzToLinearSrgb");
  const [x, y, z] = xyz;
  return [
    (12831 / 3959) * x - (329 / 214) * y - (1974 / 3959) * z,
    (-851781 / 878810) * x + (1648619 / 878810) * y + (36519 / 878810) * z,
    (705 / 12673) * x - (2585 / 12673) * y + (705 / 667) * z,
  ];
}

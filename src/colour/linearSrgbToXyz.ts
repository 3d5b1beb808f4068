/** From the lights of a display to tristimulus values. */
import { checkTriple } from "./_checkTriple.js";
import type { Rgb, Xyz } from "./triples.js";

/**
 * Tristimulus values of linear sRGB; the inverse of `xyzToLinearSrgb`.
 *
 * Model: the matrix that the primaries of Rec. 709 and the white (0.3127, 0.3290) fix, in exact fractions rounded once.
 * Validity: any numbers, negative ones and those above 1 included. NaN gives NaN.
 * Accuracy: 1e-12 against two independent colour libraries; there and back within 1e-14 (tested).
 * Source: IEC 61966-2-1 (primaries and white); matrix derived from them in rational arithmetic.
 *
 * @param linear - [red, green, blue], linear (see `decodeSrgb`)
 * @returns [X, Y, Z], Y = 1 for white
 * @throws TypeError if `linear` is not three numbers
 * @example
 * import { linearSrgbToXyz } from "airlight";
 * linearSrgbToXyz([1, 1, 1])[0]; // => 0.950456
 */
export function linearSrgbToXyz(linear: Readonly<Rgb>): Xyz {
  checkTriple(linear, "linear", "linearSrgbToXyz");
  const [red, green, blue] = linear;
  return [
    (506752 / 1228815) * red + (87881 / 245763) * green + (12673 / 70218) * blue,
    (87098 / 409605) * red + (175762 / 245763) * green + (12673 / 175545) * blue,
    (7918 / 409605) * red + (87881 / 737289) * green + (1001167 / 1053270) * blue,
  ];
}

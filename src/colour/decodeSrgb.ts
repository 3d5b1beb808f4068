/** From the numbers a display is sent to light. */
import { pow } from "../_numeric.js";
import { checkTriple } from "./_checkTriple.js";
import type { Rgb } from "./triples.js";

/**
 * Linear sRGB of encoded sRGB; the inverse of `encodeSrgb`.
 *
 * Model: c / 12.92 up to 0.04045, above it ((c + 0.055) / 1.055)^2.4; the same for negative numbers with the sign turned.
 * Validity: any numbers; nothing is clipped. NaN gives NaN in its place.
 * Accuracy: 1e-12 against two independent colour libraries; there and back within 1e-14 except between the joints of the
 * two directions (0.0031308 and 0.04045), where the standard itself leaves 3e-8 (tested).
 * Source: IEC 61966-2-1.
 *
 * @param encoded - [red, green, blue], encoded, 0 to 1 (not 0 to 255)
 * @returns [red, green, blue], linear
 * @throws TypeError if `encoded` is not three numbers
 * @example
 * import { decodeSrgb } from "airlight";
 * decodeSrgb([0.5, 0.5, 0.5])[0]; // => 0.2140411
 */
export function decodeSrgb(encoded: Readonly<Rgb>): Rgb {
  checkTriple(encoded, "encoded", "decodeSrgb");
  return [decode(encoded[0]), decode(encoded[1]), decode(encoded[2])];
}

function decode(encoded: number): number {
  const size = Math.abs(encoded);
  if (!(size > 0.04045)) return encoded / 12.92;
  const linear = pow((size + 0.055) / 1.055, 2.4);
  return encoded < 0 ? -linear : linear;
}

/** From light to the numbers a display is sent. */
import { cbrt, sqrt } from "../_numeric.js";
import { checkTriple } from "./_checkTriple.js";
import type { Rgb } from "./triples.js";

/**
 * Encoded sRGB of linear sRGB.
 *
 * Model: 12.92 c up to 0.0031308, above it 1.055 c^(1/2.4) - 0.055; the same for negative numbers with the sign turned.
 * Validity: any numbers; nothing is clipped. NaN gives NaN in its place.
 * Accuracy: 1e-12 against two independent colour libraries (tested). The two branches miss each other by 3e-8 at their
 * joint, as the standard has them.
 * Source: IEC 61966-2-1.
 *
 * @param linear - [red, green, blue], linear
 * @returns [red, green, blue], encoded; 0 to 1 for 0 to 1
 * @throws TypeError if `linear` is not three numbers
 * @example
 * import { encodeSrgb } from "airlight";
 * encodeSrgb([0.18, 0.18, 0.18])[0]; // => 0.4613561
 */
export function encodeSrgb(linear: Readonly<Rgb>): Rgb {
  checkTriple(linear, "linear", "encodeSrgb");
  return [encode(linear[0]), encode(linear[1]), encode(linear[2])];
}

function encode(linear: number): number {
  const size = Math.abs(linear);
  if (!(size > 0.0031308)) return 12.92 * linear;
  const root = sqrt(size);
  const encoded = 1.055 * sqrt(root) * cbrt(root) - 0.055; // 1/2.4 = 1/4 + 1/6
  return linear < 0 ? -encoded : encoded;
}

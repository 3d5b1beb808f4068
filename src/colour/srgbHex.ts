/** The text form of a display colour. */
import { checkNumber } from "../_check.js";
import { checkTriple } from "./_checkTriple.js";
import type { Rgb } from "./triples.js";

/**
 * Encoded sRGB as the text that style sheets and drawings take.
 *
 * Model: each part times 255, rounded, as two hexadecimal digits.
 * Validity: 0 to 1, enforced: bring other colours in with `fitToDisplay` before encoding.
 * Accuracy: half of 1/255, the rounding to 8 bits.
 * Source: CSS Color Module (form of the text).
 *
 * @param encoded - [red, green, blue], encoded, each 0 to 1
 * @returns "#rrggbb"
 * @throws TypeError if `encoded` is not three numbers; RangeError if one is outside 0 to 1 or NaN
 * @example
 * import { srgbHex } from "airlight";
 * srgbHex([1, 0.5, 0]); // => "#ff8000"
 */
export function srgbHex(encoded: Readonly<Rgb>): string {
  checkTriple(encoded, "encoded", "srgbHex");
  let text = "#";
  for (let i = 0; i < 3; i++) {
    checkNumber(encoded[i], 0, 1, "", `encoded[${i}]`, "srgbHex");
    text += Math.round(255 * encoded[i]!)
      .toString(16)
      .padStart(2, "0");
  }
  return text;
}

/** The nearest thing a display can show. */
import { refuse } from "../_check.js";
import { checkTriple } from "./_checkTriple.js";
import type { Rgb } from "./triples.js";

/**
 * Linear sRGB moved into the range of a display.
 *
 * Model: if a part is negative, the colour moves towards the grey of equal luminance until nothing is; then, if a part
 * exceeds 1, all three are scaled so that the largest is 1. Hue is kept in the linear sense; saturation, and then
 * brightness, give way. Colours already within 0 to 1 stay as they are.
 * Validity: luminance must not be negative (no light has that). NaN gives NaN in all three.
 * Accuracy: luminance is kept to 1e-13 where nothing exceeds 1 (tested).
 * Source: arithmetic; the luminance weights are those of `linearSrgbToXyz`.
 *
 * @param linear - [red, green, blue], linear, of any size
 * @returns [red, green, blue], linear, each 0 to 1
 * @throws TypeError if `linear` is not three numbers; RangeError if its luminance is negative
 * @example
 * import { fitToDisplay } from "airlight";
 * fitToDisplay([1.2, 0.4, -0.1])[0]; // => 1
 * fitToDisplay([1.2, 0.4, -0.1])[2]; // => 0
 */
export function fitToDisplay(linear: Readonly<Rgb>): Rgb {
  checkTriple(linear, "linear", "fitToDisplay");
  const [red, green, blue] = linear;
  const grey = (87098 / 409605) * red + (175762 / 245763) * green + (12673 / 175545) * blue;
  if (grey < 0) refuse(grey, "of luminance 0 or more", "", "linear", "fitToDisplay");
  const least = Math.min(red, green, blue);
  const most = Math.max(red, green, blue);
  if (least >= 0 && most <= 1) return [red, green, blue];
  const share = least < 0 ? grey / (grey - least) : 1;
  const scale = Math.max(1, grey + share * (most - grey));
  const moved = (part: number): number =>
    Math.max(0, Math.min(1, (grey + share * (part - grey)) / scale));
  return [moved(red), moved(green), moved(blue)];
}

/** Strips of the zenith's colour against the height of the sun. */
import { encodeSrgb, fitToDisplay, xyzToLinearSrgb } from "airlight";
import {
  blankPicture,
  drawLine,
  type Picture,
  type ScreenColour,
  setDot,
  writeWords,
} from "./picture.js";

/** One strip: its title and the tristimulus values of its columns. */
export interface Strip {
  readonly title: string;
  readonly colours: readonly (readonly [number, number, number])[];
}

const PAPER: ScreenColour = [0.97, 0.965, 0.95];
const INK: ScreenColour = [0.15, 0.15, 0.2];
const BAND = 90;
/** Luminance every column is shown at, white being 1: its own exposure, since the strip spans a factor of thousands. */
const SHOWN = 0.22;

/** Paints the strips one under the other over a common axis of sun heights (one a column, high to low). */
export function paintStrips(strips: readonly Strip[], sunHeightsDeg: readonly number[]): Picture {
  const left = 24;
  const width = sunHeightsDeg.length + 2 * left;
  const height = strips.length * (BAND + 34) + 60;
  const picture = blankPicture(width, height, PAPER);
  for (const [s, { title, colours }] of strips.entries()) {
    const top = 26 + s * (BAND + 34);
    writeWords(picture, title, width / 2, top - 12, INK);
    for (const [column, [x, y, z]] of colours.entries()) {
      const colour = encodeSrgb(
        fitToDisplay(xyzToLinearSrgb([(SHOWN * x) / y, SHOWN, (SHOWN * z) / y])),
      );
      for (let row = 0; row < BAND; row++) setDot(picture, left + column, top + row, colour);
    }
  }
  const axis = height - 52;
  for (const mark of [60, 30, 10, 5, 2, 0, -2, -4, -6]) {
    const column = sunHeightsDeg.findIndex((h) => h <= mark + 1e-9);
    if (column < 0) continue;
    drawLine(picture, [left + column, axis], [left + column, axis + 6], INK);
    writeWords(picture, `${mark}°`, left + column, axis + 16, INK, 1);
  }
  writeWords(
    picture,
    "Height of the sun. Each column at its own exposure",
    width / 2,
    height - 14,
    INK,
    1,
  );
  return picture;
}

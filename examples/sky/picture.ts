/** A picture of dots with words and lines on it, written as PNG. */
import { mkdirSync, writeFileSync } from "node:fs";
import { dirname } from "node:path";
import { PNG } from "pngjs";
import { dotsOf, widthOf } from "./glyphs.js";

/** Red, green, blue, each 0 to 1, as a screen takes them. */
export type ScreenColour = readonly [number, number, number];

/** Dots of a picture, row by row, four bytes each. */
export interface Picture {
  readonly width: number;
  readonly height: number;
  readonly bytes: Uint8Array;
}

/** An even picture. */
export function blankPicture(width: number, height: number, colour: ScreenColour): Picture {
  const picture = { width, height, bytes: new Uint8Array(4 * width * height) };
  for (let y = 0; y < height; y++) for (let x = 0; x < width; x++) setDot(picture, x, y, colour);
  return picture;
}

/** Sets a dot, or mixes `share` of a colour into it; dots outside are left out. */
export function setDot(
  picture: Picture,
  x: number,
  y: number,
  colour: ScreenColour,
  share = 1,
): void {
  const [column, row] = [Math.round(x), Math.round(y)];
  if (column < 0 || row < 0 || column >= picture.width || row >= picture.height) return;
  const at = 4 * (row * picture.width + column);
  for (let c = 0; c < 3; c++) {
    const old = picture.bytes[at + c]!;
    picture.bytes[at + c] = Math.round(old + share * (255 * colour[c]! - old));
  }
  picture.bytes[at + 3] = 255;
}

/** Writes words, centred on a place, letters `size` times seven dots high. */
export function writeWords(
  picture: Picture,
  text: string,
  x: number,
  y: number,
  colour: ScreenColour,
  size = 2,
): void {
  const left = x - (size * widthOf(text)) / 2;
  const top = y - 3.5 * size;
  for (const [column, row] of dotsOf(text)) {
    for (let i = 0; i < size; i++) {
      for (let j = 0; j < size; j++)
        setDot(picture, left + size * column + i, top + size * row + j, colour);
    }
  }
}

/** Draws a straight line. */
export function drawLine(
  picture: Picture,
  from: readonly [number, number],
  to: readonly [number, number],
  colour: ScreenColour,
  share = 1,
): void {
  const steps = Math.ceil(2 * Math.hypot(to[0] - from[0], to[1] - from[1]));
  for (let k = 0; k <= steps; k++) {
    const t = k / Math.max(steps, 1);
    setDot(
      picture,
      from[0] + t * (to[0] - from[0]),
      from[1] + t * (to[1] - from[1]),
      colour,
      share,
    );
  }
}

/** Draws a circle. */
export function drawCircle(
  picture: Picture,
  centre: readonly [number, number],
  radius: number,
  colour: ScreenColour,
  share = 1,
): void {
  const sides = Math.max(24, Math.ceil(radius));
  for (let k = 0; k < sides; k++) {
    const at = (step: number): [number, number] => {
      const turn = (2 * Math.PI * step) / sides;
      return [centre[0] + radius * Math.cos(turn), centre[1] + radius * Math.sin(turn)];
    };
    drawLine(picture, at(k), at(k + 1), colour, 0.5 * share);
  }
}

/** Writes the picture to a file, making its folder. */
export function savePicture(picture: Picture, path: string): void {
  const png = new PNG({ width: picture.width, height: picture.height });
  png.data = Buffer.from(picture.bytes);
  mkdirSync(dirname(path), { recursive: true });
  writeFileSync(path, PNG.sync.write(png));
}

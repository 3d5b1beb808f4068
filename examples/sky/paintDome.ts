/** Pictures of a dome: its colour, and its polarisation. */
import {
  angleOfPolarisation,
  degreeOfPolarisation,
  encodeSrgb,
  fitToDisplay,
  type NeutralPoints,
  xyzToLinearSrgb,
} from "airlight";
import { type Dome, placeOf } from "./dome.js";
import type { Sun } from "./domeStokes.js";
import {
  blankPicture,
  drawCircle,
  drawLine,
  type Picture,
  type ScreenColour,
  setDot,
  writeWords,
} from "./picture.js";

const PAPER: ScreenColour = [0.97, 0.965, 0.95];
const INK: ScreenColour = [0.15, 0.15, 0.2];
/** Room under the disc for the caption, dots. */
const CAPTION = 64;

/** The sky as a camera would see it whose white is a surface of `whiteCdM2`. */
export function paintColour(dome: Dome, xyz: Float64Array, whiteCdM2: number, sun: Sun): Picture {
  const picture = blankPicture(dome.size, dome.size + CAPTION, PAPER);
  for (const [k, dot] of dome.dots.entries()) {
    const [x, y, z] = [0, 1, 2].map((c) => xyz[3 * k + c]! / whiteCdM2) as [number, number, number];
    setDot(
      picture,
      dot % dome.size,
      Math.floor(dot / dome.size),
      encodeSrgb(fitToDisplay(xyzToLinearSrgb([x, y, z]))),
    );
  }
  drawGrid(picture, dome, sun, [1, 1, 1]);
  const middle = dome.size / 2;
  writeWords(picture, `White = ${whiteCdM2} cd/m²`, middle, dome.size + 12, INK);
  writeWords(
    picture,
    `Sun ${90 - sun.zenithDeg}° high, bearing ${sun.bearingDeg}°`,
    middle,
    dome.size + 36,
    INK,
  );
  return picture;
}

/** Degree of polarisation from dark (none) to bright (all), with bars along the vibration and rings at the neutral points. */
export function paintPolarisation(
  dome: Dome,
  stokes: Float64Array,
  points: NeutralPoints,
  sun: Sun,
  wavelengthNm: number,
): Picture {
  const picture = blankPicture(dome.size, dome.size + CAPTION, PAPER);
  for (const [k, dot] of dome.dots.entries()) {
    const degree = degreeOfPolarisation([stokes[3 * k]!, stokes[3 * k + 1]!, stokes[3 * k + 2]!]);
    setDot(picture, dot % dome.size, Math.floor(dot / dome.size), heat(degree));
  }
  drawBars(picture, dome, stokes);
  drawGrid(picture, dome, sun, [1, 1, 1]);
  for (const [name, point] of Object.entries(points)) {
    if (point === undefined) continue;
    const place = placeOf(dome, point.viewZenithDeg, sun.bearingDeg + point.relativeAzimuthDeg);
    drawCircle(picture, place, 6, [1, 0.95, 0.6], 2);
    writeWords(picture, name, place[0], place[1] + 14, [1, 0.95, 0.6], 1);
  }
  const middle = dome.size / 2;
  const left = middle - 150;
  for (let x = 0; x < 300; x++)
    for (let y = 0; y < 12; y++) setDot(picture, left + x, dome.size + 8 + y, heat(x / 299));
  writeWords(picture, "0", left - 14, dome.size + 14, INK);
  writeWords(picture, "100%", left + 328, dome.size + 14, INK);
  writeWords(picture, `Degree of polarisation, ${wavelengthNm} nm`, middle, dome.size + 42, INK);
  return picture;
}

/** Our own scale: night blue, plum, ember, straw; brightness rises all along. */
function heat(value: number): ScreenColour {
  const stops: ScreenColour[] = [
    [0.05, 0.06, 0.18],
    [0.28, 0.14, 0.42],
    [0.66, 0.23, 0.38],
    [0.92, 0.5, 0.25],
    [0.99, 0.93, 0.66],
  ];
  const place = Math.min(Math.max(value, 0), 0.9999) * (stops.length - 1);
  const k = Math.floor(place);
  const mix = (c: number): number =>
    stops[k]![c]! + (place - k) * (stops[k + 1]![c]! - stops[k]![c]!);
  return [mix(0), mix(1), mix(2)];
}

/** Rings every 30° from the vertical with their heights above the horizon, compass points, and a ring for the sun. */
function drawGrid(picture: Picture, dome: Dome, sun: Sun, colour: ScreenColour): void {
  const centre = [dome.size / 2, dome.size / 2] as const;
  for (const zenith of [30, 60, 90]) {
    drawCircle(
      picture,
      centre,
      (dome.radius * zenith) / 90,
      zenith === 90 ? INK : colour,
      zenith === 90 ? 1 : 0.45,
    );
  }
  for (const zenith of [30, 60]) {
    const [x, y] = placeOf(dome, zenith, 0);
    writeWords(picture, `${90 - zenith}°`, x + 18, y + 10, colour, 1);
  }
  drawLine(picture, [centre[0] - 5, centre[1]], [centre[0] + 5, centre[1]], colour, 0.8);
  drawLine(picture, [centre[0], centre[1] - 5], [centre[0], centre[1] + 5], colour, 0.8);
  writeWords(picture, "zenith", centre[0] + 30, centre[1] + 9, colour, 1);
  for (const [name, bearing] of [
    ["N", 0],
    ["NE", 45],
    ["E", 90],
    ["SE", 135],
    ["S", 180],
    ["SW", 225],
    ["W", 270],
    ["NW", 315],
  ] as const) {
    const [x, y] = placeOf(dome, 90 + (90 * 14) / dome.radius, bearing);
    writeWords(picture, name, x, y, INK, name.length === 1 ? 2 : 1);
  }
  const [x, y] = placeOf(dome, sun.zenithDeg, sun.bearingDeg);
  drawCircle(picture, [x, y], 4, [1, 0.85, 0.2], 2);
  writeWords(picture, "sun", x, y + 12, [1, 0.85, 0.2], 1);
}

/** Bars along the vibration, as long as the degree of polarisation is high. */
function drawBars(picture: Picture, dome: Dome, stokes: Float64Array): void {
  const numbers = new Map(Array.from(dome.dots, (dot, k) => [dot, k]));
  const step = Math.round(dome.size / 24);
  for (let row = step / 2; row < dome.size; row += step) {
    for (let column = step / 2; column < dome.size; column += step) {
      const k = numbers.get(Math.floor(row) * dome.size + Math.floor(column));
      if (k === undefined || dome.zenithsDeg[k]! > 86) continue;
      const light: [number, number, number] = [
        stokes[3 * k]!,
        stokes[3 * k + 1]!,
        stokes[3 * k + 2]!,
      ];
      const half = 0.45 * step * degreeOfPolarisation(light);
      // the vertical plane runs through the centre; seen from below on this disc, counter-clockwise is counter-clockwise
      const [x, y] = [column - dome.size / 2, dome.size / 2 - row];
      const turn = Math.atan2(y, x) + (angleOfPolarisation(light) * Math.PI) / 180;
      const [dx, dy] = [half * Math.cos(turn), -half * Math.sin(turn)];
      drawLine(picture, [column - dx, row - dy], [column + dx, row + dy], [1, 1, 1], 0.8);
    }
  }
}

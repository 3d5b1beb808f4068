/** Pictures of the sun at several heights: spectra and a strip of colours. */
import { line, rectX, text, tickX } from "@observablehq/plot";
import { solarIrradiance } from "airlight";
import type { SunView } from "./lookForward.js";
import { draw, lineColour, type PictureWidth } from "./plotting.js";

/** Direct spectra on a plane facing the sun, with the one outside the air. */
export function drawSpectra(
  views: readonly SunView[],
  distanceAu: number,
  width: PictureWidth,
): string {
  const count = views.length;
  const toPoints = (
    wavelengthsNm: Float64Array,
    values: Float64Array,
  ): { nm: number; value: number }[] =>
    Array.from(wavelengthsNm, (nm, i) => ({ nm, value: values[i]! }));
  const grid = views[0]!.spectrum.wavelengthsNm;
  const outside = grid.map((nm) => solarIrradiance(nm) / (distanceAu * distanceAu));
  const labels = views.map(({ spectrum, trueHeightDeg }, k) => {
    const value = Math.max(...spectrum.values);
    const nm = spectrum.wavelengthsNm[spectrum.values.indexOf(value)]!;
    return { nm, value, label: `${trueHeightDeg}°`, colour: lineColour(k, count) };
  });
  const top = Math.max(...outside);
  const peak = grid[outside.indexOf(top)]!;
  return draw(width, "Spectra of direct sunlight at the ground", {
    height: 420,
    marginLeft: 56,
    marginRight: 24,
    marginBottom: 44,
    marginTop: 34,
    x: {
      domain: [300, 1100],
      ticks: width < 500 ? 4 : 8,
      tickFormat: String,
      label: "vacuum wavelength, nm",
      labelArrow: "none",
      labelAnchor: "center",
    },
    y: {
      domain: [0, top * 1.08],
      label: "irradiance on a plane facing the sun, W m⁻² nm⁻¹",
      labelArrow: "none",
      grid: true,
    },
    marks: [
      line(toPoints(grid, outside), {
        x: "nm",
        y: "value",
        stroke: "currentColor",
        strokeOpacity: 0.5,
      }),
      ...views.map(({ spectrum }, k) =>
        line(toPoints(spectrum.wavelengthsNm, spectrum.values), {
          x: "nm",
          y: "value",
          stroke: lineColour(k, count),
          strokeWidth: 1.4,
        }),
      ),
      text([{ nm: peak, value: top }], {
        x: "nm",
        y: "value",
        text: () => "outside the air",
        textAnchor: "start",
        dx: 40,
        dy: 4,
      }),
      text(labels, {
        x: "nm",
        y: "value",
        text: "label",
        fill: "colour",
        stroke: "var(--paper, #fff)",
        strokeWidth: 4,
        dy: -9,
        fontWeight: "bold",
      }),
    ],
  });
}

/** The colour of the sun against its true height, on an axis of equal ratios; colour temperature and illuminance above. */
export function drawColourStrip(
  strip: readonly SunView[],
  views: readonly SunView[],
  width: PictureWidth,
): string {
  const heights = strip.map(({ trueHeightDeg }) => trueHeightDeg);
  const half = Math.sqrt(heights[0]! / heights[1]!);
  const ends = [heights.at(-1)! / half, heights[0]! * half];
  // every patch reaches down to the lowest height and the next one covers the rest: no seams
  const patches = strip.map(({ trueHeightDeg, displayColour }) => ({
    from: ends[0]!,
    to: trueHeightDeg * half,
    colour: displayColour,
  }));
  const temperature = ({ colourTemperature }: SunView): string =>
    colourTemperature ? `${(colourTemperature.temperatureK / 10).toFixed(0)}0` : "none";
  const light = ({ illuminanceLx }: SunView): string => (illuminanceLx / 1000).toPrecision(3);
  return draw(width, "Colour of the sun against its height", {
    height: 190,
    marginLeft: 24,
    marginRight: 28,
    marginBottom: 46,
    marginTop: 70,
    x: { type: "log", domain: ends, axis: null },
    marks: [
      rectX(patches, { x1: "from", x2: "to", fill: "colour" }),
      tickX(views, { x: "trueHeightDeg", stroke: "#20262e", strokeOpacity: 0.35 }),
      text(views, {
        x: "trueHeightDeg",
        frameAnchor: "bottom",
        text: (view: SunView) => `${view.trueHeightDeg}°`,
        dy: 18,
      }),
      text(["true height of the sun above the horizon, degrees"], {
        frameAnchor: "bottom",
        text: (words: string) => words,
        dy: 42,
      }),
      text(views, { x: "trueHeightDeg", frameAnchor: "top", text: temperature, dy: -34 }),
      text(views, { x: "trueHeightDeg", frameAnchor: "top", text: light, dy: -14 }),
      text(["colour temperature (K) over illuminance (klx)"], {
        frameAnchor: "top-left",
        text: (words: string) => words,
        dy: -60,
        dx: -20,
      }),
    ],
  });
}

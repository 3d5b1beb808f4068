/** The picture of what the published air masses are off by. */
import { line, ruleY, text } from "@observablehq/plot";
import { draw, plainColour } from "../station/plotting.js";
import { AIR, type ErrorLine, OTHERS } from "./errorLines.js";

/** Most that is shown, per cent. */
const MOST = 3;
/** Where each line's name stands: elevation, and per cent. */
const PLACES: Readonly<Record<string, readonly [number, number]>> = {
  "Kasten & Young 1989": [0.05, -1.1],
  "Young 1994 (true)": [6.3, -0.35],
  "Kasten 1965": [0.42, -2.1],
  "Pickering 2002": [1.15, 1.75],
  "Rozenberg 1966": [14.5, 1.2],
  "Hardie 1962": [5.4, -1.2],
  "Young & Irvine 1967 (true)": [17, -0.6],
  "Kasten & Young at the true angle": [5.8, 2.4],
  "ozone: thin shell (true)": [2.8, -2.2],
  "water: Kasten 1965": [0.6, 0.5],
  "ozone: mass of air": [19, 2.1],
  "water: mass of air": [15.5, -1.2],
};

export function drawErrors(lines: readonly ErrorLine[]): string {
  const names = lines.map(({ name }) => name);
  // neighbours in the list far apart in hue
  const colour = (name: string): string =>
    plainColour((5 * names.indexOf(name)) % names.length, names.length, 36);
  const shown = lines.map(({ points, ...rest }) => ({
    ...rest,
    points: points.map((point) => ({ ...point, ...rest })),
  }));
  const labels = lines.map(({ name, panel }) => {
    const [elevation, percent] = PLACES[name]!;
    return { name, panel, elevation, percent };
  });
  return draw(760, "Error of published air masses against the refracted ray, over elevation", {
    height: 620,
    marginLeft: 52,
    marginRight: 132,
    marginBottom: 46,
    x: {
      type: "sqrt",
      domain: [0, 40],
      ticks: [0, 0.5, 1, 2, 3, 5, 7, 10, 15, 20, 30, 40],
      tickFormat: String,
      label: "apparent elevation, degrees",
      labelArrow: "none",
      labelAnchor: "center",
    },
    y: { domain: [-MOST, MOST], label: "error, per cent", labelArrow: "none", grid: true },
    fy: { domain: [AIR, OTHERS], label: null },
    marks: [
      ruleY([0], { stroke: "currentColor", strokeOpacity: 0.6 }),
      ...shown.map(({ name, misused, points }) =>
        line(points, {
          x: "elevation",
          y: "percent",
          fy: "panel",
          stroke: colour(name),
          strokeWidth: 1.8,
          strokeDasharray: misused ? "5 4" : "none",
          clip: true,
        }),
      ),
      text(labels, {
        x: "elevation",
        y: "percent",
        fy: "panel",
        text: "name",
        textAnchor: "start",
        fill: (label: { name: string }) => colour(label.name),
        stroke: "white",
        strokeWidth: 4,
      }),
    ],
  });
}

/** Pictures of the measured day: optical depth and exponent through the hours. */
import { dot, rectX, text } from "@observablehq/plot";
import type { Calibration } from "./calibrate.js";
import { type CloudySpell, cloudySpells } from "./cloudySpells.js";
import { draw, lineColour, type PictureWidth, spreadApart } from "./plotting.js";
import type { AerosolPoint } from "./retrieveAerosol.js";

/** Optical depth of aerosol in every channel, cloudy spells shaded and their readings crossed where they fit in. */
export function drawAerosolDepth(
  points: readonly AerosolPoint[],
  calibrations: readonly Calibration[],
  width: PictureWidth,
): string {
  const count = calibrations.length;
  const all = points.flatMap(({ reading, depths, cloudy }) =>
    depths.map((depth, k) => ({ time: reading.time, depth, cloudy, colour: lineColour(k, count) })),
  );
  const clear = all.filter(({ cloudy }) => !cloudy);
  const top = Math.max(...clear.map(({ depth }) => depth)) * 1.25;
  const low = Math.min(0, ...clear.map(({ depth }) => depth));
  const last = points.filter(({ cloudy }) => !cloudy).at(-1)!;
  const places = spreadApart(last.depths, (top - low) * 0.05);
  const labels = calibrations.map(({ optics }, k) => ({
    time: points.at(-1)!.reading.time,
    depth: places[k]!,
    label: `${optics.channel.centreNm} nm`,
    colour: lineColour(k, count),
  }));
  return draw(width, "Optical depth of aerosol through the day", {
    ...layout(400),
    x: timeAxis(points, width),
    y: {
      domain: [low, top],
      label: "optical depth of aerosol",
      labelArrow: "none",
      grid: true,
      ticks: 6,
    },
    marks: [
      ...cloudMarks(cloudySpells(points), top),
      dot(clear, { x: "time", y: "depth", fill: "colour", r: 1.4 }),
      dot(
        all.filter(({ cloudy, depth }) => cloudy && depth <= top),
        {
          x: "time",
          y: "depth",
          stroke: "currentColor",
          symbol: "times",
          r: 2.2,
          strokeOpacity: 0.55,
        },
      ),
      text(labels, {
        x: "time",
        y: "depth",
        text: "label",
        fill: "colour",
        textAnchor: "start",
        dx: 8,
      }),
    ],
  });
}

/** Exponent of the power law at the readings without cloud: it falls as coarse particles take over. */
export function drawExponent(points: readonly AerosolPoint[], width: PictureWidth): string {
  const clear = points.flatMap(({ reading, powerLaw, cloudy }) =>
    powerLaw && !cloudy ? [{ time: reading.time, ...powerLaw }] : [],
  );
  const top = Math.max(...clear.map(({ exponent }) => exponent)) * 1.2;
  return draw(width, "Exponent of the aerosol through the day", {
    ...layout(260),
    x: timeAxis(points, width),
    y: {
      domain: [Math.min(0, ...clear.map(({ exponent }) => exponent)), top],
      label: "Ångström exponent",
      labelArrow: "none",
      grid: true,
    },
    marks: [
      ...cloudMarks(cloudySpells(points), top),
      dot(clear, { x: "time", y: "exponent", fill: "currentColor", r: 1.4 }),
    ],
  });
}

function layout(height: number): {
  height: number;
  marginLeft: number;
  marginRight: number;
  marginBottom: number;
  marginTop: number;
} {
  return { height, marginLeft: 56, marginRight: 70, marginBottom: 44, marginTop: 34 };
}

function timeAxis(points: readonly AerosolPoint[], width: PictureWidth): object {
  const ends = [points[0]!.reading.time, points.at(-1)!.reading.time];
  return {
    type: "utc",
    domain: ends,
    label: "time of day, hours UTC",
    labelArrow: "none",
    labelAnchor: "center",
    ticks: width < 500 ? "4 hours" : "2 hours",
    tickFormat: (time: Date) => String(time.getUTCHours()),
  };
}

/** Shaded spells with the word over the longest of them. */
function cloudMarks(spells: readonly CloudySpell[], top: number): ReturnType<typeof rectX>[] {
  const length = ({ from, to }: CloudySpell): number => to.getTime() - from.getTime();
  const longest = [...spells].sort((one, other) => length(other) - length(one)).slice(0, 1);
  return [
    rectX(spells, { x1: "from", x2: "to", fill: "currentColor", fillOpacity: 0.1 }),
    text(longest, {
      x: (spell: CloudySpell) => new Date((spell.from.getTime() + spell.to.getTime()) / 2),
      y: top,
      text: () => "cloud",
      dy: -8,
    }),
  ];
}

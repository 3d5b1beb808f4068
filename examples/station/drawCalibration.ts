/** Pictures of the calibration: the lines, and what is left after them. */
import { axisY, dot, frame, lineY, ruleX, ruleY, text } from "@observablehq/plot";
import { type Calibration, MOST_AIR_MASS } from "./calibrate.js";
import { draw, lineColour, type PictureWidth, spreadApart } from "./plotting.js";

const MASS_LABEL = "air mass of aerosol";

/** Readings and fitted lines, drawn on to air mass 0, where the constants are read off. */
export function drawCalibrationLines(
  calibrations: readonly Calibration[],
  unit: string,
  width: PictureWidth,
): string {
  const count = calibrations.length;
  const starts = calibrations.map(({ fit }) => Math.log(fit.constant));
  const kept = calibrations.flatMap(({ points }, k) =>
    points.map((point) => ({ ...point, colour: lineColour(k, count) })),
  );
  const ends = calibrations.map(({ fit }, k) => starts[k]! - fit.opticalDepth * MOST_AIR_MASS);
  const [low, high] = [Math.min(...ends) - 0.12, Math.max(...starts) + 0.08];
  const places = spreadApart(ends, (high - low) * 0.05);
  const labels = calibrations.map(({ optics }, k) => ({
    x: MOST_AIR_MASS + 0.1,
    y: places[k]!,
    label: `${optics.channel.centreNm} nm`,
    colour: lineColour(k, count),
  }));
  return draw(width, "Calibration lines: logarithm of the signal against air mass", {
    height: 440,
    marginLeft: 56,
    marginRight: 70,
    marginBottom: 44,
    marginTop: 34,
    x: { domain: [0, MOST_AIR_MASS], label: MASS_LABEL, labelArrow: "none", labelAnchor: "center" },
    y: {
      domain: [low, high],
      label: `ln(signal at 1 au, freed of the gases / ${unit})`,
      labelArrow: "none",
      grid: true,
    },
    marks: [
      ruleX([0]),
      ...calibrations.map((_, k) =>
        lineY(
          [
            { x: 0, y: starts[k]! },
            { x: MOST_AIR_MASS, y: ends[k]! },
          ],
          { x: "x", y: "y", stroke: lineColour(k, count), strokeWidth: 1.2 },
        ),
      ),
      dot(
        kept.filter(({ use, airMass }) => use === "kept" && airMass <= MOST_AIR_MASS),
        { x: "airMass", y: "logSignal", fill: "colour", r: 1.8 },
      ),
      dot(
        kept.filter(({ use, logSignal }) => use === "rejected" && logSignal > low),
        {
          x: "airMass",
          y: "logSignal",
          stroke: "currentColor",
          symbol: "times",
          r: 2.6,
          strokeOpacity: 0.7,
        },
      ),
      dot(
        calibrations.map((_, k) => ({ x: 0, y: starts[k]!, colour: lineColour(k, count) })),
        { x: "x", y: "y", stroke: "colour", fill: "var(--paper, #fff)", r: 4, strokeWidth: 1.6 },
      ),
      text(labels, { x: "x", y: "y", text: "label", fill: "colour", textAnchor: "start" }),
    ],
  });
}

/** Residuals of the kept readings in per cent, channel under channel: a bend would show a wrong air mass or a changing sky. */
export function drawCalibrationResiduals(
  calibrations: readonly Calibration[],
  width: PictureWidth,
): string {
  const kept = calibrations.flatMap(({ points, optics }) =>
    points
      .filter(({ use }) => use === "kept")
      .map(({ airMass, residual }) => ({
        airMass,
        percent: residual * 100,
        channel: `${optics.channel.centreNm} nm`,
      })),
  );
  const most = Math.max(...kept.map(({ percent }) => Math.abs(percent))) * 1.1;
  const colours = new Map(
    calibrations.map(({ optics }, k) => [
      `${optics.channel.centreNm} nm`,
      lineColour(k, calibrations.length),
    ]),
  );
  return draw(width, "Residuals of the calibration against air mass", {
    height: 60 + 78 * calibrations.length,
    marginLeft: 56,
    marginRight: 70,
    marginBottom: 44,
    marginTop: 34,
    x: { domain: [0, MOST_AIR_MASS], label: MASS_LABEL, labelArrow: "none", labelAnchor: "center" },
    y: { domain: [-most, most], label: null },
    fy: { domain: [...colours.keys()], label: null, padding: 0.12, axis: "right" },
    marks: [
      axisY({
        ticks: 3,
        label: "signal over the line, per cent",
        labelArrow: "none",
        labelAnchor: "top",
      }),
      frame({ strokeOpacity: 0.25 }),
      ruleY([0], { strokeOpacity: 0.6 }),
      dot(kept, {
        x: "airMass",
        y: "percent",
        fy: "channel",
        r: 1.7,
        fill: ({ channel }: { channel: string }) => colours.get(channel),
      }),
    ],
  });
}

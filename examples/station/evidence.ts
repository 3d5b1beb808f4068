/** What the readings themselves say for or against the analysis. */
import type { StationResult } from "./analyseStation.js";
import { turbidityOf } from "./calibrate.js";
import { mean } from "./lines.js";
import type { Table } from "./table.js";

/** Air masses at which the residuals are cut into ranges: [low, high) each. */
const RANGES: readonly (readonly [number, number])[] = [
  [1, 1.5],
  [1.5, 3],
  [3, 6],
];

/**
 * Channel by channel: mean residual of the calibration in three ranges of air mass (a bend would show a wrong air mass, a wrong
 * band or a sky that changed), and how far the measured optical depths stand off their own power law, on the calibration
 * morning and on the measured day. An error of a constant would show as a departure that is largest at low air mass;
 * an error of a gas, as one that keeps.
 */
export function evidenceTable({ calibrations, aerosol }: StationResult): Table {
  const morning = turbidityOf(calibrations);
  const clear = aerosol.filter(({ cloudy, powerLaw }) => !cloudy && powerLaw !== undefined);
  return {
    title: "Evidence: what the fits leave over",
    columns: [
      ["channel", "nm"],
      ...RANGES.map(([low, high]) => [`residual, mass ${low} to ${high}`, "%"] as const),
      ["off the power law", "calibration"],
      ["off the power law", "day, mass < 2"],
      ["off the power law", "day, mass > 2"],
    ],
    rows: calibrations.map(({ optics, fit, points }, k) => {
      const inRange = RANGES.map(([low, high]) =>
        points.filter(({ use, airMass }) => use === "kept" && airMass >= low && airMass < high),
      );
      const off = (take: (mass: number) => boolean): number[] =>
        clear
          .filter(({ reading }) => take(reading.masses.aerosol))
          .map(({ depths, powerLaw }) => depths[k]! - lawAt(powerLaw!, optics.meanNm));
      return [
        String(optics.channel.centreNm),
        ...inRange.map((some) =>
          signed(
            some.map(({ residual }) => residual * 100),
            3,
          ),
        ),
        signed([fit.opticalDepth - lawAt(morning, optics.meanNm)], 4),
        signed(
          off((mass) => mass < 2),
          4,
        ),
        signed(
          off((mass) => mass >= 2),
          4,
        ),
      ];
    }),
  };
}

function lawAt(law: { turbidity: number; exponent: number }, wavelengthNm: number): number {
  return law.turbidity * (wavelengthNm / 1000) ** -law.exponent;
}

/** Mean with its sign, or a dash for none. */
function signed(values: readonly number[], digits: number): string {
  if (values.length === 0) return "-";
  const text = mean(values).toFixed(digits);
  return text.startsWith("-") ? text : `+${text}`;
}

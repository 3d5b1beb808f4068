/** The one reading whose budget is shown. */
import type { AerosolOpticalDepth } from "airlight";
import type { StationResult } from "./analyseStation.js";
import { nearestTo500 } from "./nearestTo500.js";
import type { PlacedReading } from "./placeReadings.js";
import type { Table } from "./table.js";

/** A reading, the wavelength of its channel and the depth with its budget. */
export interface BudgetedReading {
  readonly reading: PlacedReading;
  readonly centreNm: number;
  readonly depth: AerosolOpticalDepth;
}

/** The middle one of the day's readings without cloud, in the channel nearest 500 nm. */
export function budgetedReading({ aerosol, calibrations }: StationResult): BudgetedReading {
  const k = nearestTo500(calibrations);
  const clear = aerosol.filter(({ cloudy, budgets }) => !cloudy && budgets[k] !== undefined);
  const { reading, budgets } = clear[clear.length >> 1]!;
  return { reading, centreNm: calibrations[k]!.optics.channel.centreNm, depth: budgets[k]! };
}

/** Its budget line by line. */
export function budgetTable(result: StationResult): Table {
  const { reading, centreNm, depth } = budgetedReading(result);
  const clock = reading.time.toISOString().slice(11, 16);
  const bound = `the criterion of ±${depth.criterion.toFixed(4)} at air mass ${reading.masses.aerosol.toFixed(2)} is ${depth.meetsCriterion ? "met" : "not met"}`;
  return {
    title: `Budget of the optical depth at ${centreNm} nm at ${clock} UTC: ${depth.opticalDepth.toFixed(4)} ± ${depth.expandedUncertainty.toFixed(4)} (95 %); ${bound}`,
    columns: [
      ["line", ""],
      ["std. uncertainty", "own unit"],
      ["sensitivity", "depth per unit"],
      ["contribution", "depth"],
      ["share", "%"],
    ],
    rows: depth.budget
      .filter(({ standardUncertainty }) => standardUncertainty > 0)
      .map(({ input, standardUncertainty, sensitivity, contribution, share }) => [
        input,
        standardUncertainty.toPrecision(3),
        sensitivity.toPrecision(3),
        contribution.toFixed(5),
        (share * 100).toFixed(1),
      ]),
  };
}

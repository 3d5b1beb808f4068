/** The results as tables. */
import { coverageFactor } from "airlight";
import type { StationResult } from "./analyseStation.js";
import { ASSUMED } from "./assumed.js";
import { MOST_AIR_MASS } from "./calibrate.js";
import { cloudySpells } from "./cloudySpells.js";
import { constantUncertainty, scatterOf } from "./depthBudget.js";
import { mean, median } from "./lines.js";
import { nearestTo500 } from "./nearestTo500.js";
import type { AerosolPoint } from "./retrieveAerosol.js";
import type { Table } from "./table.js";

/** Unit of the signals: what stands before the first comma of `signalUnit`. */
export function signalUnit({ station }: StationResult): string {
  return station.signalUnit.split(",")[0]!;
}

/** Half width of a 95 % interval over the standard uncertainty. */
const FACTOR_95 = coverageFactor(0.95, Number.POSITIVE_INFINITY);

/** Heading of such a half width; its spaces do not break. */
const PLUS_MINUS = "±\u00a095\u00a0%";

/** Constants and aerosol of the calibration morning. */
export function calibrationTable(result: StationResult): Table {
  const unit = signalUnit(result);
  return {
    title: `Calibration (${result.station.calibrationFile}, aerosol air masses up to ${MOST_AIR_MASS})`,
    columns: [
      ["channel", "nm"],
      ["constant at 1 au", unit],
      [PLUS_MINUS, unit],
      [PLUS_MINUS, "%"],
      ["error of the fit", "%"],
      ["aerosol depth", ""],
      [PLUS_MINUS, ""],
      ["scatter", "%"],
      ["kept", "readings"],
      ["rejected", "readings"],
    ],
    rows: result.calibrations.map((calibration) => {
      const { optics, fit, points } = calibration;
      const kept = points.filter(({ use }) => use === "kept");
      const expanded = FACTOR_95 * constantUncertainty(calibration);
      const drift = ASSUMED.hazeDrift / mean(kept.map(({ airMass }) => airMass));
      return [
        String(optics.channel.centreNm),
        fit.constant.toFixed(5),
        expanded.toFixed(5),
        ((expanded / fit.constant) * 100).toFixed(2),
        ((fit.constantStandardError / fit.constant) * 100).toFixed(3),
        fit.opticalDepth.toFixed(4),
        (FACTOR_95 * Math.hypot(fit.opticalDepthStandardError, drift)).toFixed(4),
        (scatterOf(calibration) * 100).toFixed(3),
        String(kept.length),
        String(fit.rejected.length),
      ];
    }),
  };
}

/** Medians of the clear readings hour by hour. */
export function aerosolTable({ aerosol, calibrations, station }: StationResult): Table {
  const k = nearestTo500(calibrations);
  const hours = [...new Set(aerosol.map(({ reading }) => hourOf(reading.time)))];
  return {
    title: `Aerosol through the day (${station.measurementFile}), medians of the readings without cloud`,
    columns: [
      ["hour", "UTC"],
      ["air mass", ""],
      [`depth at ${calibrations[k]!.optics.channel.centreNm} nm`, ""],
      [PLUS_MINUS, ""],
      ["exponent", ""],
      [PLUS_MINUS, ""],
      ["turbidity", "at 1000 nm"],
      [PLUS_MINUS, ""],
      ["clear", "readings"],
      ["cloudy", "readings"],
    ],
    rows: hours.map((hour) =>
      hourRow(
        hour,
        aerosol.filter(({ reading }) => hourOf(reading.time) === hour),
        k,
      ),
    ),
  };
}

/** Where cloud stood before the sun. */
export function cloudTable({ aerosol, calibrations, station }: StationResult): Table {
  const k = nearestTo500(calibrations);
  return {
    title: `Cloudy spells (${station.measurementFile})`,
    columns: [
      ["from", "UTC"],
      ["to", "UTC"],
      ["readings", ""],
      [`greatest depth at ${calibrations[k]!.optics.channel.centreNm} nm`, "haze and cloud"],
    ],
    rows: cloudySpells(aerosol, k).map(({ first, last, count, deepest }) => [
      clockOf(first),
      clockOf(last),
      String(count),
      Number.isFinite(deepest) ? deepest.toFixed(2) : "no sun",
    ]),
  };
}

/** The way of the sun's light at several heights. */
export function pathTable({ views }: StationResult): Table {
  return {
    title: "The sun's path through the air of the measured day",
    columns: [
      ["true height", "degrees"],
      ["seen height", "degrees"],
      ["refraction", "arcmin"],
      ["air mass", "air"],
      ["air mass", "ozone, NO2"],
      ["air mass", "water, aerosol"],
    ],
    rows: views.map(({ trueHeightDeg, apparentHeightDeg, masses }) => [
      trueHeightDeg.toFixed(0),
      apparentHeightDeg.toFixed(3),
      ((apparentHeightDeg - trueHeightDeg) * 60).toFixed(2),
      masses.air.toFixed(3),
      masses.ozone.toFixed(3),
      masses.aerosol.toFixed(3),
    ]),
  };
}

/** The sun at several heights. */
export function sunTable({ views, viewUncertainties }: StationResult): Table {
  return {
    title: "Direct sunlight at the ground, on a plane facing the sun",
    columns: [
      ["true height", "degrees"],
      ["seen height", "degrees"],
      ["illuminance", "lx"],
      [PLUS_MINUS, "lx"],
      ["colour temp.", "K"],
      [PLUS_MINUS, "K"],
      ["duv", ""],
      ["x", ""],
      ["y", ""],
      [PLUS_MINUS, "x, y"],
      ["display", "sRGB"],
    ],
    rows: views.map((view, i) => [
      view.trueHeightDeg.toFixed(0),
      view.apparentHeightDeg.toFixed(2),
      Number(view.illuminanceLx.toPrecision(3)).toFixed(0),
      Number((FACTOR_95 * viewUncertainties[i]!.illuminanceLx).toPrecision(2)).toFixed(0),
      view.colourTemperature?.temperatureK.toFixed(0) ?? "none",
      viewUncertainties[i]!.temperatureK === undefined
        ? "-"
        : (FACTOR_95 * viewUncertainties[i]!.temperatureK!).toFixed(0),
      view.colourTemperature?.duv.toFixed(4) ?? "none",
      view.chromaticity[0].toFixed(4),
      view.chromaticity[1].toFixed(4),
      (FACTOR_95 * Math.max(...viewUncertainties[i]!.chromaticity)).toFixed(4),
      view.displayColour,
    ]),
  };
}

function hourRow(hour: string, points: readonly AerosolPoint[], k: number): string[] {
  const clear = points.filter(({ cloudy }) => !cloudy);
  const fits = clear.flatMap(({ powerLaw, powerLawUncertainty: uncertainty }) =>
    powerLaw && uncertainty ? [{ powerLaw, uncertainty }] : [],
  );
  const middle = (values: readonly number[], digits: number): string =>
    values.length > 0 ? median(values).toFixed(digits) : "-";
  const pick = (take: (point: AerosolPoint) => number): number[] => clear.map(take);
  return [
    hour,
    middle(
      pick(({ reading }) => reading.masses.aerosol),
      2,
    ),
    middle(
      pick(({ depths }) => depths[k]!),
      4,
    ),
    middle(
      pick(({ budgets }) => budgets[k]!.expandedUncertainty),
      4,
    ),
    middle(
      fits.map(({ powerLaw }) => powerLaw.exponent),
      2,
    ),
    middle(
      fits.map(({ uncertainty }) => FACTOR_95 * uncertainty.exponent),
      2,
    ),
    middle(
      fits.map(({ powerLaw }) => powerLaw.turbidity),
      4,
    ),
    middle(
      fits.map(
        ({ powerLaw, uncertainty }) => FACTOR_95 * uncertainty.turbidity * powerLaw.turbidity,
      ),
      4,
    ),
    String(clear.length),
    String(points.length - clear.length),
  ];
}

function hourOf(time: Date): string {
  return time.toISOString().slice(11, 13);
}

/** Hours and minutes, UTC. */
export function clockOf(time: Date): string {
  return time.toISOString().slice(11, 16);
}

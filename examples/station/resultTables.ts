/** The results as tables. */
import type { StationResult } from "./analyseStation.js";
import { type Calibration, MOST_AIR_MASS } from "./calibrate.js";
import { cloudySpells } from "./cloudySpells.js";
import { mean, median } from "./lines.js";
import type { AerosolPoint } from "./retrieveAerosol.js";
import type { Table } from "./table.js";

/** Place in the list of channels of the one nearest 500 nm, the customary one for turbidity. */
export function nearestTo500(calibrations: readonly Calibration[]): number {
  const gaps = calibrations.map(({ optics }) => Math.abs(optics.channel.centreNm - 500));
  return gaps.indexOf(Math.min(...gaps));
}

/** Unit of the signals: what stands before the first comma of `signalUnit`. */
export function signalUnit({ station }: StationResult): string {
  return station.signalUnit.split(",")[0]!;
}

/** Constants and aerosol of the calibration morning. */
export function calibrationTable(result: StationResult): Table {
  const unit = signalUnit(result);
  return {
    title: `Calibration (${result.station.calibrationFile}, aerosol air masses up to ${MOST_AIR_MASS})`,
    columns: [
      ["channel", "nm"],
      ["constant at 1 au", unit],
      ["std. error", unit],
      ["std. error", "%"],
      ["aerosol depth", ""],
      ["std. error", ""],
      ["scatter", "%"],
      ["kept", "readings"],
      ["rejected", "readings"],
    ],
    rows: result.calibrations.map(({ optics, fit, points }) => {
      const kept = points.filter(({ use }) => use === "kept");
      const scatter = Math.sqrt(mean(kept.map(({ residual }) => residual * residual)));
      return [
        String(optics.channel.centreNm),
        fit.constant.toFixed(5),
        fit.constantStandardError.toFixed(5),
        ((fit.constantStandardError / fit.constant) * 100).toFixed(3),
        fit.opticalDepth.toFixed(4),
        fit.opticalDepthStandardError.toFixed(5),
        (scatter * 100).toFixed(3),
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
      ["exponent", ""],
      ["turbidity", "at 1000 nm"],
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

/** The sun at several heights. */
export function sunTable({ views }: StationResult): Table {
  return {
    title: "Direct sunlight at the ground, on a plane facing the sun",
    columns: [
      ["true height", "degrees"],
      ["seen height", "degrees"],
      ["illuminance", "lx"],
      ["colour temp.", "K"],
      ["duv", ""],
      ["x", ""],
      ["y", ""],
      ["display", "sRGB"],
    ],
    rows: views.map((view) => [
      view.trueHeightDeg.toFixed(0),
      view.apparentHeightDeg.toFixed(2),
      Number(view.illuminanceLx.toPrecision(3)).toFixed(0),
      view.colourTemperature?.temperatureK.toFixed(0) ?? "none",
      view.colourTemperature?.duv.toFixed(4) ?? "none",
      view.chromaticity[0].toFixed(4),
      view.chromaticity[1].toFixed(4),
      view.displayColour,
    ]),
  };
}

function hourRow(hour: string, points: readonly AerosolPoint[], k: number): string[] {
  const clear = points.filter(({ cloudy }) => !cloudy);
  const fits = clear.flatMap(({ powerLaw }) => (powerLaw ? [powerLaw] : []));
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
      fits.map(({ exponent }) => exponent),
      2,
    ),
    middle(
      fits.map(({ turbidity }) => turbidity),
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

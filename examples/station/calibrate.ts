/** Calibration: the signal of each channel outside the air at 1 au, from the clear morning. */
import { angstromFit, langleyFit, type LangleyResult } from "airlight";
import type { ChannelOptics } from "./channelOptics.js";
import { blaming } from "./inputError.js";
import { knownTerms, NO_AEROSOL, type Turbidity } from "./knownTerms.js";
import type { PlacedReading } from "./placeReadings.js";

/** Readings through more air than this are not used: there the published air masses differ by as much as the readings scatter. */
export const MOST_AIR_MASS = 6;

/** One reading of the calibration morning in one channel. */
export interface CalibrationPoint {
  /** Air mass of aerosol. */
  readonly airMass: number;
  /** Logarithm of the signal at 1 au, freed of air, ozone and nitrogen dioxide. */
  readonly logSignal: number;
  /** Logarithm of the signal over the fitted line. */
  readonly residual: number;
  readonly use: "kept" | "rejected" | "too much air";
}

/** The calibration of one channel. */
export interface Calibration {
  readonly optics: ChannelOptics;
  readonly fit: LangleyResult;
  readonly points: readonly CalibrationPoint[];
}

/**
 * Calibrates every channel. What is not known on that morning is the aerosol, so the signals are freed of everything known
 * (each constituent on its own air mass, with the pressure of each reading) and fitted against aerosol's air mass: the slope is its
 * optical depth. The fit is run twice, the second time with the aerosol found in the band's curvature.
 */
export function calibrate(
  channels: readonly ChannelOptics[],
  day: readonly PlacedReading[],
  file: string,
): Calibration[] {
  const fitAll = (aerosol: Turbidity): Calibration[] =>
    channels.map((optics, c) => calibrateChannel(optics, c, day, aerosol, file));
  return fitAll(turbidityOf(fitAll(NO_AEROSOL)));
}

/** Power law through the aerosol depths of the morning; none where a depth is not above 0. */
export function turbidityOf(calibrations: readonly Calibration[]): Turbidity {
  const depths = calibrations.map(({ fit }) => fit.opticalDepth);
  if (depths.some((depth) => depth <= 0)) return NO_AEROSOL;
  return angstromFit(
    calibrations.map(({ optics }) => optics.meanNm),
    depths,
  );
}

function calibrateChannel(
  optics: ChannelOptics,
  c: number,
  day: readonly PlacedReading[],
  aerosol: Turbidity,
  file: string,
): Calibration {
  const signals = day.map((reading) => {
    const terms = knownTerms(optics, reading.masses, reading.molecules, aerosol);
    const slant = terms.reduce((sum, term) => sum + term.opticalDepth * term.airMass, 0);
    return reading.signals[c]! * reading.distanceAu * reading.distanceAu * Math.exp(slant);
  });
  const usable = day.flatMap(({ masses }, i) => (masses.aerosol <= MOST_AIR_MASS ? [i] : []));
  const fit = blaming({ file, column: optics.channel.name }, () =>
    langleyFit({
      airMasses: usable.map((i) => day[i]!.masses.aerosol),
      signals: usable.map((i) => signals[i]!),
    }),
  );
  const rejected = new Set(fit.rejected.map(({ index }) => usable[index]));
  const points = day.map(({ masses }, i): CalibrationPoint => {
    const airMass = masses.aerosol;
    const use = airMass > MOST_AIR_MASS ? "too much air" : rejected.has(i) ? "rejected" : "kept";
    const logSignal = Math.log(signals[i]!);
    const residual = logSignal - Math.log(fit.constant) + fit.opticalDepth * airMass;
    return { airMass, logSignal, residual, use };
  });
  return { optics, fit, points };
}

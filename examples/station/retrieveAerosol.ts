/** Aerosol through the day, from calibrated readings. */
import {
  type AerosolOpticalDepth,
  type AngstromResult,
  angstromFit,
  residualOpticalDepth,
} from "airlight";
import type { Calibration } from "./calibrate.js";
import { depthBudget } from "./depthBudget.js";
import { knownTerms, NO_AEROSOL, type Turbidity } from "./knownTerms.js";
import { markClouds } from "./markClouds.js";
import type { PlacedReading } from "./placeReadings.js";
import { type PowerLawUncertainty, powerLawUncertainty } from "./powerLawUncertainty.js";

/** What one reading says about the aerosol. */
export interface AerosolPoint {
  readonly reading: PlacedReading;
  /** Optical depth in each channel; NaN where there was no signal. */
  readonly depths: readonly number[];
  /** The same depths with their budgets; undefined where there was no signal. */
  readonly budgets: readonly (AerosolOpticalDepth | undefined)[];
  /** Power law through the depths, undefined where one of them is not above 0. */
  readonly powerLaw: AngstromResult | undefined;
  /** What the depths' errors make of it. */
  readonly powerLawUncertainty: PowerLawUncertainty | undefined;
  /** Something besides aerosol stood before the sun (or nothing was measured): see markClouds. */
  readonly cloudy: boolean;
}

/** Aerosol at every reading of the day, cloudy readings marked. */
export function retrieveAerosol(
  calibrations: readonly Calibration[],
  day: readonly PlacedReading[],
  latitudeDeg: number,
): AerosolPoint[] {
  const points = day.map((reading) => {
    const rough = powerLawOf(calibrations, depthsOf(calibrations, reading, NO_AEROSOL));
    const budgets = calibrations.map((calibration, c) =>
      depthBudget(calibration, c, reading, rough ?? NO_AEROSOL, latitudeDeg),
    );
    const depths = budgets.map((budget) => budget?.opticalDepth ?? Number.NaN);
    const powerLaw = powerLawOf(calibrations, depths);
    const wavelengthsNm = calibrations.map(({ optics }) => optics.meanNm);
    const known = budgets.flatMap((budget) => (budget ? [budget] : []));
    const uncertainty = powerLaw && powerLawUncertainty(wavelengthsNm, known);
    return { reading, depths, budgets, powerLaw, powerLawUncertainty: uncertainty };
  });
  const means = points.map(({ depths }) => depths.reduce((a, b) => a + b, 0) / depths.length);
  const hours = day.map(({ time }) => time.getTime() / 3.6e6);
  const cloudy = markClouds(hours, means);
  return points.map((point, i) => ({ ...point, cloudy: cloudy[i]! }));
}

function depthsOf(
  calibrations: readonly Calibration[],
  { signals, distanceAu, masses, molecules }: PlacedReading,
  aerosol: Turbidity,
): number[] {
  return calibrations.map(({ optics, fit }, c) => {
    const signal = signals[c]! * distanceAu * distanceAu;
    if (signal <= 0) return Number.NaN;
    const terms = knownTerms(optics, masses, molecules, aerosol);
    return residualOpticalDepth(signal, fit.constant, { terms, airMass: masses.aerosol });
  });
}

function powerLawOf(
  calibrations: readonly Calibration[],
  depths: readonly number[],
): AngstromResult | undefined {
  if (!depths.every((depth) => depth > 0)) return undefined;
  return angstromFit(
    calibrations.map(({ optics }) => optics.meanNm),
    depths,
  );
}

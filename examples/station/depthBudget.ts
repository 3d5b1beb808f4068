/** Optical depth of aerosol in one channel at one reading, with its budget. */
import {
  type AerosolOpticalDepth,
  aerosolOpticalDepth,
  type UncertainTerm,
  zenithStandardUncertainty,
} from "airlight";
import { ASSUMED } from "./assumed.js";
import type { Calibration } from "./calibrate.js";
import { knownTerms, type Turbidity } from "./knownTerms.js";
import { mean } from "./lines.js";
import type { PlacedReading } from "./placeReadings.js";

/** Lines of the budget whose error is one and the same in all channels. */
export const SHARED_LINES: readonly string[] = [
  "zenith angle",
  "Rayleigh",
  "ozone",
  "nitrogen dioxide",
];

/** Standard uncertainty of a constant: of the fit, and of haze that drifted unseen. */
export function constantUncertainty({ fit }: Calibration): number {
  return Math.hypot(fit.constantStandardError, ASSUMED.hazeDrift * fit.constant);
}

/** Scatter of the kept readings about the calibration line, relative: the noise of a reading. */
export function scatterOf({ points }: Calibration): number {
  const kept = points.filter(({ use }) => use === "kept");
  return Math.sqrt(mean(kept.map(({ residual }) => residual * residual)));
}

/** The depth of channel `c`; undefined where there was no signal. */
export function depthBudget(
  calibration: Calibration,
  c: number,
  reading: PlacedReading,
  aerosol: Turbidity,
  latitudeDeg: number,
): AerosolOpticalDepth | undefined {
  const signal = reading.signals[c]!;
  if (signal <= 0) return undefined;
  const { masses, molecules } = reading;
  const terms = knownTerms(calibration.optics, masses, molecules, aerosol);
  return aerosolOpticalDepth({
    signal,
    signalStandardUncertainty: scatterOf(calibration) * signal,
    constant: calibration.fit.constant,
    constantStandardUncertainty: constantUncertainty(calibration),
    sunDistanceAu: reading.distanceAu,
    airMass: masses.aerosol,
    airMassPerDeg: perDegree(masses.aerosol),
    zenithStandardUncertaintyDeg: zenithUncertainty(latitudeDeg),
    terms: named(terms, calibration, reading),
  });
}

/** The terms with their names and uncertainties, in the order of knownTerms. */
function named(
  terms: ReturnType<typeof knownTerms>,
  { optics }: Calibration,
  { pressurePa }: PlacedReading,
): UncertainTerm[] {
  const { ozoneDu, nitrogenDioxideDu } = optics.columns;
  const share = (uncertainty: number, column: number): number =>
    column > 0 ? uncertainty / column : 0;
  const relative = [
    ["Rayleigh", Math.hypot(ASSUMED.pressurePa / pressurePa, ASSUMED.rayleigh)],
    ["ozone", share(ASSUMED.ozoneDu, ozoneDu)],
    ["nitrogen dioxide", share(ASSUMED.nitrogenDioxideDu, nitrogenDioxideDu)],
    ["curvature of the band", 0],
  ] as const;
  return terms.map((term, i) => ({
    ...term,
    name: relative[i]![0],
    standardUncertainty: relative[i]![1] * Math.abs(term.opticalDepth),
    airMassPerDeg: i < 3 ? perDegree(term.airMass) : 0,
  }));
}

/** Change of an air mass per degree as under a flat sky: good to a few per cent where readings are used. */
function perDegree(airMass: number): number {
  return (airMass * Math.sqrt(Math.max(0, airMass * airMass - 1)) * Math.PI) / 180;
}

/** With the sun due east or west, where the clock matters most. */
function zenithUncertainty(latitudeDeg: number): number {
  return zenithStandardUncertainty({
    latitudeDeg,
    sunAzimuthDeg: 90,
    timeStandardUncertaintyS: ASSUMED.timeS,
    latitudeStandardUncertaintyDeg: ASSUMED.positionDeg,
    longitudeStandardUncertaintyDeg: ASSUMED.positionDeg,
  });
}

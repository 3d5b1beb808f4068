/** One calibration constant from several mornings. */
import { checkList, checkRecord } from "../_check.js";
import { checkPositive } from "./_checkPositive.js";
import { exp, log, sqrt } from "../_numeric.js";
import { studentQuantile } from "../_studentQuantile.js";
import type { Dimensionless } from "../units.js";
import { median } from "./_median.js";
import { randomEffectsFit } from "./_randomEffects.js";
import type { RejectedReading } from "./langleyFit.js";

const NAME = "combinedCalibration";
/** Modified z-score beyond which a morning is left out. */
const REJECTION_SCORE = 3.5;
/** Fewer mornings than this are all kept: their median absolute deviation means little. */
const LEAST_TO_SCREEN = 5;

/** One morning's constant; a result of `langleyFit` will do. */
export interface MorningCalibration {
  /** Signal outside the air at 1 au, above 0. */
  readonly constant: number;
  /** Standard error from that morning's fit, in the unit of the constant, above 0. */
  readonly constantStandardError: number;
}

/** What `combinedCalibration` returns. */
export interface CombinedCalibration {
  /** Signal outside the air at 1 au. */
  readonly constant: number;
  /** Standard uncertainty from the fits and from the scatter between mornings, in the unit of the constant. */
  readonly standardUncertainty: number;
  /** Mornings used less one. */
  readonly degreesOfFreedom: number;
  /** 95 % interval is constant ± this: Student's factor times the standard uncertainty. */
  readonly expandedUncertainty: number;
  /** What the fits alone would say, in the unit of the constant: too small wherever haze drifts. */
  readonly fitStandardError: number;
  /** Standard deviation between mornings beyond their fit errors, relative to the constant. */
  readonly betweenMornings: Dimensionless;
  /** Mornings left out, by index. */
  readonly rejected: readonly RejectedReading[];
}

/**
 * Calibration constant from several mornings, its uncertainty from the scatter between them as well as from the fits.
 *
 * Model: weighted mean of the logarithms, weights 1 / (fit variance + variance between mornings), the latter such that
 * chi-square equals the mornings less one. From five mornings on, those whose modified z-score 0.6745 |x - median| / MAD
 * exceeds 3.5 are left out first, the MAD taken no smaller than 0.6745 times the morning's own error. The interval uses
 * Student's t.
 * Validity: at least 3 mornings; constants that did not drift between them (`calibrationDrift` if they did). A drift of the
 * haze with air mass common to all mornings of a site cannot be seen by any scatter.
 * Accuracy: over 300 simulated sets of 6 mornings whose haze drifts as a parabola, fit errors alone cover the truth in under
 * half of the sets at 95 %, this interval in 92 to 98.5 %.
 * Source: Paule & Mandel 1982, J. Res. Natl. Bur. Stand. 87, 377; Iglewicz & Hoaglin 1993, How to Detect and Handle
 * Outliers (modified z-score); both from memory.
 *
 * @param mornings - constants and their standard errors, in one unit, at least three
 * @returns constant, standard and expanded uncertainty, scatter between mornings, mornings left out
 * @throws TypeError if an argument is of the wrong kind; RangeError if there are fewer than three or a value is not above 0
 * @example
 * import { combinedCalibration } from "airlight";
 * const mornings = [2.01, 2.0, 1.985, 2.004].map((constant) => ({ constant, constantStandardError: 0.002 }));
 * const calibration = combinedCalibration(mornings);
 * calibration.constant; // => 1.9997
 * calibration.expandedUncertainty; // => 0.017
 */
export function combinedCalibration(mornings: readonly MorningCalibration[]): CombinedCalibration {
  checkMornings(mornings);
  const logs = mornings.map(({ constant }) => log(constant));
  const errors = mornings.map((m) => m.constantStandardError / m.constant);
  const rejected = screened(logs, errors);
  const kept = mornings.map((_, i) => i).filter((i) => !rejected.some(({ index }) => index === i));
  const variances = Float64Array.from(kept, (i) => errors[i]! * errors[i]!);
  const data = Float64Array.from(kept, (i) => logs[i]!);
  const fit = randomEffectsFit([new Float64Array(kept.length).fill(1)], data, variances)!;
  const constant = exp(fit.unknowns[0]!);
  const standardUncertainty = constant * sqrt(fit.covariance[0]!);
  const degreesOfFreedom = kept.length - 1;
  return {
    constant,
    standardUncertainty,
    degreesOfFreedom,
    expandedUncertainty: studentQuantile(0.95, degreesOfFreedom) * standardUncertainty,
    fitStandardError: constant / sqrt(variances.reduce((sum, variance) => sum + 1 / variance, 0)),
    betweenMornings: sqrt(fit.addedVariance),
    rejected,
  };
}

function checkMornings(mornings: unknown): asserts mornings is readonly MorningCalibration[] {
  checkList(mornings, 3, "mornings", NAME);
  (mornings as unknown as readonly MorningCalibration[]).forEach((morning, i) => {
    checkRecord(morning, `mornings[${i}]`, NAME);
    checkPositive(morning.constant, `mornings[${i}].constant`, NAME);
    const error = `mornings[${i}].constantStandardError`;
    checkPositive(morning.constantStandardError, error, NAME);
  });
}

function screened(logs: readonly number[], errors: readonly number[]): RejectedReading[] {
  if (logs.length < LEAST_TO_SCREEN) return [];
  const centre = median(Float64Array.from(logs));
  const distances = Float64Array.from(logs, (value) => Math.abs(value - centre));
  const scale = median(distances);
  return logs.flatMap((_, index) => {
    const score = (0.6745 * distances[index]!) / Math.max(scale, 0.6745 * errors[index]!);
    if (score <= REJECTION_SCORE) return [];
    return [
      { index, reason: `modified z-score ${score.toFixed(1)} from the median of all mornings` },
    ];
  });
}

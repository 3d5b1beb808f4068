/** A drifting calibration constant on one date. */
import { checkNumber, checkPrepared } from "../_check.js";
import { exp, sqrt } from "../_numeric.js";
import { studentQuantile } from "../_studentQuantile.js";
import type { CalibrationDrift } from "./calibrationDrift.js";

const NAME = "calibrationAt";

/** A constant with its uncertainty. */
export interface UncertainConstant {
  /** Signal outside the air at 1 au. */
  readonly constant: number;
  /** Its standard uncertainty, in the same unit. */
  readonly standardUncertainty: number;
  /** 95 % interval is constant ± this. */
  readonly expandedUncertainty: number;
  /** Degrees of freedom of the standard uncertainty. */
  readonly degreesOfFreedom: number;
}

/**
 * Calibration constant on a date between, or a little beyond, dated calibrations.
 *
 * Model: the fitted line, its variance growing with the square of the distance from the weighted mean date.
 * Validity: from the first to the last calibration, and half as far again to either side, enforced: drifts do not keep
 * their rate.
 * Accuracy: as `calibrationDrift`.
 * Source: weighted least squares.
 *
 * @param timeDays - date, on the scale of the calibrations
 * @param drift - from `calibrationDrift`
 * @returns constant, standard and expanded uncertainty, degrees of freedom
 * @throws TypeError if an argument is of the wrong kind; RangeError if the date is too far from the calibrations
 * @example
 * import { calibrationAt, calibrationDrift } from "airlight";
 * const drift = calibrationDrift([
 *   { timeDays: 0, constant: 2.0, standardUncertainty: 0.004 },
 *   { timeDays: 200, constant: 1.99, standardUncertainty: 0.004 },
 *   { timeDays: 400, constant: 1.98, standardUncertainty: 0.004 },
 * ]);
 * calibrationAt(200, drift).standardUncertainty; // => 0.0023
 */
export function calibrationAt(timeDays: number, drift: CalibrationDrift): UncertainConstant {
  checkPrepared(drift?.relativeDriftPerDay, "calibrationDrift", "drift", NAME);
  const reach = 0.5 * (drift.lastDays - drift.firstDays);
  checkNumber(timeDays, drift.firstDays - reach, drift.lastDays + reach, "days", "timeDays", NAME);
  const since = timeDays - drift.timeDays;
  const constant = drift.constant * exp(drift.relativeDriftPerDay * since);
  const [[variance], [, slopeVariance]] = drift.covariance;
  const standardUncertainty = constant * sqrt(variance + since * since * slopeVariance);
  const { degreesOfFreedom } = drift;
  const expandedUncertainty = studentQuantile(0.95, degreesOfFreedom) * standardUncertainty;
  return { constant, standardUncertainty, expandedUncertainty, degreesOfFreedom };
}

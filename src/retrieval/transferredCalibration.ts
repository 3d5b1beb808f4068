/** Calibration carried from one instrument to another by simultaneous readings. */
import { independentBudget } from "../_budget.js";
import type { Budget } from "../budget.js";
import { checkList, checkRecord } from "../_check.js";
import { checkPositive, checkUncertainty } from "./_checkPositive.js";
import { exp, log, sqrt } from "../_numeric.js";
import type { Dimensionless } from "../units.js";
import { checkEnough, checkReadings } from "./_checkReadings.js";
import { cleanedLine, REJECTION_SCALES } from "./_cleanedLine.js";

const NAME = "transferredCalibration";

/** Simultaneous readings of two instruments at the same sun, and the calibration of one of them. */
export interface CalibrationTransfer {
  /** Readings of the instrument to calibrate, any linear unit. */
  readonly signals: ArrayLike<number>;
  /** Readings of the calibrated instrument at the same moments. */
  readonly referenceSignals: ArrayLike<number>;
  /** Air mass at each reading, above 0, to 50. */
  readonly airMasses: ArrayLike<Dimensionless>;
  /** Constant of the calibrated instrument, above 0. */
  readonly referenceConstant: number;
  /** Its standard uncertainty, same unit. */
  readonly referenceStandardUncertainty: number;
}

/** What `transferredCalibration` returns. */
export interface TransferredCalibration extends Budget {
  /** Signal of the instrument outside the air at 1 au, in its unit. */
  readonly constant: number;
  /** Optical depth of the instrument's channel less that of the reference's: how far their passbands differ. */
  readonly opticalDepthDifference: Dimensionless;
  /** Pairs of readings left out, by index. */
  readonly rejected: readonly number[];
}

/**
 * Calibration constant of an instrument from readings taken beside a calibrated one.
 *
 * Model: ln (signal / reference signal) is a line in air mass, whose value at air mass 0 is the ratio of the constants and
 * whose slope is the difference of the channels' optical depths. Haze, thin cloud and pressure act on both instruments and
 * drop out. Pairs are left out by the rule of `langleyFit`.
 * Validity: at least 8 pairs kept over an air-mass range of at least 1, as `langleyFit`; channels near enough in wavelength that
 * the difference of their depths stays the same while haze changes.
 * Accuracy: with noise of 0.1 % in each instrument and haze that wanders by 20 %, constants of 200 simulated transfers lie
 * within 0.3 % and the stated error is right to 15 %.
 * Source: common practice (ratio form of the method of Langley).
 *
 * @param transfer - the paired readings, their air masses, constant and standard uncertainty of the reference
 * @returns constant, standard uncertainty and budget in the unit of the constant, difference of the optical depths, pairs left out
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths differ, a value is out of range, or the pairs
 *   are too few or their air masses too alike
 * @example
 * import { transferredCalibration } from "airlight";
 * const airMasses = [1.5, 2, 2.5, 3, 3.5, 4, 4.5, 5];
 * const referenceSignals = airMasses.map((mass) => 2 * Math.exp(-0.2 * mass));
 * const signals = airMasses.map((mass) => 3 * Math.exp(-0.21 * mass));
 * const transfer = transferredCalibration({ signals, referenceSignals, airMasses, referenceConstant: 2, referenceStandardUncertainty: 0.01 });
 * transfer.constant; // => 3.0000
 * transfer.standardUncertainty; // => 0.0150
 */
export function transferredCalibration(transfer: CalibrationTransfer): TransferredCalibration {
  const { signals, referenceSignals, airMasses } = checkTransfer(transfer);
  const { referenceConstant, referenceStandardUncertainty } = transfer;
  const used = Array.from(signals, (_, i) => i).filter(
    (i) => signals[i]! > 0 && referenceSignals[i]! > 0,
  );
  checkEnough(used, used.length, airMasses, NAME);
  const { line, scores } = cleanedLine(
    Float64Array.from(used, (i) => airMasses[i]!),
    Float64Array.from(used, (i) => log(signals[i]! / referenceSignals[i]!)),
    new Float64Array(used.length).fill(1),
  );
  const kept = used.filter((_, k) => Math.abs(scores[k]!) <= REJECTION_SCALES);
  checkEnough(kept, used.length, airMasses, NAME);
  const ratio = exp(line!.intercept);
  const ratioError = ratio * sqrt(line!.covariance[0][0]);
  const reference = { input: "reference constant", sensitivity: ratio };
  return {
    constant: ratio * referenceConstant,
    opticalDepthDifference: -line!.slope,
    ...independentBudget([
      { ...reference, standardUncertainty: referenceStandardUncertainty },
      {
        input: "ratio of signals",
        standardUncertainty: ratioError,
        sensitivity: referenceConstant,
      },
    ]),
    rejected: Array.from(signals, (_, i) => i).filter((i) => !kept.includes(i)),
  };
}

function checkTransfer(transfer: CalibrationTransfer): CalibrationTransfer {
  checkRecord(transfer, "transfer", NAME);
  checkReadings(transfer.airMasses, transfer.signals, undefined, NAME);
  checkList(transfer.referenceSignals, 0, "referenceSignals", NAME);
  if (transfer.referenceSignals.length !== transfer.signals.length) {
    const [wanted, got] = [transfer.signals.length, transfer.referenceSignals.length];
    throw new RangeError(
      `${NAME}: referenceSignals must be as many as signals, ${wanted}, got ${got}`,
    );
  }
  const { referenceConstant, referenceStandardUncertainty } = transfer;
  checkPositive(referenceConstant, "referenceConstant", NAME);
  const spread = "referenceStandardUncertainty";
  checkUncertainty(referenceStandardUncertainty, spread, NAME);
  return transfer;
}

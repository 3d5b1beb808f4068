/** The checks of `calibrationDrift`. */
import { checkList, checkNumber, checkRecord } from "../_check.js";
import { checkPositive } from "./_checkPositive.js";
import type { DatedCalibration } from "./calibrationDrift.js";

const NAME = "calibrationDrift";

/** Throws unless there are three dated calibrations or more. */
export function checkCalibrations(given: unknown): asserts given is readonly DatedCalibration[] {
  checkList(given, 3, "calibrations", NAME);
  (given as unknown as readonly DatedCalibration[]).forEach((calibration, i) => {
    checkRecord(calibration, `calibrations[${i}]`, NAME);
    const { timeDays, constant, standardUncertainty } = calibration;
    checkNumber(timeDays, -1e9, 1e9, "days", `calibrations[${i}].timeDays`, NAME);
    checkPositive(constant, `calibrations[${i}].constant`, NAME);
    checkPositive(standardUncertainty, `calibrations[${i}].standardUncertainty`, NAME);
  });
}

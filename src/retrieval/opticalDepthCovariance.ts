/** How the errors of optical depths at several wavelengths go together. */
import { checkList, checkRecord, refuse } from "../_check.js";
import type { AerosolOpticalDepth } from "./aerosolOpticalDepth.js";

const NAME = "opticalDepthCovariance";

/**
 * Covariance matrix of optical depths read at the same moment in several channels.
 *
 * Model: lines of the budgets that share one cause (`sharedInputs`: the zenith angle, the pressure behind "Rayleigh", the
 * ozone column) are wholly correlated between channels, with their signs; all other lines are independent.
 * Validity: first order, as the budgets themselves.
 * Accuracy: 1e-14 relative against sums written out.
 * Source: GUM 2008, F.1.2.3.
 *
 * @param depths - results of `aerosolOpticalDepth`, one per channel
 * @param sharedInputs - names of the budget lines with one cause for all channels
 * @returns covariance, row by row in the order of the channels
 * @throws TypeError if an argument is of the wrong kind, or a shared name is in no budget
 * @example
 * import { aerosolOpticalDepth, opticalDepthCovariance } from "airlight";
 * const reading = {
 *   signal: 1.25, signalStandardUncertainty: 0, constant: 2, constantStandardUncertainty: 0.01, sunDistanceAu: 1,
 *   airMass: 2, airMassPerDeg: 0.06, zenithStandardUncertaintyDeg: 0.1, terms: [],
 * };
 * const depths = [reading, { ...reading, constant: 1.8 }].map(aerosolOpticalDepth);
 * opticalDepthCovariance(depths, ["zenith angle"])[1] * 1e7; // => 3.856
 */
export function opticalDepthCovariance(
  depths: readonly AerosolOpticalDepth[],
  sharedInputs: readonly string[],
): Float64Array {
  checkList(depths, 1, "depths", NAME);
  checkList(sharedInputs, 0, "sharedInputs", NAME);
  const count = depths.length;
  const covariance = new Float64Array(count * count);
  depths.forEach((depth, i) => {
    checkRecord(depth, `depths[${i}]`, NAME);
    covariance[i * count + i] = depth.standardUncertainty * depth.standardUncertainty;
  });
  for (const input of sharedInputs) {
    const steps = depths.map((depth) => signedStep(depth, input));
    if (steps.every((step) => step === undefined)) {
      refuse(input, "a line of some budget", "", "sharedInputs", NAME);
    }
    for (let i = 0; i < count; i++) {
      for (let j = 0; j < count; j++) {
        if (i !== j) covariance[i * count + j]! += (steps[i] ?? 0) * (steps[j] ?? 0);
      }
    }
  }
  return covariance;
}

function signedStep(depth: AerosolOpticalDepth, input: string): number | undefined {
  const row = depth.budget.find((line) => line.input === input);
  return row && row.sensitivity * row.standardUncertainty;
}

/** Which readings of a day see cloud. */
import { checkList, checkNumber } from "../_check.js";
import { moments } from "../_moments.js";
import type { Dimensionless } from "../units.js";
import { markLonely, markTriplets } from "./_screeningRules.js";

const NAME = "cloudScreening";

const LEAST_STABLE = 0.015;

/**
 * Cloud screening of a day's aerosol optical depths, in one channel, by how they vary.
 *
 * Model: in this order, 1: readings that are NaN or below -0.01 are out. 2: three successive readings of the rest within
 * `windowMinutes` that differ by more than 0.02, or 0.03 of their least where that is more, are out, all three. 3: a
 * reading with fewer than 2 others left within `windowMinutes` to either side is out. 4: unless the standard deviation of
 * what is left is below 0.015, readings beyond three standard deviations of its mean are out.
 * Validity: readings every few seconds to every few minutes. Variation is all it knows: thin even cirrus passes, and the edge
 * of a smoke plume is taken for cloud.
 * Accuracy: on 40 simulated days with cloud passing through over a quarter of the time it keeps at least 90 % of the clear readings
 * and leaves at most 2 % of those with a cloud depth above 0.02.
 * Source: after Smirnov et al. 2000, Remote Sens. Environ. 73, 337 (triplets, 0.02 or 3 %, 0.015, three standard deviations;
 * from memory), applied to successive single readings; the neighbour rule is our own.
 *
 * @param timesMinutes - times of the readings, minutes on any scale, rising
 * @param opticalDepths - aerosol optical depth at each, one channel (500 nm or near it)
 * @param windowMinutes - time within which readings belong together, 0.1 to 120 minutes (about four times their interval)
 * @returns a code for each reading: 0 kept, 1 to 4 the rule that left it out (`screeningReasons`)
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths differ, times do not rise or the window is
 *   out of range
 * @example
 * import { cloudScreening } from "airlight";
 * cloudScreening([0, 1, 2, 3, 4, 5, 6], [0.1, 0.1, 0.1, 0.1, 0.1, 0.1, 0.2], 4)[6]; // => 2
 */
export function cloudScreening(
  timesMinutes: ArrayLike<number>,
  opticalDepths: ArrayLike<Dimensionless>,
  windowMinutes: number,
): Uint8Array {
  checkList(timesMinutes, 0, "timesMinutes", NAME);
  checkList(opticalDepths, 0, "opticalDepths", NAME);
  checkNumber(windowMinutes, 0.1, 120, "minutes", "windowMinutes", NAME);
  checkTimes(timesMinutes, opticalDepths.length);
  const codes = new Uint8Array(opticalDepths.length);
  for (let i = 0; i < codes.length; i++) if (!(opticalDepths[i]! >= -0.01)) codes[i] = 1;
  markTriplets(codes, timesMinutes, opticalDepths, windowMinutes);
  markLonely(codes, timesMinutes, windowMinutes);
  const kept = Array.from(codes.keys()).filter((i) => codes[i] === 0);
  const { mean, standardDeviation } = moments(kept.map((i) => opticalDepths[i]!));
  if (!(standardDeviation >= LEAST_STABLE)) return codes;
  for (const i of kept) {
    if (Math.abs(opticalDepths[i]! - mean) > 3 * standardDeviation) codes[i] = 4;
  }
  return codes;
}

function checkTimes(timesMinutes: ArrayLike<number>, count: number): void {
  if (timesMinutes.length !== count) {
    throw new RangeError(
      `${NAME}: timesMinutes must be as many as opticalDepths, ${count}, got ${timesMinutes.length}`,
    );
  }
  for (let i = 1; i < count; i++) {
    if (timesMinutes[i]! > timesMinutes[i - 1]!) continue;
    throw new RangeError(
      `${NAME}: timesMinutes[${i}] must be after the one before it, got ${timesMinutes[i]}`,
    );
  }
}

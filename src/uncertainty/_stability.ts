/** When enough trials have been made (GUM Supplement 1, 7.9). */
import { moments } from "../_moments.js";
import { pow, sqrt } from "../_numeric.js";
import type { Summary } from "./_summary.js";

/** Trials in a block: 10 000, or 100 / (1 - coverage) where that is more. */
export function blockSize(coverage: number): number {
  return Math.max(10_000, Math.ceil(100 / (1 - coverage)));
}

/** The standard asks for two blocks; the scatter of two can be small by chance. */
const LEAST_BLOCKS = 5;

/** Whether mean, standard deviation and interval ends stand still, over blocks, to `digits` of the standard deviation. */
export function isStable(blocks: readonly Summary[], digits: number): boolean {
  if (blocks.length < LEAST_BLOCKS) return false;
  const deviations = blocks.map((block) => block.standardDeviation);
  const tolerance = numericalTolerance(moments(deviations).mean, digits);
  const still = (values: number[]): boolean =>
    (2 * moments(values).standardDeviation) / sqrt(values.length) <= tolerance;
  return (
    still(deviations) &&
    still(blocks.map((block) => block.mean)) &&
    still(blocks.map((block) => block.interval[0])) &&
    still(blocks.map((block) => block.interval[1]))
  );
}

/** Half a unit of the last of `digits` significant digits of `value` (7.9.2). */
function numericalTolerance(value: number, digits: number): number {
  if (value === 0) return 0;
  let exponent = 0;
  for (let v = value; v < pow(10, digits - 1); v *= 10) exponent--;
  for (let v = value; v >= pow(10, digits); v /= 10) exponent++;
  return 0.5 * pow(10, exponent);
}

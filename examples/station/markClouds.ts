/** Which readings of a day were taken through cloud. */
import { median, repeatedMedianLine } from "./lines.js";

/** Neighbours within this time on either side tell what the air was like: wide at first, so that cloud stays in the minority. */
const FIRST_HOURS = 1.5;
const LATER_HOURS = 0.75;
/** Marked if it stands above the neighbours' line by more than this many times the scatter, and by more than LEAST_EXCESS. */
const MOST_SCATTER = 4;
const LEAST_EXCESS = 0.001;
/** Median distance to standard deviation, for a normal scatter. */
const NORMAL_MEDIAN = 1.4826;
/** Rounds after the first; the marks settle in two or three. */
const MOST_ROUNDS = 10;

/** The rule in words, for the report. */
export const CLOUD_RULE: string = `Haze changes slowly, cloud comes and goes. For each reading a line is put through the mean optical depths of its neighbours (median of the median slopes between them, which does not move while fewer than half of them are cloudy): at first those within ${FIRST_HOURS * 60} minutes on either side; then, in rounds until nothing changes, those within ${LATER_HOURS * 60} minutes that are not marked. A reading is marked as cloudy if it stands above the line by more than ${LEAST_EXCESS} and by more than ${MOST_SCATTER} times the scatter; the scatter is taken from the readings below the line, since cloud cannot put a reading there. A reading without a signal is marked too. Cloud that lasts for hours cannot be told from haze in this way.`;

/** Marks by the rule above; `depths` may hold NaN where nothing was measured. */
export function markClouds(hours: readonly number[], depths: readonly number[]): boolean[] {
  const empty = depths.map((depth) => Number.isNaN(depth));
  let marks = markOnce(hours, depths, empty, FIRST_HOURS);
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const next = markOnce(hours, depths, marks, LATER_HOURS);
    if (next.every((mark, i) => mark === marks[i])) return marks;
    marks = next;
  }
  return marks;
}

/** One round: every reading against the line through its neighbours within `window` hours that are not `left` out. */
function markOnce(
  hours: readonly number[],
  depths: readonly number[],
  left: readonly boolean[],
  window: number,
): boolean[] {
  return depths.map((depth, i) => {
    if (Number.isNaN(depth)) return true;
    const near = hours.flatMap((hour, j) =>
      Math.abs(hour - hours[i]!) <= window && !left[j] ? [j] : [],
    );
    if (near.length === 0) return true;
    const x = near.map((j) => hours[j]! - hours[i]!);
    const y = near.map((j) => depths[j]!);
    const { level, slope } = repeatedMedianLine(x, y);
    const below = y.map((value, k) => level + slope * x[k]! - value).filter((gap) => gap > 0);
    const scatter = below.length > 0 ? NORMAL_MEDIAN * median(below) : 0;
    return depth - level > Math.max(LEAST_EXCESS, MOST_SCATTER * scatter);
  });
}

/** Cloud screening of an archive, day by day. */
import type { ArchiveResult, ArchiveSettings } from "./_archive.js";
import { cloudScreening } from "./cloudScreening.js";

/** A gap longer than this parts two days, minutes. */
const NIGHT_MINUTES = 180;

/** Fills `result.screening` from the depths of the screened channel. */
export function screenDays(
  timesMinutes: Float64Array,
  stride: number,
  { screeningChannel, windowMinutes }: ArchiveSettings,
  result: ArchiveResult,
): void {
  let first = 0;
  for (let i = 1; i <= timesMinutes.length; i++) {
    if (i < timesMinutes.length && !(timesMinutes[i]! - timesMinutes[i - 1]! > NIGHT_MINUTES))
      continue;
    const depths = new Float64Array(i - first);
    for (let k = first; k < i; k++) {
      depths[k - first] = result.opticalDepths[k * stride + screeningChannel]!;
    }
    result.screening.set(
      cloudScreening(timesMinutes.subarray(first, i), depths, windowMinutes),
      first,
    );
    first = i;
  }
}

/** Runs of cloudy readings. */
import type { AerosolPoint } from "./retrieveAerosol.js";

/** Neighbouring cloudy readings taken together. */
export interface CloudySpell {
  /** Half way to the reading before, so that a single one has some width too. */
  readonly from: Date;
  readonly to: Date;
  /** Times of the first and the last reading. */
  readonly first: Date;
  readonly last: Date;
  /** How many readings. */
  readonly count: number;
  /** Greatest depth in the channel asked for. */
  readonly deepest: number;
}

/** The cloudy spells of a day; `deepest` is of channel `k`. */
export function cloudySpells(points: readonly AerosolPoint[], k = 0): CloudySpell[] {
  const time = (i: number): number =>
    points[Math.min(points.length - 1, Math.max(0, i))]!.reading.time.getTime();
  const spells: CloudySpell[] = [];
  for (let first = 0; first < points.length; first++) {
    if (!points[first]!.cloudy) continue;
    let last = first;
    while (points[last + 1]?.cloudy) last++;
    const depths = points.slice(first, last + 1).map(({ depths }) => depths[k]!);
    spells.push({
      from: new Date((time(first - 1) + time(first)) / 2),
      to: new Date((time(last) + time(last + 1)) / 2),
      first: new Date(time(first)),
      last: new Date(time(last)),
      count: last - first + 1,
      deepest: Math.max(...depths),
    });
    first = last;
  }
  return spells;
}

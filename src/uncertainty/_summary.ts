/** Mean, standard deviation and coverage intervals of trials. */
import { moments } from "../_moments.js";

/** What a set of trials says of the result. */
export interface Summary {
  readonly mean: number;
  readonly standardDeviation: number;
  /** Probabilistically symmetric interval: as many trials below it as above. */
  readonly interval: readonly [number, number];
  /** The shortest interval that holds as many trials. */
  readonly shortestInterval: readonly [number, number];
}

/** Summary of the trials, which are sorted in place (GUM Supplement 1, 7.6 and 7.7). */
export function summarise(trials: Float64Array, coverage: number): Summary {
  trials.sort();
  const count = trials.length;
  const { mean, standardDeviation } = moments(trials);
  const inside = Math.round(coverage * count);
  const first = Math.round((count - inside) / 2);
  let shortest = 0;
  const width = (from: number): number => trials[from + inside]! - trials[from]!;
  for (let from = 0; from + inside < count; from++) {
    if (width(from) < width(shortest)) shortest = from;
  }
  const ends = (from: number): [number, number] => [trials[from]!, trials[from + inside]!];
  return { mean, standardDeviation, interval: ends(first), shortestInterval: ends(shortest) };
}

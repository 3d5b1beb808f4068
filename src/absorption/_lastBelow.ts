/** Bisection in a rising table. */

/** Index of the last entry at or below `value`, but at least 0 and never the last of all. */
export function lastBelow(table: readonly number[], value: number): number {
  let low = 0;
  let high = table.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (table[middle]! <= value) low = middle;
    else high = middle;
  }
  return low;
}

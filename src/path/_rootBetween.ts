/** Root of a function between two points where its signs differ, by false position with halving (Illinois). */

/** `low` <= 0 <= `high` are the values at `lowAt` and `highAt`; stops when |f| or the bracket is within its tolerance. */
export function rootBetween(
  f: (x: number) => number,
  lowAt: number,
  low: number,
  highAt: number,
  high: number,
  tolerance: number,
): number {
  let [a, fa, b, fb] = [lowAt, low, highAt, high];
  let side = 0;
  for (let i = 0; i < 200; i++) {
    const x = fa === fb ? a : a - (fa * (b - a)) / (fb - fa);
    const fx = f(x);
    if (Math.abs(fx) <= tolerance || x === a || x === b) return x;
    if (fx < 0) {
      [a, fa] = [x, fx];
      if (side < 0) fb /= 2;
      side = -1;
    } else {
      [b, fb] = [x, fx];
      if (side > 0) fa /= 2;
      side = 1;
    }
  }
  return a;
}

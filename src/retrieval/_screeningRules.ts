/** The rules of `cloudScreening` that look at neighbours. */

const SPREAD = 0.02;
const RELATIVE_SPREAD = 0.03;
const LEAST_NEIGHBOURS = 2;

/** Rule 2, over the last two usable readings and each new one. */
export function markTriplets(
  codes: Uint8Array,
  times: ArrayLike<number>,
  depths: ArrayLike<number>,
  span: number,
): void {
  let [first, second] = [-1, -1];
  for (let i = 0; i < codes.length; i++) {
    if (codes[i] === 1) continue;
    if (first >= 0 && times[i]! - times[first]! <= span) {
      const [a, b, c] = [depths[first]!, depths[second]!, depths[i]!];
      const least = Math.min(a, b, c);
      if (Math.max(a, b, c) - least > Math.max(SPREAD, RELATIVE_SPREAD * least)) {
        for (const place of [first, second, i]) codes[place] = 2;
      }
    }
    [first, second] = [second, i];
  }
}

/** Rule 3: counts kept readings within the span by two moving ends. */
export function markLonely(codes: Uint8Array, times: ArrayLike<number>, span: number): void {
  let [from, to] = [0, 0];
  let kept = 0;
  const good = codes.map((code) => Number(code === 0));
  for (let i = 0; i < codes.length; i++) {
    while (to < codes.length && times[to]! <= times[i]! + span) kept += good[to++]!;
    while (times[from]! < times[i]! - span) kept -= good[from++]!;
    if (good[i] === 1 && kept - 1 < LEAST_NEIGHBOURS) codes[i] = 3;
  }
}

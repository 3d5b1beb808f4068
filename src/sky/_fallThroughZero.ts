/** Zeros of a function of an angle. */

const STEP_DEG = 0.5;

/** Where `f`, positive at `start`, first falls to zero on the way to `end`; undefined if it does not or is not positive at `start`. */
export function fallThroughZero(
  f: (angleDeg: number) => number,
  start: number,
  end: number,
): number | undefined {
  if (!(f(start) > 0)) return undefined;
  const steps = Math.ceil(Math.abs(end - start) / STEP_DEG);
  let inside = start;
  for (let k = 1; k <= steps; k++) {
    const next = start + ((end - start) * k) / steps;
    if (f(next) <= 0) return bisect(f, inside, next);
    inside = next;
  }
  return undefined;
}

function bisect(f: (angleDeg: number) => number, positive: number, other: number): number {
  let [inside, outside] = [positive, other];
  // 30 halvings of half a degree
  for (let n = 0; n < 30; n++) {
    const middle = 0.5 * (inside + outside);
    if (f(middle) > 0) inside = middle;
    else outside = middle;
  }
  return 0.5 * (inside + outside);
}

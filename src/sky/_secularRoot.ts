/** Roots of the equation whose solutions are the eigenvalues of a diagonal matrix less one outer product. */

/** Relative length of a step after which the next would be below rounding: Newton's steps square it. */
const SETTLED = 1e-10;

/** The root between poles m - 1 and m as its distance from pole `origin`, one of the two: Newton's steps kept between shrinking bounds. */
export function secularRoot(
  poles: Float64Array,
  vector: Float64Array,
  m: number,
  origin: number,
): number {
  const own = vector[origin]! * vector[origin]!;
  let width = 0;
  if (m > 0) width = 0.5 * (poles[m]! - poles[m - 1]!);
  else for (const component of vector) width += component * component;
  let low = origin === m ? -width : 0;
  let high = origin === m ? 0 : width;
  let shift = origin === m ? Math.max(-own, 0.75 * low) : Math.min(own, 0.75 * high);
  for (let step = 0; step < 80; step++) {
    const { value, slope } = reducedSecular(poles, vector, m, origin, shift);
    if (value > 0) low = shift;
    else high = shift;
    let next = shift - value / slope;
    if (!(next >= low && next <= high)) next = 0.5 * (low + high);
    const move = Math.abs(next - shift);
    shift = next;
    if (move <= SETTLED * Math.abs(shift)) break;
  }
  return shift;
}

/** (1 - sum of vector² / (pole - x)) times the distances from x to the two poles around it, which removes its infinities; and its slope. */
export function reducedSecular(
  poles: Float64Array,
  vector: Float64Array,
  m: number,
  origin: number,
  shift: number,
): { value: number; slope: number } {
  const base = poles[origin]!;
  let sum = 1;
  let slope = 0;
  for (let j = 0; j < poles.length; j++) {
    if (j === m) continue;
    if (j === m - 1) continue;
    const over = vector[j]! / (poles[j]! - base - shift);
    sum -= over * vector[j]!;
    slope -= over * over;
  }
  const above = poles[m]! - base - shift;
  const own = vector[m]! * vector[m]!;
  if (m === 0) return { value: above * sum - own, slope: above * slope - sum };
  const below = shift - (poles[m - 1]! - base);
  const other = vector[m - 1]! * vector[m - 1]!;
  return {
    value: below * above * sum - own * below + other * above,
    slope: (above - below) * sum + below * above * slope - own - other,
  };
}

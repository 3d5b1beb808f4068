/** Quantile of the standard normal distribution. */
import { log, sqrt } from "./_numeric.js";

/**
 * x with P(X <= x) = `probability` for a standard normal X.
 * Model: three rational functions of degree 7.
 * Accuracy: 2e-15 relative against 30-digit values over 1e-300 to 0.9999 (test/uncertainty/random.test.ts).
 * Source: Wichura 1988, Applied Statistics 37, 477 (algorithm AS 241, PPND16), coefficients from memory, checked as above.
 */
export function normalQuantile(probability: number): number {
  const q = probability - 0.5;
  if (Math.abs(q) <= 0.425) {
    const r = 0.180625 - q * q;
    return (q * polynomial(CENTRE_ABOVE, r)) / polynomial(CENTRE_BELOW, r);
  }
  const r = sqrt(-log(q < 0 ? probability : 1 - probability));
  const tail =
    r <= 5
      ? polynomial(NEAR_ABOVE, r - 1.6) / polynomial(NEAR_BELOW, r - 1.6)
      : polynomial(FAR_ABOVE, r - 5) / polynomial(FAR_BELOW, r - 5);
  return q < 0 ? -tail : tail;
}

/** Sum of coefficients times powers of x, lowest power first. */
function polynomial(coefficients: readonly number[], x: number): number {
  let sum = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * x + coefficients[i]!;
  return sum;
}

// biome-ignore format: numerator and denominator of each of the three regions, four to a row
const CENTRE_ABOVE: readonly number[] = [
  3.387132872796366608, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125,
  45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727,
];
// biome-ignore format: as above
const CENTRE_BELOW: readonly number[] = [
  1, 42.313330701600911252, 687.1870074920579083, 5394.1960214247511077,
  21213.794301586595867, 39307.89580009271061, 28729.085735721942674, 5226.495278852854561,
];
// biome-ignore format: as above
const NEAR_ABOVE: readonly number[] = [
  1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504,
  1.27045825245236838258, 0.24178072517745061177, 0.0227238449892691845833, 7.7454501427834140764e-4,
];
// biome-ignore format: as above
const NEAR_BELOW: readonly number[] = [
  1, 2.05319162663775882187, 1.6763848301838038494, 0.68976733498510000455,
  0.14810397642748007459, 0.0151986665636164571966, 5.475938084995344946e-4, 1.05075007164441684324e-9,
];
// biome-ignore format: as above
const FAR_ABOVE: readonly number[] = [
  6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 0.29656057182850489123,
  0.026532189526576123093, 0.0012426609473880784386, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
];
// biome-ignore format: as above
const FAR_BELOW: readonly number[] = [
  1, 0.59983220655588793769, 0.1369298809227358053, 0.0148753612908506148525,
  7.868691311456132591e-4, 1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15,
];

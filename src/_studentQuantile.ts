/** Two-sided quantile of Student's t: the factor from a standard to an expanded uncertainty. */
import { normalQuantile } from "./_normalQuantile.js";
import { exp, log, log1p, sqrt } from "./_numeric.js";

/** t with P(|T| <= t) = `probability` for Student's T of `degreesOfFreedom` (at least 1, Infinity for a normal T). */
export function studentQuantile(probability: number, degreesOfFreedom: number): number {
  const z = normalQuantile(0.5 + 0.5 * probability);
  if (degreesOfFreedom === Number.POSITIVE_INFINITY) return z;
  let t = expanded(z, degreesOfFreedom);
  if (degreesOfFreedom > 1e4) return t;
  const scale = exp(-logBeta(0.5 * degreesOfFreedom)) / sqrt(degreesOfFreedom);
  let [low, high] = [0, Number.POSITIVE_INFINITY];
  for (let step = 0; step < 100; step++) {
    const excess = 1 - studentTails(t, degreesOfFreedom) - probability;
    if (excess > 0) high = t;
    else low = t;
    const density =
      2 * scale * exp(-0.5 * (degreesOfFreedom + 1) * log1p((t * t) / degreesOfFreedom));
    const newton = t - excess / density;
    const next =
      newton > low && newton < high
        ? newton
        : high === Number.POSITIVE_INFINITY
          ? 2 * t
          : 0.5 * (low + high);
    if (Math.abs(next - t) <= 1e-14 * t) return next;
    t = next;
  }
  return t;
}

/** Student's t from the normal quantile z, Cornish-Fisher to the third power of 1/ν (Abramowitz & Stegun 26.7.5). */
function expanded(z: number, nu: number): number {
  const s = z * z;
  const first = (s + 1) * z;
  const second = ((5 * s + 16) * s + 3) * z;
  const third = (((3 * s + 19) * s + 17) * s - 15) * z;
  return z + (first / 4 + (second / 96 + third / (384 * nu)) / nu) / nu;
}

/** P(|T| > t): the regularised incomplete beta function I_x(ν/2, 1/2), x = ν / (ν + t²), by continued fraction. */
function studentTails(t: number, nu: number): number {
  const a = 0.5 * nu;
  const [x, y] = [nu / (nu + t * t), (t * t) / (nu + t * t)];
  const front = exp(-a * log1p((t * t) / nu) + 0.5 * log(y) - logBeta(a));
  if (x < (a + 1) / (a + 2.5)) return (front * betaFraction(x, a, 0.5)) / a;
  return 1 - 2 * front * betaFraction(y, 0.5, a);
}

/** The continued fraction of the incomplete beta function (Abramowitz & Stegun 26.5.8), by Lentz's method. */
function betaFraction(x: number, a: number, b: number): number {
  let c = 1;
  let d = 1 / (1 - ((a + b) * x) / (a + 1));
  let product = d;
  for (let m = 1; m < 1000; m++) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / (1 + even * d);
    c = 1 + even / c;
    product *= c * d;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / (1 + odd * d);
    c = 1 + odd / c;
    product *= c * d;
    if (Math.abs(c * d - 1) < 1e-16) break;
  }
  return product;
}

/** ln B(a, 1/2). */
function logBeta(a: number): number {
  return logGamma(a) + 0.5723649429247001 - logGamma(a + 0.5); // ln Γ(1/2) = ln(π) / 2
}

/** ln Γ(x), x >= 0.5: Stirling's series (Abramowitz & Stegun 6.1.41) after shifting x above 10. */
function logGamma(x: number): number {
  let product = 1;
  let s = x;
  for (; s < 10; s++) product *= s;
  const r = 1 / (s * s);
  const series = (1 / 12 - r * (1 / 360 - r * (1 / 1260 - r * (1 / 1680 - r / 1188)))) / s;
  return (s - 0.5) * log(s) - s + 0.9189385332046727 + series - log(product); // ln(2π) / 2
}

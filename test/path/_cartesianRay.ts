/** An independent ray: the eikonal equation in plane Cartesian coordinates, by Runge and Kutta, for tests. */

/** Index and densities of the air at a geometric height, and the Earth's radius. */
export interface TestAir {
  readonly earthRadiusM: number;
  readonly index: (heightM: number) => number;
  readonly densities: ((heightM: number) => number)[];
  /** Heights at which the air has kinks, rising; the last is its top. */
  readonly breaksM: readonly number[];
}

/** Where a ray is and goes, and what it has collected. */
export interface RayEnd {
  readonly x: number;
  readonly y: number;
  /** Angle of its direction from the observer's vertical, degrees. */
  readonly directionDeg: number;
  readonly sums: number[];
  /** n r sin z at the end over that at the start, less 1. */
  readonly drift: number;
}

/**
 * Follows dr/ds = t, d(n t)/ds = grad n from the observer (0, R + h) with steps that shrink near the ground and land on the
 * breaks. `stepM` is the step at the ground; it grows with height.
 */
export function cartesianRay(
  air: TestAir,
  observerM: number,
  apparentZenithDeg: number,
  stepM: number,
): RayEnd {
  const { earthRadiusM, index, densities, breaksM } = air;
  const top = breaksM.at(-1)!;
  const z = (apparentZenithDeg * Math.PI) / 180;
  const n0 = index(observerM);
  // position, optical direction n t, sums
  let state = [
    0,
    earthRadiusM + observerM,
    n0 * Math.sin(z),
    n0 * Math.cos(z),
    ...densities.map(() => 0),
  ];
  const height = (s: readonly number[]): number => {
    // sqrt(x² + y²) - R without losing the metres
    const rise = s[1]! - earthRadiusM;
    const excess = s[0]! * s[0]! + rise * (s[1]! + earthRadiusM);
    return excess / (Math.hypot(s[0]!, s[1]!) + earthRadiusM);
  };
  const slope = (s: readonly number[], low: number, high: number): number[] => {
    const h = Math.min(Math.max(height(s), low), high);
    const r = earthRadiusM + h;
    const d = 0.5;
    // one-sided at the ends so that no difference straddles a kink
    const [a, b] = [Math.max(low, h - d), Math.min(high, h + d)];
    const gradient = (index(b) - index(a)) / (b - a);
    const n = index(h);
    return [
      s[2]! / n,
      s[3]! / n,
      (gradient * s[0]!) / r,
      (gradient * s[1]!) / r,
      ...densities.map((density) => density(h)),
    ];
  };
  const moved = (s: readonly number[], k: readonly number[], ds: number): number[] =>
    s.map((v, i) => v + ds * k[i]!);
  const step = (s: readonly number[], ds: number, low: number, high: number): number[] => {
    const k1 = slope(s, low, high);
    const k2 = slope(moved(s, k1, ds / 2), low, high);
    const k3 = slope(moved(s, k2, ds / 2), low, high);
    const k4 = slope(moved(s, k3, ds), low, high);
    return s.map((v, i) => v + (ds / 6) * (k1[i]! + 2 * k2[i]! + 2 * k3[i]! + k4[i]!));
  };
  const levels = [0, ...breaksM];
  for (let guard = 0; guard < 1e6; guard++) {
    const h = height(state);
    const up = (state[0]! * state[2]! + state[1]! * state[3]!) / Math.hypot(state[0]!, state[1]!);
    const cell =
      up >= 0
        ? levels.filter((level) => level <= h + 1e-7).length - 1
        : levels.findIndex((level) => level >= h - 1e-7) - 1;
    if (h >= top - 1e-6) break;
    const [low, high] = [levels[Math.max(cell, 0)]!, levels[Math.max(cell, 0) + 1]!];
    let ds = stepM * (1 + h / 10_000);
    let next = step(state, ds, low, high);
    const edge = height(next) > high ? high : height(next) < low ? low : undefined;
    if (edge !== undefined) {
      // land on the break: secant on the step length
      let [a, fa, b] = [0, h - edge, ds];
      let fb = height(next) - edge;
      for (let i = 0; i < 60 && Math.abs(fb) > 1e-8; i++) {
        const c = b - (fb * (b - a)) / (fb - fa);
        [a, fa] = [b, fb];
        b = c;
        fb = height(step(state, b, low, high)) - edge;
      }
      ds = b;
      next = step(state, ds, low, high);
    }
    state = next;
  }
  const nEnd = Math.hypot(state[2]!, state[3]!);
  const invariant = state[1]! * state[2]! - state[0]! * state[3]!;
  const start = n0 * (earthRadiusM + observerM) * Math.sin(z);
  // Snell at the top, from n to 1: the tangential part stays
  const r = Math.hypot(state[0]!, state[1]!);
  const outside = Math.asin(invariant / r) + Math.atan2(state[0]!, state[1]!);
  return {
    x: state[0]! / nEnd,
    y: state[1]! / nEnd,
    directionDeg: (outside * 180) / Math.PI,
    sums: state.slice(4),
    drift: invariant / start - 1,
  };
}

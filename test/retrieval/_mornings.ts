/** Invented mornings of readings, from a seeded generator written apart from the library. */

/** Numbers in [0, 1) that are the same for the same seed (mulberry32, public domain, from memory). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t = (t + Math.imul(t ^ (t >>> 7), t | 61)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Normal deviates of mean 0 and deviation 1 from a uniform source (Box and Muller). */
export function normal(uniform: () => number): () => number {
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}

/** A morning at equal steps of time: the sun climbs, the air mass falls; a share of readings in the middle is behind cloud. */
export function morning(choice: {
  seed: number;
  count: number;
  constant: number;
  opticalDepth: number;
  noise: number;
  cloudShare: number;
}): { airMasses: number[]; signals: number[]; cloudy: number[] } {
  const uniform = seeded(choice.seed);
  const gauss = normal(uniform);
  const sines = Array.from({ length: choice.count }, (_, i) => {
    const hour = i / (choice.count - 1);
    return Math.sin((0.125 + hour * 0.605 * (1 - 0.1 * hour)) * 1.0);
  });
  const airMasses = sines.map((sine) => 1 / sine);
  const first = Math.floor((choice.count * (1 - choice.cloudShare)) / 2);
  const last = first + Math.round(choice.count * choice.cloudShare);
  const cloudy = airMasses.map((_, i) => i).filter((i) => i >= first && i < last);
  const signals = airMasses.map((mass, i) => {
    const cloud = cloudy.includes(i) ? 0.02 + 0.8 * uniform() ** 2 : 0;
    const depth = choice.opticalDepth + cloud;
    return choice.constant * 10 ** (-Math.LOG10E * depth * mass) * (1 + choice.noise * gauss());
  });
  return { airMasses, signals, cloudy };
}

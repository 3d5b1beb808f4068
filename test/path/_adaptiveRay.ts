/** An independent ray: its differential equation in height and zenith angle over arc length, with steps that follow the error, for tests. */
import { dryLayer, LAYER_TOPS_M, testRefractivity } from "./_dryStandardAir.js";

const EARTH_M = 6371000;
/** Error allowed in a step: of the height 1e-8 m, of everything else this share. */
const TOLERANCE = 1e-12;

/** What a ray from the observer to the top of dry standard air has gathered. */
export interface AdaptiveRay {
  /** Angle between the ray outside the air and at the observer, arcsec. */
  readonly refractionArcsec: number;
  /** Pressure over temperature, ozone and water summed along the ray. */
  readonly sums: readonly number[];
}

/** Dormand & Prince 1980, J. Comput. Appl. Math. 6, 19 (from memory; the rows add up to their nodes, which is checked). */
const NODES = [0, 1 / 5, 3 / 10, 4 / 5, 8 / 9, 1, 1];
const ROWS = [
  [],
  [1 / 5],
  [3 / 40, 9 / 40],
  [44 / 45, -56 / 15, 32 / 9],
  [19372 / 6561, -25360 / 2187, 64448 / 6561, -212 / 729],
  [9017 / 3168, -355 / 33, 46732 / 5247, 49 / 176, -5103 / 18656],
  [35 / 384, 0, 500 / 1113, 125 / 192, -2187 / 6784, 11 / 84],
];
const FOURTH = [5179 / 57600, 0, 7571 / 16695, 393 / 640, -92097 / 339200, 187 / 2100, 1 / 40];
ROWS.forEach((row, i) => {
  const sum = row.reduce((a, b) => a + b, 0);
  if (Math.abs(sum - NODES[i]!) > 1e-14)
    throw new Error(`row ${i} of the method adds up to ${sum}`);
});

/** n - 1 and its slope per metre in one layer, the layer's formulas carried on past its ends. */
function refractivity(layer: number, heightM: number): [number, number] {
  const at = (h: number): number => {
    const [t, p] = dryLayer(layer, h);
    return testRefractivity(550, t, p, 0, 450);
  };
  const d = 20; // fourth order: (20 m / 8 km)^4 / 30 of the slope, 1e-12
  const far = at(heightM - 2 * d) - at(heightM + 2 * d);
  return [at(heightM), (far + 8 * (at(heightM + d) - at(heightM - d))) / (12 * d)];
}

/** Follows height, zenith angle, bending and sums over arc length; lands on the ends of the layers it leaves. */
export function adaptiveRay(altitudeM: number, apparentZenithDeg: number): AdaptiveRay {
  let layer = LAYER_TOPS_M.findIndex((top) => top > altitudeM);
  let state = [altitudeM, (apparentZenithDeg * Math.PI) / 180, 0, 0, 0, 0];
  const slope = ([h, z]: readonly number[]): number[] => {
    const [index, gradient] = refractivity(layer, h!);
    const bend = (gradient / (1 + index)) * Math.sin(z!);
    const [t, p] = dryLayer(layer, h!);
    const ozone = Math.exp(-0.5 * ((h! - 22000) / 5000) ** 2);
    const turn = -Math.sin(z!) / (EARTH_M + h!) - bend;
    return [Math.cos(z!), turn, -bend, p / t, ozone, Math.exp(-h! / 2000)];
  };
  const step = (from: readonly number[], ds: number): { to: number[]; error: number } => {
    const k: number[][] = [];
    for (const row of ROWS) {
      k.push(slope(from.map((v, i) => v + ds * row.reduce((sum, a, j) => sum + a * k[j]![i]!, 0))));
    }
    const add = (weights: readonly number[]): number[] =>
      from.map((v, i) => v + ds * weights.reduce((sum, w, j) => sum + w * k[j]![i]!, 0));
    const [to, other] = [add(ROWS[6]!), add(FOURTH)];
    const scales = [1e4, 1, 1e-3, 1e6, 1e4, 1e3];
    return { to, error: Math.max(...to.map((v, i) => Math.abs(v - other[i]!) / scales[i]!)) };
  };
  for (let ds = 100; layer < LAYER_TOPS_M.length; ) {
    const [bottom, top] = [LAYER_TOPS_M[layer - 1] ?? 0, LAYER_TOPS_M[layer]!];
    const { to, error } = step(state, ds);
    const growth = Math.min(4, Math.max(0.2, 0.9 * (TOLERANCE / Math.max(error, 1e-300)) ** 0.2));
    if (error > TOLERANCE) {
      ds *= growth;
      continue;
    }
    if (to[0]! < top && to[0]! > bottom) {
      state = to;
      ds *= growth;
      continue;
    }
    // land on the layer's end: halving between no step and this one
    const edge = to[0]! < top ? bottom : top;
    const beyond = (h: number): boolean => (edge === top ? h > top : h < bottom);
    let [short, long, landed] = [0, ds, to];
    for (let i = 0; i < 60 && Math.abs(landed[0]! - edge) > 1e-9; i++) {
      const middle = (short + long) / 2;
      landed = step(state, middle).to;
      if (beyond(landed[0]!)) long = middle;
      else short = middle;
    }
    state = landed;
    layer += edge === top ? 1 : -1;
  }
  const [, z, bending, ...sums] = state;
  const last = refractivity(LAYER_TOPS_M.length - 1, LAYER_TOPS_M.at(-1)!)[0];
  const exit = last * Math.tan(z!); // Snell's law out of n - 1 of 1e-9, to first order
  return { refractionArcsec: (bending! + exit) * (648000 / Math.PI), sums };
}

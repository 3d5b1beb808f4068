/** Dry standard air at 550 nm written out again, apart from src, for independent rays. */
import type { TestAir } from "./_cartesianRay.js";

const BASES = [0, 11e3, 20e3, 32e3, 47e3, 51e3, 71e3, Number.POSITIVE_INFINITY];
const LAPSES = [-0.0065, 0, 0.001, 0.0028, 0, -0.0028, -0.002];
const GMR = (9.80665 * 0.0289644) / 8.31432;

/** Temperature K and pressure Pa of the US Standard Atmosphere 1976 at a geometric height. */
export function dryStandard(heightM: number): [number, number] {
  const geopotential = (6356766 * heightM) / (6356766 + heightM);
  let [t, p] = [288.15, 101325];
  for (let i = 0; i < 7 && (i === 0 || geopotential > BASES[i]!); i++) {
    const climb = Math.min(geopotential, BASES[i + 1]!) - BASES[i]!;
    const above = t + LAPSES[i]! * climb;
    p *= LAPSES[i] === 0 ? Math.exp((-GMR * climb) / t) : (t / above) ** (GMR / LAPSES[i]!);
    t = above;
  }
  return [t, p];
}

/** Tops of the layers of the standard atmosphere and of the air, geometric m. */
export const LAYER_TOPS_M: readonly number[] = [
  ...BASES.slice(1, 7).map((h) => (6356766 * h) / (6356766 - h)),
  86000,
];

/** Temperature K and pressure Pa by the formulas of one layer, also outside it: no kink anywhere. */
export function dryLayer(layer: number, heightM: number): [number, number] {
  const geopotential = (6356766 * heightM) / (6356766 + heightM);
  let [t, p] = [288.15, 101325];
  for (let i = 0; i <= layer; i++) {
    const climb = (i === layer ? geopotential : BASES[i + 1]!) - BASES[i]!;
    const above = t + LAPSES[i]! * climb;
    p *= LAPSES[i] === 0 ? Math.exp((-GMR * climb) / t) : (t / above) ** (GMR / LAPSES[i]!);
    t = above;
  }
  return [t, p];
}

function compressibility(p: number, t: number, x: number): number {
  const c = t - 273.15;
  const first =
    1.58123e-6 -
    2.9331e-8 * c +
    1.1043e-10 * c * c +
    (5.707e-6 - 2.051e-8 * c) * x +
    (1.9898e-4 - 2.376e-6 * c) * x * x;
  return 1 - (p / t) * first + (p / t) ** 2 * (1.83e-11 - 0.765e-8 * x * x);
}

/** n - 1 by Ciddor's formulas at any state, without ranges. */
export function testRefractivity(nm: number, t: number, p: number, x: number, co2: number): number {
  const s = (1000 / nm) ** 2;
  const dry =
    (5792105 / (238.0185 - s) + 167917 / (57.362 - s)) * (1 + 0.534e-6 * (co2 - 450)) * 1e-8;
  const vapour = 1.022e-8 * (295.235 + 2.6422 * s - 0.03238 * s * s + 0.004028 * s ** 3);
  const moles = p / (compressibility(p, t, x) * t);
  const dryMoles = 101325 / (compressibility(101325, 288.15, 0) * 288.15);
  const vapourMoles = 1333 / (compressibility(1333, 293.15, 1) * 293.15);
  return (dry * moles * (1 - x)) / dryMoles + (vapour * moles * x) / vapourMoles;
}

/** Air, ozone (22 km, 5 km) and water (2 km), for an Earth of 6371 km. */
export const dryStandardAir: TestAir = {
  earthRadiusM: 6371000,
  index: (heightM) => {
    const [t, p] = dryStandard(heightM);
    return 1 + testRefractivity(550, t, p, 0, 450);
  },
  densities: [
    (heightM) => {
      const [t, p] = dryStandard(heightM);
      return p / t;
    },
    (heightM) => Math.exp(-(((heightM - 22000) / 5000) ** 2) / 2),
    (heightM) => Math.exp(-heightM / 2000),
  ],
  breaksM: LAYER_TOPS_M,
};

/** Air in spherical shells: the standard atmosphere's molecules and a layer of ozone, scaled to given optical depths. */
import { BASE_M, GEOPOTENTIAL_RADIUS_M, standardState } from "../air/_standardLayers.js";
import { exp, log } from "../_numeric.js";

/** Mean radius of the Earth, m (IUGG, rounded). */
const EARTH_RADIUS_M = 6_371_000;
/** Height where the air ends, m above the ground. */
export const TOP_M = 120_000;
/** Step of the tables, m. */
const STEP_M = 100;
/** Highest point of the standard atmosphere, m above sea level; beyond it density falls on at the rate it has there. */
const STANDARD_TOP_M = 86_000;
/** Height and breadth of the ozone layer, m: column above h in proportion to 1 / (1 + exp((h - 20 km) / 5 km)) (Lacis & Hansen 1974, from memory). */
const OZONE_HEIGHT_M = 20_000;
const OZONE_BREADTH_M = 5_000;

/** Air at one wavelength in shells around the Earth. */
export interface ShellAir {
  /** Distance of the ground from the Earth's centre, m. */
  readonly groundM: number;
  /** Heights above the ground where the gradient of density changes, m. */
  readonly kinks: readonly number[];
  /** Logarithm of the scattering coefficient (per m) at every step of height above the ground. */
  readonly lnScattering: Float64Array;
  /** Logarithm of the extinction coefficient (per m), ozone included. */
  readonly lnExtinction: Float64Array;
}

/** Air over a ground at `altitudeM` with the vertical optical depths given. */
export function shellAir(rayleighDepth: number, ozoneDepth: number, altitudeM: number): ShellAir {
  const count = TOP_M / STEP_M + 1;
  const molecules = new Float64Array(count);
  const ozone = new Float64Array(count);
  for (let k = 0; k < count; k++) {
    molecules[k] = moleculeDensity(altitudeM + k * STEP_M);
    const x = exp(-Math.abs(altitudeM + k * STEP_M - OZONE_HEIGHT_M) / OZONE_BREADTH_M);
    ozone[k] = x / ((1 + x) * (1 + x));
  }
  const scattering = rayleighDepth / column(molecules);
  const absorption = ozoneDepth / column(ozone);
  return {
    groundM: EARTH_RADIUS_M + altitudeM,
    kinks: [...BASE_M.slice(1).map(geometricHeight), STANDARD_TOP_M].map((m) => m - altitudeM),
    lnScattering: molecules.map((density) => log(scattering * density)),
    lnExtinction: molecules.map((density, k) => log(scattering * density + absorption * ozone[k]!)),
  };
}

/** Molecules per m³ at a height above sea level. */
function moleculeDensity(heightM: number): number {
  if (heightM <= STANDARD_TOP_M) return standardState(heightM).numberDensityM3;
  const top = standardState(STANDARD_TOP_M).numberDensityM3;
  const rate = log(standardState(STANDARD_TOP_M - 1000).numberDensityM3 / top) / 1000;
  return top * exp(-rate * (heightM - STANDARD_TOP_M));
}

/** Geometric height of a geopotential height, both m. */
function geometricHeight(geopotentialM: number): number {
  return (GEOPOTENTIAL_RADIUS_M * geopotentialM) / (GEOPOTENTIAL_RADIUS_M - geopotentialM);
}

/** Integral over height of a table that falls or rises exponentially from step to step. */
function column(density: Float64Array): number {
  let sum = 0;
  for (let k = 1; k < density.length; k++) {
    const [a, b] = [density[k - 1]!, density[k]!];
    const ratio = log(a / b);
    sum += Math.abs(ratio) < 1e-3 ? 0.5 * (a + b) : (a - b) / ratio;
  }
  return sum * STEP_M;
}

/** Coefficient at a height above the ground from its table of logarithms. */
export function coefficientAt(table: Float64Array, heightM: number): number {
  const place = Math.min(Math.max(heightM / STEP_M, 0), table.length - 1.000001);
  const k = Math.floor(place);
  const lower = table[k]!;
  return exp(lower + (place - k) * (table[k + 1]! - lower));
}

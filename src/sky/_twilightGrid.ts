/** The grid of heights and sun angles that carries light of higher orders. */
import { acos } from "../_numeric.js";
import { DEGREES_PER_RADIAN } from "../units.js";
import { RAY_TOP_M } from "./_rays.js";

/** Heights: 116 km (i / 15)². */
export const HEIGHTS = 16;
/** Sun angles: every 12° to 84°, every 1° from there to 110°. */
export const ANGLES = 34;
/** Grid points: heights times angles. */
export const NODES = 544;
/** Tensor components of all grid points, four to each. */
export const TENSORS = 2176;
/** Unknowns: the tensors, then the diffuse irradiance of the ground under each sun. */
export const UNKNOWNS = 2210;
const COARSE_DEG = 12;
const COARSE = 7;
const FINE_FROM_DEG = 84;

/** Height of row i, m. */
export function gridHeight(i: number): number {
  const root = i / (HEIGHTS - 1);
  return RAY_TOP_M * root * root;
}

/** Sun angle of column j, degrees. */
export function gridAngle(j: number): number {
  return j < COARSE ? COARSE_DEG * j : FINE_FROM_DEG + j - COARSE;
}

/** Column of a sun of cosine `cosine`, as a real number below ANGLES - 1. */
export function gridColumn(cosine: number): number {
  const angle = acos(Math.max(-1, Math.min(1, cosine))) * DEGREES_PER_RADIAN;
  const column = angle < FINE_FROM_DEG ? angle / COARSE_DEG : COARSE + angle - FINE_FROM_DEG;
  return Math.min(column, ANGLES - 1.000001);
}

/** The four grid points around a place: the first, then one column on, one row on, both on. */
export interface GridPlace {
  node: number;
  s00: number;
  s01: number;
  s10: number;
  s11: number;
  /** Logarithm of the reference there. */
  ln: number;
}

/** Writes to `place` where a height and a sun's cosine lie in the grid. */
export function findPlace(
  heightM: number,
  cosine: number,
  lnReference: Float64Array,
  place: GridPlace,
): void {
  const most = HEIGHTS - 1.000001;
  const row = Math.min(Math.sqrt(Math.max(heightM, 0) / RAY_TOP_M) * (HEIGHTS - 1), most);
  const column = gridColumn(cosine);
  const i = Math.floor(row);
  const j = Math.floor(column);
  const v = row - i;
  const u = column - j;
  const node = i * ANGLES + j;
  place.node = node;
  place.s00 = (1 - v) * (1 - u);
  place.s01 = (1 - v) * u;
  place.s10 = v * (1 - u);
  place.s11 = v * u;
  place.ln =
    place.s00 * lnReference[node]! +
    place.s01 * lnReference[node + 1]! +
    place.s10 * lnReference[node + ANGLES]! +
    place.s11 * lnReference[node + ANGLES + 1]!;
}

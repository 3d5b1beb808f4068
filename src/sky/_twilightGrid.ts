/** The grid of heights and sun angles that carries light of higher orders. */
import { acos, cos, expm1, log } from "../_numeric.js";
import { DEGREES_PER_RADIAN, RADIANS_PER_DEGREE } from "../units.js";
import { RAY_TOP_M } from "./_rays.js";

/** Heights: 116 km (i / 15)². */
export const HEIGHTS = 16;
/** Sun angles: every 20° to 60°, every 3° to 84°, every 1° from there to 110°. */
export const ANGLES = 38;
/** Grid points: heights times angles. */
export const NODES = 608;
/** Tensor components of all grid points, four to each. */
export const TENSORS = 2432;
/** Unknowns: the tensors, then the diffuse irradiance of the ground under each sun. */
export const UNKNOWNS = 2470;
/** Columns from which the sun is low, and from which it is about to set: before that light goes as the sun's cosine, then as an exponential. */
const LOW = 3;
const SETTING = 11;
const LOW_DEG = 60;
const SETTING_DEG = 84;

/** Height of row i, m. */
export function gridHeight(i: number): number {
  const root = i / (HEIGHTS - 1);
  return RAY_TOP_M * root * root;
}

/** Sun angle of column j, degrees. */
export function gridAngle(j: number): number {
  if (j < LOW) return 20 * j;
  return j < SETTING ? LOW_DEG + 3 * (j - LOW) : SETTING_DEG + j - SETTING;
}

/** Column of a sun of cosine `cosine`, as a real number below ANGLES - 1; between high suns it counts by the cosine. */
export function gridColumn(cosine: number): number {
  const angle = acos(Math.max(-1, Math.min(1, cosine))) * DEGREES_PER_RADIAN;
  if (angle >= SETTING_DEG) return Math.min(SETTING + angle - SETTING_DEG, ANGLES - 1.000001);
  const j = angle < LOW_DEG ? Math.floor(angle / 20) : LOW + Math.floor((angle - LOW_DEG) / 3);
  const [from, to] = [gridAngle(j), gridAngle(j + 1)].map((deg) => cos(deg * RADIANS_PER_DEGREE));
  return j + Math.max(0, (from! - cosine) / (from! - to!));
}

/** Logarithm of a reference between columns j and j + 1 from those there: straight in the reference itself while the sun is high. */
export function lnBetween(j: number, u: number, here: number, next: number): number {
  return j < SETTING ? here + log(1 + u * expm1(next - here)) : here + u * (next - here);
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
  const next = node + ANGLES;
  place.ln =
    (1 - v) * lnBetween(j, u, lnReference[node]!, lnReference[node + 1]!) +
    v * lnBetween(j, u, lnReference[next]!, lnReference[next + 1]!);
}

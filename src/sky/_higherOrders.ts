/** Light scattered more than once in shells of air, on a grid of height and sun angle. */
import { acos, cos, exp, log, sin } from "../_numeric.js";
import { DEGREES_PER_RADIAN, RADIANS_PER_DEGREE } from "../units.js";
import { gaussPoint } from "./_nodes.js";
import { type Ray, RAY_TOP_M, ray, type ShellSky } from "./_rays.js";
import { sunlightAt } from "./_slantDepth.js";

/** Heights of the grid: 100 km (i / 15)². */
export const HEIGHTS = 16;
/** Sun angles of the grid: every 12° to 84°, every 1° from there to 110°. */
export const ANGLES = 34;
const COARSE_DEG = 12;
const FINE_FROM = 7;
const FINE_FROM_DEG = 84;
/** Components of the field tensor: xx, yy, zz, xz; x horizontal towards the sun, z up. */
const COMPONENTS = 4;
const STATES = HEIGHTS * ANGLES * COMPONENTS;
/** Azimuths around a grid point on one side of the sun's vertical plane, and points to a stretch of ray. */
const AZIMUTHS = 8;
const RAY_POINTS = 14;

/** Field tensors of the light that was scattered (or came from the ground) before, relative to a reference. */
export interface HigherOrders {
  /** Logarithm of the reference at each grid point: trace of the tensor of the first such light. */
  readonly lnReference: Float64Array;
  /** Tensor components over the reference, four to a grid point. */
  readonly tensors: Float64Array;
}

/** Grid heights in m. */
export function gridHeight(i: number): number {
  const root = i / (HEIGHTS - 1);
  return RAY_TOP_M * root * root;
}

/** Grid sun angles in degrees. */
export function gridAngle(j: number): number {
  return j < FINE_FROM ? COARSE_DEG * j : FINE_FROM_DEG + j - FINE_FROM;
}

/** Place in the grid: rows and columns as real numbers. */
export function gridRow(heightM: number): number {
  return Math.min(Math.sqrt(Math.max(heightM, 0) / RAY_TOP_M) * (HEIGHTS - 1), HEIGHTS - 1.000001);
}
export function gridColumn(cosine: number): number {
  const angle = acos(Math.max(-1, Math.min(1, cosine))) * DEGREES_PER_RADIAN;
  const column = angle < FINE_FROM_DEG ? angle / COARSE_DEG : FINE_FROM + angle - FINE_FROM_DEG;
  return Math.min(column, ANGLES - 1.000001);
}

/** A direction to look in from a grid point, without azimuth. */
interface Polar {
  readonly cosine: number;
  readonly weight: number;
  readonly ray: Ray;
}

/** Solves for the light of all higher orders. */
export function higherOrders(sky: ShellSky, dipole: number, albedo: number): HigherOrders {
  const size = STATES + ANGLES;
  const polars = Array.from({ length: HEIGHTS }, (_, i) => polarDirections(sky, gridHeight(i)));
  const first = new Float64Array(size);
  forEachRay(sky, polars, (p) => addSunlit(sky, p, dipole, albedo, first));
  const traces = new Float64Array(HEIGHTS * ANGLES);
  for (let g = 0; g < traces.length; g++) {
    const at = COMPONENTS * g;
    traces[g] = first[at]! + first[at + 1]! + first[at + 2]!;
  }
  const lnReference = reference(traces);
  const lnGround = reference(first.subarray(STATES));
  for (let k = 0; k < STATES; k++) first[k]! *= exp(-lnReference[Math.floor(k / COMPONENTS)]!);
  for (let j = 0; j < ANGLES; j++) first[STATES + j]! *= exp(-lnGround[j]!);
  const kernel = new Float64Array(size * size);
  forEachRay(sky, polars, (p) => addKernel(p, dipole, albedo, lnReference, lnGround, kernel));
  return { lnReference, tensors: sumOrders(first, kernel).slice(0, STATES) };
}

/** Logarithms of `values`, rows of ANGLES, that fall by no more than a factor e² to the next sun angle. */
function reference(values: Float64Array): Float64Array {
  const ln = new Float64Array(values.length);
  for (let g = 0; g < values.length; g++) {
    const own = log(Math.max(values[g]!, 1e-300));
    ln[g] = g % ANGLES === 0 ? own : Math.max(own, ln[g - 1]! - 2);
  }
  return ln;
}

/** first + kernel first + kernel² first + ..., until an order adds less than 1e-5 of the reference. */
function sumOrders(first: Float64Array, kernel: Float64Array): Float64Array {
  const size = first.length;
  const total = first.slice();
  let order = first;
  for (let n = 0; n < 200; n++) {
    const next = new Float64Array(size);
    let most = 0;
    for (let r = 0; r < size; r++) {
      let [a, b] = [0, 0];
      const row = r * size;
      for (let c = 0; c < size; c += 2) {
        a += kernel[row + c]! * order[c]!;
        b += kernel[row + c + 1]! * order[c + 1]!;
      }
      next[r] = a + b;
      total[r]! += a + b;
      most = Math.max(most, Math.abs(a + b) / Math.max(Math.abs(total[r]!), 1e-3));
    }
    order = next;
    if (most < 1e-5) break;
  }
  return total;
}

/** Directions around a grid point: above its horizontal, between that and the Earth's limb, and onto the ground. */
function polarDirections(sky: ShellSky, heightM: number): Polar[] {
  const ratio = sky.air.groundM / (sky.air.groundM + heightM);
  const limb = -Math.sqrt(1 - ratio * ratio);
  const list: Polar[] = [];
  const add = (from: number, to: number, count: number): void => {
    if (to === from) return;
    for (let k = 0; k < count; k++) {
      const { point, weight } = gaussPoint(count, k);
      const x = 0.5 * (1 + point);
      const cosine = from + (to - from) * x * x;
      list.push({
        cosine,
        weight: weight * x * Math.abs(to - from),
        ray: ray(sky, heightM, cosine, RAY_POINTS),
      });
    }
  };
  add(0, 1, 8);
  if (limb < 0) add(limb, 0, 5);
  add(limb, -1, 6);
  return list;
}

/** One ray from one grid point under one sun. */
interface Probe {
  readonly row: number;
  readonly column: number;
  readonly heightM: number;
  readonly radius: number;
  readonly groundM: number;
  readonly ray: Ray;
  /** Solid angle it stands for, both sides of the sun's plane. */
  readonly solid: number;
  /** Cosines: sun from the vertical, ray from the vertical, ray from the sun. */
  readonly sun: number;
  readonly view: number;
  readonly between: number;
  /** Two unit vectors square to the ray (x, z of the first; x of the second, whose z is 0) and their y. */
  readonly e1: readonly [number, number, number];
  readonly e2: readonly [number, number, number];
  /** Their cosines from the sun. */
  readonly sun1: number;
  readonly sun2: number;
}

function forEachRay(sky: ShellSky, polars: Polar[][], visit: (probe: Probe) => void): void {
  const { groundM } = sky.air;
  for (let row = 0; row < HEIGHTS; row++) {
    const heightM = gridHeight(row);
    for (let column = 0; column < ANGLES; column++) {
      const angle = gridAngle(column) * RADIANS_PER_DEGREE;
      const [sun, sine] = [cos(angle), sin(angle)];
      for (const { cosine: view, weight, ray: path } of polars[row]!) {
        const s = Math.sqrt(1 - view * view);
        for (let k = 0; k < AZIMUTHS; k++) {
          const azimuth = (Math.PI * (k + 0.5)) / AZIMUTHS;
          const [x, y] = [cos(azimuth), sin(azimuth)];
          visit({
            row, column, heightM, groundM, radius: groundM + heightM, ray: path,
            solid: (2 * Math.PI * weight) / AZIMUTHS,
            sun, view,
            between: s * x * sine + view * sun,
            e1: [view * x, view * y, -s],
            e2: [-y, x, 0],
            sun1: view * x * sine - s * sun,
            sun2: -y * sine,
          });
        }
      }
    }
  }
}

/** Adds field `a` along e1, `b` along e2 and `g` between them, as a tensor, to four values of `out`. */
function addTensor(out: Float64Array, at: number, p: Probe, a: number, b: number, g: number): void {
  const [x1, y1, z1] = p.e1;
  const [x2, y2] = p.e2;
  out[at]! += a * x1 * x1 + b * x2 * x2 + 2 * g * x1 * x2;
  out[at + 1]! += a * y1 * y1 + b * y2 * y2 + 2 * g * y1 * y2;
  out[at + 2]! += a * z1 * z1;
  out[at + 3]! += (a * x1 + g * x2) * z1;
}

/** Adds to a grid point what one ray brings of sunlight scattered once or reflected by the ground. */
function addSunlit(
  sky: ShellSky,
  p: Probe,
  dipole: number,
  albedo: number,
  out: Float64Array,
): void {
  const { paths, heights, weights, groundPath, fromGround } = p.ray;
  let sum = 0;
  for (let k = 0; k < paths.length; k++) {
    const cosine = (p.radius * p.sun + paths[k]! * p.between) / (p.groundM + heights[k]!);
    sum += weights[k]! * sunlightAt(sky.table, heights[k]!, cosine);
  }
  const scale = 0.375 * sum * p.solid;
  const even = (1 - dipole) / 3;
  let a = scale * (0.5 * dipole * (1 - p.sun1 * p.sun1) + even);
  let b = scale * (0.5 * dipole * (1 - p.sun2 * p.sun2) + even);
  const g = -scale * 0.5 * dipole * p.sun1 * p.sun2;
  if (groundPath >= 0 && albedo > 0) {
    const cosine = (p.radius * p.sun + groundPath * p.between) / p.groundM;
    const lit = cosine > 0 ? albedo * cosine * sunlightAt(sky.table, 0, cosine) : 0;
    a += 0.5 * lit * fromGround * p.solid;
    b += 0.5 * lit * fromGround * p.solid;
  }
  addTensor(out, COMPONENTS * (p.row * ANGLES + p.column), p, a, b, g);
  if (p.row === 0 && p.view > 0) out[STATES + p.column]! += p.view * (a + b);
}

/** Adds what one ray brings a grid point of the light at every other grid point. */
function addKernel(
  p: Probe,
  dipole: number,
  albedo: number,
  lnReference: Float64Array,
  lnGround: Float64Array,
  kernel: Float64Array,
): void {
  const size = STATES + ANGLES;
  const here = p.row * ANGLES + p.column;
  const { paths, heights, weights, groundPath, fromGround } = p.ray;
  const [x1, y1, z1] = p.e1;
  const [x2, y2] = p.e2;
  const parts = new Float64Array(3 * COMPONENTS);
  const toGround = p.row === 0 && p.view > 0 ? exp(lnReference[here]! - lnGround[p.column]!) * p.view : 0;
  const add = (target: number, source: number, a: number, b: number, g: number): void => {
    kernel[target + source]! += a * x1 * x1 + b * x2 * x2 + 2 * g * x1 * x2;
    kernel[target + size + source]! += a * y1 * y1 + b * y2 * y2 + 2 * g * y1 * y2;
    kernel[target + 2 * size + source]! += a * z1 * z1;
    kernel[target + 3 * size + source]! += (a * x1 + g * x2) * z1;
    if (toGround > 0) kernel[(STATES + p.column) * size + source]! += toGround * (a + b);
  };
  const target = COMPONENTS * here * size;
  for (let k = 0; k < paths.length; k++) {
    const radius = p.groundM + heights[k]!;
    const sun = (p.radius * p.sun + paths[k]! * p.between) / radius;
    emission(p.sun1, p.sun2, (z1 * p.radius) / radius, sun, dipole, parts);
    const row = gridRow(heights[k]!);
    const column = gridColumn(sun);
    const [i, j] = [Math.floor(row), Math.floor(column)];
    const [v, u] = [row - i, column - j];
    const node = i * ANGLES + j;
    const nodes = [node, node + 1, node + ANGLES, node + ANGLES + 1];
    const shares = [(1 - v) * (1 - u), (1 - v) * u, v * (1 - u), v * u];
    let ln = -lnReference[here]!;
    for (let n = 0; n < 4; n++) ln += shares[n]! * lnReference[nodes[n]!]!;
    const scale = weights[k]! * p.solid * exp(ln);
    for (let n = 0; n < 4; n++) {
      const f = scale * shares[n]!;
      for (let c = 0; c < COMPONENTS; c++) {
        add(target, COMPONENTS * nodes[n]! + c, f * parts[c]!, f * parts[4 + c]!, f * parts[8 + c]!);
      }
    }
  }
  if (groundPath >= 0 && albedo > 0) {
    const column = gridColumn((p.radius * p.sun + groundPath * p.between) / p.groundM);
    const j = Math.floor(column);
    const u = column - j;
    const ln = (1 - u) * lnGround[j]! + u * lnGround[j + 1]! - lnReference[here]!;
    const lit = (0.5 * albedo * fromGround * p.solid * exp(ln)) / Math.PI;
    add(target, STATES + j, (1 - u) * lit, (1 - u) * lit, 0);
    add(target, STATES + j + 1, u * lit, u * lit, 0);
  }
}

/**
 * What air emits towards e1, e2 for each unit component of the field tensor there, per scattering coefficient and solid
 * angle: along e1 (four values), along e2 (four), between them (four). `sun1`, `sun2` are the cosines of e1, e2 from the sun,
 * `z1` that of e1 from the vertical of the place; e2 is horizontal there.
 */
export function emission(
  sun1: number,
  sun2: number,
  z1: number,
  sun: number,
  dipole: number,
  parts: Float64Array,
): void {
  const sine = Math.sqrt(Math.max(1 - sun * sun, 1e-18));
  const x1 = (sun1 - sun * z1) / sine;
  const x2 = sun2 / sine;
  const scale = 0.375 / Math.PI;
  const d = scale * dipole;
  const even = (scale * (1 - dipole)) / 3;
  parts[0] = d * x1 * x1 + even;
  parts[1] = d * (1 - x1 * x1 - z1 * z1) + even;
  parts[2] = d * z1 * z1 + even;
  parts[3] = 2 * d * x1 * z1;
  parts[4] = d * x2 * x2 + even;
  parts[5] = d * (1 - x2 * x2) + even;
  parts[6] = even;
  parts[7] = 0;
  parts[8] = d * x1 * x2;
  parts[9] = -d * x1 * x2;
  parts[10] = 0;
  parts[11] = d * x2 * z1;
}

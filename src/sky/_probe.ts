/** A ray from a point of the twilight grid. */
import type { Ray } from "./_rays.js";

/** One ray from one grid point under one sun. */
export interface Probe {
  /** Row and column of the grid point, and its distance from the Earth's centre, m. */
  row: number;
  column: number;
  radius: number;
  readonly groundM: number;
  ray: Ray;
  /** Solid angle the ray stands for, on both sides of the sun's plane. */
  solid: number;
  /** Cosines: sun from the vertical, ray from the vertical, ray from the sun. */
  sun: number;
  view: number;
  between: number;
  /** Two unit vectors square to the ray: the first in its vertical plane, the second horizontal (no z). */
  x1: number;
  y1: number;
  z1: number;
  x2: number;
  y2: number;
  /** Their cosines from the sun. */
  sun1: number;
  sun2: number;
}

/** What of a probe is not known before its sun and azimuth. */
export const NOWHERE = {
  column: 0,
  sun: 0,
  between: 0,
  x1: 0,
  y1: 0,
  z1: 0,
  x2: 0,
  y2: 0,
  sun1: 0,
  sun2: 0,
};

/** Optical depth along straight rays through shells of air, from a table. */
import { exp, log } from "../_numeric.js";
import { outwardDepth } from "./_outwardDepth.js";
import type { ShellAir } from "./_shellAir.js";

/** Step in height of the table, m, and its number of rows. */
const ROW_M = 1000;
const ROWS = 119;
/** Columns: cosines (j / 40)², j = 0 to 40. */
const COLUMNS = 41;

/** Optical depths outward from points in the air, by height and cosine of the ray from the vertical. */
export interface SlantTable {
  readonly groundM: number;
  /** Logarithm of the optical depth to the top, row by row. */
  readonly lnDepths: Float64Array;
}

/** Integrates the table. */
export function slantTable(air: ShellAir): SlantTable {
  const lnDepths = new Float64Array(ROWS * COLUMNS);
  for (let i = 0; i < ROWS; i++) {
    for (let j = 0; j < COLUMNS; j++) {
      const root = j / (COLUMNS - 1);
      lnDepths[i * COLUMNS + j] = log(outwardDepth(air, i * ROW_M, root * root));
    }
  }
  return { groundM: air.groundM, lnDepths };
}

/** Optical depth from a point at `heightM` to the top along a ray of cosine `cosine` from the vertical, at least 0. */
export function outward(table: SlantTable, heightM: number, cosine: number): number {
  const row = Math.min(Math.max(heightM / ROW_M, 0), ROWS - 1);
  const column = Math.sqrt(Math.min(cosine, 1)) * (COLUMNS - 1);
  const i = Math.min(Math.max(Math.floor(row) - 1, 0), ROWS - 4);
  const j = Math.min(Math.max(Math.floor(column) - 1, 0), COLUMNS - 4);
  const u = column - j;
  // cubic through four points
  const u0 = (-(u - 1) * (u - 2) * (u - 3)) / 6;
  const u1 = 0.5 * u * (u - 2) * (u - 3);
  const u2 = -0.5 * u * (u - 1) * (u - 3);
  const u3 = (u * (u - 1) * (u - 2)) / 6;
  const v = row - i;
  const v0 = (-(v - 1) * (v - 2) * (v - 3)) / 6;
  const v1 = 0.5 * v * (v - 2) * (v - 3);
  const v2 = -0.5 * v * (v - 1) * (v - 3);
  const v3 = (v * (v - 1) * (v - 2)) / 6;
  const t = table.lnDepths;
  const a = i * COLUMNS + j;
  const b = a + COLUMNS;
  const c = b + COLUMNS;
  const d = c + COLUMNS;
  return exp(
    v0 * (u0 * t[a]! + u1 * t[a + 1]! + u2 * t[a + 2]! + u3 * t[a + 3]!) +
      v1 * (u0 * t[b]! + u1 * t[b + 1]! + u2 * t[b + 2]! + u3 * t[b + 3]!) +
      v2 * (u0 * t[c]! + u1 * t[c + 1]! + u2 * t[c + 2]! + u3 * t[c + 3]!) +
      v3 * (u0 * t[d]! + u1 * t[d + 1]! + u2 * t[d + 2]! + u3 * t[d + 3]!),
  );
}

/** Share of sunlight that reaches a point at `heightM` where the sun stands at `cosine` from the vertical; 0 in the Earth's shadow. */
export function sunlightAt(table: SlantTable, heightM: number, cosine: number): number {
  if (cosine >= 0) return exp(-outward(table, heightM, cosine));
  const radius = table.groundM + heightM;
  const lowest = radius * Math.sqrt(1 - cosine * cosine) - table.groundM;
  if (lowest < 0) return 0;
  return exp(outward(table, heightM, -cosine) - 2 * outward(table, lowest, 0));
}

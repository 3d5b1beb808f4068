/** The checks of a sounding: kinds, ranges, order, gaps, and hydrostatic balance, which wrong units break. */
import { checkNumber, checkRecord } from "../_check.js";
import { log } from "../_numeric.js";
import { HYDROSTATIC_K_PER_M } from "./_standardLayers.js";
import type { ProfileRow } from "./tabulatedProfile.js";

const NAME = "tabulatedProfile";
/** The widest step taken for a sounding without a hole, m. */
const WIDEST_STEP_M = 5000;
/** Thinnest layer whose balance is judged (rounded pressures spoil thinner ones), m, and how far it may be off. */
const BALANCE_STEP_M = 500;
const BALANCE_TOLERANCE = 0.1;

export function checkProfileRows(rows: readonly ProfileRow[]): void {
  checkTable(rows, NAME);
  let from = 0;
  for (const [i, row] of rows.entries()) {
    checkRow(row, i);
    if (i > 0) checkStep(rows[i - 1]!, row, i);
    if (row.heightM - rows[from]!.heightM < BALANCE_STEP_M) continue;
    checkBalance(rows, from, i);
    from = i;
  }
}

/** Throws unless `rows` is an array of at least two records. */
export function checkTable(rows: unknown, functionName: string): asserts rows is object[] {
  if (!Array.isArray(rows)) {
    throw new TypeError(`${functionName}: rows must be an array of records, got ${typeof rows}`);
  }
  if (rows.length < 2) {
    throw new RangeError(`${functionName}: rows needs at least 2 rows, got ${rows.length}`);
  }
  for (const [i, row] of rows.entries()) checkRecord(row, `rows[${i}]`, functionName);
}

function checkRow(row: ProfileRow, i: number): void {
  const lowestPa = i === 0 ? 10_000 : 0.1;
  checkNumber(row.heightM, -1000, 85_000, "m", `rows[${i}].heightM`, NAME);
  checkNumber(row.temperatureK, 150, 380, "K", `rows[${i}].temperatureK`, NAME);
  checkNumber(row.pressurePa, lowestPa, 140_000, "Pa", `rows[${i}].pressurePa`, NAME);
  checkNumber(row.relativeHumidity, 0, 1, "fraction", `rows[${i}].relativeHumidity`, NAME);
}

function checkStep(lower: ProfileRow, upper: ProfileRow, i: number): void {
  const step = upper.heightM - lower.heightM;
  if (!(step > 0)) {
    fail(i, `heightM must be above the row before (${lower.heightM} m), got ${upper.heightM}`);
  }
  if (step > WIDEST_STEP_M) {
    fail(i, `heightM leaves a gap of ${step} m, at most ${WIDEST_STEP_M} m between rows`);
  }
  if (!(upper.pressurePa < lower.pressurePa)) {
    const got = `got ${upper.pressurePa} at ${upper.heightM} m`;
    fail(i, `pressurePa must be below the row before (${lower.pressurePa} Pa), ${got}`);
  }
}

/** The height that the pressures and temperatures from one row to another stand for must be near the height given. */
function checkBalance(rows: readonly ProfileRow[], from: number, to: number): void {
  let balanced = 0;
  for (let i = from; i < to; i++) {
    const meanK = (rows[i]!.temperatureK + rows[i + 1]!.temperatureK) / 2;
    balanced += (log(rows[i]!.pressurePa / rows[i + 1]!.pressurePa) * meanK) / HYDROSTATIC_K_PER_M;
  }
  const climb = rows[to]!.heightM - rows[from]!.heightM;
  if (Math.abs(balanced / climb - 1) <= BALANCE_TOLERANCE) return;
  const slip =
    Math.abs((balanced / climb) * 3.2808 - 1) < 2 * BALANCE_TOLERANCE
      ? " (heightM in feet? multiply by 0.3048)"
      : "";
  const span = `${climb} m above row ${from}, but its pressures and temperatures stand for ${Math.round(balanced)} m`;
  fail(to, `is ${span}; they must agree within 10 %${slip}`);
}

function fail(row: number, text: string): never {
  throw new RangeError(`${NAME}: rows[${row}] ${text}`);
}

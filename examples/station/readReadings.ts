/** Reading a day's CSV file. */
import { readFileSync } from "node:fs";
import { join } from "node:path";
import Papa from "papaparse";
import { cellNumber, cellTime, WEATHER_COLUMNS } from "./checkCell.js";
import { type InputPlace, inputError } from "./inputError.js";

/** One reading: the weather and the signal of each channel at a moment. */
export interface Reading {
  /** Row in its file; the heading is row 1. */
  readonly row: number;
  readonly time: Date;
  /** At the station, not reduced to sea level. */
  readonly pressurePa: number;
  readonly temperatureK: number;
  /** 0 to 1. */
  readonly relativeHumidity: number;
  /** Signals in the order of the channels asked for. */
  readonly signals: readonly number[];
}

/** Reads and checks `folder`/`file`: weather and the columns `channelNames`, in order of time. */
export function readReadings(
  folder: string,
  file: string,
  channelNames: readonly string[],
): Reading[] {
  const text = readFileSync(join(folder, file), "utf8").replace(/^\uFEFF/, "");
  if (text.trim() === "") throw inputError({ file }, "the file is empty");
  const rows = Papa.parse<string[]>(text.replace(/\s+$/, ""), { delimiter: "," });
  const broken = rows.errors[0];
  if (broken) throw inputError({ file, row: (broken.row ?? 0) + 1 }, broken.message);
  const [heading, ...body] = rows.data as [string[], ...string[][]];
  const columns = findColumns(file, heading, channelNames);
  if (body.length === 0) throw inputError({ file, row: 2 }, "no readings below the heading");
  const readings = body.map((cells, i) => readRow(file, i + 2, cells, heading.length, columns));
  readings.forEach((reading, i) => {
    const before = readings[i - 1];
    if (!before || reading.time > before.time) return;
    const what = `${cellOf(reading.time)} does not come after ${cellOf(before.time)} in row ${before.row}: sort the readings by time`;
    throw inputError({ file, row: reading.row, column: "time_utc" }, what);
  });
  return readings;
}

interface Columns {
  readonly at: ReadonlyMap<string, number>;
  readonly channelNames: readonly string[];
}

function findColumns(file: string, heading: string[], channelNames: readonly string[]): Columns {
  const names = heading.map((name) => name.trim());
  const at = new Map<string, number>();
  for (const column of ["time_utc", ...Object.keys(WEATHER_COLUMNS), ...channelNames]) {
    const place: InputPlace = { file, row: 1, column };
    const first = names.indexOf(column);
    if (first < 0) throw inputError(place, `missing; the heading has ${names.join(", ")}`);
    if (names.lastIndexOf(column) !== first) throw inputError(place, "stands twice");
    at.set(column, first);
  }
  return { at, channelNames };
}

function readRow(
  file: string,
  row: number,
  cells: string[],
  width: number,
  { at, channelNames }: Columns,
): Reading {
  if (cells.length !== width) {
    const column = [...at].find(([, index]) => index >= cells.length)?.[0];
    const what = `has ${cells.length} cells, the heading ${width}`;
    throw inputError({ file, row, ...(column === undefined ? {} : { column }) }, what);
  }
  const cell = (column: string): string => cells[at.get(column)!]!.trim();
  const number = (column: string): number => cellNumber(cell(column), { file, row, column });
  return {
    row,
    time: cellTime(cell("time_utc"), { file, row, column: "time_utc" }),
    pressurePa: number("pressure_pa"),
    temperatureK: number("temperature_k"),
    relativeHumidity: number("relative_humidity"),
    signals: channelNames.map(number),
  };
}

function cellOf(time: Date): string {
  return time.toISOString().replace(".000Z", "Z");
}

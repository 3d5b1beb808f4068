/** Checks of single cells of a CSV file. */
import { type InputPlace, inputError } from "./inputError.js";

interface Range {
  readonly low: number;
  readonly high: number;
  readonly unit: string;
  /** The unit it is often mixed up with, and how to get from there. */
  readonly slip: { readonly name: string; readonly convert: (value: number) => number };
}

/** Ranges of the weather columns: what stations on land report, with room to spare. */
export const WEATHER_COLUMNS: Readonly<Record<string, Range>> = {
  pressure_pa: {
    low: 40_000,
    high: 110_000,
    unit: "Pa",
    slip: { name: "hPa? multiply by 100", convert: (value) => value * 100 },
  },
  temperature_k: {
    low: 200,
    high: 330,
    unit: "K",
    slip: { name: "°C? add 273.15", convert: (value) => value + 273.15 },
  },
  relative_humidity: {
    low: 0,
    high: 1,
    unit: "as a fraction",
    slip: { name: "percent? divide by 100", convert: (value) => value / 100 },
  },
};

/** The cell as a finite number within the range of its column, if it has one. */
export function cellNumber(text: string, place: InputPlace): number {
  if (text === "") throw inputError(place, "the cell is empty; leave the row out or fill it in");
  const value = Number(text);
  if (!Number.isFinite(value)) throw inputError(place, `must be a number, got "${text}"`);
  const range = WEATHER_COLUMNS[place.column ?? ""];
  if (range === undefined || (value >= range.low && value <= range.high)) return value;
  const { low, high, unit, slip } = range;
  const mixedUp = slip.convert(value);
  const hint = mixedUp >= low && mixedUp <= high ? ` (${slip.name})` : "";
  throw inputError(place, `must be ${low} to ${high} ${unit}, got ${text}${hint}`);
}

/** The cell as a moment in UTC. */
export function cellTime(text: string, place: InputPlace): Date {
  const time = new Date(/^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d(\.\d+)?)?Z$/.test(text) ? text : "");
  // 30 February would slip through as 2 March: the date must come back as it was
  if (!Number.isNaN(time.getTime()) && time.toISOString().startsWith(text.slice(0, 16)))
    return time;
  throw inputError(place, `must be a time in UTC such as 2026-06-14T06:40:00Z, got "${text}"`);
}

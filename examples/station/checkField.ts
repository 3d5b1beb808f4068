/** Checks of single fields of station.json. */
import { inputError } from "./inputError.js";

/** A parsed record whose fields are not known yet. */
export type UnknownRecord = Readonly<Record<string, unknown>>;

const FILE = "station.json";

/** `value` as a record, or an error naming `field`. */
export function recordField(value: unknown, field: string): UnknownRecord {
  if (typeof value === "object" && value !== null && !Array.isArray(value)) {
    return value as UnknownRecord;
  }
  throw inputError({ file: FILE, field }, `must be a record in braces, got ${show(value)}`);
}

/** `value` as a list of at least `least` records. */
export function listField(value: unknown, least: number, field: string): UnknownRecord[] {
  if (Array.isArray(value) && value.length >= least) {
    return value.map((item, i) => recordField(item, `${field}[${i}]`));
  }
  const got = Array.isArray(value) ? `a list of ${value.length}` : show(value);
  throw inputError(
    { file: FILE, field },
    `must be a list of at least ${least} records, got ${got}`,
  );
}

/** `value` as a text that is not empty. */
export function textField(value: unknown, field: string): string {
  if (typeof value === "string" && value.trim() !== "") return value;
  throw inputError({ file: FILE, field }, `must be a text, got ${show(value)}`);
}

/** `value` as one of `choices`. */
export function choiceField<Choice extends string>(
  value: unknown,
  choices: readonly Choice[],
  field: string,
): Choice {
  const found = choices.find((choice) => choice === value);
  if (found !== undefined) return found;
  const wanted = choices.map((choice) => `"${choice}"`).join(" or ");
  throw inputError({ file: FILE, field }, `must be ${wanted}, got ${show(value)}`);
}

/** `value` as a number from `low` to `high`; `unit` is printed after the range. */
export function numberField(
  value: unknown,
  low: number,
  high: number,
  unit: string,
  field: string,
): number {
  if (typeof value === "number" && value >= low && value <= high) return value;
  const range = `${low} to ${high}${unit && ` ${unit}`}`;
  throw inputError({ file: FILE, field }, `must be a number, ${range}, got ${show(value)}`);
}

function show(value: unknown): string {
  return value === undefined ? "nothing (the field is missing)" : JSON.stringify(value);
}

/** Errors in what the user gave: one line that says where and what to do. */

/** Where in the input something is wrong. */
export interface InputPlace {
  /** Name of the file. */
  readonly file: string;
  /** Row of a table as an editor numbers it; the heading is row 1. */
  readonly row?: number;
  /** Column of a table. */
  readonly column?: string;
  /** Field of a record. */
  readonly field?: string;
}

/** An error for the user: `file, row 5, column pressure_pa: what is wrong`. */
export function inputError(place: InputPlace, what: string): Error {
  const { file, row, column, field } = place;
  const parts = [file];
  if (row !== undefined) parts.push(`row ${row}`);
  if (column !== undefined) parts.push(`column ${column}`);
  if (field !== undefined) parts.push(`field ${field}`);
  const error = new Error(`${parts.join(", ")}: ${what}`.replace(/\s+/g, " "));
  error.name = "InputError";
  return error;
}

/** Runs `work`; a refusal by the library (RangeError) becomes an error for the user at `place`. */
export function blaming<Result>(place: InputPlace, work: () => Result): Result {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) throw inputError(place, error.message);
    throw error;
  }
}

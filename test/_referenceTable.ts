/** Reader of the tables in test/reference: comment lines, one line of column names, then numbers. */
import { readFileSync } from "node:fs";

/** Columns of a table by name; a field that is no number (a flag, a blank) becomes NaN. */
export function referenceTable(file: string): Record<string, number[]> {
  const text = readFileSync(new URL(`reference/${file}`, import.meta.url), "utf8");
  const lines = text.split("\n").filter((line) => line !== "" && !line.startsWith("#"));
  const names = lines[0]!.split(",");
  const rows = lines.slice(1).map((line) => line.split(","));
  return Object.fromEntries(
    names.map((name, k) => [name, rows.map((row) => (row[k] ? Number(row[k]) : Number.NaN))]),
  );
}

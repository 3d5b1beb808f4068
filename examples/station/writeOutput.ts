/** Writing a folder of results, all of it or nothing. */
import { chmodSync, mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { basename, dirname, join } from "node:path";

/** Writes `files` (text by name) beside `folder`, then puts the new folder in the place of the old one. */
export function writeOutput(folder: string, files: Readonly<Record<string, string>>): void {
  const parent = dirname(folder);
  mkdirSync(parent, { recursive: true });
  const fresh = mkdtempSync(join(parent, `.${basename(folder)}-`));
  try {
    for (const [name, text] of Object.entries(files)) writeFileSync(join(fresh, name), text);
    chmodSync(fresh, 0o755); // a temporary folder is private
    rmSync(folder, { recursive: true, force: true });
    renameSync(fresh, folder);
  } catch (error) {
    rmSync(fresh, { recursive: true, force: true });
    throw error;
  }
}

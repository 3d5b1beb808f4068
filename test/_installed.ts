/** Programs that some tests need and not every machine has. */
import { accessSync, constants } from "node:fs";
import { delimiter, join } from "node:path";

/** Path of the first of `names` found on the PATH, if any. */
export function findProgram(...names: string[]): string | undefined {
  const folders = (process.env.PATH ?? "").split(delimiter);
  return names
    .flatMap((name) => folders.map((folder) => join(folder, name)))
    .find((path) => {
      try {
        accessSync(path, constants.X_OK);
        return true;
      } catch {
        return false;
      }
    });
}

/** A Chromium to drive. */
export const CHROMIUM: string | undefined =
  process.env.CHROMIUM ?? findProgram("chromium", "chromium-browser", "google-chrome");

/** Jupyter's converter, which executes notebooks. */
export const NBCONVERT: string | undefined = findProgram("jupyter-nbconvert");

/** With REQUIRE_ALL=1 (the continuous integration) nothing may be skipped. */
export const REQUIRE_ALL: boolean = process.env.REQUIRE_ALL === "1";

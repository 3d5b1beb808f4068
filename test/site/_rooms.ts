/** The rooms that have a chapter: the subpaths of the package. */
import { textOf } from "../_source.js";

const { exports } = JSON.parse(textOf("package.json"));

/** Their names. */
export const rooms: string[] = Object.keys(exports)
  .filter((path) => path.startsWith("./") && !path.endsWith(".json"))
  .map((path) => path.slice(2));

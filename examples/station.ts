/** The main job on a folder of sun-photometer readings: `npm start`, or `npm start -- path/to/station` for a folder of your own. */
import { fileURLToPath } from "node:url";
import { runStation } from "./station/runStation.js";

const demo = fileURLToPath(new URL("data", import.meta.url));
const out = fileURLToPath(new URL("out", import.meta.url));

try {
  runStation(process.argv[2] ?? demo, out, console.log);
} catch (error) {
  if (!(error instanceof Error && error.name === "InputError")) throw error;
  console.error(error.message);
  process.exitCode = 1;
}

/** Draws what the published air masses are off by: examples/paths/air-mass-errors.svg, shown in the guide beside it. */
import { writeFileSync } from "node:fs";
import { drawErrors } from "./paths/drawErrors.js";
import { errorLines } from "./paths/errorLines.js";
import { standalone } from "./station/plotting.js";

const file = new URL("paths/air-mass-errors.svg", import.meta.url);
writeFileSync(file, standalone(drawErrors(errorLines())));
console.log("examples/paths/air-mass-errors.svg");

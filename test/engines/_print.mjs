/** Prints what this engine works out on the grid, as one line of JSON. */
import * as airlight from "airlight";
import { resultsOf } from "./_grid.mjs";

console.log(JSON.stringify(resultsOf(airlight)));

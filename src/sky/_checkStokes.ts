/** Guard of Stokes parameters. */
import { checkList, checkNumber } from "../_check.js";
import type { Stokes } from "./skyStokes.js";

/** Throws unless `stokes` is `[I, Q, U]` with I above 0. */
export function checkStokes(stokes: Readonly<Stokes>, functionName: string): void {
  checkList(stokes, 3, "stokes", functionName);
  checkNumber(stokes[0], Number.MIN_VALUE, Number.MAX_VALUE, "", "stokes[0] (I)", functionName);
  for (const [k, name] of [
    [1, "Q"],
    [2, "U"],
  ] as const) {
    checkNumber(
      stokes[k],
      -Number.MAX_VALUE,
      Number.MAX_VALUE,
      "",
      `stokes[${k}] (${name})`,
      functionName,
    );
  }
}

/** Guard of three-number colours. */
import { checkList } from "../_check.js";

/** Throws unless `triple` is a list of three numbers; NaN passes, for it gives NaN. */
export function checkTriple(
  triple: ArrayLike<number>,
  argument: string,
  functionName: string,
): void {
  checkList(triple, 3, argument, functionName);
  if (triple.length > 3) {
    throw new RangeError(`${functionName}: ${argument} must be 3 numbers, got ${triple.length}`);
  }
  for (let i = 0; i < 3; i++) {
    if (typeof triple[i] === "number") continue;
    throw new TypeError(`${functionName}: ${argument}[${i}] must be a number, got ${triple[i]}`);
  }
}

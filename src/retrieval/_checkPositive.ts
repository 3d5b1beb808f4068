/** Guards of readings and of their uncertainties. */
import { checkNumber } from "../_check.js";

/** Throws unless `value` is a number above 0. */
export function checkPositive(
  value: unknown,
  argument: string,
  name: string,
): asserts value is number {
  checkNumber(value, Number.MIN_VALUE, Number.MAX_VALUE, "", argument, name);
}

/** Throws unless `value` is a number, 0 or above. */
export function checkUncertainty(
  value: unknown,
  argument: string,
  name: string,
): asserts value is number {
  checkNumber(value, 0, Number.MAX_VALUE, "", argument, name);
}

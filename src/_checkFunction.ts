/** Guard of arguments that are functions. */
import { show } from "./_refuse.js";

/** Throws unless `value` is a function, `of` what in words. */
export function checkFunction(
  value: unknown,
  of: string,
  argument: string,
  functionName: string,
): void {
  if (typeof value === "function") return;
  throw new TypeError(
    `${functionName}: ${argument} must be a function of ${of}, got ${show(value)}`,
  );
}

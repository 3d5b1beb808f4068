/** Guard of the observer argument. */
import type { Observer } from "./observer.js";

/** Throws unless `observer` can be one: catches a missing or swapped argument, not slips in a table of one's own. */
export function checkObserver(observer: Observer, functionName: string): void {
  if (observer?.stepNm > 0) return;
  throw new TypeError(`${functionName}: observer must be a table such as cie1931Observer`);
}

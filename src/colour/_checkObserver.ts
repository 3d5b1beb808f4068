/** Guard of the observer argument. */
import type { Observer } from "./observer.js";

/** Throws unless `observer` can be one: rows at rising wavelengths, as many of each function; slips in its numbers are not looked for. */
export function checkObserver(observer: Observer, functionName: string): void {
  const { startNm = 0, stepNm = 0, x, y, z } = observer ?? {};
  const rows = x?.length ?? 0;
  const even = startNm > 0 && stepNm > 0 && startNm + stepNm < Infinity;
  if (even && rows > 1 && y?.length === rows && z?.length === rows) return;
  throw new TypeError(`${functionName}: observer must be a table such as cie1931Observer`);
}

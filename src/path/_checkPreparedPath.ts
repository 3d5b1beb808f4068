/** The checks of a prepared path's arguments. */
import { checkList, checkNumber, checkPrepared, refuse } from "../_check.js";
import type { PreparedPath } from "./preparedPath.js";

const MAKERS = "preparePath or pathInWeather";

/** Apparent elevation of a zenith angle within the path's range. */
export function apparentElevationOf(
  apparentZenithDeg: number,
  path: PreparedPath<string>,
  functionName: string,
): number {
  checkPrepared(path?.levelRefractionDeg, MAKERS, "path", functionName);
  const most = path.horizonApparentZenithDeg;
  checkNumber(apparentZenithDeg, 0, most, "degrees", "apparentZenithDeg", functionName);
  return 90 - apparentZenithDeg;
}

/** True elevation of a zenith angle within the path's range. */
export function trueElevationOf(
  trueZenithDeg: number,
  path: PreparedPath<string>,
  functionName: string,
): number {
  checkPrepared(path?.levelRefractionDeg, MAKERS, "path", functionName);
  const most = path.horizonTrueZenithDeg;
  checkNumber(trueZenithDeg, 0, most, "degrees", "trueZenithDeg", functionName);
  return 90 - trueZenithDeg;
}

/** Place of a constituent's table. */
export function quantityOf(key: string, path: PreparedPath<string>, functionName: string): number {
  checkPrepared(path?.levelRefractionDeg, MAKERS, "path", functionName);
  const place = path.keys.indexOf(key);
  if (place >= 0) return place + 2;
  const known = path.keys.length > 0 ? path.keys.join(", ") : "none";
  return refuse(key, `a constituent of the path (${known})`, "", "key", functionName);
}

/** The array to fill: `out`, or a new one, of the length of `angles`. */
export function outOf(
  angles: ArrayLike<number>,
  out: Float64Array | undefined,
  argument: string,
  functionName: string,
): Float64Array {
  checkList(angles, 0, argument, functionName);
  if (out === undefined) return new Float64Array(angles.length);
  checkList(out, angles.length, "out", functionName);
  return out;
}

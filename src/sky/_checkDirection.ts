/** Guards of lines of sight. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import { checkZenith } from "./_checkZenith.js";
import type { SkyDirection } from "./skyStokes.js";

/** Throws unless `direction` is a line of sight. */
export function checkDirection(direction: SkyDirection, functionName: string): void {
  checkRecord(direction, "direction", functionName);
  checkZenith(direction.viewZenithDeg, "viewZenithDeg", functionName);
  checkAzimuth(direction.relativeAzimuthDeg, "relativeAzimuthDeg", functionName);
  checkLevel(direction.at, functionName);
}

/** Throws unless `azimuthDeg` is a finite number of at most ten turns. */
export function checkAzimuth(azimuthDeg: unknown, argument: string, functionName: string): void {
  checkNumber(azimuthDeg, -3600, 3600, "degrees", argument, functionName);
}

/** Throws unless `at` names a level. */
export function checkLevel(at: unknown, functionName: string): void {
  if (at !== "ground" && at !== "top") refuse(at, '"ground" or "top"', "", "at", functionName);
}

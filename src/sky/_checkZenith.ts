/** Guard of angles from the vertical that must stay above the horizon. */
import { checkNumber, refuse } from "../_check.js";

/** Throws unless `zenithDeg` is 0 to under 90. */
export function checkZenith(zenithDeg: unknown, argument: string, functionName: string): void {
  checkNumber(zenithDeg, 0, 90, "degrees", argument, functionName);
  if (zenithDeg === 90) {
    refuse(
      zenithDeg,
      "0 to under 90 degrees",
      "flat layers have no horizon",
      argument,
      functionName,
    );
  }
}

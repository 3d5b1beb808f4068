/** Guards of the twilight functions. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import { checkAzimuth } from "./_checkDirection.js";
import type { TwilightInput } from "./prepareTwilight.js";
import type { TwilightDirection } from "./twilightStokes.js";

/** Throws unless `input` can be air over ground. */
export function checkTwilight(input: TwilightInput): void {
  const name = "prepareTwilight";
  checkRecord(input, "input", name);
  checkNumber(input.rayleighDepth, 1e-6, 5, "", "rayleighDepth", name);
  checkNumber(input.ozoneDepth, 0, 20, "", "ozoneDepth", name);
  checkNumber(input.depolarisation, 0, 0.5, "fraction", "depolarisation", name);
  checkNumber(input.groundAlbedo, 0, 1, "fraction", "groundAlbedo", name);
  checkNumber(input.altitudeM, -500, 6000, "m", "altitudeM", name);
  if (input.orders !== "single" && input.orders !== "all") {
    refuse(input.orders, '"single" or "all"', "", "orders", name);
  }
}

/** Throws unless `direction` is a sun and a line of sight. */
export function checkTwilightDirection(direction: TwilightDirection): void {
  const name = "twilightStokes";
  checkRecord(direction, "direction", name);
  checkNumber(direction.sunZenithDeg, 0, 96, "degrees", "sunZenithDeg", name);
  checkNumber(direction.viewZenithDeg, 0, 90, "degrees", "viewZenithDeg", name);
  checkAzimuth(direction.relativeAzimuthDeg, "relativeAzimuthDeg", name);
}

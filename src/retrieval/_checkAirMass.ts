/** The guard of every air mass in this room. */
import { refuse } from "../_check.js";

/** Throws unless `mass` is above 0 and at most 50 (water near the ground reaches more at the horizon itself: no reading is taken there). */
export function checkAirMass(mass: unknown, argument: string, functionName: string): void {
  if (typeof mass === "number" && mass > 0 && mass <= 50) return;
  const hint = typeof mass === "number" && mass > 50 ? "zenith angle? convert to an air mass" : "";
  refuse(mass, "above 0, to 50", hint, argument, functionName);
}

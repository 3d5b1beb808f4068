/** Guards for the surface state that scales a refraction formula. */
import { checkNumber, checkRecord } from "../_check.js";
import type { Kelvins, Pascals } from "../units.js";

/** Air at the observer, for the published refraction formulas. */
export interface SurfaceAir {
  /** Pressure at the observer (not reduced to sea level), Pa. */
  readonly pressurePa: Pascals;
  /** Air temperature, K. */
  readonly temperatureK: Kelvins;
}

export function checkSurface(surface: SurfaceAir, functionName: string): void {
  checkRecord(surface, "surface", functionName);
  checkNumber(surface.pressurePa, 10_000, 140_000, "Pa", "pressurePa", functionName);
  checkNumber(surface.temperatureK, 180, 380, "K", "temperatureK", functionName);
}

/** The guards shared by the ways to make a column. */
import { checkNumber, checkRecord } from "../_check.js";
import type { AirColumnInput } from "./airColumn.js";

export function checkAirColumn(site: AirColumnInput, functionName: string): void {
  checkRecord(site, "site", functionName);
  checkNumber(site.pressurePa, 10_000, 140_000, "Pa", "pressurePa", functionName);
  checkNumber(site.altitudeM, -500, 20_000, "m", "altitudeM", functionName);
  checkNumber(site.latitudeDeg, -90, 90, "degrees", "latitudeDeg", functionName);
  checkNumber(site.co2Ppm, 0, 2000, "ppm", "co2Ppm", functionName);
}

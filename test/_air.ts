/** The moist-air states tests share. */
import { type MoistAir, moistAir } from "../src/index.js";

/** Moist air from °C, Pa, relative humidity and ppm. */
export function airAt(
  celsius: number,
  pressurePa: number,
  relativeHumidity: number,
  co2Ppm: number,
): MoistAir {
  return moistAir({ pressurePa, temperatureK: celsius + 273.15, relativeHumidity, co2Ppm });
}

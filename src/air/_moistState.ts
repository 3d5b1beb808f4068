/** The working of `moistAir`, for others that take a station's readings. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import { ciddorFactors } from "./_ciddorDensity.js";
import { compressibility } from "./_compressibility.js";
import { enhancementFactor } from "./_enhancementFactor.js";
import type { MoistAir, MoistAirInput } from "./moistAir.js";
import { saturationVapourPressure } from "./_saturationVapourPressure.js";

/** Checks a state and prepares it; errors name `argument` and the function `name`. */
export function moistState(state: MoistAirInput, argument: string, name: string): MoistAir {
  checkRecord(state, argument, name);
  const { pressurePa, temperatureK, relativeHumidity, co2Ppm } = state;
  checkNumber(pressurePa, 10_000, 140_000, "Pa", "pressurePa", name);
  checkNumber(temperatureK, 180, 380, "K", "temperatureK", name);
  checkNumber(relativeHumidity, 0, 1, "fraction", "relativeHumidity", name);
  checkNumber(co2Ppm, 0, 2000, "ppm", "co2Ppm", name);
  const saturated =
    enhancementFactor(pressurePa, temperatureK) * saturationVapourPressure(temperatureK);
  const vapourPressurePa = relativeHumidity * saturated;
  if (vapourPressurePa > pressurePa) {
    const most = `0 to ${pressurePa / saturated} at ${temperatureK} K and ${pressurePa} Pa (more would boil)`;
    refuse(relativeHumidity, most, "", "relativeHumidity", name);
  }
  const waterMoleFraction = vapourPressurePa / pressurePa;
  return {
    pressurePa,
    temperatureK,
    relativeHumidity,
    co2Ppm,
    waterMoleFraction,
    vapourPressurePa,
    compressibility: compressibility(pressurePa, temperatureK, waterMoleFraction),
    ...ciddorFactors(pressurePa, temperatureK, waterMoleFraction, co2Ppm),
  };
}

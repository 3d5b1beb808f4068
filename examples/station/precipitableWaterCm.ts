/** Water vapour above the station, guessed from the weather at the ground. */
import { moistAir } from "airlight";

/** Gas constant of water vapour, J kg⁻¹ K⁻¹ (8.314463 / 0.01801528). */
const VAPOUR_GAS_CONSTANT = 461.52;
/** Height over which vapour thins by e, m: common practice; on a given day it can be half or twice that. */
const SCALE_HEIGHT_M = 2000;

/** Liquid depth of the vapour above, cm: density at the ground times a scale height of 2 km (1 cm is 10 kg per m²). */
export function precipitableWaterCm(weather: {
  readonly pressurePa: number;
  readonly temperatureK: number;
  readonly relativeHumidity: number;
}): number {
  const { vapourPressurePa, temperatureK } = moistAir({ ...weather, co2Ppm: 0 });
  return (vapourPressurePa / (VAPOUR_GAS_CONSTANT * temperatureK)) * (SCALE_HEIGHT_M / 10);
}

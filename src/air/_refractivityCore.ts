/** Ciddor's refractivity with everything but the state worked out, unguarded, for use along a ray. */
import { ciddorFactors } from "./_ciddorDensity.js";
import { dryDispersion, vapourDispersion } from "./_ciddorDispersion.js";
import { compressibility } from "./_compressibility.js";

/** n - 1 per P / (Z T) in Pa/K, of dry air and of vapour, at one wavelength and CO2. */
export interface RefractivityFactors {
  readonly dry: number;
  readonly vapour: number;
}

/** Any state will do to get the factors; this is the reference state of dry air. */
const PRESSURE_PA = 101325;
const TEMPERATURE_K = 288.15;

export function refractivityFactors(wavelengthNm: number, co2Ppm: number): RefractivityFactors {
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  const { dryFactor } = ciddorFactors(PRESSURE_PA, TEMPERATURE_K, 0, co2Ppm);
  const { vapourFactor } = ciddorFactors(PRESSURE_PA, TEMPERATURE_K, 1, co2Ppm);
  return {
    dry: (1e-8 * dryFactor * dryDispersion(s)) / molesPerVolume(0),
    vapour: (1e-8 * vapourFactor * vapourDispersion(s)) / molesPerVolume(1),
  };
}

function molesPerVolume(water: number): number {
  return PRESSURE_PA / (compressibility(PRESSURE_PA, TEMPERATURE_K, water) * TEMPERATURE_K);
}

/** n - 1 of air at a state. */
export function refractivity(
  factors: RefractivityFactors,
  temperatureK: number,
  pressurePa: number,
  water: number,
): number {
  const moles = pressurePa / (compressibility(pressurePa, temperatureK, water) * temperatureK);
  return moles * (factors.dry + water * (factors.vapour - factors.dry));
}

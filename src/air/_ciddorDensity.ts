/** Density ratios of Ciddor's index: the dry and the vapour part of the air over their reference states. */
import { compressibility } from "./_compressibility.js";

/** Compressibility of dry air at 15 °C and 101 325 Pa, and of pure vapour at 20 °C and 1333 Pa: the reference states. */
const DRY_REFERENCE_K = 288.15;
const DRY_REFERENCE_PA = 101325;
const VAPOUR_REFERENCE_K = 293.15;
const VAPOUR_REFERENCE_PA = 1333;
/** Effect of CO2 on the index of dry air per ppm away from 450 ppm (Ciddor 1996, equation 2). */
const CO2_INDEX_PER_PPM = 0.534e-6;
const CO2_REFERENCE_PPM = 450;

/** The factors by which (n - 1) of standard dry air and of reference vapour enter (Ciddor 1996, equation 5); R and the molar masses cancel. */
export function ciddorFactors(
  pressurePa: number,
  temperatureK: number,
  waterMoleFraction: number,
  co2Ppm: number,
): { dryFactor: number; vapourFactor: number } {
  const z = compressibility(pressurePa, temperatureK, waterMoleFraction);
  const moles = pressurePa / (z * temperatureK);
  const dryReference =
    DRY_REFERENCE_PA / (compressibility(DRY_REFERENCE_PA, DRY_REFERENCE_K, 0) * DRY_REFERENCE_K);
  const vapourReference =
    VAPOUR_REFERENCE_PA /
    (compressibility(VAPOUR_REFERENCE_PA, VAPOUR_REFERENCE_K, 1) * VAPOUR_REFERENCE_K);
  const co2 = 1 + CO2_INDEX_PER_PPM * (co2Ppm - CO2_REFERENCE_PPM);
  return {
    dryFactor: (co2 * moles * (1 - waterMoleFraction)) / dryReference,
    vapourFactor: (moles * waterMoleFraction) / vapourReference,
  };
}

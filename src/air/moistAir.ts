/** The state of moist air at a point, with everything that does not depend on wavelength worked out once. */
import type { Fraction, Kelvins, PartsPerMillion, Pascals } from "../units.js";
import { moistState } from "./_moistState.js";

/** What `moistAir` takes: the state as a weather station reports it. */
export interface MoistAirInput {
  /** Total pressure, Pa. */
  readonly pressurePa: Pascals;
  /** Air temperature, K. */
  readonly temperatureK: Kelvins;
  /** Relative humidity over liquid water, 0 to 1. */
  readonly relativeHumidity: Fraction;
  /** Carbon dioxide, µmol/mol. */
  readonly co2Ppm: PartsPerMillion;
}

/** Prepared state of moist air; make it with `moistAir`. */
export interface MoistAir extends MoistAirInput {
  /** Mole fraction of water vapour. */
  readonly waterMoleFraction: Fraction;
  /** Partial pressure of water vapour, Pa. */
  readonly vapourPressurePa: Pascals;
  /** Compressibility factor Z. */
  readonly compressibility: number;
  /** Density of the dry part over standard air's, times the CO2 factor (Ciddor's first term). */
  readonly dryFactor: number;
  /** Density of the vapour part over that of vapour at 20 °C and 1333 Pa (Ciddor's second term). */
  readonly vapourFactor: number;
}

/**
 * State of moist air from pressure, temperature, relative humidity and CO2.
 *
 * Model: mole fraction of vapour from saturation over liquid water and the enhancement factor; compressibility of the
 * mixture; the two density ratios of Ciddor's index.
 * Validity: enforced 180-380 K, 10-140 kPa, humidity 0-1, CO2 0-2000 ppm; published for -40 to 100 °C, 80 to 120 kPa
 * (Ciddor 1996), where the uncertainty of the index built on it holds. Saturation is over liquid water at every temperature.
 * Accuracy: see `refractiveIndexCiddor` and `airDensity`, which are this state's uses.
 * Source: Ciddor 1996, Appl. Opt. 35, 1566, appendices A and B; Picard et al. 2008, Metrologia 45, 149 (CIPM-2007), appendix A.
 *
 * @param state - `pressurePa` 10 000 to 140 000 Pa; `temperatureK` 180 to 380 K; `relativeHumidity` 0 to 1 (over water);
 *   `co2Ppm` 0 to 2000 µmol/mol
 * @returns the prepared state
 * @throws TypeError if a value is not a number; RangeError if it is outside its range, or if humidity and temperature
 *   ask for more vapour than the pressure allows
 * @example
 * import { moistAir } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 293.15, relativeHumidity: 0.5, co2Ppm: 425 });
 * air.vapourPressurePa; // => 1174.3
 */
export function moistAir(state: MoistAirInput): MoistAir {
  return moistState(state, "state", "moistAir");
}

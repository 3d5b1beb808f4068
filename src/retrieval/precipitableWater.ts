/** Water vapour above a site from one absorbing band. */
import { independentBudget } from "../_budget.js";
import type { Budget } from "../budget.js";
import { log, pow } from "../_numeric.js";
import type { AstronomicalUnits, Centimetres, Dimensionless } from "../units.js";
import { checkWater } from "./_checkWater.js";

const NAME = "precipitableWater";
/** A reading in a water vapour band and the band's calibration. */
export interface WaterReading {
  /** Reading in the band, above 0. */
  readonly signal: number;
  /** Its standard uncertainty, same unit. */
  readonly signalStandardUncertainty: number;
  /** Signal outside the air at 1 au, above 0. */
  readonly constant: number;
  /** Its standard uncertainty, same unit. */
  readonly constantStandardUncertainty: number;
  /** Distance of the sun, 0.9 to 1.1 au. */
  readonly sunDistanceAu: AstronomicalUnits;
  /** Air mass of water vapour, above 0, to 50. */
  readonly airMass: Dimensionless;
  /** Slant optical depth of everything else in the band (Rayleigh, aerosol). */
  readonly knownSlantDepth: Dimensionless;
  /** Its standard uncertainty. */
  readonly knownSlantStandardUncertainty: Dimensionless;
  /** Factor a of the band, above 0, for slant water in cm. */
  readonly bandFactor: number;
  /** Its standard uncertainty. */
  readonly bandFactorStandardUncertainty: number;
  /** Exponent b of the band, 0.1 to 1.5. */
  readonly bandExponent: number;
  /** Its standard uncertainty. */
  readonly bandExponentStandardUncertainty: number;
}

/** What `precipitableWater` returns; the budget is in cm. */
export interface PrecipitableWater extends Budget {
  /** Water above the site as liquid depth, cm. */
  readonly waterCm: Centimetres;
}

/**
 * Precipitable water from a reading in one water vapour band, with its budget.
 *
 * Model: band transmittance of water = exp(-a (air mass × water)^b), solved for water. The lines of the budget are independent; in
 * truth a and b come from one fit and partly offset each other, which leaves the sum on the safe side.
 * Validity: the range of slant water for which a and b were fitted for this filter; they are the instrument's, not nature's.
 * Accuracy: 1e-12 on the inverse of the model; what counts is a and b (some 5 to 10 % of the water, common practice).
 * Source: Bruegge et al. 1992, J. Geophys. Res. 97, 18759; Halthore et al. 1997, J. Geophys. Res. 102, 4343 (from memory).
 *
 * @param reading - signal, constant, air mass, depth of everything else, band factor and exponent, each with its uncertainty
 * @returns water, cm, with standard uncertainty and budget, cm
 * @throws TypeError if a value is not a number; RangeError if it is out of range, or if the reading shows no absorption by water
 * @example
 * import { precipitableWater } from "airlight";
 * const water = precipitableWater({
 *   signal: 0.5, signalStandardUncertainty: 0.0005, constant: 1, constantStandardUncertainty: 0.01, sunDistanceAu: 1,
 *   airMass: 2, knownSlantDepth: 0.1, knownSlantStandardUncertainty: 0.01,
 *   bandFactor: 0.55, bandFactorStandardUncertainty: 0.01, bandExponent: 0.6, bandExponentStandardUncertainty: 0.01,
 * });
 * water.waterCm; // => 0.56707
 * water.standardUncertainty; // => 0.02841
 */
export function precipitableWater(reading: WaterReading): PrecipitableWater {
  checkWater(reading);
  const { signal, constant, sunDistanceAu, airMass, knownSlantDepth } = reading;
  const { bandFactor, bandExponent } = reading;
  const slant = log(constant / (signal * sunDistanceAu * sunDistanceAu)) - knownSlantDepth;
  if (!(slant > 0)) {
    throw new RangeError(
      `${NAME}: signal must show absorption by water beyond the known slant depth, got a water depth of ${slant}`,
    );
  }
  const slantWater = pow(slant / bandFactor, 1 / bandExponent);
  const waterCm = slantWater / airMass;
  const perDepth = waterCm / (bandExponent * slant);
  const part = (input: string, standardUncertainty: number, sensitivity: number) => ({
    input,
    standardUncertainty,
    sensitivity,
  });
  const byExponent = (-waterCm * log(slantWater)) / bandExponent;
  const byFactor = -waterCm / (bandExponent * bandFactor);
  return {
    waterCm,
    ...independentBudget([
      part("signal", reading.signalStandardUncertainty, -perDepth / signal),
      part("constant", reading.constantStandardUncertainty, perDepth / constant),
      part("known slant depth", reading.knownSlantStandardUncertainty, -perDepth),
      part("band factor", reading.bandFactorStandardUncertainty, byFactor),
      part("band exponent", reading.bandExponentStandardUncertainty, byExponent),
    ]),
  };
}

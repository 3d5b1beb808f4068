/** How small the uncertainty of an aerosol optical depth should be. */
import type { Dimensionless } from "../units.js";
import { checkAirMass } from "./_checkAirMass.js";

/**
 * Bound that the World Meteorological Organization sets to the difference between two instruments of finite field of view
 * that agree, in 95 % of readings: 0.005 + 0.010 / air mass.
 *
 * Model: a floor, and an error of 1 % of the calibration, which shrinks with air mass.
 * Validity: instruments of finite field of view measuring the direct sun.
 * Accuracy: definition.
 * Source: World Meteorological Organization, GAW report 162 (2005), from memory.
 *
 * @param airMass - air mass of the aerosol, above 0, to 50
 * @returns bound of the optical depth, without unit
 * @throws TypeError if the air mass is not a number; RangeError if it is out of range
 * @example
 * import { opticalDepthCriterion } from "airlight";
 * opticalDepthCriterion(2); // => 0.010
 */
export function opticalDepthCriterion(airMass: Dimensionless): Dimensionless {
  checkAirMass(airMass, "airMass", "opticalDepthCriterion");
  return 0.005 + 0.01 / airMass;
}

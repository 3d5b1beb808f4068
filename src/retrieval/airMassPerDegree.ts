/** How fast an air mass changes with the zenith angle. */
import { checkNumber } from "../_check.js";
import type { Degrees } from "../units.js";

/**
 * Change of an air mass per degree of zenith angle, for budgets.
 *
 * Model: difference over 0.02°, inside 0 to 90°.
 * Validity: any function of the zenith angle in degrees, apparent or true.
 * Accuracy: 5e-6 relative to 85° against the derivative of 1 / cos; within 0.01° of 0 one-sided, off by up to 1.6e-6 per degree.
 * Source: arithmetic.
 *
 * @param airMass - function of the zenith angle in degrees, such as `airMassKastenYoung`
 * @param zenithDeg - zenith angle as that function takes it, 0 to 90°
 * @returns change of the air mass, per degree
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { airMassKastenYoung, airMassPerDegree } from "airlight";
 * airMassPerDegree(airMassKastenYoung, 70); // => 0.13694
 */
export function airMassPerDegree(
  airMass: (zenithDeg: Degrees) => number,
  zenithDeg: Degrees,
): number {
  if (typeof airMass !== "function") {
    throw new TypeError(
      "airMassPerDegree: airMass must be a function of the zenith angle in degrees",
    );
  }
  checkNumber(zenithDeg, 0, 90, "degrees", "zenithDeg", "airMassPerDegree");
  const [low, high] = [Math.max(0, zenithDeg - 0.01), Math.min(90, zenithDeg + 0.01)];
  return (airMass(high) - airMass(low)) / (high - low);
}

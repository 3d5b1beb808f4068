/** The checks of a direct-sun reading and its known terms. */
import { checkList, checkNumber, checkRecord, refuse } from "../_check.js";
import { checkPositive, checkUncertainty } from "./_checkPositive.js";
import { checkAirMass } from "./_checkAirMass.js";
import type { SunReading, UncertainTerm } from "./aerosolOpticalDepth.js";

/** Throws unless the reading is sound. */
export function checkReading(reading: SunReading, name: string): void {
  checkRecord(reading, "reading", name);
  checkPositive(reading.signal, "signal", name);
  checkUncertainty(reading.signalStandardUncertainty, "signalStandardUncertainty", name);
  checkPositive(reading.constant, "constant", name);
  checkUncertainty(reading.constantStandardUncertainty, "constantStandardUncertainty", name);
  const { constantDegreesOfFreedom = 1 } = reading;
  checkNumber(constantDegreesOfFreedom, 1, Infinity, "", "constantDegreesOfFreedom", name);
  checkNumber(reading.sunDistanceAu, 0.9, 1.1, "au", "sunDistanceAu", name);
  checkAirMass(reading.airMass, "airMass", name);
  checkNumber(reading.airMassPerDeg, -50, 50, "per degree", "airMassPerDeg", name);
  const zenith = "zenithStandardUncertaintyDeg";
  checkNumber(reading.zenithStandardUncertaintyDeg, 0, 10, "degrees", zenith, name);
  checkTerms(reading.terms, name);
}

/** Throws unless `terms` is a list of known constituents with names of their own. */
export function checkTerms(terms: readonly UncertainTerm[], name: string): void {
  checkList(terms, 0, "terms", name);
  terms.forEach((term, i) => {
    checkRecord(term, `terms[${i}]`, name);
    if (typeof term.name !== "string") refuse(term.name, "a text", "", `terms[${i}].name`, name);
    checkNumber(term.opticalDepth, -100, 100, "", `terms[${i}].opticalDepth`, name);
    checkNumber(term.standardUncertainty, 0, 100, "", `terms[${i}].standardUncertainty`, name);
    checkAirMass(term.airMass, `terms[${i}].airMass`, name);
    checkNumber(term.airMassPerDeg, -50, 50, "per degree", `terms[${i}].airMassPerDeg`, name);
  });
}

/** The checks of `precipitableWater`. */
import { checkNumber, checkRecord } from "../_check.js";
import { checkAirMass } from "./_checkAirMass.js";
import { checkPositive, checkUncertainty } from "./_checkPositive.js";
import type { WaterReading } from "./precipitableWater.js";

const NAME = "precipitableWater";

/** Throws unless the reading is sound. */
export function checkWater(reading: WaterReading): void {
  checkRecord(reading, "reading", NAME);
  checkPositive(reading.signal, "signal", NAME);
  checkPositive(reading.constant, "constant", NAME);
  checkNumber(reading.sunDistanceAu, 0.9, 1.1, "au", "sunDistanceAu", NAME);
  checkAirMass(reading.airMass, "airMass", NAME);
  checkNumber(reading.knownSlantDepth, -100, 100, "", "knownSlantDepth", NAME);
  checkPositive(reading.bandFactor, "bandFactor", NAME);
  checkNumber(reading.bandExponent, 0.1, 1.5, "", "bandExponent", NAME);
  const spreads = [
    "signalStandardUncertainty",
    "constantStandardUncertainty",
    "knownSlantStandardUncertainty",
    "bandFactorStandardUncertainty",
    "bandExponentStandardUncertainty",
  ] as const;
  for (const field of spreads) checkUncertainty(reading[field], field, NAME);
}

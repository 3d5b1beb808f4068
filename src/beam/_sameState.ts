/** Whether a table and a beam speak of the same air. */
import type { BeamState } from "./beam.js";

/** The numbers of a state that a table depends on, by name. */
function numbersOf(state: BeamState): Record<string, number> {
  const { column, aerosol, ozoneDu, ozoneTemperatureK, nitrogenDioxideDu, waterCm } = state;
  const { pressurePa, co2Ppm, moleculesPerM2 } = column;
  const { opticalDepth, referenceNm, exponent } = aerosol;
  return {
    ...{ pressurePa, co2Ppm, moleculesPerM2, ozoneDu, ozoneTemperatureK, nitrogenDioxideDu },
    ...{ waterCm, opticalDepth, referenceNm, exponent },
  };
}

/** Throws if the table's state differs from the beam's in anything its depths depend on. */
export function checkSameState(table: BeamState, beam: BeamState, functionName: string): void {
  if (table === beam) return;
  const expected = numbersOf(table);
  for (const [name, value] of Object.entries(numbersOf(beam))) {
    if (value === expected[name]) continue;
    throw new RangeError(
      `${functionName}: the table was made for ${name} ${expected[name]}, the beam has ${value}; make one with beamTable`,
    );
  }
}

/** The state of the air along the sun's beam, with the air mass of each constituent worked out once. */
import { checkNumber, checkPrepared, checkRecord } from "../_check.js";
import { checkAngstrom } from "../column/_angstrom.js";
import type { Degrees } from "../units.js";
import { massesAt } from "./_beamMasses.js";
import { beamOf } from "./_beamOf.js";
import { checkMasses } from "./_checkBeam.js";
import { checkBeamPath, checkBeamZenith } from "./_massesOnPath.js";
import type { Beam, BeamMasses, BeamState } from "./beam.js";

/** What `clearBeam` takes. */
export interface ClearBeamInput extends BeamState {
  /** True (geometric) zenith angle of the sun, degrees. */
  readonly trueZenithDeg: Degrees;
  /** Air masses of your own in place of the closed formulas, from a traced ray for instance. */
  readonly masses?: BeamMasses;
}

/**
 * The direct beam of the sun through clear air, ready for any wavelength.
 *
 * Model: each constituent on its own air mass. Air: `airMassYoung` at the true zenith angle. Ozone and nitrogen dioxide: thin shell,
 * `airMassShell`. Water and aerosol: `airMassKastenWater` at the apparent zenith angle, which is the true one less
 * `refractionSaemundsson` at the column's pressure and the standard atmosphere's temperature at its altitude. Mixed gases: air's mass.
 * With a prepared `path` every mass is the refracted ray's, and the angle may go down to the path's horizon.
 * Validity: true zenith angle 0 to 90°; ozone 0 to 1000 DU at 200 to 298 K, layer 1 to 100 km high and above the site; nitrogen
 * dioxide 0 to 50 DU; water 0 to 20 cm; aerosol as `angstromOpticalDepth`; own masses 0 to 1000; enforced. No cloud.
 * Accuracy: that of the air mass formulas, see each; air's mass for ozone would be wrong by 21 % at 85°. With a path, 1e-9
 * relative in every mass.
 * Source: composition; the formulas name theirs.
 *
 * @param input - `column` from `airColumn`; `trueZenithDeg` 0 to 90°; `ozoneDu`, `ozoneTemperatureK`, `ozoneHeightM`;
 *   `nitrogenDioxideDu`; `waterCm`; `aerosol: { opticalDepth, referenceNm, exponent }`; `masses` to override all air
 *   masses; `path` prepared at the column's altitude with constituents `ozone`, `water`, `aerosol` (and `nitrogenDioxide`)
 * @returns the prepared beam
 * @throws TypeError if a value is of the wrong kind; RangeError if it is out of range
 * @example
 * import { airColumn, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 85, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beam.masses.air; // => 10.0587
 * beam.masses.ozone; // => 8.32911
 */
export function clearBeam(input: ClearBeamInput): Beam {
  checkRecord(input, "input", "clearBeam");
  const { column, trueZenithDeg, ozoneDu, ozoneTemperatureK, ozoneHeightM } = input;
  const { nitrogenDioxideDu, waterCm, aerosol, masses, path } = input;
  checkPrepared(column?.moleculesPerM2, "airColumn", "column", "clearBeam");
  if (path !== undefined) checkBeamPath(path, column, "clearBeam");
  checkBeamZenith(trueZenithDeg, path, "clearBeam");
  checkNumber(ozoneDu, 0, 1000, "DU", "ozoneDu", "clearBeam");
  checkNumber(ozoneTemperatureK, 200, 298, "K", "ozoneTemperatureK", "clearBeam");
  const lowest = Math.max(1000, column.altitudeM + 1);
  checkNumber(ozoneHeightM, lowest, 100_000, "m", "ozoneHeightM", "clearBeam");
  checkNumber(nitrogenDioxideDu, 0, 50, "DU", "nitrogenDioxideDu", "clearBeam");
  checkNumber(waterCm, 0, 20, "cm", "waterCm", "clearBeam");
  checkAngstrom(aerosol, "clearBeam");
  if (masses !== undefined) checkMasses(masses, "clearBeam");
  const state = {
    ...{ column, ozoneDu, ozoneTemperatureK, ozoneHeightM, nitrogenDioxideDu, waterCm },
    aerosol: { ...aerosol },
    ...(path && { path }),
  };
  return beamOf(state, trueZenithDeg, masses ?? massesAt(state, trueZenithDeg));
}

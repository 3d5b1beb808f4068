/** The same air with the sun elsewhere. */
import type { Degrees } from "../units.js";
import { massesAt } from "./_beamMasses.js";
import { beamOf } from "./_beamOf.js";
import { checkBeam } from "./_checkBeam.js";
import { checkBeamZenith } from "./_massesOnPath.js";
import type { Beam } from "./beam.js";

/**
 * The same state of the air with the sun at another zenith angle; the state record is shared, so a `beamTable` fits all of them.
 *
 * Model: air masses of `clearBeam` at the new angle, from the state's path if it has one; masses of your own are not carried over.
 * Validity: true zenith angle 0 to 90°, or to the horizon of the state's path, enforced.
 * Accuracy: the same record `clearBeam` makes.
 * Source: see `clearBeam`.
 *
 * @param beam - prepared beam from `clearBeam`
 * @param trueZenithDeg - true (geometric) zenith angle of the sun, 0 to 90° or the path's horizon
 * @returns the prepared beam at the new angle
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { airColumn, beamAt, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const noon = clearBeam({ column, trueZenithDeg: 30, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beamAt(noon, 60).masses.aerosol; // => 1.99688
 */
export function beamAt(beam: Beam, trueZenithDeg: Degrees): Beam {
  checkBeam(beam, "beamAt");
  checkBeamZenith(trueZenithDeg, beam.state.path, "beamAt");
  return beamOf(beam.state, trueZenithDeg, massesAt(beam.state, trueZenithDeg));
}

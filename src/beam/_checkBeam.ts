/** Guards of the beam functions. */
import { checkNumber, checkPrepared, checkRecord } from "../_check.js";
import type { Beam, BeamMasses } from "./beam.js";

/** Where Rayleigh scattering (to 1690 nm) and sunlight outside the air (from 280 nm) are both known. */
export const BEAM_FROM_NM = 280;
export const BEAM_TO_NM = 1690;

export function checkBeam(beam: Beam, functionName: string): void {
  checkPrepared(beam?.pressureAirMass, "clearBeam", "beam", functionName);
}

export function checkBeamWavelength(
  wavelengthNm: number,
  argument: string,
  functionName: string,
): void {
  checkNumber(wavelengthNm, BEAM_FROM_NM, BEAM_TO_NM, "nm", argument, functionName);
}

export function checkMasses(masses: BeamMasses, functionName: string): void {
  checkRecord(masses, "masses", functionName);
  for (const name of ["air", "ozone", "nitrogenDioxide", "water", "aerosol"] as const) {
    checkNumber(masses[name], 0, 1000, "", `masses.${name}`, functionName);
  }
}

/** The array to fill: `out` if it is given and long enough, else a new one. */
export function outFor(
  count: number,
  out: Float64Array | undefined,
  functionName: string,
): Float64Array {
  if (out === undefined) return new Float64Array(count);
  if (!(out instanceof Float64Array)) {
    throw new TypeError(`${functionName}: out must be a Float64Array`);
  }
  if (out.length >= count) return out;
  throw new RangeError(`${functionName}: out needs at least ${count} values, got ${out.length}`);
}

/** What of a beam depends on wavelength and state alone, worked out once for any number of suns. */
import { checkList } from "../_check.js";
import { type BeamKernel, beamKernel } from "./_beamKernel.js";
import { checkBeam, checkBeamWavelength } from "./_checkBeam.js";
import type { Beam, BeamState } from "./beam.js";

/** Prepared depths of one state of the air at a list of wavelengths; make it with `beamTable`. */
export interface BeamTable {
  /** The wavelengths, nm, in the order given. */
  readonly wavelengthsNm: Float64Array;
  /** The state of the air it holds for. */
  readonly state: BeamState;
  /** Number of wavelengths. */
  readonly count: number;
  /** Depths laid out for `beamTransmittances`. */
  readonly kernel: BeamKernel;
}

/**
 * Depths of a state of the air at many wavelengths, for `beamTransmittances` with many suns.
 *
 * Model: vertical depths of air, ozone, nitrogen dioxide and aerosol; depths of water and mixed gases at 39 air masses, between which
 * they are interpolated.
 * Validity: wavelengths 280-1690 nm, in any order, enforced. Fits every beam of the same state: those `beamAt` makes, and those
 * `clearBeam` makes from equal columns, ozone, nitrogen dioxide, water and aerosol.
 * Accuracy: see `beamTransmittances`.
 * Source: see `beamTransmittance`.
 *
 * @param wavelengthsNm - vacuum wavelengths, 280 to 1690 nm; copied
 * @param beam - any prepared beam of the state, from `clearBeam` or `beamAt`
 * @returns the prepared table
 * @throws TypeError if an argument is of the wrong kind; RangeError if a wavelength is out of range, NaN included
 * @example
 * import { airColumn, beamAt, beamTable, beamTransmittances, clearBeam, wavelengthGrid } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const noon = clearBeam({ column, trueZenithDeg: 30, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * const table = beamTable(wavelengthGrid(300, 1100, 1), noon);
 * beamTransmittances(table, beamAt(noon, 60))[200]; // => 0.621113
 */
export function beamTable(wavelengthsNm: ArrayLike<number>, beam: Beam): BeamTable {
  checkList(wavelengthsNm, 1, "wavelengthsNm", "beamTable");
  checkBeam(beam, "beamTable");
  const { state } = beam;
  const count = wavelengthsNm.length;
  for (let i = 0; i < count; i++) {
    checkBeamWavelength(wavelengthsNm[i]!, `wavelengthsNm[${i}]`, "beamTable");
  }
  const grid = Float64Array.from(wavelengthsNm);
  return { wavelengthsNm: grid, state, count, kernel: beamKernel(grid, state) };
}

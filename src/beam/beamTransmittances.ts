/** Transmittance of the direct beam at many wavelengths. */
import { checkList } from "../_check.js";
import { exp } from "../_numeric.js";
import { runKernel } from "./_beamKernel.js";
import { checkBeam, checkBeamWavelength, outFor } from "./_checkBeam.js";
import { withinNodes } from "./_massNodes.js";
import { checkSameState } from "./_sameState.js";
import { slantDepth } from "./_slantDepth.js";
import type { Beam } from "./beam.js";
import type { BeamTable } from "./beamTable.js";

const NAME = "beamTransmittances";

/**
 * Share of the sun's direct light that reaches the ground, at a list of wavelengths or over a `beamTable`.
 *
 * Model: as `beamTransmittance`; with a table the depths are summed and one exponential is taken at each wavelength.
 * Validity: 280-1690 nm, enforced. A table must belong to the state of the beam; with masses outside 0.89 to 79 its
 * wavelengths are worked out one by one.
 * Accuracy: with a list the same bits as `beamTransmittance`; with a table within 3e-7 of it, from the interpolation of the
 * water and gas bands, and 1e-13 relative where those bands are absent.
 * Source: see `beamTransmittance`.
 *
 * @param wavelengthsNm - vacuum wavelengths, 280 to 1690 nm, in any order, or a table from `beamTable`
 * @param beam - prepared beam from `clearBeam` or `beamAt`
 * @param out - filled and returned if given: a Float64Array at least as long as the wavelengths
 * @returns transmittances, 0 to 1, in the order of the wavelengths
 * @throws TypeError if an argument is of the wrong kind; RangeError if a wavelength is out of range (NaN included), the table
 *   is of another state, or `out` is too short
 * @example
 * import { airColumn, beamTransmittances, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 60, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beamTransmittances([400, 500, 600], beam)[1]; // => 0.621113
 */
export function beamTransmittances(
  wavelengthsNm: ArrayLike<number> | BeamTable,
  beam: Beam,
  out?: Float64Array,
): Float64Array {
  checkBeam(beam, NAME);
  if (!isTable(wavelengthsNm)) {
    checkList(wavelengthsNm, 1, "wavelengthsNm", NAME);
    return oneByOne(wavelengthsNm, beam, outFor(wavelengthsNm.length, out, NAME));
  }
  checkSameState(wavelengthsNm.state, beam.state, NAME);
  const filled = outFor(wavelengthsNm.count, out, NAME);
  const { air, water } = beam.masses;
  if (!(withinNodes(air) && withinNodes(water))) {
    return oneByOne(wavelengthsNm.wavelengthsNm, beam, filled);
  }
  runKernel(wavelengthsNm.kernel, wavelengthsNm.count, beam.masses, filled);
  return filled;
}

function isTable(value: ArrayLike<number> | BeamTable): value is BeamTable {
  return typeof (value as BeamTable)?.count === "number";
}

function oneByOne(wavelengthsNm: ArrayLike<number>, beam: Beam, out: Float64Array): Float64Array {
  for (let i = 0; i < wavelengthsNm.length; i++) {
    const wavelengthNm = wavelengthsNm[i]!;
    checkBeamWavelength(wavelengthNm, `wavelengthsNm[${i}]`, NAME);
    out[i] = exp(-slantDepth(wavelengthNm, beam));
  }
  return out;
}

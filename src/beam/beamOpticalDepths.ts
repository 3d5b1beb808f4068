/** Optical depth of each constituent along the beam. */
import type { Dimensionless, Nanometres } from "../units.js";
import { checkBeam, checkBeamWavelength } from "./_checkBeam.js";
import { slantDepths } from "./_slantDepth.js";
import type { Beam } from "./beam.js";

/** Slant optical depths; the transmittance of each is exp of minus its depth, that of the beam exp of minus their sum. */
export interface BeamOpticalDepths {
  /** Rayleigh scattering by the molecules of air. */
  readonly air: Dimensionless;
  /** Ozone. */
  readonly ozone: Dimensionless;
  /** Nitrogen dioxide. */
  readonly nitrogenDioxide: Dimensionless;
  /** Aerosol. */
  readonly aerosol: Dimensionless;
  /** Water vapour. */
  readonly water: Dimensionless;
  /** Oxygen and carbon dioxide. */
  readonly mixedGases: Dimensionless;
}

/**
 * Slant optical depth of each constituent of the beam: which of them takes how much.
 *
 * Model: vertical depth times the constituent's own air mass; water and mixed gases by their band model on the slant amount.
 * Validity: 280-1690 nm, enforced. Outside its table a constituent counts as transparent: nitrogen dioxide beyond 660 nm, ozone beyond
 * 1098 nm, water and mixed gases below 300 nm.
 * Accuracy: 1e-13 relative against each constituent's own function (water and mixed gases through their transmittances, 1e-15).
 * Source: see `beamTransmittance`.
 *
 * @param wavelengthNm - vacuum wavelength, 280 to 1690 nm
 * @param beam - prepared beam from `clearBeam`
 * @returns the six slant depths
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { airColumn, beamOpticalDepths, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 60, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beamOpticalDepths(500, beam).air; // => 0.2857
 */
export function beamOpticalDepths(wavelengthNm: Nanometres, beam: Beam): BeamOpticalDepths {
  checkBeamWavelength(wavelengthNm, "wavelengthNm", "beamOpticalDepths");
  checkBeam(beam, "beamOpticalDepths");
  return slantDepths(wavelengthNm, beam);
}

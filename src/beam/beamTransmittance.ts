/** Transmittance of the direct beam. */
import { exp } from "../_numeric.js";
import type { Fraction, Nanometres } from "../units.js";
import { checkBeam, checkBeamWavelength } from "./_checkBeam.js";
import { slantDepth } from "./_slantDepth.js";
import type { Beam } from "./beam.js";

/**
 * Share of the sun's direct light that reaches the ground at one wavelength.
 *
 * Model: exp of minus the sum of the slant optical depths of air, ozone, nitrogen dioxide, aerosol, water and mixed gases.
 * Validity: 280-1690 nm (sunlight is known from 280 nm, Rayleigh scattering to 1690 nm), enforced. Outside its table a constituent
 * counts as transparent: nitrogen dioxide beyond 660 nm, ozone beyond 1098 nm, water and mixed gases below 300 nm. Light scattered
 * into the field of view is not counted.
 * Accuracy: the product of the constituents' transmittances to 1e-13 relative where more than 1e-8 is left, 1e-12 below. With the air of ASTM G173 (air mass 1.5, 1.4164 cm of water, 343.8 DU,
 * aerosol 0.084 at 500 nm) the direct irradiance to 4000 nm sums to within 0.2 % of that standard's; single
 * wavelengths inside water and oxygen bands are off by much more, see `waterVapourTransmittance`.
 * Source: Bouguer's law; Bodhaine et al. 1999; JPL 19-5; IUPAC; Bird & Riordan 1986; see each constituent's function.
 *
 * @param wavelengthNm - vacuum wavelength, 280 to 1690 nm
 * @param beam - prepared beam from `clearBeam`
 * @returns transmittance, 0 to 1
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { airColumn, beamTransmittance, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 60, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beamTransmittance(500, beam); // => 0.621113
 */
export function beamTransmittance(wavelengthNm: Nanometres, beam: Beam): Fraction {
  checkBeamWavelength(wavelengthNm, "wavelengthNm", "beamTransmittance");
  checkBeam(beam, "beamTransmittance");
  return exp(-slantDepth(wavelengthNm, beam));
}

/** Direct sunlight at the ground. */
import { checkNumber } from "../_check.js";
import { exp } from "../_numeric.js";
import { solarIrradiance } from "../spectrum/solarIrradiance.js";
import type { AstronomicalUnits, Nanometres, SpectralIrradiance } from "../units.js";
import { checkBeam, checkBeamWavelength } from "./_checkBeam.js";
import { slantDepth } from "./_slantDepth.js";
import type { Beam } from "./beam.js";

/**
 * Spectral irradiance of the direct beam on a plane facing the sun.
 *
 * Model: sunlight outside the air over the square of the distance, times the transmittance.
 * Validity: 280-1690 nm, distance 0.9 to 1.1 au, enforced. A computed irradiance is no proof that looking at the sun, or being in it, is
 * safe: never look at the sun through any optics, and mind ultraviolet light.
 * Accuracy: as `solarIrradiance` and `beamTransmittance`.
 * Source: see `solarIrradiance` and `beamTransmittance`.
 *
 * @param wavelengthNm - vacuum wavelength, 280 to 1690 nm
 * @param beam - prepared beam from `clearBeam`
 * @param sunDistanceAu - distance of the sun, 0.9 to 1.1 au
 * @returns irradiance, W m⁻² nm⁻¹
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { airColumn, beamIrradiance, clearBeam } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 60, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * beamIrradiance(500, beam, 1.0167); // => 1.14896
 */
export function beamIrradiance(
  wavelengthNm: Nanometres,
  beam: Beam,
  sunDistanceAu: AstronomicalUnits,
): SpectralIrradiance {
  checkBeamWavelength(wavelengthNm, "wavelengthNm", "beamIrradiance");
  checkBeam(beam, "beamIrradiance");
  checkNumber(sunDistanceAu, 0.9, 1.1, "au", "sunDistanceAu", "beamIrradiance");
  const outside = solarIrradiance(wavelengthNm) / (sunDistanceAu * sunDistanceAu);
  return outside * exp(-slantDepth(wavelengthNm, beam));
}

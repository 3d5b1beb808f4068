/** Wavelength in air to vacuum wavelength. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { Nanometres } from "../units.js";
import type { MoistAir } from "./moistAir.js";
import { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";

/** Each round shrinks the error by the dispersion of air, under 1e-4: four reach double precision. */
const ROUNDS = 4;

/**
 * Vacuum wavelength of light with the given wavelength in air.
 *
 * Model: fixed point of vacuum wavelength = air wavelength times index at the vacuum wavelength.
 * Validity: 300-1688 nm in air, enforced; state as `moistAir`.
 * Accuracy: 1e-12 relative against `vacuumToAirWavelength`; that of the index beyond it (5e-8).
 * Source: definition of the refractive index; Ciddor 1996, Appl. Opt. 35, 1566.
 *
 * @param airWavelengthNm - wavelength in that air, 300 to 1688 nm
 * @param air - prepared state from `moistAir`
 * @returns vacuum wavelength, nm
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { airToVacuumWavelength, moistAir } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 450 });
 * airToVacuumWavelength(500, air); // => 500.13949
 */
export function airToVacuumWavelength(airWavelengthNm: Nanometres, air: MoistAir): Nanometres {
  checkNumber(airWavelengthNm, 300, 1688, "nm", "airWavelengthNm", "airToVacuumWavelength");
  checkPrepared(air?.dryFactor, "moistAir", "air", "airToVacuumWavelength");
  let vacuumNm = airWavelengthNm;
  for (let i = 0; i < ROUNDS; i++)
    vacuumNm = airWavelengthNm * refractiveIndexCiddor(vacuumNm, air);
  return vacuumNm;
}

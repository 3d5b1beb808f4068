/** Phase refractive index of moist air after Edlén. */
import { checkNumber, checkPrepared } from "../_check.js";
import { KELVINS_AT_ZERO_CELSIUS, type Dimensionless, type Nanometres } from "../units.js";
import type { MoistAir } from "./moistAir.js";

/** Dispersion at 15 °C, 760 torr, 300 ppm CO2, 1e-8. */
const A = 8342.13;
const B = 2406030; // µm-2
const B_POLE = 130; // µm-2
const C = 15997; // µm-2
const C_POLE = 38.9; // µm-2
/** Density: p (1 + p (0.817 - 0.0133 t) 1e-6) / (720.775 (1 + 0.003661 t)), p in torr. */
const PRESSURE_SCALE = 720.775; // torr
const D0 = 0.817;
const D1 = 0.0133;
const EXPANSION = 0.003661; // 1/°C
/** Vapour: -f (5.722 - 0.0457 s) 1e-8, f in torr. */
const V0 = 5.722;
const V1 = 0.0457;
/** Pascals in one torr, 101 325 / 760, rounded to double precision. */
const PASCALS_PER_TORR = 133.32236842105263;

/**
 * Phase refractive index n of moist air by the formula most older spectroscopy used; it ignores CO2 (fixed at 300 ppm).
 *
 * Model: two-pole dispersion, density by a virial expansion, vapour as a shift proportional to its pressure.
 * Validity: 200-2000 nm, enforced, as published; laboratory air near 20 °C.
 * Accuracy: within 2.1e-7 of `refractiveIndexCiddor` (450 ppm) for 350-650 nm, 10-30 °C, 90-110 kPa, humidity 0-0.6
 * (its vapour term is 15 % too strong); 3e-8 dry.
 * Source: Edlén 1966, Metrologia 2, 71, equations 1, 12 and 22 (from memory).
 *
 * @param wavelengthNm - vacuum wavelength, 200 to 2000 nm
 * @param air - prepared state from `moistAir`
 * @returns n, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { moistAir, refractiveIndexEdlen } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 288.15, relativeHumidity: 0, co2Ppm: 300 });
 * refractiveIndexEdlen(633, air); // => 1.000276518
 */
export function refractiveIndexEdlen(wavelengthNm: Nanometres, air: MoistAir): Dimensionless {
  checkNumber(wavelengthNm, 200, 2000, "nm", "wavelengthNm", "refractiveIndexEdlen");
  checkPrepared(air?.dryFactor, "moistAir", "air", "refractiveIndexEdlen");
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  const t = air.temperatureK - KELVINS_AT_ZERO_CELSIUS;
  const p = air.pressurePa / PASCALS_PER_TORR;
  const f = air.vapourPressurePa / PASCALS_PER_TORR;
  const standard = A + B / (B_POLE - s) + C / (C_POLE - s);
  const density = (p * (1 + 1e-6 * (D0 - D1 * t) * p)) / (PRESSURE_SCALE * (1 + EXPANSION * t));
  return 1 + 1e-8 * (standard * density - f * (V0 - V1 * s));
}

/** Phase refractive index of moist air after Birch and Downs. */
import { checkNumber, checkPrepared } from "../_check.js";
import { KELVINS_AT_ZERO_CELSIUS, type Dimensionless, type Nanometres } from "../units.js";
import type { MoistAir } from "./moistAir.js";

/** Dispersion at 15 °C, 101 325 Pa, 450 ppm CO2, 1e-8 (1994 correction of the 1993 paper). */
const A = 8342.54;
const B = 2406147; // µm-2
const B_POLE = 130; // µm-2
const C = 15998; // µm-2
const C_POLE = 38.9; // µm-2
/** Density: p / 96095.43 (1 + 1e-8 (0.601 - 0.00972 t) p) / (1 + 0.003661 t). */
const PRESSURE_SCALE = 96095.43; // Pa
const D0 = 0.601;
const D1 = 0.00972;
const EXPANSION = 0.003661; // 1/°C
/** Vapour: -f (3.7345 - 0.0401 s) 1e-10. */
const V0 = 3.7345;
const V1 = 0.0401;
/** CO2 after Edlén 1966, 0.540 per unit mole fraction, from the paper's 450 ppm. */
const CO2_PER_PPM = 0.54e-6;
const CO2_REFERENCE_PPM = 450;

/**
 * Phase refractive index n of moist air by the revised Edlén formula; use `refractiveIndexCiddor` unless you must match work
 * done with this one.
 *
 * Model: Edlén's dispersion and density terms refitted in the laboratory; vapour as a shift proportional to its pressure.
 * Validity: 300-1690 nm, enforced; published for 350-650 nm and ordinary laboratory air near 20 °C.
 * Accuracy: within 4e-8 of `refractiveIndexCiddor` for 350-650 nm, 10-30 °C, 90-110 kPa, humidity 0-0.6;
 * 5e-7 low in hot moist air (50 °C, saturated), as the vapour term has no temperature.
 * Source: Birch & Downs 1994, Metrologia 31, 315, equations 1-3 (from memory).
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param air - prepared state from `moistAir`
 * @returns n, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if the wavelength is out of range
 * @example
 * import { moistAir, refractiveIndexBirchDowns } from "airlight";
 * const air = moistAir({ pressurePa: 101325, temperatureK: 293.15, relativeHumidity: 0, co2Ppm: 450 });
 * refractiveIndexBirchDowns(633, air); // => 1.000271799
 */
export function refractiveIndexBirchDowns(wavelengthNm: Nanometres, air: MoistAir): Dimensionless {
  checkNumber(wavelengthNm, 300, 1690, "nm", "wavelengthNm", "refractiveIndexBirchDowns");
  checkPrepared(air?.dryFactor, "moistAir", "air", "refractiveIndexBirchDowns");
  const s = 1e6 / (wavelengthNm * wavelengthNm);
  const t = air.temperatureK - KELVINS_AT_ZERO_CELSIUS;
  const p = air.pressurePa;
  const standard = A + B / (B_POLE - s) + C / (C_POLE - s);
  const co2 = 1 + CO2_PER_PPM * (air.co2Ppm - CO2_REFERENCE_PPM);
  const density = (p * (1 + 1e-8 * (D0 - D1 * t) * p)) / (PRESSURE_SCALE * (1 + EXPANSION * t));
  return 1 + 1e-8 * standard * co2 * density - 1e-10 * air.vapourPressurePa * (V0 - V1 * s);
}

import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import * as constants from "../../src/constants.js";
import * as units from "../../src/units.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

interface Entry {
  value: number;
}
const file = new URL("../reference/physical-constants.json", import.meta.url);
const known: Record<string, Record<string, Entry>> = JSON.parse(readFileSync(file, "utf8"));

/** Where each exported constant stands in the table of constants; the rest is worked out below. */
const IN_TABLE: Record<string, [string, string]> = {
  SPEED_OF_LIGHT: ["radiation", "speed_of_light"],
  PLANCK_CONSTANT: ["radiation", "planck_constant"],
  BOLTZMANN_CONSTANT: ["radiation", "boltzmann_constant"],
  SECOND_RADIATION_CONSTANT: ["radiation", "second_radiation_constant_c2"],
  FIRST_RADIATION_CONSTANT_RADIANCE: ["radiation", "first_radiation_constant_for_radiance_c1L"],
  AVOGADRO_CONSTANT: ["gas", "avogadro_constant"],
  MOLAR_GAS_CONSTANT: ["gas", "molar_gas_constant"],
  MOLECULES_PER_DOBSON_UNIT: ["gas", "dobson_unit"],
  STANDARD_ATMOSPHERE: ["gas", "standard_atmosphere"],
  ASTRONOMICAL_UNIT: ["sun_and_earth", "astronomical_unit"],
  TOTAL_SOLAR_IRRADIANCE: ["sun_and_earth", "nominal_total_solar_irradiance"],
  MEAN_EARTH_RADIUS: ["sun_and_earth", "mean_earth_radius"],
};

const values: Record<string, number> = { ...constants };

describe("constants", () => {
  it("are all checked here", () => {
    const checked = [...Object.keys(IN_TABLE), "PEAK_LUMINOUS_EFFICACY"];
    expect(Object.keys(values).sort()).toEqual(checked.sort());
  });

  it.each(Object.entries(IN_TABLE))("%s is that of the table", (name, [group, key]) => {
    // Loschmidt's constant times 1e-5 m: equal to the table's rounding
    expectRelative(values[name]!, known[group]![key]!.value, 2e-16);
  });

  it("the derived ones follow from the exact ones", () => {
    const { SPEED_OF_LIGHT: c, PLANCK_CONSTANT: h, BOLTZMANN_CONSTANT: k } = constants;
    // three roundings at most
    expectRelative(constants.MOLAR_GAS_CONSTANT, k * constants.AVOGADRO_CONSTANT, 5e-16);
    expectRelative(constants.SECOND_RADIATION_CONSTANT, (h * c) / k, 5e-16);
    expectRelative(constants.FIRST_RADIATION_CONSTANT_RADIANCE, 2 * h * c * c, 5e-16);
    expectRelative(constants.MOLECULES_PER_DOBSON_UNIT, (1e-5 * 101325) / (k * 273.15), 5e-16);
    expectRelative(constants.MEAN_EARTH_RADIUS, (2 * 6378137 + 6356752.3142) / 3, 1e-8); // printed to 0.1 m
  });

  it("the peak of luminous efficacy follows from 683 lm/W at 540 THz and the observer's y", () => {
    const inAir = (constants.SPEED_OF_LIGHT / 540e12 / 1.00028) * 1e9; // 555.016 nm
    const { wavelength_nm: nm, ybar: y } = referenceTable("cie-1931-2deg-1nm.csv");
    const i = nm!.indexOf(Math.floor(inAir));
    const there = y![i]! + (inAir - nm![i]!) * (y![i + 1]! - y![i]!);
    expectAbsolute(constants.PEAK_LUMINOUS_EFFICACY, 683 / there, 0.0005); // half of its last digit
  });
});

describe("unit factors", () => {
  it("are what their names say", () => {
    expect({ ...units }).toEqual({
      PASCALS_PER_HECTOPASCAL: 100,
      KELVINS_AT_ZERO_CELSIUS: 273.15,
      RADIANS_PER_DEGREE: Math.PI / 180,
      DEGREES_PER_RADIAN: 180 / Math.PI,
      ARCSECONDS_PER_DEGREE: 3600,
      NANOMETRES_PER_MICROMETRE: 1000,
    });
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { airDensity, airNumberDensity, moistAir } from "../../src/index.js";
import { airAt } from "../_air.js";
import { airState } from "../_generators.js";
import { expectRefusal, expectRelative } from "../_tolerance.js";

describe("published values", () => {
  it("CIPM-2007: 1.199314 kg m-3 at 20 °C, 101 325 Pa, 50 %, 400 ppm (worked for the plan from the formula)", () => {
    expectRelative(airDensity(airAt(20, 101325, 0.5, 400)), 1.199314, 4.2e-7); // half of the last digit
  });
  it("dry standard air weighs 1.2250 kg m-3 with the ideal gas (US Standard Atmosphere 1976)", () => {
    const air = airAt(15, 101325, 0, 400);
    // real over ideal gas 1/Z; 28.96546 against 28.9644 g/mol: 3.7e-5; last digit 4e-5
    expectRelative(airDensity(air) * air.compressibility, 1.225, 8e-5);
  });
  it("2.5469e25 molecules per m3 in the US Standard Atmosphere (ideal gas)", () => {
    const air = airAt(15, 101325, 0, 400);
    expectRelative(airNumberDensity(air) * air.compressibility, 2.5469165e25, 1e-8);
  });
});

describe("independent fixtures", () => {
  it("CIPM-2007 in its short form with 3.483740 and 0.3780 (Picard et al. 2008, equation 2)", () => {
    // rho = [3.483740 + 1.4446 (x - 0.0004)] p / (Z T) (1 - 0.3780 xv) 1e-3; digits of the short form
    for (const [t, p, h, co2] of [
      [20, 101325, 0.5, 400],
      [27, 95_000, 0.9, 400],
      [15, 105_000, 0, 600],
    ] as const) {
      const air = airAt(t, p, h, co2);
      const short =
        ((3.48374 + 1.4446 * (co2 * 1e-6 - 4e-4)) *
          p *
          (1 - 0.378 * air.waterMoleFraction) *
          1e-3) /
        (air.compressibility * (t + 273.15));
      expectRelative(airDensity(air), short, 2e-6); // 0.3780 is 0.37804 to four digits
    }
  });
  it("mass of the molecules of each kind, added", () => {
    const air = airAt(25, 90_000, 0.7, 900);
    const perMole = airNumberDensity(air) / 6.02214076e23;
    const dry = 28.96546e-3 + 12.011e-3 * (900e-6 - 400e-6);
    const sum = perMole * (dry * (1 - air.waterMoleFraction) + 18.01528e-3 * air.waterMoleFraction);
    // the paper's R (8.314472) against today's
    expectRelative(airDensity(air), (sum * 8.31446261815324) / 8.314472, 1e-10);
  });
});

describe("properties", () => {
  it("moist air is lighter than dry, heavier air comes with CO2, density follows pressure", () => {
    fc.assert(
      fc.property(airState, (state) => {
        const dry = moistAir({ ...state, relativeHumidity: 0 });
        const wet = moistAir({ ...state, relativeHumidity: 1 });
        expect(airDensity(wet)).toBeLessThan(airDensity(dry));
        const rich = moistAir({ ...state, co2Ppm: state.co2Ppm + 0 > 1000 ? 0 : 2000 });
        const sign = rich.co2Ppm > state.co2Ppm ? 1 : -1;
        expect(sign * (airDensity(rich) - airDensity(moistAir(state)))).toBeGreaterThan(0);
        expectRelative(
          airNumberDensity(dry),
          dry.pressurePa / (dry.compressibility * 1.380649e-23 * dry.temperatureK),
          1e-14,
        );
      }),
    );
  });
});

describe("edges", () => {
  it("wants a prepared record", () => {
    expectRefusal(() => airDensity({} as never), TypeError, "airDensity", "moistAir");
    expectRefusal(() => airDensity(undefined as never), TypeError, "airDensity", "moistAir");
    expectRefusal(() => airNumberDensity(null as never), TypeError, "airNumberDensity", "moistAir");
  });
});

import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { planckRadiance } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectRefusal, expectRelative } from "../_tolerance.js";

const fixture = JSON.parse(
  readFileSync(new URL("../reference/planck-radiance.json", import.meta.url), "utf8"),
) as { rows: [number, number, number][] };

describe("published values", () => {
  it("gives the Stefan-Boltzmann constant", () => {
    // π ∫ L dλ = σ T⁴, σ = 5.670374419e-8 W m-2 K-4 (CODATA 2018); trapezium in ln λ, whose error here is below 1e-12
    const temperature = 1000;
    let sum = 0;
    for (let i = 0; i <= 4000; i++) {
      const wavelengthNm = 100 * 1e7 ** (i / 4000);
      sum += planckRadiance(wavelengthNm, temperature) * wavelengthNm * (Math.log(1e7) / 4000);
    }
    expectRelative((Math.PI * sum) / temperature ** 4, 5.670374419e-8, 1e-9); // tail beyond 1 m and printed digits
  });
  it.each([300, 2856, 5772, 40000])("peaks where Wien says at %d K", (temperature) => {
    const peak = 2.897771955e6 / temperature; // nm K, CODATA 2018
    const slope = (at: number): number =>
      planckRadiance(at * 1.0001, temperature) - planckRadiance(at * 0.9999, temperature);
    expect(slope(peak * 0.999999)).toBeGreaterThan(0);
    expect(slope(peak * 1.000001)).toBeLessThan(0);
  });
});

describe("independent fixtures", () => {
  it.each(fixture.rows)(
    "%d nm, %d K in 40-digit decimals",
    (wavelengthNm, temperatureK, radiance) => {
      // the exponent's rounding is multiplied by the exponent: 2e-16 × up to 192 at 300 nm and 250 K
      const exponent = 0.014387768775039337 / (wavelengthNm * 1e-9 * temperatureK);
      expectRelative(
        planckRadiance(wavelengthNm, temperatureK),
        radiance,
        Math.max(2e-15, 5e-16 * exponent),
      );
    },
  );
});

describe("properties", () => {
  it("rises with temperature at every wavelength, and is never negative", () => {
    fc.assert(
      fc.property(between(200, 20000), between(200, 50000), (wavelengthNm, temperatureK) => {
        const radiance = planckRadiance(wavelengthNm, temperatureK);
        expect(radiance).toBeGreaterThanOrEqual(0);
        expect(planckRadiance(wavelengthNm, temperatureK * 1.001)).toBeGreaterThan(radiance);
      }),
    );
  });
  it("depends on λT alone apart from λ⁻⁵", () => {
    fc.assert(
      fc.property(between(300, 3000), between(1000, 20000), (wavelengthNm, temperatureK) => {
        const doubled = planckRadiance(2 * wavelengthNm, temperatureK / 2);
        expectRelative(doubled * 32, planckRadiance(wavelengthNm, temperatureK), 1e-14);
      }),
    );
  });
});

describe("edges", () => {
  it("goes to zero, never to NaN", () => {
    expect(planckRadiance(1, 1)).toBe(0);
    expect(planckRadiance(1e9, 1e8)).toBeGreaterThan(0);
    expect(planckRadiance(1e9, 1)).toBeGreaterThan(0);
  });
  it("refuses bad input", () => {
    expectRefusal(
      () => planckRadiance(0.5, 5772),
      RangeError,
      "wavelengthNm",
      "µm?",
      "1 to 1000000000 nm",
    );
    expectRefusal(() => planckRadiance(500, 0), RangeError, "temperatureK", "1 to 100000000 K");
    expectRefusal(() => planckRadiance(500, Number.NaN), RangeError, "NaN");
    expectRefusal(() => planckRadiance(500, "hot" as never), TypeError, '"hot"');
    expectRefusal(() => planckRadiance(undefined as never, 5772), TypeError, "wavelengthNm");
  });
});

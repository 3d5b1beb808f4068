import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { moistAir, refractiveIndexCiddor } from "../../src/index.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const air = moistAir({
  pressurePa: 101325,
  temperatureK: 293.15,
  relativeHumidity: 0.5,
  co2Ppm: 425,
});

describe("published values", () => {
  // Ciddor 1996, Appl. Opt. 35, 1566, table of dry air at 633 nm, 450 ppm CO2 (from memory): t °C, p kPa, (n - 1) 1e8
  it.each([
    [20, 80, 21458.0],
    [20, 100, 26824.4],
    [20, 120, 32191.6],
    [10, 100, 27774.7],
    [30, 100, 25937.2],
  ])("dry air at %d °C and %d kPa", (celsius, kilopascals, refractivity) => {
    const dry = moistAir({
      pressurePa: kilopascals * 1000,
      temperatureK: celsius + 273.15,
      relativeHumidity: 0,
      co2Ppm: 450,
    });
    // printed to 0.1: half of the last digit
    expectAbsolute((refractiveIndexCiddor(633, dry) - 1) * 1e8, refractivity, 0.05);
  });
});

describe("independent fixtures", () => {
  it("is the density-proportional sum written out with absolute densities, R and molar masses", () => {
    // the paper's own route (densities in kg m-3, equations 4 and 5) instead of the ratios used in src
    const [t, p, f] = [293.15, 101325, 1174.2898896960422];
    const c = t - 273.15;
    const z = (pp: number, tt: number, x: number): number => {
      const cc = tt - 273.15;
      const a = 1.58123e-6 - 2.9331e-8 * cc + 1.1043e-10 * cc ** 2 + (5.707e-6 - 2.051e-8 * cc) * x;
      return (
        1 -
        (pp / tt) * (a + (1.9898e-4 - 2.376e-6 * cc) * x ** 2) +
        (pp / tt) ** 2 * (1.83e-11 - 0.765e-8 * x ** 2)
      );
    };
    expectRelative((1.00062 + 3.14e-8 * p + 5.6e-7 * c * c) * 0.5 * 2339.2147, f, 1e-4);
    const xw = f / p;
    const [ma, mv, r] = [1e-3 * (28.9635 + 12.011e-6 * 25), 0.018015, 8.31451];
    const rhoA = (p * ma * (1 - xw)) / (z(p, t, xw) * r * t);
    const rhoW = (p * mv * xw) / (z(p, t, xw) * r * t);
    const rhoAxs = (101325 * ma) / (z(101325, 288.15, 0) * r * 288.15);
    const rhoWs = (1333 * mv) / (z(1333, 293.15, 1) * r * 293.15);
    const s = (1 / 0.55) ** 2;
    const nas =
      1e-8 * (5792105 / (238.0185 - s) + 167917 / (57.362 - s)) * (1 + 0.534e-6 * (425 - 450));
    const nws = 1.022e-8 * (295.235 + 2.6422 * s - 0.03238 * s * s + 0.004028 * s ** 3);
    const n = 1 + (rhoA / rhoAxs) * nas + (rhoW / rhoWs) * nws;
    expectAbsolute(refractiveIndexCiddor(550, air), n, 1e-11); // plan: 1e-11 of n
  });
});

describe("properties", () => {
  it("falls with wavelength, and stays between 1 and 1.001", () => {
    fc.assert(
      fc.property(airState, between(300, 1600), (state, wavelengthNm) => {
        const a = moistAir(state);
        const n = refractiveIndexCiddor(wavelengthNm, a);
        expect(n).toBeGreaterThan(1);
        expect(n).toBeLessThan(1.001);
        expect(refractiveIndexCiddor(wavelengthNm + 50, a)).toBeLessThan(n);
      }),
    );
  });
});

describe("edges", () => {
  it("accepts both ends of its range and refuses what lies beyond", () => {
    expect(refractiveIndexCiddor(300, air)).toBeGreaterThan(refractiveIndexCiddor(1690, air));
    expectRefusal(
      () => refractiveIndexCiddor(299.9, air),
      RangeError,
      "refractiveIndexCiddor",
      "wavelengthNm",
      "300 to 1690 nm",
      "299.9",
    );
    expectRefusal(
      () => refractiveIndexCiddor(0.55, air),
      RangeError,
      "0.55",
      "µm? multiply by 1000",
    );
    expectRefusal(() => refractiveIndexCiddor(Number.NaN, air), RangeError, "NaN");
    expectRefusal(() => refractiveIndexCiddor("550" as never, air), TypeError, '"550"');
    expectRefusal(() => refractiveIndexCiddor(550, {} as never), TypeError, "moistAir");
    expectRefusal(() => refractiveIndexCiddor(550, undefined as never), TypeError, "moistAir");
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { moistAir } from "../../src/index.js";
import { airAt } from "../_air.js";
import { airState } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const room = { pressurePa: 101325, temperatureK: 293.15, relativeHumidity: 0.5, co2Ppm: 400 };

describe("published values", () => {
  // saturation over water, steam tables, from memory: 0 °C 611.2 Pa (4 digits), 20 °C 2339 Pa, 50 °C 12.35 kPa
  it.each([
    [0, 611.2, 1e-3],
    [20, 2339, 5e-4],
    [50, 12_350, 1e-3],
  ])("saturation at %d °C", (celsius, pascals, tolerance) => {
    const saturated = airAt(celsius, 101325, 1, 400);
    // the enhancement factor, 1.004 to 1.006 here, is divided out as the paper gives it
    const enhancement = 1.00062 + 3.14e-8 * 101325 + 5.6e-7 * celsius ** 2;
    expectRelative(saturated.vapourPressurePa / enhancement, pascals, tolerance);
  });
  it("compressibility of CIPM-2007's example air", () => {
    // Z = 0.99961 at 20 °C, 101 325 Pa, half saturated (from memory, last digit)
    expectAbsolute(moistAir(room).compressibility, 0.99961, 5e-6);
  });
});

describe("independent fixtures", () => {
  it("is the published sum written out with °C and powers", () => {
    const [p, t] = [90_000, 10];
    const k = t + 273.15;
    const svp = Math.exp(1.2378847e-5 * k ** 2 - 1.9121316e-2 * k + 33.93711047 - 6343.1645 / k);
    const x = (0.7 * (1.00062 + 3.14e-8 * p + 5.6e-7 * t ** 2) * svp) / p;
    const z =
      1 -
      (p / k) *
        (1.58123e-6 -
          2.9331e-8 * t +
          1.1043e-10 * t ** 2 +
          (5.707e-6 - 2.051e-8 * t) * x +
          (1.9898e-4 - 2.376e-6 * t) * x ** 2) +
      (p / k) ** 2 * (1.83e-11 - 7.65e-9 * x ** 2);
    const air = airAt(t, p, 0.7, 400);
    expectRelative(air.waterMoleFraction, x, 1e-13);
    expectRelative(air.compressibility, z, 1e-14);
  });
});

describe("properties", () => {
  it("keeps its inputs, and vapour and compressibility stay physical", () => {
    fc.assert(
      fc.property(airState, (state) => {
        const air = moistAir(state);
        expect(air).toMatchObject(state);
        expect(air.waterMoleFraction).toBeGreaterThanOrEqual(0);
        expect(air.waterMoleFraction).toBeLessThanOrEqual(1);
        expect(air.compressibility).toBeGreaterThan(0.99);
        expect(air.compressibility).toBeLessThanOrEqual(1);
        expectRelative(air.vapourPressurePa + 1, air.waterMoleFraction * air.pressurePa + 1, 1e-14);
      }),
    );
  });
});

describe("edges", () => {
  it("accepts its ends", () => {
    expect(
      moistAir({ pressurePa: 10_000, temperatureK: 180, relativeHumidity: 0, co2Ppm: 0 })
        .waterMoleFraction,
    ).toBe(0);
    expect(
      moistAir({ pressurePa: 140_000, temperatureK: 380, relativeHumidity: 1, co2Ppm: 2000 })
        .waterMoleFraction,
    ).toBeLessThan(1);
  });
  it.each([
    [
      { pressurePa: 1013.25 },
      ["pressurePa", "10000 to 140000 Pa", "1013.25", "hPa? multiply by 100"],
    ],
    [{ pressurePa: 101.325 }, ["kPa? multiply by 1000"]],
    [{ temperatureK: 20 }, ["temperatureK", "180 to 380 K", "°C? add 273.15"]],
    [{ temperatureK: Number.NaN }, ["temperatureK", "NaN"]],
    [{ relativeHumidity: 50 }, ["relativeHumidity", "0 to 1", "percent? divide by 100"]],
    [{ relativeHumidity: -0.01 }, ["relativeHumidity"]],
    [{ co2Ppm: 2001 }, ["co2Ppm", "0 to 2000 ppm"]],
    [{ temperatureK: 378, relativeHumidity: 1 }, ["relativeHumidity", "would boil", "0.83"]],
  ])("refuses %o", (change, parts) => {
    expectRefusal(() => moistAir({ ...room, ...change }), RangeError, "moistAir", ...parts);
  });
  it("refuses the wrong kind", () => {
    expectRefusal(() => moistAir(undefined as never), TypeError, "moistAir", "state");
    expectRefusal(
      () => moistAir({ ...room, pressurePa: "101325" } as never),
      TypeError,
      "pressurePa",
    );
    expectRefusal(
      () => moistAir({ pressurePa: 101325 } as never),
      TypeError,
      "temperatureK",
      "undefined",
    );
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { standardAtmosphere } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

describe("published values", () => {
  // US Standard Atmosphere 1976, table I, geometric height (from memory): T K, p Pa, density kg m-3, each to its last digit
  it.each([
    [0, 288.15, 1.01325e5, 5e-7, 1.225, 5e-5],
    [1000, 281.651, 8.9876e4, 6e-6, 1.1117, 5e-5],
    [5000, 255.676, 5.4048e4, 1e-5, 7.3643e-1, 7e-6],
    [10_000, 223.252, 2.6499e4, 4e-5, 4.1351e-1, 2e-5],
    [20_000, 216.65, 5.5293e3, 1e-5, 8.891e-2, 1e-5],
    [30_000, 226.509, 1.197e3, 5e-5, 1.841e-2, 3e-5],
    [50_000, 270.65, 7.9779e1, 2e-5, 1.0269e-3, 5e-5],
  ])("%d m", (altitudeM, temperatureK, pressurePa, pTolerance, density, dTolerance) => {
    const state = standardAtmosphere(altitudeM);
    expectAbsolute(state.temperatureK, temperatureK, 5.1e-4);
    expectRelative(state.pressurePa, pressurePa, pTolerance);
    expectRelative(state.densityKgM3, density, dTolerance);
  });
  // pressures at the layers' bases (geopotential 11, 20, 32, 47, 51, 71, 84.852 km), from memory, to their last digit
  it.each([
    [11_000, 22632.06],
    [20_000, 5474.889],
    [32_000, 868.0187],
    [47_000, 110.9063],
    [51_000, 66.93887],
    [71_000, 3.95642],
    [84_852.05, 0.37338],
  ])("base at %d m geopotential", (h, pascals) => {
    const z = (6356766 * h) / (6356766 - h);
    const step = 10 ** Math.floor(Math.log10(pascals) - 6);
    expectRelative(
      standardAtmosphere(Math.min(z, 86_000)).pressurePa,
      pascals,
      h > 80_000 ? 1.4e-5 : (step * 10) / pascals,
    );
  });
  it("86 km: 186.87 K kinetic, 186.95 K molecular-scale", () => {
    expectAbsolute(standardAtmosphere(86_000).temperatureK, 186.87, 0.005);
    expectAbsolute(standardAtmosphere(86_000).temperatureK / 0.999579, 186.946, 0.001);
  });
});

describe("independent fixtures", () => {
  it("is hydrostatic: ln p falls by the integral of g0 M0 / (R T) over geopotential height", () => {
    const table: [number, number][] = [
      [0, 288.15],
      [11e3, 216.65],
      [20e3, 216.65],
      [32e3, 228.65],
      [47e3, 270.65],
      [51e3, 270.65],
      [71e3, 214.65],
      [84_852.05, 186.9459],
    ];
    const temperature = (h: number): number => {
      const i = table.findIndex(([top]) => h < top);
      const [[h0, t0], [h1, t1]] = [table[i - 1]!, table[i]!];
      return t0 + ((h - h0) / (h1 - h0)) * (t1 - t0);
    };
    let lnp = Math.log(101325);
    let from = 0;
    for (const z of [500, 3000, 11_019, 15_000, 25_000, 40_000, 49_000, 60_000, 75_000, 85_000]) {
      const h = (6356766 * z) / (6356766 + z);
      // midpoint rule split at the kinks, fine enough for 1e-9
      for (const [top] of table) {
        const to = Math.min(Math.max(top, from), h);
        const n = 8000;
        for (let i = 0; i < n; i++) {
          lnp -=
            (((9.80665 * 0.0289644) / 8.31432) * ((to - from) / n)) /
            temperature(from + ((i + 0.5) * (to - from)) / n);
        }
        from = to;
      }
      expectRelative(standardAtmosphere(z).pressurePa, Math.exp(lnp), 1e-9);
    }
  });
  it("geometric taken for geopotential height is off by -2.4e-3 at 10 km and -16 % at 80 km (sizes from the plan)", () => {
    const off = (z: number): number =>
      standardAtmosphere((6356766 * z) / (6356766 - z)).pressurePa /
        standardAtmosphere(z).pressurePa -
      1;
    expectAbsolute(off(10_000), -2.4e-3, 5e-5);
    expectAbsolute(off(80_000), -0.16, 5e-3);
  });
});

describe("properties", () => {
  it("pressure and number density fall with height; density is theirs", () => {
    fc.assert(
      fc.property(between(-5000, 85_000), (z) => {
        const [low, high] = [standardAtmosphere(z), standardAtmosphere(z + 500)];
        expect(high.pressurePa).toBeLessThan(low.pressurePa);
        expect(high.numberDensityM3).toBeLessThan(low.numberDensityM3);
        expectRelative(
          low.pressurePa,
          low.numberDensityM3 * low.temperatureK * (8.31432 / 6.022169e23),
          1e-14,
        );
      }),
    );
  });
  it("is continuous at every joint", () => {
    for (const h of [11e3, 20e3, 32e3, 47e3, 51e3, 71e3]) {
      const z = (6356766 * h) / (6356766 - h);
      const [below, above] = [standardAtmosphere(z - 1e-6), standardAtmosphere(z + 1e-6)];
      expectAbsolute(below.temperatureK, above.temperatureK, 1e-7);
      expectRelative(below.pressurePa, above.pressurePa, 1e-9);
    }
    expectAbsolute(
      standardAtmosphere(80_000 - 1e-3).temperatureK,
      standardAtmosphere(80_000 + 1e-3).temperatureK,
      1e-4,
    );
  });
});

describe("edges", () => {
  it("ends at -5 and 86 km", () => {
    expect(standardAtmosphere(-5000).pressurePa).toBeGreaterThan(177_000);
    expectRefusal(
      () => standardAtmosphere(86_001),
      RangeError,
      "standardAtmosphere",
      "altitudeM",
      "-5000 to 86000 m",
    );
    expectRefusal(() => standardAtmosphere(-5001), RangeError, "-5001");
    expectRefusal(() => standardAtmosphere(Number.NaN), RangeError, "NaN");
    expectRefusal(() => standardAtmosphere("0" as never), TypeError, "altitudeM");
  });
});

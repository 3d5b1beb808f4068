import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airAtHeight,
  exponentialLayer,
  gaussianLayer,
  moistAir,
  standardAtmosphere,
  standardProfile,
  tabulatedLayer,
  tabulatedProfile,
} from "../../src/index.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const standard = standardProfile({
  pressurePa: 101325,
  temperatureK: 288.15,
  relativeHumidity: 0,
  altitudeM: 0,
  co2Ppm: 450,
});
const summer = {
  pressurePa: 93000,
  temperatureK: 305.15,
  relativeHumidity: 0.7,
  altitudeM: 700,
  co2Ppm: 425,
};

/** Rows of the standard atmosphere every `stepM`, dry. */
const standardRows = (stepM: number, topM: number): Parameters<typeof tabulatedProfile>[0] =>
  Array.from({ length: Math.floor(topM / stepM) + 1 }, (_, i) => {
    const { temperatureK, pressurePa } = standardAtmosphere(i * stepM);
    return { heightM: i * stepM, temperatureK, pressurePa, relativeHumidity: 0 };
  });

describe("published values", () => {
  // US Standard Atmosphere 1976, table I, geometric height m, K, Pa (from memory): five digits as printed
  it.each([
    [1000, 281.651, 89876],
    [5000, 255.676, 54048],
    [11000, 216.774, 22700],
    [20000, 216.65, 5529.3],
    [50000, 270.65, 79.779],
  ])("the standard station gives the standard atmosphere at %d m", (height, kelvins, pascals) => {
    const air = airAtHeight(height, standard);
    expectAbsolute(air.temperatureK, kelvins, 1e-3); // last digit printed
    expectRelative(air.pressurePa, pascals, 2e-5);
  });
});

describe("independent fixtures", () => {
  it("is the standard atmosphere in its own state, at sea level or from a station on a mountain", () => {
    const { temperatureK, pressurePa } = standardAtmosphere(4000);
    const high = standardProfile({
      temperatureK,
      pressurePa,
      relativeHumidity: 0,
      altitudeM: 4000,
      co2Ppm: 400,
    });
    const aloft = standardAtmosphere(14_000);
    const balloon = standardProfile({
      ...aloft,
      relativeHumidity: 0,
      altitudeM: 14_000,
      co2Ppm: 0,
    });
    for (const height of [0, 500, 10_999, 11_020, 25_000, 47_500, 60_000, 79_000]) {
      const expected = standardAtmosphere(height);
      for (const profile of [standard, high, balloon]) {
        expectRelative(airAtHeight(height, profile).pressurePa, expected.pressurePa, 1e-12);
        expectRelative(airAtHeight(height, profile).temperatureK, expected.temperatureK, 1e-13);
      }
    }
  });

  it("stays in hydrostatic balance in hot moist air (Runge-Kutta in geometric height)", () => {
    const profile = standardProfile(summer);
    const slope = (h: number, p: number): number => {
      const { temperatureK, waterMoleFraction } = airAtHeight(h, profile);
      const gravity = 9.80665 * (6356766 / (6356766 + h)) ** 2;
      const mass = (28.9644 * (1 - waterMoleFraction) + 18.015 * waterMoleFraction) / 1000;
      return (-p * mass * gravity) / (8.31432 * temperatureK);
    };
    let [h, p] = [summer.altitudeM, summer.pressurePa];
    // panels end at the kinks of the temperature: 11 and 20 km of geopotential height
    for (const end of [4000, 11019.067731, 20063.124075]) {
      const steps = 2000;
      const dh = (end - h) / steps;
      for (let i = 0; i < steps; i++) {
        const k1 = slope(h, p);
        const k2 = slope(h + dh / 2, p + (k1 * dh) / 2);
        const k3 = slope(h + dh / 2, p + (k2 * dh) / 2);
        const k4 = slope(h + dh, p + k3 * dh);
        p += ((k1 + 2 * k2 + 2 * k3 + k4) * dh) / 6;
        h += dh;
      }
      expectRelative(airAtHeight(h, profile).pressurePa, p, 1e-9);
    }
  });

  it("vapour's density falls with 2 km at the station, 1.9 km between 8 and 11 km", () => {
    const profile = standardProfile(summer);
    const density = (h: number): number => {
      const air = airAtHeight(h, profile);
      return (air.waterMoleFraction * air.pressurePa) / air.temperatureK;
    };
    const scale = (h: number, step: number): number =>
      step / Math.log(density(h) / density(h + step));
    // geometric against geopotential height: 2e-4 at 700 m; a step of 1 m: 1e-4
    expectRelative(scale(700, 1), 2000, 4e-4);
    expectRelative(scale(8000, 3000), 1900, 0.01);
    expectRelative(
      airAtHeight(700, profile).waterMoleFraction,
      moistAir(summer).waterMoleFraction,
      1e-14,
    );
  });

  it("a table of the standard atmosphere gives it back between rows, and above the last", () => {
    const profile = tabulatedProfile(standardRows(1000, 30_000), { co2Ppm: 425 });
    for (const height of [0, 350, 5500, 10_500, 15_300, 29_999, 30_000, 45_000, 70_000]) {
      const expected = standardAtmosphere(height);
      const air = airAtHeight(height, profile);
      // the tropopause lies 19 m above a row: its kink is cut
      expectRelative(air.pressurePa, expected.pressurePa, 1e-5);
      expectAbsolute(air.temperatureK, expected.temperatureK, 0.13);
    }
  });

  it("a table passes through its rows, vapour and all", () => {
    const rows = [
      { heightM: 113, temperatureK: 279.2, pressurePa: 100400, relativeHumidity: 0.93 },
      { heightM: 480, temperatureK: 283.4, pressurePa: 95990, relativeHumidity: 0.55 },
      { heightM: 900, temperatureK: 283.4, pressurePa: 91260, relativeHumidity: 0.4 },
      { heightM: 1520, temperatureK: 276.9, pressurePa: 84600, relativeHumidity: 0.5 },
    ];
    const profile = tabulatedProfile(rows);
    expect(profile.co2Ppm).toBe(450);
    expect(profile.lowestM).toBe(113);
    for (const row of rows) {
      const air = airAtHeight(row.heightM, profile);
      expectRelative(air.pressurePa, row.pressurePa, 1e-12);
      expectRelative(air.temperatureK, row.temperatureK, 1e-13);
      if (row.heightM === 1520) continue; // above the last row the air is dry
      const { waterMoleFraction } = moistAir({ ...row, co2Ppm: 450 });
      expectRelative(air.waterMoleFraction, waterMoleFraction, 1e-11);
    }
    // temperature and vapour are straight in geopotential height between the rows
    const geopotential = (z: number): number => (6_356_766 * z) / (6_356_766 + z);
    const [low, high] = [rows[0]!, rows[1]!].map((row) => ({
      ...moistAir({ ...row, co2Ppm: 450 }),
      h: geopotential(row.heightM),
      temperatureK: row.temperatureK,
    }));
    for (const heightM of [150, 300, 450]) {
      const share = (geopotential(heightM) - low!.h) / (high!.h - low!.h);
      const air = airAtHeight(heightM, profile);
      const between = (a: number, b: number): number => a + share * (b - a);
      expectRelative(air.temperatureK, between(low!.temperatureK, high!.temperatureK), 1e-12);
      const vapour = between(low!.waterMoleFraction, high!.waterMoleFraction);
      expectRelative(air.waterMoleFraction, vapour, 1e-11);
    }
    expect(airAtHeight(1521, profile).waterMoleFraction).toBe(0);
  });
});

describe("properties", () => {
  it("pressure falls with height, the temperature offset is the same everywhere, vapour never exceeds the station's", () => {
    fc.assert(
      fc.property(airState, between(0, 5000), between(0, 79_000), (state, altitudeM, height) => {
        const profile = standardProfile({ ...state, altitudeM });
        const here = airAtHeight(height, profile);
        expect(airAtHeight(height + 100, profile).pressurePa).toBeLessThan(here.pressurePa);
        const offset = state.temperatureK - standardAtmosphere(altitudeM).temperatureK;
        expectAbsolute(here.temperatureK - standardAtmosphere(height).temperatureK, offset, 1e-9);
        const station = airAtHeight(altitudeM, profile);
        expectRelative(station.pressurePa, state.pressurePa, 1e-13);
        if (height > altitudeM)
          expect(here.waterMoleFraction).toBeLessThanOrEqual(station.waterMoleFraction);
      }),
    );
  });
});

describe("edges", () => {
  it("standardProfile refuses what a station cannot read", () => {
    expectRefusal(
      () => standardProfile({ ...summer, pressurePa: 930 }),
      RangeError,
      "pressurePa",
      "hPa? multiply by 100",
    );
    expectRefusal(
      () => standardProfile({ ...summer, altitudeM: 20_001 }),
      RangeError,
      "standardProfile",
      "altitudeM",
      "-1000 to 20000 m",
    );
    expectRefusal(
      () => standardProfile({ ...summer, altitudeM: "700" as never }),
      TypeError,
      '"700"',
    );
    expectRefusal(() => standardProfile(undefined as never), TypeError, "record");
    expect(standardProfile({ ...summer, altitudeM: -400 }).lowestM).toBe(-400);
    expect(standardProfile(summer).lowestM).toBe(0);
  });

  it("airAtHeight refuses heights outside and raw input", () => {
    expectRefusal(() => airAtHeight(-1, standard), RangeError, "airAtHeight", "0 to 86000 m", "-1");
    expectRefusal(() => airAtHeight(86_001, standard), RangeError, "86001");
    expectRefusal(() => airAtHeight(0, summer as never), TypeError, "standardProfile");
    expect(airAtHeight(86_000, standard).pressurePa).toBeGreaterThan(0.3);
  });

  it("tabulatedProfile names the row that is wrong", () => {
    const rows = standardRows(1000, 12_000);
    const change = (i: number, fields: object): typeof rows =>
      rows.map((row, k) => (k === i ? { ...row, ...fields } : row));
    expectRefusal(() => tabulatedProfile(rows.slice(0, 1)), RangeError, "at least 2 rows, got 1");
    expectRefusal(() => tabulatedProfile({} as never), TypeError, "tabulatedProfile", "rows");
    expectRefusal(() => tabulatedProfile([1, 2] as never), TypeError, "rows[0]");
    expectRefusal(
      () => tabulatedProfile(change(3, { heightM: 2000 })),
      RangeError,
      "rows[3]",
      "above the row before (2000 m)",
    );
    expectRefusal(
      () => tabulatedProfile([...rows.slice(0, 3), ...rows.slice(9)]),
      RangeError,
      "rows[3]",
      "gap of 7000 m",
    );
    expectRefusal(() => tabulatedProfile(change(2, { temperatureK: 2 })), RangeError, "°C");
    expectRefusal(
      () => tabulatedProfile(change(4, { pressurePa: Number.NaN })),
      RangeError,
      "rows[4].pressurePa",
      "NaN",
    );
    expectRefusal(
      () => tabulatedProfile(change(4, { pressurePa: 75_000 })),
      RangeError,
      "rows[4]",
      "below the row before",
    );
    expectRefusal(
      () => tabulatedProfile(change(1, { relativeHumidity: 50 })),
      RangeError,
      "percent? divide by 100",
    );
    expectRefusal(
      () => tabulatedProfile(rows.map((row) => ({ ...row, pressurePa: row.pressurePa / 100 }))),
      RangeError,
      "rows[0].pressurePa",
      "hPa? multiply by 100",
    );
    expectRefusal(
      () => tabulatedProfile(rows.map((row) => ({ ...row, heightM: row.heightM * 3.2808 }))),
      RangeError,
      "stand for 1000 m",
      "feet? multiply by 0.3048",
    );
    expectRefusal(() => tabulatedProfile(rows, { co2Ppm: 3000 }), RangeError, "co2Ppm");
    expectRefusal(() => tabulatedProfile(rows, 425 as never), TypeError, "composition");
  });

  it("layers refuse what cannot be a layer", () => {
    expectRefusal(
      () => gaussianLayer({ heightM: 22_000, standardDeviationM: 5 }),
      RangeError,
      "gaussianLayer",
      "standardDeviationM",
      "100 to 30000 m",
      "km? multiply by 1000",
    );
    expectRefusal(
      () => gaussianLayer({ heightM: Number.NaN, standardDeviationM: 5000 }),
      RangeError,
      "heightM",
    );
    expectRefusal(() => gaussianLayer(undefined as never), TypeError, "gaussianLayer");
    expectRefusal(
      () => exponentialLayer({ scaleHeightM: 2 }),
      RangeError,
      "exponentialLayer",
      "km? multiply by 1000",
    );
    const rows = [
      { heightM: 0, density: 1 },
      { heightM: 1000, density: 0.5 },
    ];
    expect(tabulatedLayer(rows).densities).toEqual([1, 0.5]);
    expect(tabulatedLayer([{ heightM: -5, density: 0 }, ...rows]).densities[0]).toBe(0);
    expectRefusal(() => tabulatedLayer([rows[0]!, rows[0]!]), RangeError, "rows[1].heightM");
    expectRefusal(() => tabulatedLayer([...rows].reverse()), RangeError, "rows[1].heightM");
    expectRefusal(() => tabulatedLayer(rows.slice(1)), RangeError, "at least 2");
    expectRefusal(
      () => tabulatedLayer(rows.map((row) => ({ ...row, density: 0 }))),
      RangeError,
      "above 0",
    );
    expectRefusal(
      () => tabulatedLayer([rows[0]!, { heightM: 1000, density: -1 }]),
      RangeError,
      "rows[1].density",
    );
    expectRefusal(
      () => tabulatedLayer([rows[0]!, { heightM: 1000, density: Number.NaN }]),
      RangeError,
      "NaN",
    );
  });
});

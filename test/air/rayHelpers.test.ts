/** Helpers of profiles that rays use without guards, and the last digits of the checks of a sounding. */
import { describe, expect, it } from "vitest";
import { layerBreaks, layerDensity } from "../../src/air/_layerDensity.js";
import { fillState, profileLayer } from "../../src/air/_profileState.js";
import { refractivity, refractivityFactors } from "../../src/air/_refractivityCore.js";
import { shiftedProfile } from "../../src/air/_shiftedProfile.js";
import {
  airAtHeight,
  exponentialLayer,
  gaussianLayer,
  moistAir,
  type ProfileRow,
  refractiveIndexCiddor,
  standardProfile,
  tabulatedLayer,
  tabulatedProfile,
} from "../../src/index.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const summer = {
  pressurePa: 93000,
  temperatureK: 305.15,
  relativeHumidity: 0.7,
  altitudeM: 700,
  co2Ppm: 390,
};

describe("the index along a ray", () => {
  it.each([0, 0.7, 1])("is the public one, humidity %d", (relativeHumidity) => {
    for (const nm of [310, 550, 1600]) {
      const air = moistAir({ ...summer, relativeHumidity });
      const factors = refractivityFactors(nm, air.co2Ppm);
      const { temperatureK, pressurePa, waterMoleFraction } = air;
      const ours = refractivity(factors, temperatureK, pressurePa, waterMoleFraction);
      // n - 1 of the public function keeps 12 digits
      expectRelative(ours, refractiveIndexCiddor(nm, air) - 1, 2e-12);
    }
  });
});

describe("densities of layers", () => {
  it("Gaussian, exponential and table", () => {
    const gaussian = gaussianLayer({ heightM: 22_000, standardDeviationM: 5000 });
    expectRelative(layerDensity(gaussian, 32_000), Math.exp(-2), 1e-14);
    expectRelative(
      layerDensity(exponentialLayer({ scaleHeightM: 2000 }), 3000),
      Math.exp(-1.5),
      1e-14,
    );
    const heights = [1000, 1500, 2500, 4000, 7000, 9000];
    const table = tabulatedLayer(heights.map((heightM, i) => ({ heightM, density: 1 + i * i })));
    expect(layerDensity(table, 999)).toBe(0);
    expect(layerDensity(table, 9001)).toBe(0);
    heights.forEach((height, i) => {
      expect(layerDensity(table, height)).toBe(1 + i * i);
      if (i === 0) return;
      const middle = (height + heights[i - 1]!) / 2;
      expectRelative(layerDensity(table, middle), (2 + i * i + (i - 1) * (i - 1)) / 2, 1e-14);
    });
    expect(layerBreaks(table)).toEqual(heights);
    for (const layer of [gaussian, exponentialLayer({ scaleHeightM: 2000 })]) {
      const breaks = layerBreaks(layer);
      expect(breaks).toEqual([...breaks].sort((a, b) => a - b));
      // between breaks the density changes by less than Gauss's rule of 16 points can follow
      for (let i = 1; i < breaks.length; i++) {
        const [a, b] = [layerDensity(layer, breaks[i - 1]!), layerDensity(layer, breaks[i]!)];
        expect(Math.abs(Math.log(a / b))).toBeLessThanOrEqual(25);
      }
    }
  });
});

describe("a profile in other weather", () => {
  const weather = { ...summer, pressurePa: 92_100, temperatureK: 301.15 };
  const saturated = moistAir({ ...weather, relativeHumidity: 0.01 }).waterMoleFraction * 100;
  const relativeHumidity = moistAir(summer).waterMoleFraction / saturated;

  it("is the standard profile of that weather with the same vapour", () => {
    const shifted = shiftedProfile(standardProfile(summer), 700, 92_100, 301.15);
    const exact = standardProfile({ ...weather, relativeHumidity });
    for (const height of [0, 700, 5000, 11_030, 15_000, 30_000, 48_000, 60_000, 80_000]) {
      const [ours, theirs] = [airAtHeight(height, shifted), airAtHeight(height, exact)];
      expectRelative(ours.temperatureK, theirs.temperatureK, 1e-13);
      expectRelative(ours.pressurePa, theirs.pressurePa, 1e-12);
      expectRelative(ours.waterMoleFraction, theirs.waterMoleFraction, 1e-11);
    }
  });

  it("keeps a table's weights and mole fractions, from any height in it", () => {
    const rows = [0, 400, 1500, 3000, 6000].map((heightM) => {
      const { temperatureK, pressurePa } = airAtHeight(heightM, standardProfile(summer));
      return { heightM, temperatureK, pressurePa, relativeHumidity: 0.4 };
    });
    const table = tabulatedProfile(rows);
    const shifted = shiftedProfile(
      table,
      1500,
      rows[2]!.pressurePa * 0.99,
      rows[2]!.temperatureK - 5,
    );
    const state = new Float64Array(3);
    for (const { heightM, temperatureK, pressurePa } of rows.slice(0, 4)) {
      const here = airAtHeight(heightM, shifted);
      expectRelative(here.temperatureK, temperatureK - 5, 1e-13);
      expectRelative(here.waterMoleFraction, airAtHeight(heightM, table).waterMoleFraction, 1e-12);
      // hydrostatic: ln p falls faster in the colder air, by dT/T of the fall from the row of reference
      const fall = Math.log(rows[2]!.pressurePa / pressurePa);
      const mean = (rows[2]!.temperatureK + temperatureK) / 2;
      const expected = Math.log(0.99 * rows[2]!.pressurePa) - (fall * mean) / (mean - 5);
      expectAbsolute(Math.log(here.pressurePa), expected, 1e-5);
    }
    fillState(shifted, shifted.layers[profileLayer(shifted, 1499)]!, 1500, state);
    expectRelative(state[1]!, rows[2]!.pressurePa * 0.99, 1e-4);
  });
});

describe("the limits of a sounding, to their last digits", () => {
  const GAMMA = 0.03416319473631036; // K per m
  /** Isothermal rows whose pressures stand for `excess` more than each step of height. */
  const isothermal = (
    heights: number[],
    excess = 0,
    kelvins = 250,
    bottom = 100_000,
  ): ProfileRow[] =>
    heights.map((heightM) => ({
      heightM,
      temperatureK: kelvins,
      pressurePa: bottom * Math.exp((-GAMMA * (heightM - heights[0]!) * (1 + excess)) / kelvins),
      relativeHumidity: 0,
    }));
  const refused = (rows: ProfileRow[], ...parts: string[]): void =>
    expectRefusal(() => tabulatedProfile(rows), RangeError, ...parts);

  it("steps: up to 5 km, any rise above 0", () => {
    expect(tabulatedProfile(isothermal([0, 5000])).lowestM).toBe(0);
    refused(isothermal([0, 5000.5]), "rows[1]", "gap of 5000.5 m");
    const close = isothermal([0, 5e-4, 1000]);
    expect(tabulatedProfile(close).lowestM).toBe(0);
    refused(
      isothermal([0, -100]).map((row) => ({ ...row, pressurePa: 99_000 })),
      "rows[1]",
      "above the row before",
    );
  });

  it("balance: 10 % over 500 m and more", () => {
    for (const [excess, fits] of [
      [0.1 - 1e-6, true],
      [0.1 + 1e-6, false],
      [-0.1 + 1e-6, true],
      [-0.1 - 1e-6, false],
    ] as const) {
      const rows = isothermal([0, 500, 1000], excess);
      if (fits) expect(tabulatedProfile(rows).lowestM).toBe(0);
      else refused(rows, "rows[1]", "within 10 %");
    }
    refused(isothermal([0, 499.9, 1000], 0.2), "rows[2]");
  });

  it("feet are suspected within 20 % of them", () => {
    for (const [share, suspected] of [
      [1.1999, true],
      [1.2001, false],
      [0.8001, true],
      [0.7999, false],
    ] as const) {
      const rows = isothermal([0, 1000, 2000], share / 3.2808 - 1);
      refused(rows, "stand for");
      let message = "";
      try {
        tabulatedProfile(rows);
      } catch (error) {
        message = (error as Error).message;
      }
      expect(message.includes("feet?")).toBe(suspected);
    }
  });

  it("pressures: 10 kPa in the first row, 0.1 Pa in the last; the air ends at 86 km", () => {
    const high = tabulatedProfile(isothermal([16_000, 17_000], 0, 220, 10_000.5));
    expect(airAtHeight(86_000, high).pressurePa).toBeGreaterThan(0);
    expectRefusal(() => airAtHeight(86_001, high), RangeError, "86000");
    refused(isothermal([16_000, 17_000], 0, 220, 9999), "rows[0].pressurePa", "10000 to 140000 Pa");
    const heights = Array.from({ length: 13 }, (_, i) => i * 5000);
    const last = (Math.log(100_000 / 0.10005) * 150) / GAMMA;
    expect(last).toBeGreaterThan(60_000);
    expect(last).toBeLessThan(65_000);
    const cold = isothermal([...heights, last], 0, 150);
    expect(tabulatedProfile(cold).lowestM).toBe(0);
    const colder = cold.map((row, i) => (i === 13 ? { ...row, pressurePa: 0.0999 } : row));
    refused(colder, "rows[13].pressurePa", "0.1 to 140000 Pa");
  });

  it("between isothermal rows pressure falls by the plain exponential", () => {
    const [low, high] = isothermal([0, 4000]) as [ProfileRow, ProfileRow];
    const profile = tabulatedProfile([low, high]);
    const middle = airAtHeight(2000, profile).pressurePa;
    // geopotential against geometric middle: 2 km times 2 km over the Earth's radius, 0.3 m of 7 km
    expectRelative(middle, Math.sqrt(low.pressurePa * high.pressurePa), 1e-4);
  });
});

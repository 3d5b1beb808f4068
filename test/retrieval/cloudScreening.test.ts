import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cloudScreening, screeningReasons } from "../../src/index.js";
import { between } from "../_generators.js";
import { randomOf } from "../_stationDays.js";
import { expectRefusal } from "../_tolerance.js";

const minutes = (count: number): number[] => Array.from({ length: count }, (_, i) => i);
const steady = (count: number, depth = 0.1): number[] => minutes(count).map(() => depth);

describe("published values", () => {
  // Smirnov et al. 2000 (from memory): a triplet may spread by 0.02, or by 3 % where the depth is above 0.67
  it.each([
    [0.1, 0.01999, 0],
    [0.1, 0.02001, 2],
    [0.6, 0.01999, 0],
    [0.6, 0.02001, 2],
    [2, 0.05998, 0],
    [2, 0.06002, 2],
  ])("triplet about %d that spreads by %d", (depth, spread, code) => {
    const depths = steady(60, depth);
    depths[30] = depth + spread;
    const codes = cloudScreening(minutes(60), depths, 4);
    expect(Array.from(codes.slice(28, 33))).toEqual(Array(5).fill(code));
    expect(codes[27]).toBe(0);
    expect(codes[33]).toBe(0);
  });
});

describe("limits", () => {
  /** 20 readings of 5 ± spread in turn and a last one of 5 + step: triplets may differ by 0.15 there. */
  const stepped = (spread: number, step: number): number[] => [
    ...minutes(20).map((i) => 5 + spread * (1 - 2 * (i % 2))),
    5 + step,
  ];
  const last = (depths: number[]): number =>
    cloudScreening(minutes(depths.length), depths, 4).at(-1)!;

  it("takes depths from -0.01 on", () => {
    const depths = steady(9, -0.01);
    depths[4] = -0.010005;
    expect(Array.from(cloudScreening(minutes(9), depths, 4))).toEqual([0, 0, 0, 0, 1, 0, 0, 0, 0]);
  });
  it("looks at the first three readings", () => {
    expect(Array.from(cloudScreening([0, 1, 2], [0.1, 0.1, 0.2], 4))).toEqual([2, 2, 2]);
    expect(Array.from(cloudScreening([0, 1, 2], [0.2, 0.1, 0.1], 2))).toEqual([2, 2, 2]);
    expect(Array.from(cloudScreening([0, 1, 2.01], [0.2, 0.1, 0.1], 2))).toEqual([3, 0, 3]);
  });
  it("looks for readings far off on days that vary by 0.015 or more", () => {
    // 20 equal ones and one a step away: standard deviation step / √21, the one 20 / √21 = 4.4 of them off the mean
    expect(last(stepped(0, 0.015005 * Math.sqrt(21)))).toBe(4);
    expect(last(stepped(0, 0.014995 * Math.sqrt(21)))).toBe(0);
  });
  it("calls those far that are beyond three standard deviations", () => {
    // step 20 / 21 off the mean, variance step² / 21 + spread²
    const times = (n: number): number[] =>
      stepped(0.1 * Math.sqrt((20 / 21 / n) ** 2 - 1 / 21), 0.1);
    expect(last(times(3.001))).toBe(4);
    expect(last(times(2.999))).toBe(0);
  });
});

describe("independent fixtures", () => {
  it("keeps clear readings and finds cloud on 40 simulated days", () => {
    const totals = { clear: 0, kept: 0, cloudy: 0, missed: 0 };
    for (let seed = 1; seed <= 40; seed++) {
      const { uniform, normal } = randomOf(seed);
      const clouds = Array.from({ length: 8 }, () => ({
        centre: 600 * uniform(),
        halfWidth: 4 + 18 * uniform(),
        depth: 0.1 + uniform(),
      }));
      const truth = minutes(600).map((t) =>
        clouds.reduce((sum, { centre, halfWidth, depth }) => {
          const x = (t - centre) / halfWidth;
          if (Math.abs(x) >= 1) return sum;
          // cumulus: ragged from minute to minute, with thin edges
          return sum + depth * (1 - x * x) * (0.6 + 0.4 * Math.abs(Math.sin(7.3 * t)));
        }, 0),
      );
      const depths = truth.map(
        (cloud, t) => 0.12 + 0.03 * Math.sin(t / 100) + cloud + 0.002 * normal(),
      );
      const codes = cloudScreening(minutes(600), depths, 4);
      truth.forEach((cloud, t) => {
        if (cloud === 0) totals.clear += 1;
        if (cloud === 0 && codes[t] === 0) totals.kept += 1;
        if (cloud > 0.02) totals.cloudy += 1;
        if (cloud > 0.02 && codes[t] === 0) totals.missed += 1;
      });
    }
    expect(totals.cloudy / (40 * 600)).toBeGreaterThan(0.25); // over a quarter, as the comment says
    expect(totals.kept / totals.clear).toBeGreaterThan(0.9);
    expect(totals.missed / totals.cloudy).toBeLessThan(0.02);
  });

  it("gives the rules in order, each its own code", () => {
    const depths = steady(40);
    depths[5] = Number.NaN;
    depths[6] = -0.02;
    for (let i = 20; i < 26; i++) depths[i] = 0.5 + 0.1 * (i % 2); // a cloud
    const codes = cloudScreening(minutes(40), depths, 4);
    expect([codes[5], codes[6]]).toEqual([1, 1]);
    expect(Array.from(codes.slice(18, 28))).toEqual(Array(10).fill(2));
    expect(codes[17]).toBe(0);
    // one reading between two clouds, too far from others
    const lonely = cloudScreening([0, 1, 2, 3, 30, 60, 61, 62], steady(8), 4);
    expect(Array.from(lonely)).toEqual([0, 0, 0, 0, 3, 0, 0, 0]);
    // a slow thick bank: no triplet sees its middle, the day does
    const bank = minutes(300).map((t) => 0.1 + 1.0 * Math.exp(-(((t - 150) / 14) ** 4)));
    const far = cloudScreening(minutes(300), bank, 4);
    expect(far[150]).toBe(4);
    expect(far[20]).toBe(0);
    expect(screeningReasons.length).toBe(5);
  });
});

describe("properties", () => {
  it("keeps every reading of a day that hardly varies", () => {
    fc.assert(
      fc.property(fc.array(between(0.1, 0.115), { minLength: 3, maxLength: 200 }), (depths) => {
        expect(cloudScreening(minutes(depths.length), depths, 4).every((code) => code === 0)).toBe(
          true,
        );
      }),
    );
  });
  it("does not ask when the clock started", () => {
    fc.assert(
      fc.property(fc.array(between(0.05, 0.4), { minLength: 3, maxLength: 60 }), (depths) => {
        const times = minutes(depths.length);
        expect(
          cloudScreening(
            times.map((t) => t + 1e5),
            depths,
            3,
          ),
        ).toEqual(cloudScreening(times, depths, 3));
      }),
    );
  });
});

describe("edges", () => {
  it("takes a day without readings and one with a single one", () => {
    expect(cloudScreening([], [], 4).length).toBe(0);
    expect(Array.from(cloudScreening([0], [0.1], 4))).toEqual([3]);
    expect(Array.from(cloudScreening([0], [Number.NaN], 4))).toEqual([1]);
  });
  it("refuses what cannot be", () => {
    expectRefusal(() => cloudScreening([0, 1], [0.1], 4), RangeError, "timesMinutes", "as many");
    expectRefusal(() => cloudScreening([1, 1], [0.1, 0.1], 4), RangeError, "timesMinutes[1]");
    expectRefusal(
      () => cloudScreening([0, Number.NaN], [0.1, 0.1], 4),
      RangeError,
      "timesMinutes[1]",
    );
    expectRefusal(() => cloudScreening([0], [0.1], 0), RangeError, "windowMinutes");
    expectRefusal(() => cloudScreening(0 as never, [0.1], 1), TypeError, "timesMinutes");
  });
});

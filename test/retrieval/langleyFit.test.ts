import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { langleyFit } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { morning, normal, seeded } from "./_mornings.js";

// Anscombe 1973, Am. Stat. 27, 17 (data from memory; the sums he states hold for them: line y = 3 + 0.5 x in every set)
const ANSCOMBE_X = [10, 8, 13, 9, 11, 14, 6, 4, 12, 7, 5];
const ANSCOMBE_1 = [8.04, 6.95, 7.58, 8.81, 8.33, 9.96, 7.24, 4.26, 10.84, 4.82, 5.68];
const ANSCOMBE_3 = [7.46, 6.77, 12.74, 7.11, 7.81, 8.84, 6.08, 5.39, 8.15, 6.42, 5.73];

describe("published values", () => {
  it("gives Anscombe's regression of his first set", () => {
    const fit = langleyFit({ airMasses: ANSCOMBE_X, signals: ANSCOMBE_1.map(Math.exp) });
    expect(fit.rejected).toEqual([]);
    // he prints 3, 0.5 and 0.118; further digits as statistics programs print them: half of the last digit
    expectAbsolute(Math.log(fit.constant), 3.00009, 5e-6);
    expectAbsolute(fit.opticalDepth, -0.50009, 5e-6);
    expectAbsolute(fit.constantStandardError / fit.constant, 1.12475, 5e-6);
    expectAbsolute(fit.opticalDepthStandardError, 0.11791, 5e-6);
  });

  it("finds the line of his third set, where one point spoils least squares", () => {
    const fit = langleyFit({ airMasses: ANSCOMBE_X, signals: ANSCOMBE_3.map(Math.exp) });
    expect(fit.rejected.map(({ index }) => index)).toEqual([2]);
    // the other ten lie on a line from (4, 5.39) to (14, 8.84), each rounded to 0.01: 0.345 within 0.02 / 10
    expectAbsolute(fit.opticalDepth, -0.345, 2e-3);
    expectAbsolute(Math.log(fit.constant), 5.39 - 4 * 0.345, 0.02);
    expect(fit.constantStandardError / fit.constant).toBeLessThan(0.01); // with the eleventh point it is 1.12
  });
});

describe("independent fixtures", () => {
  it("is the weighted normal equations, solved by Cramer's rule", () => {
    const uniform = seeded(7);
    const airMasses = Array.from({ length: 30 }, (_, i) => 1.2 + i * 0.2);
    const weights = airMasses.map((mass) => 1 / (mass * mass));
    const logs = airMasses.map((mass) => 0.4 - 0.3 * mass + 0.002 * (uniform() - 0.5) * mass);
    const fit = langleyFit({ airMasses, signals: logs.map(Math.exp), weights });
    const s = (f: (i: number) => number): number =>
      weights.reduce((total, weight, i) => total + weight * f(i), 0);
    const [s0, s1, s2] = [s(() => 1), s((i) => airMasses[i]!), s((i) => airMasses[i]! ** 2)];
    const [t0, t1] = [s((i) => logs[i]!), s((i) => airMasses[i]! * logs[i]!)];
    const determinant = s0 * s2 - s1 * s1;
    const intercept = (s2 * t0 - s1 * t1) / determinant;
    const slope = (s0 * t1 - s1 * t0) / determinant;
    const variance = s((i) => (logs[i]! - intercept - slope * airMasses[i]!) ** 2) / 28;
    const constant = Math.exp(intercept);
    expect(fit.rejected).toEqual([]);
    // two orders of the same sums in double precision: 1e-16 times the condition of the normal equations, about 100
    expectRelative(fit.constant, constant, 1e-13);
    expectRelative(fit.opticalDepth, -slope, 1e-13);
    const error = Math.sqrt((variance * s2) / determinant);
    expectRelative(fit.constantStandardError, constant * error, 1e-10); // residuals lose 3 digits more
    expectRelative(fit.opticalDepthStandardError, Math.sqrt((variance * s0) / determinant), 1e-10);
    const shared = (constant * variance * s1) / determinant;
    expectRelative(fit.covariance[0][1], shared, 1e-10);
    expect(fit.covariance[1][0]).toBe(fit.covariance[0][1]);
    expectRelative(fit.covariance[0][0], fit.constantStandardError ** 2, 1e-14);
    expectRelative(fit.covariance[1][1], fit.opticalDepthStandardError ** 2, 1e-14);
  });

  it("recovers 200 simulated mornings with 30 % cloud in the middle, and states errors that hold", () => {
    const scores = Array.from({ length: 200 }, (_, seed) => {
      const truth = { constant: 1.7, opticalDepth: 0.08 };
      const { cloudy, ...readings } = morning({
        ...truth,
        seed: seed + 1,
        count: 120,
        noise: 1e-3,
        cloudShare: 0.3,
      });
      const fit = langleyFit(readings);
      expectRelative(fit.constant, truth.constant, 1.2e-3); // as the comment of langleyFit says
      const left = new Set(fit.rejected.map(({ index }) => index));
      expect(cloudy.filter((i) => !left.has(i))).toEqual([]);
      expect(left.size - cloudy.length).toBeLessThanOrEqual(4); // 84 clear readings beyond 3 sigma: 0.2 expected
      const dTau = (fit.opticalDepth - truth.opticalDepth) / fit.opticalDepthStandardError;
      return [(fit.constant - truth.constant) / fit.constantStandardError, dTau];
    });
    for (const k of [0, 1]) {
      const spread = Math.sqrt(scores.reduce((total, score) => total + score[k]! ** 2, 0) / 200);
      expectAbsolute(spread, 1, 0.15); // 200 draws: 3 sigma of a standard deviation
    }
  });

  it("least squares alone would miss the same mornings by per cents", () => {
    const { airMasses, signals } = morning({
      seed: 3,
      count: 120,
      constant: 1.7,
      opticalDepth: 0.08,
      noise: 1e-3,
      cloudShare: 0.3,
    });
    const mean = (v: number[]): number => v.reduce((a, b) => a + b, 0) / v.length;
    const y = signals.map(Math.log);
    const [mx, my] = [mean(airMasses), mean(y)];
    const slope =
      mean(airMasses.map((x, i) => (x - mx) * (y[i]! - my))) /
      mean(airMasses.map((x) => (x - mx) ** 2));
    expect(Math.abs(my - slope * mx - Math.log(1.7))).toBeGreaterThan(0.05);
  });
});

describe("properties", () => {
  const lines = fc.tuple(between(1e-3, 1e3), between(0.01, 1.5), fc.integer({ min: 8, max: 60 }));
  const exact = ([constant, opticalDepth, count]: [number, number, number]): {
    airMasses: number[];
    signals: number[];
  } => {
    const airMasses = Array.from({ length: count }, (_, i) => 1 + (6 * i) / (count - 1));
    return { airMasses, signals: airMasses.map((m) => constant * Math.exp(-opticalDepth * m)) };
  };

  it("finds an exact line again, in any order and unit, and rejects nothing", () => {
    fc.assert(
      fc.property(lines, between(1e-6, 1e6), (line, unit) => {
        const { airMasses, signals } = exact(line);
        const fit = langleyFit({
          airMasses: airMasses.slice().reverse(),
          signals: signals
            .slice()
            .reverse()
            .map((signal) => signal * unit),
        });
        expectRelative(fit.constant, line[0] * unit, 1e-12); // rounding of exponentials and logarithms
        expectAbsolute(fit.opticalDepth, line[1], 1e-12);
        expect(fit.rejected).toEqual([]);
      }),
    );
  });

  it("is not moved by clouds on fewer than half of the readings, wherever they are", () => {
    fc.assert(
      fc.property(lines, fc.integer({ min: 1, max: 1e6 }), (line, seed) => {
        const { airMasses, signals } = exact(line);
        const uniform = seeded(seed);
        const most = Math.floor((signals.length - 8) * 0.45);
        const places = airMasses.map((_, i) => ({ i, key: uniform() }));
        const cloudy = places.sort((a, b) => a.key - b.key).slice(0, Math.max(0, most));
        for (const { i } of cloudy) signals[i]! *= 0.2 + 0.75 * uniform();
        const fit = langleyFit({ airMasses, signals });
        expectRelative(fit.constant, line[0], 1e-9);
        const left = fit.rejected.map(({ index }) => index);
        expect(left).toEqual(cloudy.map(({ i }) => i).sort((a, b) => a - b));
        for (const { reason } of fit.rejected) expect(reason).toContain("cloud");
      }),
    );
  });

  it("does not care about a common factor of the weights, and does about their ratio", () => {
    const gauss = normal(seeded(11));
    const airMasses = Array.from({ length: 40 }, (_, i) => 1 + i * 0.15);
    const signals = airMasses.map((mass) => Math.exp(-0.2 * mass) * (1 + 0.002 * gauss()));
    const plain = langleyFit({ airMasses, signals });
    const scaled = langleyFit({ airMasses, signals, weights: airMasses.map(() => 1e4) });
    expectRelative(scaled.constant, plain.constant, 1e-14); // same sums, rounding only
    expectRelative(scaled.constantStandardError, plain.constantStandardError, 1e-12);
    const tilted = langleyFit({ airMasses, signals, weights: airMasses.map((m) => 1 / (m * m)) });
    expect(Math.abs(tilted.constant / plain.constant - 1)).toBeGreaterThan(1e-5);
  });
});

describe("edges", () => {
  const airMasses = [1, 2, 3, 4, 5, 6, 7, 8];
  const signals = airMasses.map((mass) => Math.exp(-0.1 * mass));

  it("works with 8 readings and a range of 1, and refuses less", () => {
    expectAbsolute(langleyFit({ airMasses, signals }).opticalDepth, 0.1, 1e-14);
    const seven = { airMasses: airMasses.slice(1), signals: signals.slice(1) };
    expectRefusal(() => langleyFit(seven), RangeError, "langleyFit", "at least 8", "got 7");
    const narrow = (range: number): unknown =>
      langleyFit({ airMasses: airMasses.map((m) => 2 + ((m - 1) / 7) * range), signals });
    expect(() => narrow(1)).not.toThrow();
    expectRefusal(() => narrow(0.99), RangeError, "airMasses", "span at least 1", "0.990");
    expectRefusal(() => narrow(0), RangeError, "span at least 1");
  });

  it("leaves out readings that are no signal and says so", () => {
    const fit = langleyFit({
      airMasses: [...airMasses, 9, 10, 11],
      signals: [...signals, 0, -0.1, Number.NaN],
    });
    expect(fit.rejected.map(({ index }) => index)).toEqual([8, 9, 10]);
    expect(fit.rejected.map(({ reason }) => reason).join("; ")).toBe(
      "signal 0 is not above 0; signal -0.1 is not above 0; signal NaN is not above 0",
    );
  });

  it("says on which side of the line a reading lay", () => {
    const bright = signals.slice();
    const masses = [...airMasses, 1.5, 2.5, 3.5];
    const more = [...bright, Math.exp(-0.15) * 1.1, Math.exp(-0.25), Math.exp(-0.35) * 0.9];
    const fit = langleyFit({ airMasses: masses, signals: more });
    expect(fit.rejected.map(({ index }) => index)).toEqual([8, 10]);
    expect(fit.rejected[0]!.reason).toContain("above the line");
    expect(fit.rejected[1]!.reason).toContain("below the line (cloud?)");
  });

  it("refuses a morning without a line in most of it", () => {
    const uniform = seeded(1);
    const wild = (): number => Math.tan(Math.PI * (uniform() - 0.5)) ** 5; // no scatter to speak of as normal
    const masses = Array.from({ length: 40 }, (_, i) => 1 + i * 0.2);
    const broken = masses.map((m) =>
      Math.exp(-0.1 * m + Math.max(-50, Math.min(50, 0.01 * wild()))),
    );
    const call = (): unknown => langleyFit({ airMasses: masses, signals: broken });
    expectRefusal(call, RangeError, "langleyFit", "more than half", "of 40", "clearer morning");
  });

  it("refuses the wrong kind, the wrong length and impossible values", () => {
    expectRefusal(() => langleyFit(undefined as never), TypeError, "readings");
    expectRefusal(() => langleyFit({ airMasses } as never), TypeError, "signals");
    expectRefusal(() => langleyFit({ airMasses, signals: [1, 2] }), RangeError, "signals", "got 2");
    const strings = signals.map(String) as never;
    expectRefusal(() => langleyFit({ airMasses, signals: strings }), TypeError, "signals[0]");
    const angles = airMasses.map((mass) => 88 - mass);
    expectRefusal(() => langleyFit({ airMasses: angles, signals }), RangeError, "zenith angle?");
    const nan = airMasses.map((mass) => (mass === 4 ? Number.NaN : mass));
    expectRefusal(() => langleyFit({ airMasses: nan, signals }), RangeError, "airMasses[3]", "NaN");
    const zero = signals.map(() => 0);
    expectRefusal(
      () => langleyFit({ airMasses, signals, weights: zero }),
      RangeError,
      "weights[0]",
    );
    expectRefusal(() => langleyFit({ airMasses, signals, weights: [1] }), RangeError, "weights");
  });

  it("takes Float64Array", () => {
    const fit = langleyFit({
      airMasses: Float64Array.from(airMasses),
      signals: Float64Array.from(signals),
      weights: new Float64Array(8).fill(2),
    });
    expectAbsolute(fit.opticalDepth, 0.1, 1e-14);
  });
});

/** The fits that the functions of this room share, at their limits. */
import { describe, expect, it } from "vitest";
import { extinctionFit, langleyFit } from "../../src/index.js";
import { checkEnough } from "../../src/retrieval/_checkReadings.js";
import { cleanedLine } from "../../src/retrieval/_cleanedLine.js";
import { cleanedPlane } from "../../src/retrieval/_cleanedPlane.js";
import { leastSquares } from "../../src/retrieval/_leastSquares.js";
import { median } from "../../src/retrieval/_median.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { normal, seeded } from "./_mornings.js";

/** Median distance to standard deviation of a normal scatter, the quantile of 3/4 to ten digits (from memory). */
const NORMAL_MEDIAN = 1 / 0.6744897502;
/** The sources have it to 7 digits: half of the last. */
const DIGITS = 0.5e-6 / NORMAL_MEDIAN;

const f64 = (...values: number[]): Float64Array => Float64Array.from(values);
const middle = (values: readonly number[]): number =>
  values.map(Math.abs).sort((a, b) => a - b)[(values.length - 1) / 2]!;

/** What is left of `y` after the least-squares line, whose slope is the mean slope of all pairs by squared distance. */
function offLine(x: readonly number[], y: readonly number[]): number[] {
  const pairs = x.flatMap((a, i) => x.map((b, j) => [a - b, y[i]! - y[j]!] as const));
  const slope =
    pairs.reduce((sum, [dx, dy]) => sum + dx * dy, 0) /
    pairs.reduce((sum, [dx]) => sum + dx * dx, 0);
  const mean = (list: readonly number[]): number => list.reduce((a, b) => a + b) / list.length;
  return y.map((value, i) => value - mean(y) - slope * (x[i]! - mean(x)));
}

/** At each of the masses 1 and 2: 0, `pairs` times ±1 and one ±far. All fits are the line 0, with or without ±far. */
function symmetric(pairs: number, far: number): { x: number[]; y: number[]; ends: number[] } {
  const one = [0, ...Array.from({ length: 2 * pairs }, (_, i) => 1 - 2 * (i % 2)), far, -far];
  const [x, y] = [
    [...one.map(() => 1), ...one.map(() => 2)],
    [...one, ...one],
  ];
  return { x, y, ends: y.flatMap((value, i) => (Math.abs(value) === far ? [i] : [])) };
}

describe("median", () => {
  it("is the middle one, or the mean of the middle two", () => {
    expect([f64(7), f64(3, 1, 2), f64(9, 5, 1, 7, 2)].map(median)).toEqual([7, 2, 5]);
    expect([f64(2, 1), f64(8, 1, 4, 2), f64(6, 5, 4, 3, 2, 1)].map(median)).toEqual([1.5, 3, 3.5]);
    expect(median(f64())).toBeNaN();
  });
});

describe("leastSquares", () => {
  it("refuses a column that follows from the others to 1e-10, on both sides of the limit", () => {
    // of (1, e) nothing but e is left beside (1, 0)
    const beside = (e: number) => leastSquares([f64(1, 0), f64(1, e)], f64(2, e), f64(1, 1));
    expectAbsolute(beside(1.0005e-10)!.unknowns[1]!, 1, 1e-5); // 16 digits less 10
    expect(beside(0.9995e-10)).toBeUndefined();
  });
  it("gives residuals in the unit of the data, however small the weights; none without weight", () => {
    const { residuals } = leastSquares([f64(1, 1, 1)], f64(1, 3, 9), f64(1e-8, 1e-8, 0))!;
    expectAbsolute(residuals[0]!, -1, 1e-14);
    expectAbsolute(residuals[1]!, 1, 1e-14);
    expect(residuals[2]).toBeNaN();
  });
});

describe("cleanedLine", () => {
  const { gauss, x } = { gauss: normal(seeded(5)), x: Array.from({ length: 11 }, (_, i) => 1 + i) };
  const y = x.map((value) => 2 - 0.3 * value + 0.01 * gauss());

  it("measures from the least-squares line in scales of 1.4826 (1 + 5 / (n - 2)) median distances", () => {
    const off = offLine(x, y);
    const scale = NORMAL_MEDIAN * (1 + 5 / 9) * middle(off);
    const { scores } = cleanedLine(f64(...x), f64(...y), new Float64Array(11).fill(7));
    expect(Math.max(...scores.map(Math.abs))).toBeLessThan(3);
    off.forEach((value, i) => {
      expectRelative(scores[i]!, value / scale, DIGITS);
    });
  });
  it("takes three points, no fewer", () => {
    // the line through (1, d/3), (2, d/3), (3, d/3) leaves -d/3, 2d/3, -d/3: median d/3, scale 6 × 1.4826 times it
    const three = cleanedLine(f64(1, 2, 3), f64(0, 2e-9, 0), f64(1, 1, 1));
    expectAbsolute(three.line!.intercept, 2e-9 / 3, 1e-23);
    [-1, 2, -1].forEach((off, i) => {
      expectRelative(three.scores[i]!, off / (6 * NORMAL_MEDIAN), DIGITS);
    });
    expect(cleanedLine(f64(1, 2), f64(0, 1), f64(1, 1)).line).toBeUndefined();
  });
  it("counts a scatter below 1e-9 as 1e-9", () => {
    const { scores } = cleanedLine(f64(1, 2, 3, 4, 5), f64(0, 0, 1e-6, 0, 0), f64(3, 3, 3, 3, 3));
    expectRelative(scores[2]!, 1000, 1e-12);
  });
  it("rejects beyond 3 scales, on both sides of the limit", () => {
    // 202 points, median distance 1; without the four far ones the scale is 5e-4 wider
    const limit = 3 * NORMAL_MEDIAN * (1 + 5 / 200);
    const rejected = (far: number): [number[], number[]] => {
      const { x: airMasses, y: logs, ends } = symmetric(49, far);
      const fit = langleyFit({ airMasses, signals: logs.map((value) => Math.exp(1e-3 * value)) });
      for (const { reason } of fit.rejected) expect(reason).toMatch(/^3\.0 scales (above|below)/);
      return [fit.rejected.map(({ index }) => index), ends];
    };
    const [out, ends] = rejected(limit * 1.0008);
    expect(out).toEqual(ends);
    expect(rejected(limit * 0.9999)[0]).toEqual([]);
  });
  it("stops a set that swings to and fro at its thirtieth round", () => {
    // of 26 points four are too far; the scale of the other 22 takes them in again: the even rounds have all
    const scale = (n: number): number => NORMAL_MEDIAN * (1 + 5 / (n - 2));
    const { x: at, y: value } = symmetric(5, 1.5 * (scale(26) + scale(22)));
    const { scores } = cleanedLine(f64(...at), f64(...value), new Float64Array(26).fill(1));
    expectRelative(scores[1]!, 1 / scale(22), DIGITS);
  });
});

describe("cleanedPlane", () => {
  const x = Array.from({ length: 13 }, (_, i) => 1 + 0.2 * i);
  const ones = (count: number, value = 1): Float64Array => new Float64Array(count).fill(value);

  it("measures from the least-squares fit in scales of 1.4826 n / (n - unknowns) median distances", () => {
    const gauss = normal(seeded(8));
    const y = x.map((value) => 2 - 0.3 * value + 0.01 * gauss());
    const off = offLine(x, y);
    const scale = (NORMAL_MEDIAN * middle(off) * 13) / 11;
    const { scores, kept } = cleanedPlane([ones(13), f64(...x)], f64(...y), ones(13, 7), 3.5)!;
    expect(kept.length).toBe(13);
    off.forEach((value, i) => {
      expectRelative(scores[i]!, value / scale, DIGITS);
    });
  });
  it("counts a scatter below 1e-9 of the data as 1e-9, for a point of mean weight", () => {
    const y = x.map((_, i) => (i === 6 ? 1e-6 : 0));
    const weights = Float64Array.from(x, (_, i) => [10, 40, 25][i % 3]!);
    const { scores, kept } = cleanedPlane([ones(13), f64(...x)], f64(...y), weights, 3.5)!;
    const mean = weights.reduce((sum, weight) => sum + weight) / 13;
    expect(kept.length).toBe(12);
    expectRelative(scores[6]!, 1000 * Math.sqrt(weights[6]! / mean), 1e-12);
  });
  it("rejects nothing for rounding, whatever the stated uncertainties", () => {
    for (let count = 8; count < 22; count++) {
      const observations = Array.from({ length: count }, (_, i) => {
        const airMass = 1 + (1.1 * i) / (count - 1);
        return {
          band: "V",
          magnitude: 10.5 + 0.2 * airMass,
          standardUncertainty: 10 ** -(count % 6),
          airMass,
          catalogueMagnitude: 8,
          colourIndex: i % 2,
        };
      });
      const [fit] = extinctionFit(observations, { secondOrder: true, colourTerm: true });
      expect(fit!.rejected).toEqual([]);
      expectAbsolute(fit!.extinction.value, 0.2, 1e-12);
    }
  });
  it("rejects stars beyond 3.5 scales, on both sides of the limit", () => {
    // 202 stars, median distance 0.01; without the four far ones the scale is 2e-4 wider
    const limit = (3.5 * NORMAL_MEDIAN * 202) / 200;
    const rejected = (far: number): [number[], number[]] => {
      const set = symmetric(49, far);
      const stars = set.x.map((airMass, i) => ({
        band: "V",
        magnitude: 0.01 * set.y[i]!,
        standardUncertainty: 0.01,
        airMass,
        catalogueMagnitude: 0,
        colourIndex: 0,
      }));
      const [fit] = extinctionFit(stars, { secondOrder: false, colourTerm: false });
      for (const { reason } of fit!.rejected)
        expect(reason).toBe("3.5 robust scales from the fit in V");
      return [fit!.rejected.map(({ index }) => index), set.ends];
    };
    const [out, ends] = rejected(limit * 1.0005);
    expect(out).toEqual(ends);
    expect(rejected(limit * 0.9999)[0]).toEqual([]);
  });
  it("stops a set that swings to and fro after thirty rounds", () => {
    // of 26 points four are too far; the scale of the other 22 takes them in again: the first, third ... round have 22
    const scale = (n: number): number => (NORMAL_MEDIAN * n) / (n - 2);
    const { x: at, y } = symmetric(5, 1.75 * (scale(26) + scale(22)));
    const { scores, kept } = cleanedPlane([ones(26), f64(...at)], f64(...y), ones(26), 3.5)!;
    expect(kept.length).toBe(22);
    expectRelative(scores[1]!, 1 / scale(26), 2 * DIGITS);
  });
});

describe("checkEnough", () => {
  const kept = [0, 1, 2, 3, 4, 5, 6, 7];
  const masses = (range: number): number[] => kept.map((i) => 2 + (range * i) / 7);
  it("asks for more than half of the readings", () => {
    expect(() => checkEnough(kept, 15, masses(1), "name")).not.toThrow();
    expectRefusal(
      () => checkEnough(kept, 16, masses(1), "name"),
      RangeError,
      "name: signals must lie on one line in more than half, got 8 of 16:",
    );
  });
  it("says how long the range was, in three digits", () => {
    expectRefusal(() => checkEnough(kept, 8, masses(0.25), "name"), RangeError, "got 0.250:");
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { coverageFactor, propagate, propagatedCorrelation } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

// GUM 2008 (JCGM 100), H.1: end gauge calibration, lengths in nm (values from memory, checked by their own sums)
const endGauge = {
  ls: { value: 50.000623e6, standardUncertainty: 25, degreesOfFreedom: 18 },
  d: { value: 215, standardUncertainty: 9.7, degreesOfFreedom: 25.6 },
  deltaAlpha: { value: 0, standardUncertainty: 0.58e-6, degreesOfFreedom: 50 },
  theta: { value: -0.1, standardUncertainty: 0.41 },
  alphaS: { value: 11.5e-6, standardUncertainty: 1.2e-6 },
  deltaTheta: { value: 0, standardUncertainty: 0.029, degreesOfFreedom: 2 },
};
type EndGauge = Readonly<Record<keyof typeof endGauge, number>>;
const gaugeLength = ({ ls, d, deltaAlpha, theta, alphaS, deltaTheta }: EndGauge): number =>
  ls + d - ls * (deltaAlpha * theta + alphaS * deltaTheta);

// GUM H.2: five simultaneous readings of voltage (V), current (mA) and phase (rad) (from memory)
const volts = [5.007, 4.994, 5.005, 4.99, 4.999];
const milliamps = [19.663, 19.639, 19.64, 19.685, 19.678];
const phases = [1.0456, 1.0438, 1.0468, 1.0428, 1.0433];
const mean = (x: readonly number[]): number => x.reduce((sum, v) => sum + v, 0) / x.length;
const covarianceOfMeans = (x: readonly number[], y: readonly number[]): number =>
  x.reduce((sum, v, i) => sum + (v - mean(x)) * (y[i]! - mean(y)), 0) / (x.length * (x.length - 1));
const ofMean = (x: readonly number[]): { value: number; standardUncertainty: number } => ({
  value: mean(x),
  standardUncertainty: Math.sqrt(covarianceOfMeans(x, x)),
});
const correlation = (x: readonly number[], y: readonly number[]): number =>
  covarianceOfMeans(x, y) / Math.sqrt(covarianceOfMeans(x, x) * covarianceOfMeans(y, y));
const bridge = { v: ofMean(volts), i: ofMean(milliamps.map((x) => x * 1e-3)), phi: ofMean(phases) };
const correlations = [
  { between: ["v", "i"], coefficient: correlation(volts, milliamps) },
  { between: ["v", "phi"], coefficient: correlation(volts, phases) },
  { between: ["i", "phi"], coefficient: correlation(milliamps, phases) },
] as const;
type Bridge = Readonly<Record<"v" | "i" | "phi", number>>;
const resistance = propagate(({ v, i, phi }: Bridge) => (v / i) * Math.cos(phi), bridge, {
  correlations,
});
const reactance = propagate(({ v, i, phi }: Bridge) => (v / i) * Math.sin(phi), bridge, {
  correlations,
});
const impedance = propagate(({ v, i }: Bridge) => v / i, bridge, { correlations });

describe("published values", () => {
  it("is the end gauge of GUM H.1", () => {
    const { value, standardUncertainty, degreesOfFreedom, budget } = propagate(
      gaugeLength,
      endGauge,
    );
    expectAbsolute(value, 50.000838e6, 0.5); // printed to the nanometre
    expectAbsolute(standardUncertainty, 32, 0.5); // printed 32 nm
    expectAbsolute(degreesOfFreedom, 16.7, 0.05); // printed 16.7, truncated there to 16
    expectAbsolute(coverageFactor(0.99, 16) * standardUncertainty, 93, 0.5); // printed 93 nm
    const printed = [25, 9.7, 2.9, 0, 0, 16.6];
    // table H.1, printed to 0.1 nm; 16.6 there is 11.5e-6 times 0.029 °C rounded down before: 16.68 in full
    budget.forEach((row, i) => {
      expectAbsolute(row.contribution, printed[i]!, i === 5 ? 0.1 : 0.05);
    });
    expectAbsolute(
      budget.reduce((sum, row) => sum + row.share, 0),
      1,
      1e-12,
    );
    expect(budget[5]!.sensitivity).toBeLessThan(0);
  });

  it("is the resistance, reactance and impedance of GUM H.2, with their correlations", () => {
    const half = 0.0005; // printed to 0.001 Ω
    expectAbsolute(resistance.value, 127.732, half);
    expectAbsolute(resistance.standardUncertainty, 0.071, half);
    expectAbsolute(reactance.value, 219.847, half);
    // 0.2956 in full; the printed 0.295 (from memory) is cut rather than rounded
    expectAbsolute(reactance.standardUncertainty, 0.295, 0.001);
    expectAbsolute(impedance.value, 254.26, half);
    expectAbsolute(impedance.standardUncertainty, 0.236, half);
    expectAbsolute(propagatedCorrelation(resistance, reactance), -0.588, half);
    expectAbsolute(propagatedCorrelation(resistance, impedance), -0.485, half);
    expectAbsolute(propagatedCorrelation(reactance, impedance), 0.993, half);
  });

  it("misses what bends: first order gives 0.0539 mg in Supplement 1, 9.3 (table 5)", () => {
    const mass = propagate(
      ({ mR, dR, ra, rw, rr }) => (mR + dR) * (1 + (ra - 1.2) * (1 / rw - 1 / rr)) - 100000,
      {
        mR: { value: 100000, standardUncertainty: 0.05 },
        dR: { value: 1.234, standardUncertainty: 0.02 },
        ra: { value: 1.2, standardUncertainty: 0.1 / Math.sqrt(3) },
        rw: { value: 8000, standardUncertainty: 1000 / Math.sqrt(3) },
        rr: { value: 8000, standardUncertainty: 50 / Math.sqrt(3) },
      },
    );
    expectAbsolute(mass.value, 1.234, 1e-9);
    expectAbsolute(mass.standardUncertainty, 0.0539, 0.00005);
  });
});

describe("independent fixtures", () => {
  it("gets exact derivatives of a product of powers and an exponential by differences", () => {
    const { budget } = propagate(({ a, b, c }) => (a * a * a * Math.exp(-b)) / c, {
      a: { value: 2, standardUncertainty: 0.02 },
      b: { value: 0.7, standardUncertainty: 0.05 },
      c: { value: 5, standardUncertainty: 0 },
    });
    const f = (8 * Math.exp(-0.7)) / 5;
    // extrapolated differences: fifth derivative times (0.05)⁴ of a twentieth, under 1e-8
    expectRelative(budget[0]!.sensitivity, (3 * f) / 2, 1e-8);
    expectRelative(budget[1]!.sensitivity, -f, 1e-8);
    expectRelative(budget[2]!.sensitivity, -f / 5, 1e-8);
    expect(budget[2]!.contribution).toBe(0);
  });

  it("is exact for a cubic, with steps as wide as its uncertainty allows", () => {
    const { budget } = propagate(({ x }) => x * x * x, { x: { value: 2, standardUncertainty: 5 } });
    expectRelative(budget[0]!.sensitivity, 12, 1e-13);
  });

  it.each([1e-6, 1e-4, 0.01, 0.1])("holds 1e-8 where the relative uncertainty is %d", (share) => {
    const of = (value: number) => ({ value, standardUncertainty: value * share });
    const { budget } = propagate(
      ({ a, b, c, d }) => (a * a * a * Math.exp(-b)) / c - Math.log(Math.cos(d)),
      { a: of(2), b: of(0.7), c: of(5), d: of(1) },
    );
    const f = (8 * Math.exp(-0.7)) / 5;
    [(3 * f) / 2, -f, -f / 5, Math.tan(1)].forEach((exact, i) => {
      expectRelative(budget[i]!.sensitivity, exact, 1e-8);
    });
  });

  it("takes the caller's derivative where one is given", () => {
    const { budget } = propagate(
      ({ x, y }) => Math.abs(x) + y,
      { x: { value: 0, standardUncertainty: 1 }, y: { value: 2, standardUncertainty: 1 } },
      { derivatives: { x: ({ y }) => 10 * y } },
    );
    expect(budget[0]!.sensitivity).toBe(20);
    expectRelative(budget[1]!.sensitivity, 1, 1e-9);
  });
});

describe("properties", () => {
  const spread = between(0.01, 2);
  it("adds independent contributions as squares, correlated ones with their cross term", () => {
    fc.assert(
      fc.property(spread, spread, between(-1, 1), (u, v, coefficient) => {
        const sum = propagate(
          ({ x, y }) => 3 * x - 2 * y,
          { x: { value: 1, standardUncertainty: u }, y: { value: 7, standardUncertainty: v } },
          { correlations: [{ between: ["x", "y"], coefficient }] },
        );
        const expected = 9 * u * u + 4 * v * v - 12 * coefficient * u * v;
        expectAbsolute(sum.standardUncertainty ** 2, expected, 1e-8 * (9 * u * u + 4 * v * v));
      }),
    );
  });
  it("has nothing left where errors cancel", () => {
    const x = { value: 1, standardUncertainty: 0.1 };
    const apart = propagate(
      ({ x: a, y: b }) => a - b,
      { x, y: x },
      {
        correlations: [{ between: ["x", "y"], coefficient: 1 }],
      },
    );
    expectAbsolute(apart.standardUncertainty, 0, 1e-7 * 0.1); // rounding of the variance, under the root
  });
  it("scales with its result", () => {
    fc.assert(
      fc.property(spread, between(0.1, 50), (u, scale) => {
        const of = (factor: number): number =>
          propagate(({ x }) => factor * Math.sin(x), { x: { value: 1, standardUncertainty: u } })
            .standardUncertainty;
        expectRelative(of(scale), scale * of(1), 1e-9);
      }),
    );
  });
  it("leaves out what is exact: its row has no share", () => {
    const { standardUncertainty, budget } = propagate(({ x, y }) => x * y, {
      x: { value: 3, standardUncertainty: 0.1 },
      y: { value: 2, standardUncertainty: 0 },
    });
    expectRelative(standardUncertainty, 0.2, 1e-9);
    expect(budget[1]!.share).toBe(0);
  });
});

describe("small numbers", () => {
  const tiny = { value: 1e-9, standardUncertainty: 1e-10, degreesOfFreedom: 4 };
  it("keep their shares and degrees of freedom", () => {
    const { budget, degreesOfFreedom } = propagate(({ x }) => 3 * x, { x: tiny });
    expectRelative(budget[0]!.share, 1, 1e-12);
    expectRelative(degreesOfFreedom, 4, 1e-12);
  });
  it("keep their correlation, which never passes 1", () => {
    fc.assert(
      fc.property(between(-3, 3), between(-3, 3), between(-3, 3), (a, b, c) => {
        fc.pre(Math.abs(a) + Math.abs(b) + Math.abs(c) > 0.1);
        const inputs = { x: tiny, y: tiny, z: tiny };
        const sum = propagate(({ x, y, z }) => a * x + b * y + c * z, inputs);
        const same = propagatedCorrelation(sum, sum);
        expectAbsolute(same, 1, 1e-12);
        expect(same).toBeLessThanOrEqual(1);
        const opposite = propagate(({ x, y, z }) => -a * x - b * y - c * z, inputs);
        expect(propagatedCorrelation(sum, opposite)).toBeGreaterThanOrEqual(-1);
      }),
    );
  });
  it("exact inputs have no share and no correlation", () => {
    const exact = propagate(({ x }) => x, { x: { value: 2, standardUncertainty: 0 } });
    expect(exact.standardUncertainty).toBe(0);
    expect(exact.budget[0]!.share).toBe(0);
    expect(propagatedCorrelation(exact, exact)).toBe(0);
  });
});

describe("edges", () => {
  const one = { x: { value: 1, standardUncertainty: 0.1 } };
  it("has no degrees of freedom to give where finite ones are correlated", () => {
    const finite = { value: 1, standardUncertainty: 1, degreesOfFreedom: 4 };
    const sum = (coefficient: number): number =>
      propagate(
        ({ x, y }) => x + y,
        { x: finite, y: finite },
        { correlations: [{ between: ["x", "y"], coefficient }] },
      ).degreesOfFreedom;
    expect(sum(0.5)).toBeNaN();
    for (const [x, y] of [
      [one.x, finite],
      [finite, one.x],
    ] as const) {
      const between = ["y", "x"] as const;
      const mixed = propagate(
        (v) => v.x + v.y,
        { x, y },
        { correlations: [{ between, coefficient: 0.5 }] },
      );
      expect(mixed.degreesOfFreedom).toBeNaN();
    }
    const known = propagate(
      (v) => v.x + v.y,
      { x: one.x, y: one.x },
      { correlations: [{ between: ["x", "y"], coefficient: 0.5 }] },
    );
    expect(known.degreesOfFreedom).toBe(Number.POSITIVE_INFINITY);
    expectRelative(sum(0), 8, 1e-6);
    expect(propagate(({ x }) => x, one).degreesOfFreedom).toBe(Number.POSITIVE_INFINITY);
  });
  it("refuses what cannot be", () => {
    const f = ({ x }: { x: number }): number => x;
    expectRefusal(() => propagate(f, undefined as never), TypeError, "propagate", "inputs");
    expectRefusal(() => propagate(f, { x: 1 } as never), TypeError, "inputs.x");
    expectRefusal(
      () => propagate(f, { x: { value: 1, standardUncertainty: -1 } }),
      RangeError,
      "inputs.x.standardUncertainty",
      "-1",
    );
    expectRefusal(
      () => propagate(f, { x: { value: Number.NaN, standardUncertainty: 1 } }),
      RangeError,
      "inputs.x.value",
      "NaN",
    );
    expectRefusal(
      () => propagate(f, { x: { value: 1, standardUncertainty: 1, degreesOfFreedom: 0.5 } }),
      RangeError,
      "degreesOfFreedom",
    );
    expectRefusal(() => propagate(() => Number.NaN, one), RangeError, "finite", "NaN");
    expectRefusal(
      () => propagate(f, one, { correlations: [{ between: ["x", "y" as never], coefficient: 0 }] }),
      TypeError,
      "x, y",
    );
    expectRefusal(
      () => propagate(f, one, { correlations: [{ between: ["x", "x"], coefficient: 2 }] }),
      RangeError,
      "-1 to 1",
    );
    expectRefusal(() => propagatedCorrelation({} as never, impedance), TypeError, "propagate");
    expectRefusal(
      () => propagatedCorrelation(propagate(f, one), impedance),
      TypeError,
      "same inputs",
    );
  });
  it("refuses correlations that cannot hold together", () => {
    const unit = { value: 0, standardUncertainty: 1 };
    const pair = (a: "x" | "y", b: "y" | "z") => ({ between: [a, b], coefficient: -0.9 }) as const;
    expectRefusal(
      () =>
        propagate(
          ({ x, y, z }) => x + y + z,
          { x: unit, y: unit, z: unit },
          {
            correlations: [pair("x", "y"), pair("y", "z"), pair("x", "z")],
          },
        ),
      RangeError,
      "variance",
    );
  });
});

import { describe, expect, it } from "vitest";
import { monteCarlo, propagate, seededRandom } from "../../src/index.js";
import { normalQuantile } from "../../src/_normalQuantile.js";
import { prepareDraws } from "../../src/uncertainty/_draws.js";
import { isStable } from "../../src/uncertainty/_stability.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const root3 = Math.sqrt(3);
const sum4 = ({ a, b, c, d }: Record<"a" | "b" | "c" | "d", number>): number => a + b + c + d;
const unit = (distribution: "normal" | "rectangular", standardUncertainty = 1) =>
  ({ value: 0, standardUncertainty, distribution }) as const;

describe("published values", () => {
  // JCGM 101:2008 (GUM Supplement 1), examples 9.2 to 9.4 (from memory)
  it("is the sum of four normal inputs of 9.2.2: 2.0, and the interval ±3.9", () => {
    const [u, random] = [unit("normal"), seededRandom(11)];
    const { value, standardUncertainty, interval } = monteCarlo(
      sum4,
      { a: u, b: u, c: u, d: u },
      { random, digits: 2 },
    );
    expectAbsolute(value, 0, 0.05);
    expectAbsolute(standardUncertainty, 2, 0.05);
    expectAbsolute(interval[0], -3.92, 0.05); // printed to 0.01, two digits asked for
    expectAbsolute(interval[1], 3.92, 0.05);
  });
  it("is the sum of four rectangular inputs of 9.2.3: the interval ±3.88", () => {
    const [u, random] = [unit("rectangular"), seededRandom(12)];
    const inputs = { a: u, b: u, c: u, d: u };
    const result = monteCarlo(sum4, inputs, { random, digits: 3 });
    expectAbsolute(result.standardUncertainty, 2, 0.005);
    expectAbsolute(result.interval[0], -3.88, 0.01); // printed to 0.01, three digits asked for
    expectAbsolute(result.interval[1], 3.88, 0.01);
  });
  it("is the sum of 9.2.4, one input ten times as wide: 10.1, ±17.0", () => {
    const [u, random] = [unit("rectangular"), seededRandom(13)];
    const inputs = { a: u, b: u, c: u, d: unit("rectangular", 10) };
    const result = monteCarlo(sum4, inputs, { random, digits: 3 });
    expectAbsolute(result.standardUncertainty, 10.15, 0.05); // printed 10.1 or 10.2 by the run
    expectAbsolute(result.interval[1], 17.0, 0.1); // printed to 0.1
  });
  it("is the mass calibration of 9.3, where first order gives 0.0539 mg", () => {
    const result = monteCarlo(
      ({ mR, dR, ra, rw, rr }) => (mR + dR) * (1 + (ra - 1.2) * (1 / rw - 1 / rr)) - 100000,
      {
        mR: { value: 100000, standardUncertainty: 0.05 },
        dR: { value: 1.234, standardUncertainty: 0.02 },
        ra: { value: 1.2, standardUncertainty: 0.1 / root3, distribution: "rectangular" },
        rw: { value: 8000, standardUncertainty: 1000 / root3, distribution: "rectangular" },
        rr: { value: 8000, standardUncertainty: 50 / root3, distribution: "rectangular" },
      },
      { random: seededRandom(14) },
    );
    // printed 1.2340, 0.0754, [1.0834, 1.3825]; two digits of 0.075 asked for
    expectAbsolute(result.value, 1.234, 0.0005);
    expectAbsolute(result.standardUncertainty, 0.0754, 0.0005);
    expectAbsolute(result.shortestInterval[0], 1.0834, 0.002);
    expectAbsolute(result.shortestInterval[1], 1.3825, 0.002);
    expect(result.stable).toBe(true);
  });
  it.each([
    // x1, mean, standard uncertainty, shortest interval, all in 1e-6: tables 6 to 8, correlation 0
    [0, 50, 50, 0, 150],
    [0.01, 150, 112, 0, 367],
    [0.05, 2551, 502, 1590, 3543],
  ])("is the comparison loss of 9.4 at %d", (x1, mean, u, low, high) => {
    const result = monteCarlo(
      ({ re, im }) => 1e6 * (re * re + im * im),
      {
        re: { value: x1, standardUncertainty: 0.005 },
        im: { value: 0, standardUncertainty: 0.005 },
      },
      { random: seededRandom(15), digits: 3, mostTrials: 300_000 },
    );
    expectRelative(result.value, mean, 0.01); // printed to 1e-6: half a unit of 50 is 1 %
    expectRelative(result.standardUncertainty, u, 0.01);
    expectAbsolute(result.shortestInterval[0], low, 0.03 * u);
    expectAbsolute(result.shortestInterval[1], high, 0.04 * u);
  });
  it("bends where GUM H.1 needs second order: 34 nm instead of 32 nm", () => {
    const { standardUncertainty } = monteCarlo(
      ({ ls, d, deltaAlpha, theta, alphaS, deltaTheta }) =>
        ls + d - ls * (deltaAlpha * theta + alphaS * deltaTheta),
      {
        ls: { value: 50.000623e6, standardUncertainty: 25 },
        d: { value: 215, standardUncertainty: 9.7 },
        deltaAlpha: { value: 0, standardUncertainty: 0.58e-6, distribution: "rectangular" },
        theta: { value: -0.1, standardUncertainty: 0.41 },
        alphaS: { value: 11.5e-6, standardUncertainty: 1.2e-6, distribution: "rectangular" },
        deltaTheta: { value: 0, standardUncertainty: 0.029, distribution: "rectangular" },
      },
      { random: seededRandom(16) },
    );
    expectAbsolute(standardUncertainty, 34, 0.6); // printed 34 nm
  });
});

describe("independent fixtures", () => {
  // standardised quantiles worked out by hand from each distribution function
  it.each([
    ["normal", 1.6449],
    ["rectangular", root3 * 0.9],
    ["triangular", Math.sqrt(6) * (1 - Math.sqrt(0.1))],
    ["arcsine", Math.SQRT2 * Math.cos(Math.PI * 0.05)],
  ] as const)("draws the %s distribution", (distribution, quantile) => {
    const result = monteCarlo(
      ({ x }) => x,
      { x: { value: 0, standardUncertainty: 1, distribution } },
      { random: seededRandom(17), coverage: 0.9, digits: 3, mostTrials: 1e6 },
    );
    expectAbsolute(result.standardUncertainty, 1, 0.005); // three digits asked for
    expectAbsolute(result.interval[1], quantile, 0.01);
    expectAbsolute(result.interval[0], -quantile, 0.01);
  });
  // the distribution functions, of mean 0 and standard deviation 1, undo the draws
  it.each<["rectangular" | "triangular" | "arcsine", (x: number) => number]>([
    ["rectangular", (x) => (x / root3 + 1) / 2],
    ["triangular", (x) => 0.5 + (Math.sign(x) * (1 - (1 - Math.abs(x) / Math.sqrt(6)) ** 2)) / 2],
    ["arcsine", (x) => 0.5 + Math.asin(x / Math.SQRT2) / Math.PI],
  ])("draws the %s distribution to the last digits", (distribution, share) => {
    const inputs = { x: { value: 0, standardUncertainty: 1, distribution } };
    const draws = prepareDraws(["x"], inputs, []);
    for (const u of [0.001, 0.1, 0.3, 0.4999, 0.5, 0.5003, 0.77, 0.999]) {
      expectAbsolute(share(draws.one("x", () => u)), u, 1e-14);
    }
  });
  it("draws a normal input at u = 0 as at half the least step of the numbers drawn", () => {
    const lowest = monteCarlo(({ x }) => x, { x: unit("normal") }, { random: () => 0 });
    expect(lowest.value).toBe(normalQuantile(2 ** -54));
  });
  it("takes the ends of its intervals from trials that lie at even steps", () => {
    // every block is 0.5/10000, 1.5/10000 and so on: of 50 000 trials the middle 95 % start at number 1250
    let i = 0;
    const random = (): number => ((i++ % 10_000) + 0.5) / 10_000;
    const inputs = {
      x: { value: 10, standardUncertainty: 1, distribution: "rectangular" },
    } as const;
    const result = monteCarlo(({ x }) => x, inputs, { random });
    expect(result.trials).toBe(50_000);
    const at = (place: number): number => 10 + root3 * (2 * ((place + 0.5) / 10_000) - 1);
    expectAbsolute(result.interval[0], at(250), 1e-13);
    expectAbsolute(result.interval[1], at(9750), 1e-13);
    // variance of the middles of 10 000 equal steps, counted with one less than 50 000
    const variance = (1 - 1e-8) * (50_000 / 49_999);
    expectRelative(result.standardUncertainty, Math.sqrt(variance), 1e-12);
  });
  it("draws correlated normal inputs", () => {
    const input = { value: 1, standardUncertainty: 1 };
    const difference = (coefficient: number): number =>
      monteCarlo(
        ({ x, y }) => x - y,
        { x: input, y: input },
        {
          random: seededRandom(18),
          correlations: [{ between: ["x", "y"], coefficient }],
        },
      ).standardUncertainty;
    expectAbsolute(difference(0.5), 1, 0.01);
    expectAbsolute(difference(-0.5), root3, 0.02);
    expectAbsolute(difference(1), 0, 1e-9);
  });
});

describe("when trials stop (Supplement 1, 7.9)", () => {
  const block = {
    mean: 0,
    standardDeviation: 1,
    interval: [-2, 2],
    shortestInterval: [-2, 2],
  } as const;
  /** Six blocks whose `part` is `value` more in every other one. */
  const swaying = (part: object): Parameters<typeof isStable>[0] =>
    [block, part, block, part, block, part].map((own) => ({ ...block, ...own }));
  // half a unit of the second digit of 1.0 is 0.05; of six values that sway by s the standard deviation is s (6/20)^½
  const most = (0.05 / 2) * Math.sqrt(6) * Math.sqrt(20 / 6);
  it.each([
    ["mean", (s: number) => ({ mean: s })],
    ["lower end", (s: number) => ({ interval: [-2 + s, 2] as const })],
    ["upper end", (s: number) => ({ interval: [-2, 2 + s] as const })],
  ])("twice the standard error of the %s stays under half a unit of the last digit", (_, part) => {
    expect(isStable(swaying(part(0.9995 * most)), 2)).toBe(true);
    expect(isStable(swaying(part(1.0005 * most)), 2)).toBe(false);
    expect(isStable(swaying(part(0.9995 * most)).slice(2), 2)).toBe(false); // four blocks
  });
  it.each([
    // standard deviation, half a unit of its second digit
    [115, 5],
    [99, 0.5],
    [50_000, 500],
    [0.0023, 0.00005],
  ])("a standard deviation of %d has its last digit at twice %d", (standardDeviation, half) => {
    const of = (s: number): boolean =>
      isStable(
        swaying({ mean: (s * most * half) / 0.05 }).map((own) => ({ ...own, standardDeviation })),
        2,
      );
    expect(of(0.9995)).toBe(true);
    expect(of(1.0005)).toBe(false);
  });
  it("takes blocks of 100 trials outside the interval where coverage is high", () => {
    const exact = { x: { value: 3, standardUncertainty: 0 } };
    const options = { random: seededRandom(1), coverage: 0.999 };
    expect(monteCarlo(({ x }) => x, exact, options).trials).toBe(500_000);
  });
});

describe("properties", () => {
  it("keeps shares and slopes however small the uncertainties", () => {
    const tiny = { value: 1e-9, standardUncertainty: 1e-10 };
    const { budget } = monteCarlo(({ x }) => 2 * x, { x: tiny }, { random: seededRandom(20) });
    expectRelative(budget[0]!.sensitivity, 2, 1e-12);
    expectRelative(budget[0]!.share, 1, 0.03); // 10 000 trials: 0.7 % of the standard deviation, four of those
  });
  it("agrees with first-order propagation within 2 % where the model is nearly straight", () => {
    const inputs = {
      signal: { value: 1.2, standardUncertainty: 0.002 },
      constant: { value: 2, standardUncertainty: 0.005 },
      airMass: { value: 2, standardUncertainty: 0.002 },
      rayleigh: { value: 0.14, standardUncertainty: 0.0004 },
    };
    const depth = ({ signal, constant, airMass, rayleigh }: Record<keyof typeof inputs, number>) =>
      Math.log(constant / signal) / airMass - rayleigh;
    const first = propagate(depth, inputs);
    const second = monteCarlo(depth, inputs, {
      random: seededRandom(19),
      digits: 3,
      mostTrials: 200_000,
    });
    expectRelative(second.standardUncertainty, first.standardUncertainty, 0.02);
    second.budget.forEach((row, i) => {
      // 10 000 trials give a standard deviation to 0.7 %: four of those
      expectRelative(row.contribution, first.budget[i]!.contribution, 0.03);
      expectRelative(row.sensitivity, first.budget[i]!.sensitivity, 0.03);
    });
  });
  it("gives the same result for the same seed, another for another", () => {
    const run = (seed: number): number =>
      monteCarlo(({ x }) => x, { x: unit("normal") }, { random: seededRandom(seed) }).value;
    expect(run(1)).toBe(run(1));
    expect(run(1)).not.toBe(run(2));
  });
});

describe("edges", () => {
  const random = seededRandom(1);
  it("handles a model of exact inputs", () => {
    const exact = monteCarlo(
      ({ x }) => 2 * x,
      { x: { value: 3, standardUncertainty: 0 } },
      { random },
    );
    expect(exact.value).toBe(6);
    expect(exact.standardUncertainty).toBe(0);
    expect(exact.budget[0]!.share).toBe(0);
    expect(exact.budget[0]!.sensitivity).toBe(0);
    expect(exact.stable).toBe(true);
  });
  it("says so when it stops before the digits stand still", () => {
    const result = monteCarlo(
      ({ x }) => x,
      { x: unit("normal") },
      {
        random,
        digits: 3,
        mostTrials: 50_000,
      },
    );
    expect(result.trials).toBe(50_000);
    expect(result.stable).toBe(false);
  });
  it("refuses what cannot be", () => {
    const f = ({ x }: { x: number }): number => x;
    const inputs = { x: { value: 1, standardUncertainty: 1 } };
    expectRefusal(() => monteCarlo(f, inputs, {} as never), TypeError, "monteCarlo", "random");
    expectRefusal(() => monteCarlo(f, inputs, undefined as never), TypeError, "options");
    expectRefusal(() => monteCarlo(f, inputs, { random, coverage: 95 }), RangeError, "percent");
    expectRefusal(() => monteCarlo(f, inputs, { random, digits: 9 }), RangeError, "digits");
    expectRefusal(
      () => monteCarlo(f, inputs, { random, digits: 1.5 }),
      RangeError,
      "digits",
      "whole",
    );
    expectRefusal(
      () => monteCarlo(f, { x: { ...inputs.x, distribution: "flat" as never } }, { random }),
      TypeError,
      "rectangular",
      '"flat"',
    );
    expectRefusal(() => monteCarlo(({ x }) => Math.log(x), inputs, { random }), RangeError, "NaN");
    const y = { value: 0, standardUncertainty: 1, distribution: "arcsine" } as const;
    expectRefusal(
      () =>
        monteCarlo(
          f,
          { ...inputs, y },
          {
            random,
            correlations: [{ between: ["x", "y"], coefficient: 0.1 }],
          },
        ),
      TypeError,
      "normal if it is correlated",
    );
    const three = { x: inputs.x, b: inputs.x, c: inputs.x };
    const pair = (a: "x" | "b", b: "b" | "c") => ({ between: [a, b], coefficient: -0.9 }) as const;
    expectRefusal(
      () =>
        monteCarlo(f, three, {
          random,
          correlations: [pair("x", "b"), pair("b", "c"), pair("x", "c")],
        }),
      RangeError,
      "hold together",
    );
  });
});

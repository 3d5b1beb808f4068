import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { angstromFit } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { normal, seeded } from "./_mornings.js";

const SIX = [368, 412, 500, 675, 778, 862];

describe("published values", () => {
  it("a turbidity of 0.1 with Ångström's mean exponent 1.3 is 0.246 at 500 nm", () => {
    // Ångström's exponent of 1.3 and the depth that goes with it: common practice, three printed digits
    const fit = angstromFit([500, 1000, 2000], [0.24623, 0.1, 0.040613]);
    expectAbsolute(fit.exponent, 1.3, 2e-5);
    expectAbsolute(fit.turbidity, 0.1, 1e-6);
  });
});

describe("independent fixtures", () => {
  it("is the regression of the logarithms by sums of pairs", () => {
    const depths = [0.21, 0.19, 0.148, 0.104, 0.083, 0.076];
    // the least-squares slope is the mean of the slopes of all pairs, weighted by squared distance
    const [x, y] = [SIX.map((nm) => Math.log10(nm / 1000)), depths.map(Math.log10)];
    let [above, below] = [0, 0];
    for (let i = 0; i < 6; i++)
      for (let j = 0; j < i; j++) {
        above += (y[i]! - y[j]!) * (x[i]! - x[j]!);
        below += (x[i]! - x[j]!) ** 2;
      }
    const mean = (v: number[]): number => v.reduce((a, b) => a + b, 0) / v.length;
    const slope = above / below;
    const intercept = mean(y) - slope * mean(x);
    const residuals = y.map((value, i) => (value - intercept - slope * x[i]!) * Math.LN10);
    const variance = residuals.reduce((a, r) => a + r * r, 0) / 4;
    const sxx = (below / 6) * Math.LN10 ** 2;
    const meanX = mean(x) * Math.LN10;
    const fit = angstromFit(SIX, depths);
    // logarithms of two bases: a few ulp, times the condition of the sums
    expectRelative(fit.exponent, -slope, 1e-13);
    expectRelative(fit.turbidity, 10 ** intercept, 1e-13);
    expectRelative(fit.exponentStandardError, Math.sqrt(variance / sxx), 1e-11);
    const error = fit.turbidity * Math.sqrt(variance * (1 / 6 + meanX ** 2 / sxx));
    expectRelative(fit.turbidityStandardError, error, 1e-11);
    expectRelative(fit.covariance[0][1], (fit.turbidity * variance * meanX) / sxx, 1e-11);
    expect(fit.covariance[1][0]).toBe(fit.covariance[0][1]);
    expectRelative(fit.covariance[0][0], fit.exponentStandardError ** 2, 1e-14);
    expectRelative(fit.covariance[1][1], fit.turbidityStandardError ** 2, 1e-14);
  });

  it("states errors and a covariance that 4000 simulated fits bear out", () => {
    const gauss = normal(seeded(21));
    const fits = Array.from({ length: 4000 }, () =>
      angstromFit(
        SIX,
        SIX.map((nm) => 0.07 * (nm / 1000) ** -1.2 * Math.exp(0.02 * gauss())),
      ),
    );
    const rms = (f: (fit: (typeof fits)[number]) => number): number =>
      Math.sqrt(fits.reduce((total, fit) => total + f(fit), 0) / fits.length);
    const spreadExponent = rms((fit) => (fit.exponent - 1.2) ** 2);
    const spreadTurbidity = rms((fit) => (fit.turbidity - 0.07) ** 2);
    // 4000 draws: 1.1 % is one sigma of a standard deviation, and the limit is 4 of them
    expectRelative(
      rms((fit) => fit.exponentStandardError ** 2),
      spreadExponent,
      0.05,
    );
    expectRelative(
      rms((fit) => fit.turbidityStandardError ** 2),
      spreadTurbidity,
      0.05,
    );
    const product = fits.reduce((t, fit) => t + (fit.exponent - 1.2) * (fit.turbidity - 0.07), 0);
    const stated = fits.reduce((t, fit) => t + fit.covariance[0][1], 0);
    expectRelative(stated, product, 0.08);
  });
});

describe("properties", () => {
  it("finds an exact power law again, whatever the wavelengths", () => {
    const wavelengths = fc.uniqueArray(fc.integer({ min: 300, max: 2500 }), {
      minLength: 3,
      maxLength: 12,
    });
    fc.assert(
      fc.property(wavelengths, between(-0.5, 4), between(1e-4, 0.5), (nm, exponent, turbidity) => {
        fc.pre(Math.max(...nm) > 1.2 * Math.min(...nm));
        const depths = nm.map((value) => turbidity * (value / 1000) ** -exponent);
        const fit = angstromFit(nm, depths);
        expectAbsolute(fit.exponent, exponent, 1e-12); // rounding over a span of at least ln 1.2
        expectRelative(fit.turbidity, turbidity, 1e-12);
        expect(fit.exponentStandardError).toBeLessThan(1e-12);
      }),
    );
  });
});

describe("edges", () => {
  it("works with three wavelengths and refuses two", () => {
    expect(() => angstromFit([400, 500, 600], [0.3, 0.2, 0.1])).not.toThrow();
    expectRefusal(
      () => angstromFit([400, 500], [0.3, 0.2]),
      RangeError,
      "angstromFit",
      "wavelengthsNm",
      "at least 3",
    );
  });

  it("refuses what cannot be", () => {
    const nm = [400, 500, 600];
    const call = (waves: unknown, depths: unknown) => () =>
      angstromFit(waves as number[], depths as number[]);
    expect(call(nm, [100, 100, 1e-9])).not.toThrow();
    expectRefusal(call(nm, [100.05, 100, 1]), RangeError, "opticalDepths[0]", "above 0, to 100");
    expectRefusal(call(nm, [0.3, 0.2, 0.1, 0.1]), RangeError, "opticalDepths", "3, got 4");
    expectRefusal(call(nm, [0.3, 0, 0.1]), RangeError, "opticalDepths[1]", "got 0", "leave");
    expectRefusal(call(nm, [0.3, Number.NaN, 0.1]), RangeError, "opticalDepths[1]", "NaN");
    expectRefusal(call(nm, [0.3, "0.2", 0.1]), TypeError, "opticalDepths[1]");
    expectRefusal(call([0.4, 0.5, 0.6], [0.3, 0.2, 0.1]), RangeError, "µm? multiply by 1000");
    expectRefusal(call([500, 500, 500], [0.3, 0.2, 0.1]), RangeError, "must differ", "500 nm");
    expectRefusal(call("400", [0.3, 0.2, 0.1]), TypeError, "wavelengthsNm");
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { residualOpticalDepth } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal } from "../_tolerance.js";

describe("published values", () => {
  it("an optical depth of 1 straight down leaves 36.788 % (1/e)", () => {
    expectAbsolute(residualOpticalDepth(36.788, 100, { terms: [], airMass: 1 }), 1, 1e-5); // five printed digits
  });
});

describe("independent fixtures", () => {
  it("agrees with the sum worked out to 50 digits", () => {
    // mpmath 1.3, 50 digits: (log(mpf("2.0") / mpf("1.1")) - 0.14 * 2.9 - 0.01 * 2.8) / 3 with the decimal inputs
    const terms = [
      { opticalDepth: 0.14, airMass: 2.9 },
      { opticalDepth: 0.01, airMass: 2.8 },
    ];
    const rest = residualOpticalDepth(1.1, 2.0, { terms, airMass: 3 });
    expectAbsolute(rest, 0.05461233358520646, 4e-16); // rounding of five inputs
  });
});

describe("properties", () => {
  const term = fc.record({ opticalDepth: between(0, 1), airMass: between(1, 38) });

  it("gives back what was put on the way, whatever stands beside it", () => {
    fc.assert(
      fc.property(
        fc.array(term, { maxLength: 5 }),
        between(-0.01, 1),
        between(1, 38),
        between(1e-3, 1e3),
        (terms, depth, airMass, constant) => {
          const known = terms.map((t) => Math.exp(-t.opticalDepth * t.airMass));
          const signal = known.reduce((a, b) => a * b, constant * Math.exp(-depth * airMass));
          const rest = residualOpticalDepth(signal, constant, { terms, airMass });
          expectAbsolute(rest, depth, 1e-13); // slant depths up to 228 in double precision
        },
      ),
    );
  });

  it("one per cent of constant is 0.00995 of slant depth", () => {
    const path = { terms: [{ opticalDepth: 0.3, airMass: 2 }], airMass: 2 };
    const change = residualOpticalDepth(1, 2.02, path) - residualOpticalDepth(1, 2, path);
    expectAbsolute(change * 2, 0.00995, 5e-6); // ln 1.01, printed digits
  });
});

describe("edges", () => {
  const path = { terms: [{ opticalDepth: 0.3, airMass: 2 }], airMass: 2 };

  it("returns a negative depth as it is", () => {
    expect(residualOpticalDepth(1.9, 2, path)).toBeLessThan(0);
  });

  it("refuses what cannot be", () => {
    const call = residualOpticalDepth;
    expectRefusal(() => call(0, 2, path), RangeError, "residualOpticalDepth", "signal", "got 0");
    expectRefusal(() => call(Number.NaN, 2, path), RangeError, "signal", "NaN");
    expectRefusal(() => call(1, -2, path), RangeError, "constant", "-2");
    expectRefusal(() => call("1" as never, 2, path), TypeError, "signal");
    expectRefusal(() => call(1, 2, undefined as never), TypeError, "path");
    expectRefusal(() => call(1, 2, { airMass: 1 } as never), TypeError, "path.terms");
    expectRefusal(() => call(1, 2, { terms: [], airMass: 0 }), RangeError, "path.airMass", "got 0");
    const angle = { terms: [], airMass: 60 };
    expectRefusal(() => call(1, 2, angle), RangeError, "path.airMass", "zenith angle?");
    const wrong = { terms: [{ opticalDepth: Number.NaN, airMass: 1 }], airMass: 1 };
    expectRefusal(() => call(1, 2, wrong), RangeError, "path.terms[0].opticalDepth", "NaN");
    const noMass = { terms: [{ opticalDepth: 0.1 } as never], airMass: 1 };
    expectRefusal(() => call(1, 2, noMass), TypeError, "path.terms[0].airMass");
  });
});

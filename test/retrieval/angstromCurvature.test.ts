import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { angstromCurvature, angstromFit, propagate } from "../../src/index.js";
import { between } from "../_generators.js";
import { randomOf } from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const NM = [368, 412, 500, 675, 778, 862];
const diagonal = (variances: readonly number[]): number[] =>
  variances.flatMap((v, i) => variances.map((_, j) => (i === j ? v : 0)));
const curve = (nm: number, depth: number, exponent: number, curvature: number): number => {
  const x = Math.log(nm / 500);
  return depth * Math.exp(-exponent * x + curvature * x * x);
};

describe("independent fixtures", () => {
  it("goes through three depths exactly, its error that of the formula solved by hand", () => {
    // wavelengths a factor 2 apart: exponent at the middle = ln(d1 / d3) / (2 ln 2), curvature = (ln d1 d3 - 2 ln d2) / (2 ln² 2)
    const [nm, depths] = [
      [400, 800, 1600],
      [0.4, 0.18, 0.1],
    ];
    const fit = angstromCurvature(nm, depths, {
      covariance: diagonal([4e-6, 1e-6, 2e-6]),
      referenceNm: 800,
    });
    expectRelative(fit.opticalDepth, 0.18, 1e-12);
    expectRelative(fit.exponent, Math.log(4) / (2 * Math.LN2), 1e-12);
    expectRelative(
      fit.curvature,
      (Math.log(0.04) - 2 * Math.log(0.18)) / (2 * Math.LN2 ** 2),
      1e-11,
    );
    const u = [0.002, 0.001, Math.sqrt(2e-6)];
    const law = propagate(
      ({ a, b, c }) => (Math.log(a * c) - 2 * Math.log(b)) / (2 * Math.LN2 ** 2),
      {
        a: { value: 0.4, standardUncertainty: u[0]! },
        b: { value: 0.18, standardUncertainty: u[1]! },
        c: { value: 0.1, standardUncertainty: u[2]! },
      },
    );
    expectRelative(fit.curvatureStandardUncertainty, law.standardUncertainty, 1e-7);
    const exponent = propagate(({ a, c }) => Math.log(a / c) / (2 * Math.LN2), {
      a: { value: 0.4, standardUncertainty: u[0]! },
      c: { value: 0.1, standardUncertainty: u[2]! },
    });
    expectRelative(fit.exponentStandardUncertainty, exponent.standardUncertainty, 1e-7);
    expectRelative(fit.opticalDepthStandardUncertainty, 0.001, 1e-10);
    expect(fit.chiSquare).toBeLessThan(1e-20);
  });

  it("states errors that 4000 simulated fits show, with a part shared between channels", () => {
    const { normal } = randomOf(77);
    const truth = NM.map((nm) => curve(nm, 0.2, 1.4, -0.5));
    const [own, shared] = [truth.map((d) => 0.03 * d), truth.map((d) => 0.04 * d)];
    const covariance = truth.flatMap((_, i) =>
      truth.map((_, j) => shared[i]! * shared[j]! + (i === j ? own[i]! ** 2 : 0)),
    );
    const squares = [0, 0, 0];
    let chi = 0;
    const stated = angstromCurvature(NM, truth, { covariance, referenceNm: 500 });
    for (let trial = 0; trial < 4000; trial++) {
      const common = normal();
      const depths = truth.map((d, i) => d + shared[i]! * common + own[i]! * normal());
      const fit = angstromCurvature(NM, depths, { covariance, referenceNm: 500 });
      squares[0]! += (fit.opticalDepth - 0.2) ** 2;
      squares[1]! += (fit.exponent - 1.4) ** 2;
      squares[2]! += (fit.curvature + 0.5) ** 2;
      chi += fit.chiSquare;
    }
    const spread = squares.map((s) => Math.sqrt(s / 4000));
    // 4000 draws give a standard deviation to 1.1 %; second-order terms of 5 % errors add under 2 %
    expectRelative(spread[0]!, stated.opticalDepthStandardUncertainty, 0.05);
    expectRelative(spread[1]!, stated.exponentStandardUncertainty, 0.05);
    expectRelative(spread[2]!, stated.curvatureStandardUncertainty, 0.05);
    expectAbsolute(chi / 4000, 3, 0.3);
    expectRelative(Math.sqrt(stated.covariance[4]!), stated.exponentStandardUncertainty, 1e-14);
  });

  it("agrees with the straight fit where there is no curvature", () => {
    const depths = NM.map((nm) => curve(nm, 0.15, 1.2, 0));
    const fit = angstromCurvature(NM, depths, {
      covariance: diagonal(NM.map(() => 1e-6)),
      referenceNm: 1000,
    });
    const straight = angstromFit(NM, depths);
    expectRelative(fit.exponent, straight.exponent, 1e-9);
    expectRelative(fit.opticalDepth, straight.turbidity, 1e-9);
    expectAbsolute(fit.curvature, 0, 1e-9);
  });
});

describe("properties", () => {
  it("recovers any exact curve, whatever the weights and the reference", () => {
    fc.assert(
      fc.property(
        between(0.05, 2),
        between(-0.5, 3),
        between(-2, 2),
        between(400, 900),
        (d, e, c, referenceNm) => {
          const depths = NM.map((nm) => curve(nm, d, e, c));
          const variances = depths.map((x, i) => (0.01 * (1 + i) * x) ** 2);
          const fit = angstromCurvature(NM, depths, {
            covariance: diagonal(variances),
            referenceNm,
          });
          expectRelative(fit.opticalDepth, curve(referenceNm, d, e, c), 1e-10);
          expectAbsolute(fit.exponent, e - 2 * c * Math.log(referenceNm / 500), 1e-9);
          expectAbsolute(fit.curvature, c, 1e-9);
        },
      ),
    );
  });
});

describe("edges", () => {
  const depths = NM.map((nm) => curve(nm, 0.1, 1.3, 0));
  const with4 =
    (factor: number): (() => unknown) =>
    () =>
      angstromCurvature(NM, depths, {
        covariance: diagonal(depths.map((d) => (d / factor) ** 2)),
        referenceNm: 500,
      });
  it("refuses depths below four standard uncertainties, on both sides of the limit", () => {
    expect(with4(4.001)).not.toThrow();
    expectRefusal(
      with4(3.999),
      RangeError,
      "angstromCurvature",
      "four standard uncertainties",
      "too little aerosol",
    );
  });
  it("takes depths as small as their errors allow", () => {
    const variances = NM.map(() => 1e-16);
    const small = depths.map((d) => 1e-6 * d);
    const fit = angstromCurvature(NM, small, { covariance: diagonal(variances), referenceNm: 500 });
    expectRelative(fit.opticalDepth, 1e-7, 1e-9);
  });
  it("refuses what cannot be", () => {
    const covariance = diagonal(NM.map(() => 1e-6));
    const curved =
      (change: object): (() => unknown) =>
      () =>
        angstromCurvature(NM, depths, { covariance, referenceNm: 500, ...change } as never);
    expectRefusal(curved({ referenceNm: 0.5 }), RangeError, "µm?");
    expectRefusal(curved({ covariance: [1, 2, 3] }), RangeError, "at least 9");
    expectRefusal(curved({ covariance: new Float64Array(9) }), RangeError, "36 values");
    expectRefusal(curved({ covariance: undefined }), TypeError, "covariance");
    expectRefusal(
      curved({ covariance: covariance.map(() => 1e-6) }),
      RangeError,
      "positive definite",
    );
    expectRefusal(
      () => angstromCurvature(NM, depths, undefined as never),
      TypeError,
      "referenceNm",
    );
    expectRefusal(
      () => angstromCurvature(NM, [0, ...depths.slice(1)], { covariance, referenceNm: 500 }),
      RangeError,
      "opticalDepths[0]",
    );
    const negative = [...depths.slice(0, 5), -0.001];
    expectRefusal(
      () => angstromCurvature(NM, negative, { covariance, referenceNm: 500 }),
      RangeError,
      "opticalDepths[5]",
    );
    expectRefusal(
      () =>
        angstromCurvature([500, 500, 600], [0.1, 0.1, 0.1], {
          covariance: diagonal([1e-6, 1e-6, 1e-6]),
          referenceNm: 500,
        }),
      RangeError,
      "three wavelengths differ",
    );
  });
});

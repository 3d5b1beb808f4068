import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  rayleighPhase,
  rayleighPhaseMode,
  rayleighPolarisation,
  rayleighScatteringMatrix,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal } from "../_tolerance.js";

describe("rayleighScatteringMatrix", () => {
  it("is Rayleigh's at the angles every textbook gives", () => {
    expect(rayleighScatteringMatrix(0, 0)).toEqual({ f11: 1.5, f12: -0, f22: 1.5, f33: 1.5 });
    const side = rayleighScatteringMatrix(90, 0);
    expectAbsolute(side.f11, 0.75, 1e-15);
    expectAbsolute(side.f12, -0.75, 1e-15);
    expectAbsolute(side.f33, 0, 1e-15);
    expectAbsolute(rayleighScatteringMatrix(180, 0).f33, -1.5, 1e-15);
  });

  it("agrees with the phase function and the degree of polarisation written otherwise", () => {
    fc.assert(
      fc.property(between(0, 180), between(0, 0.5), (angle, rho) => {
        const { f11, f12 } = rayleighScatteringMatrix(angle, rho);
        expectAbsolute(f11, rayleighPhase(angle, rho), 2e-15);
        expectAbsolute(-f12 / f11, rayleighPolarisation(angle, rho), 2e-15);
      }),
    );
  });

  it("refuses angles and factors out of range", () => {
    expectRefusal(() => rayleighScatteringMatrix(181, 0), RangeError, "scatteringAngleDeg");
    expectRefusal(() => rayleighScatteringMatrix(90, 0.6), RangeError, "depolarisation");
    expectRefusal(
      () => rayleighScatteringMatrix("90" as never, 0),
      TypeError,
      "scatteringAngleDeg",
    );
  });
});

describe("rayleighPhaseMode", () => {
  it("adds up to the scattering matrix turned into and out of the plane of scattering", () => {
    fc.assert(
      fc.property(
        between(-0.999, 0.999),
        between(-0.999, 0.999),
        between(0.01, 6.27),
        between(0, 0.5),
        (out, from, azimuth, rho) => {
          const expected = turned(out, from, azimuth, rho);
          const total = new Array(9).fill(0);
          for (const order of [0, 1, 2] as const) {
            const mode = rayleighPhaseMode(order, out, from, rho);
            expect(mode.length).toBe(9);
            for (let k = 0; k < 9; k++) {
              const mixed = (Math.floor(k / 3) === 2) !== (k % 3 === 2);
              total[k] +=
                mode[k]! * (mixed ? Math.sin(order * azimuth) : Math.cos(order * azimuth));
            }
          }
          // the angle of scattering loses digits near 0 and 180
          for (let k = 0; k < 9; k++) expectAbsolute(total[k], expected[k]!, 1e-7);
          if (Math.abs(out) < 0.9 && Math.abs(from) < 0.9 && azimuth > 0.5 && azimuth < 2.5) {
            for (let k = 0; k < 9; k++) expectAbsolute(total[k], expected[k]!, 1e-13);
          }
        },
      ),
    );
  });

  it("conserves: the first element of order 0 has mean 1 over all new directions", () => {
    for (const from of [-1, -0.3, 0, 0.7]) {
      // Simpson on 200 panels is exact to rounding for a polynomial of degree 2 in the cosine
      let sum = 0;
      for (let i = 0; i <= 200; i++) {
        const w = i === 0 || i === 200 ? 1 : i % 2 ? 4 : 2;
        sum += w * rayleighPhaseMode(0, -1 + i / 100, from, 0.0279)[0]!;
      }
      expectAbsolute(sum / 600, 1, 1e-14);
    }
  });

  it("refuses other orders and cosines", () => {
    expectRefusal(() => rayleighPhaseMode(3 as never, 0, 0, 0), RangeError, "order");
    expectRefusal(() => rayleighPhaseMode(0, 1.01, 0, 0), RangeError, "cosineOut");
    expectRefusal(() => rayleighPhaseMode(0, 0, Number.NaN, 0), RangeError, "cosineIn");
    expectRefusal(() => rayleighPhaseMode(0, 0, 0, 0.51), RangeError, "depolarisation");
  });
});

/** The phase matrix by turning Q and U into the plane of scattering, scattering, and turning back. */
function turned(out: number, from: number, azimuth: number, rho: number): number[] {
  const [so, si] = [Math.sqrt(1 - out * out), Math.sqrt(1 - from * from)];
  const old = [si, 0, from];
  const seen = [so * Math.cos(azimuth), so * Math.sin(azimuth), out];
  const dot = old.reduce((s, x, k) => s + x * seen[k]!, 0);
  const { f11, f12, f22, f33 } = rayleighScatteringMatrix((Math.acos(dot) * 180) / Math.PI, rho);
  const across = [
    old[1]! * seen[2]! - old[2]! * seen[1]!,
    old[2]! * seen[0]! - old[0]! * seen[2]!,
    old[0]! * seen[1]! - old[1]! * seen[0]!,
  ];
  // angle from the vertical plane of each beam to the plane of scattering, counter-clockwise facing the light
  const angle = (theta: number[], phi: number[]): number => {
    const [x, y] = [theta, phi].map((e) => e.reduce((s, v, k) => s + v * across[k]!, 0)) as [
      number,
      number,
    ];
    return Math.atan2(y, x) + Math.PI / 2;
  };
  const a = angle([from, 0, -si], [0, 1, 0]);
  const b = angle(
    [out * Math.cos(azimuth), out * Math.sin(azimuth), -so],
    [-Math.sin(azimuth), Math.cos(azimuth), 0],
  );
  const turn = (t: number): number[][] => [
    [1, 0, 0],
    [0, Math.cos(2 * t), Math.sin(2 * t)],
    [0, -Math.sin(2 * t), Math.cos(2 * t)],
  ];
  const times = (x: number[][], y: number[][]): number[][] =>
    x.map((row) => [0, 1, 2].map((j) => row.reduce((s, v, k) => s + v * y[k]![j]!, 0)));
  const f = [
    [f11, f12, 0],
    [f12, f22, 0],
    [0, 0, f33],
  ];
  return times(turn(-b), times(f, turn(a))).flat();
}

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { rayleighPhase, rayleighPolarisation } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const angle = between(0, 180);
const factor = between(0, 0.5);
const radians = Math.PI / 180;

describe("published values", () => {
  it("without depolarisation: 3/4 (1 + cos²): 1.5 forwards and backwards, 0.75 at a right angle (Rayleigh 1871)", () => {
    expectAbsolute(rayleighPhase(0, 0), 1.5, 1e-13);
    expectAbsolute(rayleighPhase(180, 0), 1.5, 1e-13);
    expectAbsolute(rayleighPhase(90, 0), 0.75, 1e-13);
    expectAbsolute(rayleighPhase(60, 0), 0.9375, 1e-13);
  });
  it("air, as 0.7629 (1 + 0.9324 cos²) (Penndorf's coefficients for depolarisation 0.035, from memory, four digits)", () => {
    expectAbsolute(rayleighPhase(90, 0.035), 0.7629, 5e-5);
    expectAbsolute(rayleighPhase(0, 0.035) / rayleighPhase(90, 0.035) - 1, 0.9324, 5e-5);
  });
  it("ignoring depolarisation costs 1.4 % at a right angle (size from the plan)", () => {
    expectAbsolute(rayleighPhase(90, 0.0279) / rayleighPhase(90, 0) - 1, 0.0138, 5e-4);
  });
  it("polarisation at a right angle is (1 - rho) / (1 + rho), by the definition of rho", () => {
    for (const rho of [0, 0.0279, 0.1, 0.5])
      expectAbsolute(rayleighPolarisation(90, rho), (1 - rho) / (1 + rho), 1e-13);
  });
});

describe("independent fixtures", () => {
  it("mean over the sphere is 1, by Gauss-Legendre sums of three nodes in the cosine (exact for squares)", () => {
    for (const rho of [0, 0.0279, 0.5]) {
      const node = Math.acos(Math.sqrt(0.6)) / radians;
      const mean =
        (5 * (rayleighPhase(node, rho) + rayleighPhase(180 - node, rho)) +
          8 * rayleighPhase(90, rho)) /
        18;
      expectAbsolute(mean, 1, 1e-13);
    }
  });
  it("sum and difference of two dipoles: the light vibrating across and along the scattering plane", () => {
    // isotropic part as a dipole, anisotropic part unpolarised: across 1, along rho + (1 - rho) cos²
    fc.assert(
      fc.property(angle, factor, (theta, rho) => {
        const [across, along] = [1, rho + (1 - rho) * Math.cos(theta * radians) ** 2];
        // the mean over the sphere of across + along is 4/3 + 2/3 rho
        expectAbsolute(
          rayleighPhase(theta, rho),
          (across + along) / (4 / 3 + (2 / 3) * rho),
          1e-13,
        );
        expectAbsolute(
          rayleighPolarisation(theta, rho),
          (across - along) / (across + along),
          1e-13,
        );
      }),
    );
  });
});

describe("properties", () => {
  it("is symmetric fore and aft, least at a right angle; polarisation lies in 0 to 1 and falls with depolarisation", () => {
    fc.assert(
      fc.property(angle, factor, (theta, rho) => {
        expectRelative(rayleighPhase(180 - theta, rho), rayleighPhase(theta, rho), 1e-13);
        expect(rayleighPhase(theta, rho)).toBeGreaterThanOrEqual(rayleighPhase(90, rho));
        const p = rayleighPolarisation(theta, rho);
        expect(p).toBeGreaterThanOrEqual(0);
        expect(p).toBeLessThanOrEqual(1);
        expect(rayleighPolarisation(theta, Math.min(0.5, rho + 0.01))).toBeLessThanOrEqual(p);
      }),
    );
  });
});

describe("edges", () => {
  it.each([
    ["rayleighPhase", rayleighPhase],
    ["rayleighPolarisation", rayleighPolarisation],
  ])("%s", (name, quantity) => {
    expectRefusal(
      () => quantity(180.1, 0),
      RangeError,
      name,
      "scatteringAngleDeg",
      "0 to 180 degrees",
      "180.1",
    );
    expectRefusal(() => quantity(-1, 0), RangeError, "-1");
    expectRefusal(() => quantity(Number.NaN, 0), RangeError, "NaN");
    expectRefusal(() => quantity(90, 0.51), RangeError, "depolarisation", "0 to 0.5", "0.51");
    expectRefusal(() => quantity(90, "0" as never), TypeError, "depolarisation");
  });
});

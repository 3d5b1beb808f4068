import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { gravity } from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

describe("published values", () => {
  // WGS 84 normal gravity at the equator and the pole (NIMA TR8350.2, from memory, to the last digit)
  it.each([
    [0, 9.7803253359],
    [90, 9.8321849378],
    [-90, 9.8321849378],
  ])("at %d°", (latitude, expected) => {
    expectAbsolute(gravity(latitude, 0), expected, 1.5e-10);
  });
  it("45° and 1 km, near the Smithsonian series used by Bodhaine et al. 1999", () => {
    // 980.6160 cm s-2 less 3.085462e-4 per m; that series stands on the older Potsdam-corrected formula: 2e-5
    expectRelative(gravity(45, 0), 9.80616, 2e-5);
    expectRelative((gravity(45, 0) - gravity(45, 1000)) / 1000, 3.085e-6, 1e-3);
  });
});

describe("independent fixtures", () => {
  it("falls nearly as 1/r² : within 1e-5 of the point-mass-and-spin field at the equator", () => {
    // GM = 3.986004418e14, spin 7.292115e-5 rad/s (WGS 84); J2 term at the equator: 1 + 1.5 J2 (a/r)²
    const at = (h: number): number => {
      const r = 6378137 + h;
      return (
        (3.986004418e14 / r ** 2) * (1 + 1.5 * 1.08263e-3 * (6378137 / r) ** 2) -
        7.292115e-5 ** 2 * r
      );
    };
    for (const h of [0, 10_000, 50_000, 86_000]) expectRelative(gravity(0, h), at(h), 1.2e-5);
  });
});

describe("properties", () => {
  it("grows towards the poles, falls with height, is the same north and south", () => {
    fc.assert(
      fc.property(between(0, 89), between(-5000, 85_000), (latitude, height) => {
        expect(gravity(latitude + 1, height)).toBeGreaterThan(gravity(latitude, height));
        expect(gravity(latitude, height + 100)).toBeLessThan(gravity(latitude, height));
        expect(gravity(-latitude, height)).toBe(gravity(latitude, height));
      }),
    );
  });
});

describe("edges", () => {
  it("refuses", () => {
    expectRefusal(
      () => gravity(90.1, 0),
      RangeError,
      "gravity",
      "latitudeDeg",
      "-90 to 90 degrees",
      "90.1",
    );
    expectRefusal(() => gravity(0, 86_001), RangeError, "altitudeM", "-5000 to 86000 m");
    expectRefusal(() => gravity(Number.NaN, 0), RangeError, "NaN");
    expectRefusal(() => gravity(0, undefined as never), TypeError, "altitudeM");
  });
});

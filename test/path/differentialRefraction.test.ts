import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  differentialRefraction,
  dispersionOffset,
  refractedPath,
  standardProfile,
} from "../../src/index.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { testRefractivity } from "./_dryStandardAir.js";

const mountain = {
  pressurePa: 600 * 133.322,
  temperatureK: 280.15,
  relativeHumidity: 1,
  altitudeM: 2000,
  co2Ppm: 330,
};
const site = {
  guideWavelengthNm: 500,
  profile: standardProfile(mountain),
  altitudeM: 2000,
  earthRadiusM: 6371000,
};
const at15 = (Math.acos(1 / 1.5) * 180) / Math.PI;

describe("published values", () => {
  // Filippenko 1982, table I, sec z = 1.5 (from memory, last digit 0.01)
  it.each([
    [400, 0.71],
    [600, -0.37],
  ])("%d nm against 500 nm, as apparent or true angle alike", (nm, seconds) => {
    expectAbsolute(
      differentialRefraction(nm, { ...site, apparentZenithDeg: at15 }),
      seconds,
      0.005,
    );
    expectAbsolute(differentialRefraction(nm, { ...site, trueZenithDeg: at15 }), seconds, 0.005);
  });
});

describe("independent fixtures", () => {
  it("is the difference of index times tan z, less the curvature's share", () => {
    const index = (nm: number): number => testRefractivity(nm, 280.15, 600 * 133.322, 0, 330);
    const dry = standardProfile({ ...mountain, relativeHumidity: 0 });
    const seconds = (index(350) - index(500)) * 206264.806;
    const apart = differentialRefraction(350, { ...site, profile: dry, apparentZenithDeg: 45 });
    // beta = 4.4474e-6 T (Saastamoinen 1972, from memory) times sec² z
    expectRelative(apart, seconds * (1 - 2 * 4.4474e-6 * 280.15), 3e-4);
  });

  it("apparent sense: two rays of one direction; true sense: smaller by the compression of the sky", () => {
    for (const [zenith, share] of [
      [45, 4.6e-4],
      [85, 0.0215],
      [90, 0.166],
    ] as const) {
      const ray = (nm: number): number =>
        refractedPath(zenith, { ...site, wavelengthNm: nm }).trueZenithDeg * 3600;
      const seen = differentialRefraction(400, { ...site, apparentZenithDeg: zenith });
      expectAbsolute(seen, ray(400) - ray(500), 1e-9);
      const real = differentialRefraction(400, { ...site, trueZenithDeg: ray(500) / 3600 });
      expectAbsolute(seen / real - 1, share, 0.01 * share + 1e-5); // the sizes its comment gives
      const step = 1e-3;
      const slope =
        (refractedPath(zenith, { ...site, wavelengthNm: 400 }).refractionDeg -
          refractedPath(zenith - step, { ...site, wavelengthNm: 400 }).refractionDeg) /
        step;
      expectRelative(seen / real, 1 + slope, 2e-3);
    }
  });
});

describe("properties", () => {
  it("blue is lifted more than red; it adds up over wavelengths; the vector keeps its length", () => {
    fc.assert(
      fc.property(
        airState,
        between(5, 89),
        between(320, 900),
        between(-360, 360),
        (state, zenith, nm, angle) => {
          const profile = standardProfile({ ...state, altitudeM: 0 });
          const star = { ...site, altitudeM: 0, profile, trueZenithDeg: zenith };
          const lift = differentialRefraction(nm, star);
          expect(differentialRefraction(nm + 100, star)).toBeLessThan(lift);
          const other = { ...star, guideWavelengthNm: nm };
          expectAbsolute(lift + differentialRefraction(500, other), 0, 1e-8);
          const [along, across] = dispersionOffset(nm, star, angle);
          expectAbsolute(Math.hypot(along, across), Math.abs(lift), 1e-12 * Math.abs(lift) + 1e-15);
        },
      ),
      { numRuns: 25 },
    );
  });
});

describe("edges", () => {
  const star = { ...site, trueZenithDeg: 60 };
  it("is 0 for the guiding wavelength and at the zenith", () => {
    expect(differentialRefraction(500, star)).toBe(0);
    expectAbsolute(differentialRefraction(400, { ...site, trueZenithDeg: 0 }), 0, 1e-9);
  });
  it("turns with the axis: north and east", () => {
    const lift = differentialRefraction(400, star);
    expectAbsolute(dispersionOffset(400, star, 0)[0], lift, 1e-14);
    expectAbsolute(dispersionOffset(400, star, 90)[1], lift, 1e-14);
    expectAbsolute(dispersionOffset(400, star, -90)[1], -lift, 1e-14);
  });
  it("wants one angle, and refuses bad input", () => {
    const name = "differentialRefraction";
    expectRefusal(() => differentialRefraction(400, site as never), TypeError, name, "one of");
    expectRefusal(
      () => differentialRefraction(400, { ...star, apparentZenithDeg: 60 } as never),
      TypeError,
      "one of trueZenithDeg and apparentZenithDeg",
    );
    expectRefusal(
      () => differentialRefraction(0.4, star),
      RangeError,
      name,
      "µm? multiply by 1000",
    );
    expectRefusal(
      () => differentialRefraction(400, { ...star, guideWavelengthNm: 2000 }),
      RangeError,
      "guideWavelengthNm",
    );
    expectRefusal(
      () => differentialRefraction(400, { ...site, trueZenithDeg: 95 }),
      RangeError,
      name,
      "trueZenithDeg",
      "the ground hides it",
    );
    expectRefusal(
      () => differentialRefraction(400, { ...site, trueZenithDeg: Number.NaN }),
      RangeError,
      "NaN",
    );
    expectRefusal(() => differentialRefraction(400, undefined as never), TypeError, "star");
    expectRefusal(() => dispersionOffset(400, star, 400), RangeError, "zenithAngleDeg");
    expectRefusal(() => dispersionOffset(400, undefined as never, 0), TypeError, "star");
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airMassesOnPath,
  airMassesOnTruePath,
  airMassOnPath,
  airMassOnTruePath,
  constituentMassesOnPath,
  constituentMassesOnTruePath,
  constituentMassOnPath,
  constituentMassOnTruePath,
  exponentialLayer,
  gaussianLayer,
  moistAir,
  type PathInput,
  type PreparedPath,
  pathInWeather,
  preparePath,
  prepareWeatherPaths,
  refractedPath,
  refractionOnPath,
  refractionOnTruePath,
  refractionsOnPath,
  refractionsOnTruePath,
  standardAtmosphere,
  standardProfile,
  tabulatedLayer,
  tabulatedProfile,
} from "../../src/index.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const constituents = {
  ozone: gaussianLayer({ heightM: 22_000, standardDeviationM: 5000 }),
  water: exponentialLayer({ scaleHeightM: 2000 }),
};
const station = {
  pressurePa: 101325,
  temperatureK: 288.15,
  relativeHumidity: 0,
  altitudeM: 0,
  co2Ppm: 450,
};
const sea: PathInput<"ozone" | "water"> = {
  profile: standardProfile(station),
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
  constituents,
};
const mountain = {
  ...sea,
  altitudeM: 4000,
  profile: standardProfile({
    pressurePa: 61_600,
    temperatureK: 268,
    relativeHumidity: 0.5,
    altitudeM: 4000,
    co2Ppm: 425,
  }),
};
const path = preparePath(sea);
const high = preparePath(mountain);

/** A prepared path and the ray at one apparent angle, in every quantity, from both angles. */
function expectRay(
  input: PathInput<"ozone" | "water">,
  prepared: PreparedPath<"ozone" | "water">,
  apparent: number,
): void {
  const ray = refractedPath(apparent, input);
  const zenith = Math.min(ray.trueZenithDeg, prepared.horizonTrueZenithDeg);
  // the promise of the comments: 1e-9 and 1e-5 arcsec
  expectRelative(airMassOnPath(apparent, prepared), ray.airMass, 1e-9);
  expectRelative(airMassOnTruePath(zenith, prepared), ray.airMass, 1e-9);
  for (const key of ["ozone", "water"] as const) {
    expectRelative(constituentMassOnPath(apparent, prepared, key), ray.masses[key], 1e-9);
    expectRelative(constituentMassOnTruePath(zenith, prepared, key), ray.masses[key], 1e-9);
  }
  const seconds = ray.refractionDeg * 3600;
  expectAbsolute(refractionOnPath(apparent, prepared) * 3600, seconds, 1e-5);
  expectAbsolute(refractionOnTruePath(zenith, prepared) * 3600, seconds, 1e-5);
}

describe("published values", () => {
  it("dry standard air, 550 nm, 6371 km: 38.16 at the horizon, 57.165″ at 45° (last digit)", () => {
    expectAbsolute(airMassOnPath(90, path), 38.16, 0.005);
    expectAbsolute(refractionOnPath(45, path) * 3600, 57.165, 0.0005);
  });
});

describe("independent fixtures: the quadrature itself", () => {
  const angles = [
    0, 0.01, 5, 20, 33.3, 50, 65, 72, 78, 82, 85, 87, 88.5, 89.2, 89.7, 89.95, 89.999, 90,
  ];
  it.each(angles)("on the ground at %d°", (zenith) => expectRay(sea, path, zenith));
  it.each([...angles, 90.0001, 90.01, 90.1, 90.4, 91, 91.4, 91.7, 91.85])(
    "on a mountain at %d°",
    (zenith) => expectRay(mountain, high, zenith),
  );
  it("to the ray that grazes the ground", () => {
    const { horizonApparentZenithDeg, horizonTrueZenithDeg } = high;
    const ray = refractedPath(horizonApparentZenithDeg, mountain);
    expectAbsolute(horizonTrueZenithDeg, ray.trueZenithDeg, 1e-12);
    expectRelative(airMassOnPath(horizonApparentZenithDeg, high), ray.airMass, 1e-9);
    expect(path.horizonApparentZenithDeg).toBe(90);
  });

  it("through a sounding with an inversion and a table of ozone", () => {
    const profile = tabulatedProfile([
      { heightM: 113, temperatureK: 279.2, pressurePa: 100400, relativeHumidity: 0.93 },
      { heightM: 480, temperatureK: 283.4, pressurePa: 95990, relativeHumidity: 0.55 },
      { heightM: 1520, temperatureK: 276.9, pressurePa: 84600, relativeHumidity: 0.5 },
      { heightM: 3010, temperatureK: 268.1, pressurePa: 70200, relativeHumidity: 0.3 },
      { heightM: 5600, temperatureK: 252, pressurePa: 50000, relativeHumidity: 0.2 },
    ]);
    const ozone = tabulatedLayer(
      [0, 1, 1, 3, 6, 4, 2, 1, 0].map((density, i) => ({ heightM: 5000 * i, density })),
    );
    for (const altitudeM of [113, 1000]) {
      const input = { ...sea, profile, altitudeM, constituents: { ...constituents, ozone } };
      const prepared = preparePath(input);
      for (const zenith of [30, 80, 89, 89.9, 90]) expectRay(input, prepared, zenith);
      if (altitudeM > 113) for (const zenith of [90.1, 90.5]) expectRay(input, prepared, zenith);
    }
  });

  it("from an aircraft below and above the tropopause", () => {
    for (const altitudeM of [10_500, 12_500]) {
      const input = { ...sea, altitudeM };
      const prepared = preparePath(input);
      for (const zenith of [60, 88, 90, 91, 92.5]) expectRay(input, prepared, zenith);
    }
  });
});

describe("properties", () => {
  it("holds its accuracy in any weather, wavelength and radius", () => {
    fc.assert(
      fc.property(
        fc.record({
          state: airState,
          wavelengthNm: between(300, 1690),
          earthRadiusM: between(6335000, 6400000),
        }),
        fc.array(between(0, 90), { minLength: 8, maxLength: 8 }),
        ({ state, ...rest }, zeniths) => {
          const input = { ...sea, ...rest, profile: standardProfile({ ...state, altitudeM: 0 }) };
          const prepared = preparePath(input);
          for (const zenith of zeniths) expectRay(input, prepared, zenith);
        },
      ),
      { numRuns: 12 },
    );
  });

  it("true and apparent angles are one path: the refraction takes one to the other", () => {
    fc.assert(
      fc.property(between(0, 91.8), (zenith) => {
        const trueZenith = zenith + refractionOnPath(zenith, high);
        expectAbsolute(
          refractionOnTruePath(trueZenith, high),
          refractionOnPath(zenith, high),
          1e-9,
        );
      }),
    );
  });

  it("an array gives the bits of its single angles", () => {
    const zeniths = Float64Array.from({ length: 400 }, (_, i) => (i * 91.85) / 399);
    const grounded = Float64Array.from({ length: 400 }, (_, i) => (i * 90) / 399);
    for (const [prepared, list] of [
      [high, zeniths],
      [path, grounded],
      [path, grounded.subarray(3, 399)], // rising rays alone
    ] as const) {
      const each = (f: (z: number) => number): number[] => Array.from(list, f);
      expect([...airMassesOnPath(list, prepared)]).toEqual(each((z) => airMassOnPath(z, prepared)));
      expect([...airMassesOnTruePath(list, prepared)]).toEqual(
        each((z) => airMassOnTruePath(z, prepared)),
      );
      expect([...refractionsOnPath(list, prepared)]).toEqual(
        each((z) => refractionOnPath(z, prepared)),
      );
      expect([...refractionsOnTruePath(list, prepared)]).toEqual(
        each((z) => refractionOnTruePath(z, prepared)),
      );
      expect([...constituentMassesOnPath(list, prepared, "ozone")]).toEqual(
        each((z) => constituentMassOnPath(z, prepared, "ozone")),
      );
      expect([...constituentMassesOnTruePath(list, prepared, "water")]).toEqual(
        each((z) => constituentMassOnTruePath(z, prepared, "water")),
      );
    }
  });
});

describe("weather through the day", () => {
  const morning = { ...station, relativeHumidity: 0.5, temperatureK: 285, pressurePa: 101_000 };
  const profile = standardProfile(morning);
  const { waterMoleFraction } = moistAir(morning);
  const paths = prepareWeatherPaths({
    ...sea,
    profile,
    pressureRangePa: [99_000, 103_000],
    temperatureRangeK: [275, 295],
  });
  /** The standard profile of other weather with the same mole fraction of vapour. */
  const exact = (pressurePa: number, temperatureK: number): PathInput<"ozone" | "water"> => {
    const state = { ...morning, pressurePa, temperatureK };
    const saturated = moistAir({ ...state, relativeHumidity: 0.01 }).waterMoleFraction / 0.01;
    const relativeHumidity = waterMoleFraction / saturated;
    return { ...sea, profile: standardProfile({ ...state, relativeHumidity }) };
  };

  it.each([
    [100_000, 280],
    [101_500, 283],
    [102_500, 278],
    [99_300, 294],
    [103_000, 295],
  ])("%d Pa and %d K against the ray in that weather", (pressurePa, temperatureK) => {
    const input = exact(pressurePa, temperatureK);
    const now = pathInWeather({ pressurePa, temperatureK }, paths);
    for (const [zenith, mass, seconds] of [
      [20, 2e-6, 5e-4],
      [60, 2e-6, 5e-4],
      [80, 2e-6, 5e-4],
      [85, 2e-6, 5e-4],
      [88, 2e-6, 5e-4],
      [90, 5e-6, 0.015],
    ] as const) {
      const ray = refractedPath(zenith, input);
      expectRelative(airMassOnPath(zenith, now), ray.airMass, mass);
      expectRelative(constituentMassOnPath(zenith, now, "ozone"), ray.masses.ozone, mass);
      expectRelative(constituentMassOnPath(zenith, now, "water"), ray.masses.water, mass);
      expectAbsolute(refractionOnPath(zenith, now) * 3600, ray.refractionDeg * 3600, seconds);
      const trueZenith = Math.min(ray.trueZenithDeg, now.horizonTrueZenithDeg);
      expectRelative(airMassOnTruePath(trueZenith, now), ray.airMass, 2 * mass);
    }
  });

  const wide = prepareWeatherPaths({
    ...sea,
    profile,
    pressureRangePa: [97_000, 105_000],
    temperatureRangeK: [265, 305],
  });
  it.each([
    [98_000, 302],
    [99_000, 300],
    [102_000, 280],
    [104_000, 290],
    [105_000, 305],
  ])(
    "%d Pa and %d K out of ranges twice as wide: ten times the error at most",
    (pressurePa, temperatureK) => {
      const input = exact(pressurePa, temperatureK);
      const now = pathInWeather({ pressurePa, temperatureK }, wide);
      for (const [zenith, mass, seconds] of [
        [20, 2e-5, 5e-3],
        [60, 2e-5, 5e-3],
        [85, 2e-5, 5e-3],
        [88, 2e-5, 5e-3],
        [90, 5e-5, 0.15],
      ] as const) {
        const ray = refractedPath(zenith, input);
        expectRelative(airMassOnPath(zenith, now), ray.airMass, mass);
        expectRelative(constituentMassOnPath(zenith, now, "ozone"), ray.masses.ozone, mass);
        expectRelative(constituentMassOnPath(zenith, now, "water"), ray.masses.water, mass);
        expectAbsolute(refractionOnPath(zenith, now) * 3600, ray.refractionDeg * 3600, seconds);
      }
    },
  );

  it("what the weather of a day is worth, and what is left of it", () => {
    const input = exact(99_300, 294);
    const ray = refractedPath(85, input);
    const still = preparePath({ ...sea, profile });
    // 9 K and 1.7 %: over 20 arcsec in 580 lost by a path that does not follow; 5e-4 by one that does
    expect(Math.abs(refractionOnPath(85, still) - ray.refractionDeg) * 3600).toBeGreaterThan(20);
    const now = pathInWeather({ pressurePa: 99_300, temperatureK: 294 }, paths);
    expectAbsolute(refractionOnPath(85, now) * 3600, ray.refractionDeg * 3600, 5e-4);
  });

  it("keeps a table's shape: one offset, pressure re-integrated", () => {
    const rows = Array.from({ length: 21 }, (_, i) => {
      const { temperatureK, pressurePa } = standardAtmosphere(i * 500);
      return { heightM: i * 500, temperatureK, pressurePa, relativeHumidity: 0 };
    });
    const tables = prepareWeatherPaths({
      ...sea,
      profile: tabulatedProfile(rows),
      pressureRangePa: [99_000, 103_000],
      temperatureRangeK: [280, 300],
    });
    const now = pathInWeather({ pressurePa: 100_000, temperatureK: 295 }, tables);
    const warm = standardProfile({ ...station, pressurePa: 100_000, temperatureK: 295 });
    for (const zenith of [45, 80, 89]) {
      const ray = refractedPath(zenith, { ...sea, profile: warm });
      // the table's own chords over the kink at 11 km: 1e-5
      expectRelative(airMassOnPath(zenith, now), ray.airMass, 2e-5);
      expectRelative(refractionOnPath(zenith, now), ray.refractionDeg, 2e-5);
    }
  });

  it("works from a mountain below the horizontal", () => {
    const given = {
      ...mountain,
      pressureRangePa: [60_000, 63_000] as const,
      temperatureRangeK: [262, 274] as const,
    };
    const day = prepareWeatherPaths(given);
    const now = pathInWeather({ pressurePa: 61_600, temperatureK: 268 }, day);
    for (const zenith of [89, 90, 90.5, 91.5]) {
      const ray = refractedPath(zenith, mountain);
      expectRelative(airMassOnPath(zenith, now), ray.airMass, 5e-6);
      expectAbsolute(refractionOnPath(zenith, now) * 3600, ray.refractionDeg * 3600, 0.03);
    }
  });

  it("refuses what is outside or not prepared", () => {
    const now = { pressurePa: 101_000, temperatureK: 285 };
    const name = "pathInWeather";
    expectRefusal(
      () => pathInWeather({ ...now, pressurePa: 98_999 }, paths),
      RangeError,
      name,
      "99000 to 103000 Pa",
    );
    expectRefusal(
      () => pathInWeather({ ...now, pressurePa: 1010 }, paths),
      RangeError,
      "hPa? multiply by 100",
    );
    expectRefusal(
      () => pathInWeather({ ...now, temperatureK: 12 }, paths),
      RangeError,
      "°C? add 273.15",
    );
    expectRefusal(
      () => pathInWeather({ ...now, temperatureK: Number.NaN }, paths),
      RangeError,
      "NaN",
    );
    expectRefusal(() => pathInWeather(now, path as never), TypeError, "prepareWeatherPaths");
    expectRefusal(() => pathInWeather(undefined as never, paths), TypeError, "weather");
    const bad =
      (fields: object): (() => unknown) =>
      () =>
        prepareWeatherPaths({
          ...sea,
          pressureRangePa: [99_000, 103_000],
          temperatureRangeK: [275, 295],
          ...fields,
        });
    expectRefusal(
      bad({ pressureRangePa: [103_000, 99_000] }),
      RangeError,
      "width of pressureRangePa",
    );
    expectRefusal(
      bad({ temperatureRangeK: [270, 311] }),
      RangeError,
      "width of temperatureRangeK",
      "41",
    );
    for (const [pressureRangePa, ...parts] of [
      [[9990, 12_000], "pressureRangePa[0]", "10000 to 140000"],
      [[135_000, 140_100], "pressureRangePa[1]", "140100"],
      [[99_000, 109_005], "width of pressureRangePa", "10000", "10005"],
    ] as const)
      expectRefusal(bad({ pressureRangePa }), RangeError, ...parts);
    for (const [temperatureRangeK, ...parts] of [
      [[179.9, 200], "temperatureRangeK[0]", "180 to 380"],
      [[350, 380.2], "temperatureRangeK[1]", "380.2"],
      [[270, 310.02], "width of temperatureRangeK", "40"],
    ] as const)
      expectRefusal(bad({ temperatureRangeK }), RangeError, ...parts);
    const wide = bad({ pressureRangePa: [10_000, 10_001], temperatureRangeK: [280, 280.1] });
    expect(wide).not.toThrow();
    expectRefusal(bad({ temperatureRangeK: [2, 22] }), RangeError, "temperatureRangeK[0]", "°C");
    expectRefusal(bad({ pressureRangePa: 101_000 }), TypeError, "pressureRangePa");
    expectRefusal(bad({ altitudeM: -5 }), RangeError, "prepareWeatherPaths", "altitudeM");
  });
});

describe("edges", () => {
  it("leaves NaN in its place, fills what it is given, and names the angle that is out of range", () => {
    const out = new Float64Array(4);
    const filled = airMassesOnPath([0, Number.NaN, 90], path, out);
    expect(filled).toBe(out);
    expectAbsolute(out[0]!, 1, 1e-9);
    expect(out[1]).toBeNaN();
    expect(out[2]).toBe(airMassOnPath(90, path));
    expect(out[3]).toBe(0);
    expect(refractionsOnTruePath([Number.NaN], path)[0]).toBeNaN();
    expect(airMassesOnPath([], path)).toEqual(new Float64Array(0));
    const name = "airMassesOnPath";
    expectRefusal(
      () => airMassesOnPath([10, 90.1], path),
      RangeError,
      name,
      "apparentZenithsDeg[1]",
      "0 to 90 degrees",
      "90.1",
    );
    expectRefusal(
      () => airMassesOnTruePath([91], path),
      RangeError,
      "trueZenithsDeg[0]",
      "0 to 90.55",
    );
    expectRefusal(
      () => airMassesOnPath([1, 2], path, new Float64Array(1)),
      RangeError,
      "out",
      "at least 2",
    );
    expectRefusal(() => airMassesOnPath(45 as never, path), TypeError, "apparentZenithsDeg");
    expectRefusal(() => airMassesOnPath([45], sea as never), TypeError, "preparePath");
    expectRefusal(
      () => constituentMassesOnPath([45], path, "smoke" as never),
      TypeError,
      "ozone, water",
      "smoke",
    );
  });

  it("refuses single angles out of range, raw input and unknown constituents", () => {
    expectRefusal(() => airMassOnPath(90.1, path), RangeError, "airMassOnPath", "0 to 90 degrees");
    expectRefusal(() => airMassOnPath(-0.1, path), RangeError, "-0.1");
    expectRefusal(() => refractionOnPath(Number.NaN, path), RangeError, "NaN");
    expectRefusal(() => airMassOnTruePath(90.6, path), RangeError, "trueZenithDeg", "0 to 90.55");
    expectRefusal(() => airMassOnTruePath("45" as never, path), TypeError, '"45"');
    expectRefusal(
      () => refractionOnTruePath(45, sea as never),
      TypeError,
      "preparePath or pathInWeather",
    );
    expectRefusal(
      () => constituentMassOnPath(45, path, "smoke" as never),
      TypeError,
      "a constituent of the path (ozone, water)",
    );
    const one = preparePath({ ...sea, constituents: { ozone: constituents.ozone } });
    expectRefusal(() => constituentMassOnPath(45, one, "smoke" as never), TypeError, "(ozone)");
    const bare = preparePath({ ...sea, constituents: {} });
    expectRefusal(() => constituentMassOnTruePath(45, bare, "ozone" as never), TypeError, "(none)");
    expectRefusal(
      () => preparePath({ ...sea, profile: station as never }),
      TypeError,
      "preparePath",
      "standardProfile",
    );
  });

  it("is plain data: a structured clone works", () => {
    const copy = structuredClone(path);
    expect(airMassOnPath(77, copy)).toBe(airMassOnPath(77, path));
  });
});

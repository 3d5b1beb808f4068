import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airAtHeight,
  apparentZenith,
  earthCurvatureRadius,
  exponentialLayer,
  gaussianLayer,
  moistAir,
  type PathInput,
  refractedPath,
  refractiveIndexCiddor,
  standardAtmosphere,
  standardProfile,
  tabulatedLayer,
  tabulatedProfile,
} from "../../src/index.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { adaptiveRay } from "./_adaptiveRay.js";
import { cartesianRay } from "./_cartesianRay.js";
import { dryStandardAir, testRefractivity } from "./_dryStandardAir.js";

const constituents = {
  ozone: gaussianLayer({ heightM: 22_000, standardDeviationM: 5000 }),
  water: exponentialLayer({ scaleHeightM: 2000 }),
};
const dryStation = {
  pressurePa: 101325,
  temperatureK: 288.15,
  relativeHumidity: 0,
  altitudeM: 0,
  co2Ppm: 450,
};
const dry = standardProfile(dryStation);
const input: PathInput<"ozone" | "water"> = {
  profile: dry,
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
  constituents,
};
const radians = Math.PI / 180;
const arcsec = (zenithDeg: number, given: PathInput<string> = input): number =>
  refractedPath(zenithDeg, given).refractionDeg * 3600;

describe("published values", () => {
  // dry standard air at 550 nm, 6371 km: refraction computed for the plan of this library by another program
  it.each([
    [45, 57.165, 0.0005],
    [75, 210.22, 0.005],
    [90, 33.0 * 60, 3],
  ])("refraction at %d°, last digit", (zenith, seconds, tolerance) => {
    expectAbsolute(arcsec(zenith), seconds, tolerance);
  });

  it.each([
    [6356800, 38.11],
    [6371000, 38.16],
    [6378000, 38.18],
  ])("horizon air mass for an Earth of %d m, last digit", (earthRadiusM, mass) => {
    expectAbsolute(refractedPath(90, { ...input, earthRadiusM }).airMass, mass, 0.005);
  });

  // Kasten & Young 1989, table 2 (from memory): standard air, 700 nm, geopotential radius of the Earth 6356.766 km
  it.each([
    [0, 38.0868, 1e-4],
    [1, 26.2595, 7e-5],
    [3, 15.1633, 3e-5],
    [5, 10.3164, 3e-5],
    [10, 5.5841, 2e-5],
  ])("Kasten & Young's air mass at %d° elevation", (elevation, mass, tolerance) => {
    // their index is not printed to more than a few digits: 1e-3 of n - 1 is worth 8e-5 at the horizon
    const theirs = { ...input, wavelengthNm: 700, earthRadiusM: 6356766 };
    expectRelative(refractedPath(90 - elevation, theirs).airMass, mass, tolerance);
  });
  it("and all of their table within 3e-5 once the index at the ground is 1.000276", () => {
    const theirs = { ...input, wavelengthNm: 677, earthRadiusM: 6356766 };
    expectAbsolute(refractiveIndexCiddor(677, moistAir(dryStation)), 1.000276, 5e-8);
    const table = [38.0868, 26.2595, 15.1633, 10.3164, 5.5841];
    for (const [i, elevation] of [0, 1, 3, 5, 10].entries()) {
      expectRelative(refractedPath(90 - elevation, theirs).airMass, table[i]!, 3e-5);
    }
  });

  // Pulkovo refraction tables, 5th edition (from memory): 15 °C, 1013.25 hPa, dry, 590 nm
  it("Pulkovo: 57.085″/tan h - 0.0666″/tan³ h above 20°", () => {
    for (const h of [20, 25, 30, 40, 50, 60, 75]) {
      const cot = 1 / Math.tan(h * radians);
      const pulkovo = 57.085 * cot - 0.0666 * cot * cot * cot;
      expectAbsolute(arcsec(90 - h, { ...input, wavelengthNm: 590 }), pulkovo, 0.03);
    }
  });
  it("Pulkovo: 1976.3″ at the horizon", () => {
    // with the equatorial radius; 1″ less for each 5.5 km of radius less
    const theirs = { ...input, wavelengthNm: 590, earthRadiusM: 6378000 };
    expectAbsolute(arcsec(90, theirs), 1976.3, 0.1);
  });

  // the two constants of the fundamental-astronomy standard for optical refraction (from memory), its stated use to 75°
  it.each([
    [1013.25, 15, 0, 550, 0],
    [1005, 7, 0.8, 574, 0],
    [800, -5, 0.2, 700, 2000],
    [620, 2, 0.3, 450, 4000],
    [1013.25, 30, 0.9, 550, 0],
  ])(
    "A tan z + B tan³ z at %d hPa, %d °C, humidity %d, %d nm, %d m",
    (hPa, celsius, rh, nm, altitudeM) => {
      const t = celsius + 273.15;
      const saturated =
        10 ** ((0.7859 + 0.03477 * celsius) / (1 + 0.00412 * celsius)) *
        (1 + hPa * (4.5e-6 + 6e-10 * celsius * celsius));
      const vapour = (rh * saturated) / (1 - ((1 - rh) * saturated) / hPa);
      const w2 = (nm / 1000) ** 2;
      const gamma =
        ((77.53484e-6 + (4.39108e-7 + 3.666e-9 / w2) / w2) * hPa - 11.2684e-6 * vapour) / t;
      const beta = 4.4474e-6 * t;
      const [a, b] = [gamma * (1 - beta), -gamma * (beta - gamma / 2)];
      const profile = standardProfile({
        pressurePa: hPa * 100,
        temperatureK: t,
        relativeHumidity: rh,
        altitudeM,
        co2Ppm: 425,
      });
      for (const z of [15, 30, 45, 60, 70, 75]) {
        const tan = Math.tan(z * radians);
        const constants = ((a * tan + b * tan ** 3) / radians) * 3600;
        const ray = arcsec(z, { profile, altitudeM, wavelengthNm: nm, earthRadiusM: 6371000 });
        expectAbsolute(ray, constants, 0.1);
      }
    },
  );

  it("Filippenko 1982: +0.71″ at 400 nm, -0.37″ at 600 nm against 500 nm at sec z 1.5 (from memory)", () => {
    // 2 km, 7 °C, 600 mmHg; his 8 mmHg of vapour are 106 % of saturation, taken as 100 %: 0.0003″
    const station = {
      pressurePa: 600 * 133.322,
      temperatureK: 280.15,
      relativeHumidity: 1,
      altitudeM: 2000,
      co2Ppm: 330,
    };
    const given = { ...input, profile: standardProfile(station), altitudeM: 2000 };
    const z = Math.acos(1 / 1.5) / radians;
    const at = (wavelengthNm: number): number => arcsec(z, { ...given, wavelengthNm });
    expectAbsolute(at(400) - at(500), 0.71, 0.005);
    expectAbsolute(at(600) - at(500), -0.37, 0.005);
  });

  it("common practice: the sea horizon dips by 1.76′ to 1.78′ times the square root of the height in metres", () => {
    for (const altitudeM of [10, 100, 1000]) {
      const beyond = (): unknown => refractedPath(95, { ...input, altitudeM });
      let message = "";
      try {
        beyond();
      } catch (error) {
        message = (error as Error).message;
      }
      const dip = (Number(/0 to ([\d.]+) degrees/.exec(message)![1]) - 90) * 60;
      expectRelative(dip, 1.77 * Math.sqrt(altitudeM), 0.02);
    }
  });
});

describe("independent fixtures", () => {
  const overhead = (altitudeM: number): number[] =>
    cartesianRay(dryStandardAir, altitudeM, 0, 100).sums;

  // steps of 100 m: error of the fixture 3e-8 in mass by halving; it takes one-sided gradients at the ground: 3e-4″ at 90°
  it.each([
    [0, 45, 5e-6],
    [0, 80, 5e-6],
    [0, 89, 2e-5],
    [0, 90, 3e-4],
    [4000, 90.5, 2e-5],
    [4000, 91.8, 2e-5],
    [15000, 89.9, 2e-5],
  ])("a ray in Cartesian coordinates from %d m at %d°", (altitudeM, zenith, tolerance) => {
    const ray = cartesianRay(dryStandardAir, altitudeM, zenith, 100);
    expectAbsolute(ray.drift, 0, 1e-13); // n r sin z stays along it
    const path = refractedPath(zenith, { ...input, altitudeM });
    const columns = overhead(altitudeM);
    expectAbsolute(path.trueZenithDeg * 3600, ray.directionDeg * 3600, tolerance);
    expectRelative(path.airMass, ray.sums[0]! / columns[0]!, 1e-6);
    expectRelative(path.masses.ozone, ray.sums[1]! / columns[1]!, 1e-6);
    expectRelative(path.masses.water, ray.sums[2]! / columns[2]!, 1e-6);
  });

  // steps that keep 1e-12 each; the promise of the comment: 1e-9 and 1e-5 arcsec
  it.each([
    [0, 30],
    [0, 60],
    [0, 80],
    [0, 85],
    [0, 88],
    [0, 89.5],
    [0, 89.99],
    [0, 90],
    [4000, 45],
    [4000, 90],
    [4000, 91.8],
    [15000, 89.9],
    [15000, 92],
  ])(
    "a ray by its differential equation with adaptive steps, from %d m at %d°",
    (altitudeM, zenith) => {
      const [ray, up] = [adaptiveRay(altitudeM, zenith), adaptiveRay(altitudeM, 0)];
      const path = refractedPath(zenith, { ...input, altitudeM });
      expectAbsolute(path.refractionDeg * 3600, ray.refractionArcsec, 1e-5);
      const { airMass, masses } = path;
      [airMass, masses.ozone, masses.water].forEach((mass, i) => {
        expectRelative(mass, ray.sums[i]! / up.sums[i]!, 1e-9);
      });
    },
  );

  it("Auer & Standish's integral over the zenith angle gives the same refraction", () => {
    const { index, breaksM, earthRadiusM } = dryStandardAir;
    for (const zenith of [60, 80, 88]) {
      const invariant = index(0) * earthRadiusM * Math.sin(zenith * radians);
      let sum = 0;
      let low = 0;
      for (const high of breaksM) {
        const slope = (h: number): number => {
          const [a, b] = [Math.max(h - 1, low), Math.min(h + 1, high)];
          return (index(b) - index(a)) / (b - a) / index(h);
        };
        const angle = (h: number): number => Math.asin(invariant / (index(h) * (earthRadiusM + h)));
        const integrand = (z: number): number => {
          let h = (low + high) / 2;
          for (let i = 0; i < 12; i++) {
            const product = index(h) * (earthRadiusM + h);
            const growth = index(h) + (earthRadiusM + h) * slope(h) * index(h);
            h = Math.min(high, Math.max(low, h - (product - invariant / Math.sin(z)) / growth));
          }
          const rate = (earthRadiusM + h) * slope(h);
          return -rate / (1 + rate);
        };
        const [from, to] = [angle(high), angle(low)];
        const steps = 200;
        const dz = (to - from) / steps;
        for (let i = 0; i <= steps; i++) {
          const weight = i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2;
          sum += ((weight * dz) / 3) * integrand(from + i * dz);
        }
        low = high;
      }
      // Snell's law at the top, from n to 1
      const top = earthRadiusM + low;
      sum += Math.asin(invariant / top) - Math.asin(invariant / (index(low) * top));
      expectRelative((sum / radians) * 3600, arcsec(zenith), 1e-6);
    }
  });

  it("moist air at the observer is Ciddor's, to first order of tan z near the zenith", () => {
    const station = { ...dryStation, relativeHumidity: 0.9, temperatureK: 303.15 };
    const wet = { ...input, profile: standardProfile(station) };
    const refractivity = refractiveIndexCiddor(550, moistAir(station)) - 1;
    // (n - 1) tan z less the curvature's share, H/R = 0.13 %
    const share =
      arcsec(0.01, wet) / (((refractivity * Math.tan(0.01 * radians)) / radians) * 3600);
    expectAbsolute(share, 1 - 8.9e3 / 6371e3, 1.5e-4);
  });

  it("keeping the standard's pressures while raising its temperatures 15 K costs over half a per cent of the mass at 85°", () => {
    // the wrong way, as a table: the standard's pressures at every height with temperatures 15 K higher
    const raised = standardProfile({ ...dryStation, temperatureK: 303.15 });
    const wrong = tabulatedProfile(
      Array.from({ length: 80 }, (_, i) => {
        const { temperatureK, pressurePa } = standardAtmosphere(i * 1000);
        return {
          heightM: i * 1000,
          temperatureK: temperatureK + 15,
          pressurePa,
          relativeHumidity: 0,
        };
      }),
    );
    const right = refractedPath(85, { ...input, profile: raised }).airMass;
    const off = refractedPath(85, { ...input, profile: wrong }).airMass / right - 1;
    expect(off).toBeGreaterThan(0.005);
    expect(off).toBeLessThan(0.01);
  });

  it("the Earth's radius of curvature against a circle through three points of the ellipsoid", () => {
    const [a, f] = [6378137, 1 / 298.257223563];
    const b = a * (1 - f);
    // meridian: x = a cos u, y = b sin u, tan u = (b/a) tan latitude
    for (const latitude of [0, 30, 45, 70]) {
      const u = Math.atan((b / a) * Math.tan(latitude * radians));
      const meridian = (a * a * Math.sin(u) ** 2 + b * b * Math.cos(u) ** 2) ** 1.5 / (a * b);
      const prime = (a * Math.cos(u)) / Math.cos(latitude * radians);
      expectRelative(earthCurvatureRadius(latitude, 0), meridian, 1e-12);
      expectRelative(earthCurvatureRadius(latitude, 90), prime, 1e-12);
      expectRelative(earthCurvatureRadius(latitude, -135), 2 / (1 / meridian + 1 / prime), 1e-12);
    }
    expectRelative(earthCurvatureRadius(90, 12), (a * a) / b, 1e-12);
  });
});

describe("properties", () => {
  const anywhere = fc.record({
    state: airState,
    altitudeM: between(0, 4000),
    wavelengthNm: between(300, 1690),
    earthRadiusM: between(6335000, 6400000),
  });
  const inputOf = ({
    state,
    ...rest
  }: {
    state: typeof dryStation extends infer S ? Omit<S, "altitudeM"> : never;
    altitudeM: number;
    wavelengthNm: number;
    earthRadiusM: number;
  }): PathInput<"ozone" | "water"> => ({
    ...rest,
    profile: standardProfile({ ...state, altitudeM: rest.altitudeM }),
    constituents,
  });

  it("n r sin z: two observers on one ray see it leave in the same straight line", () => {
    fc.assert(
      fc.property(anywhere, between(1, 88), between(100, 6000), (where, zenith, climb) => {
        const lower = inputOf({ ...where, altitudeM: 0 });
        const upper = { ...lower, altitudeM: climb };
        const invariant = indexAt(lower) * radius(lower) * Math.sin(zenith * radians);
        // Simpson's rule for the angle between them at the Earth's centre
        let centre = 0;
        for (let i = 0; i <= 400; i++) {
          const here = { ...lower, altitudeM: (climb * i) / 400 };
          const sine = invariant / (indexAt(here) * radius(here));
          const weight = i === 0 || i === 400 ? 1 : i % 2 === 1 ? 4 : 2;
          centre += (weight * climb * sine) / (1200 * Math.sqrt(1 - sine * sine) * radius(here));
        }
        const above = Math.asin(invariant / (indexAt(upper) * radius(upper))) / radians;
        const turned =
          refractedPath(zenith, lower).trueZenithDeg - refractedPath(above, upper).trueZenithDeg;
        // the arc sine at 88° is good to 1e-13; Simpson to 1e-9 of an angle below 2 degrees
        expectAbsolute(turned, centre / radians, 3e-9);
      }),
      { numRuns: 30 },
    );
  });

  it("n r sin z: a ray that dips is twice the horizontal ray from its lowest point less the ray that rises", () => {
    fc.assert(
      fc.property(anywhere, between(0.05, 0.95), (where, share) => {
        const lowest = inputOf({ ...where, altitudeM: 500 });
        const high = { ...lowest, altitudeM: 500 + 3500 * share };
        const sine = (indexAt(lowest) * radius(lowest)) / (indexAt(high) * radius(high));
        const dip = Math.acos(sine) / radians;
        const down = refractedPath(90 + dip, high);
        const up = refractedPath(90 - dip, high);
        const level = refractedPath(90, lowest);
        // the dip comes from an arc cosine near 1: good to 1e-8 degrees; refraction grows by up to 0.3 per degree of it
        expectAbsolute(down.refractionDeg + up.refractionDeg, 2 * level.refractionDeg, 3e-9);
      }),
      { numRuns: 40 },
    );
  });

  it("everything grows with zenith angle from 1 and 0, ozone least, water most", () => {
    fc.assert(
      fc.property(anywhere, between(1, 89.8), (where, zenith) => {
        const given = inputOf(where);
        const [near, far] = [refractedPath(zenith, given), refractedPath(zenith + 0.1, given)];
        expect(far.refractionDeg).toBeGreaterThan(near.refractionDeg);
        expect(far.airMass).toBeGreaterThan(near.airMass);
        expect(near.masses.ozone).toBeLessThan(near.airMass);
        expect(near.masses.water).toBeGreaterThan(near.airMass * (1 - 1e-3));
        expect(near.airMass).toBeLessThan(1 / Math.cos(zenith * radians));
        const overhead = refractedPath(0, given);
        expectAbsolute(overhead.airMass, 1, 1e-14);
        expectAbsolute(overhead.refractionDeg, 0, 1e-13);
      }),
      { numRuns: 40 },
    );
  });

  it("apparentZenith undoes refractedPath, below the horizon too", () => {
    fc.assert(
      fc.property(anywhere, between(0, 91), (where, zenith) => {
        const given = { ...inputOf(where), altitudeM: 4000 };
        const { trueZenithDeg } = refractedPath(zenith, given);
        // rounding of the angles 1e-14, of a grazing ray's lowest point a hundred times that
        expectAbsolute(apparentZenith(trueZenithDeg, given), zenith, 1e-11);
      }),
      { numRuns: 40 },
    );
  });
});

describe("odd air", () => {
  it("leads back from the true angle over hot ground, where refraction falls towards the horizon", () => {
    // 0.8 K a metre over the lowest 20 m, balanced by the mean temperature of each step
    const rows: {
      heightM: number;
      temperatureK: number;
      pressurePa: number;
      relativeHumidity: 0;
    }[] = [];
    let [pressurePa, lastM, lastK] = [101325, 0, 300];
    for (const heightM of [0, 5, 10, 20, 60, 300, 1000, 3000, 6000, 10_000]) {
      const temperatureK = heightM <= 20 ? 300 - 0.8 * heightM : 284 - 0.0065 * (heightM - 20);
      pressurePa *= Math.exp((-0.0341632 * (heightM - lastM)) / ((temperatureK + lastK) / 2));
      rows.push({ heightM, temperatureK, pressurePa, relativeHumidity: 0 });
      [lastM, lastK] = [heightM, temperatureK];
    }
    const hot = { ...input, profile: tabulatedProfile(rows) };
    expect(arcsec(89.9, hot)).toBeLessThan(arcsec(89.5, hot) - 200);
    for (const seen of [60, 88, 89.3, 89.6, 89.8, 89.9, 89.97, 90]) {
      const { trueZenithDeg } = refractedPath(seen, hot);
      expectAbsolute(apparentZenith(trueZenithDeg, hot), seen, 1e-11);
    }
  });
  it("does not care how much of a constituent there is", () => {
    const layer = (most: number) =>
      tabulatedLayer([
        { heightM: 1000, density: 0 },
        { heightM: 3000, density: most },
        { heightM: 5000, density: 0 },
      ]);
    const of = (most: number): number =>
      refractedPath(80, { ...input, constituents: { smoke: layer(most) } }).masses.smoke;
    expectRelative(of(1e-12), of(1), 1e-13);
  });
});

describe("edges", () => {
  it("is continuous through 90° with its slope, from a height", () => {
    const high = { ...input, altitudeM: 3000 };
    const at = (zenith: number): number[] => {
      const path = refractedPath(zenith, high);
      return [path.refractionDeg, path.airMass, path.masses.ozone, path.masses.water];
    };
    for (const step of [1e-9, 1e-6, 1e-3]) {
      const [before, level, after] = [at(90 - step), at(90), at(90 + step)];
      for (const i of [0, 1, 2, 3]) {
        // second difference against curvature of the order of the value per square degree
        const bend = before[i]! + after[i]! - 2 * level[i]!;
        expectAbsolute(bend, 0, level[i]! * (20 * step * step + 2e-10));
      }
    }
  });

  it("is continuous over the kinks of the profile and at the tables' ends", () => {
    const tropopause = (6356766 * 11_000) / (6356766 - 11_000);
    for (const altitudeM of [tropopause, 20_000]) {
      for (const zenith of [60, 90, 91]) {
        const [low, high] = [-1e-4, 1e-4].map((off) =>
          refractedPath(zenith, { ...input, altitudeM: altitudeM + off }),
        );
        // a level ray runs 50 m inside these 0.2 mm, and bends otherwise there
        expectRelative(low!.airMass, high!.airMass, 1e-5);
        expectRelative(low!.masses.ozone, high!.masses.ozone, 1e-5);
      }
    }
  });

  it("a table of a Gaussian is the Gaussian, a thin table a shell", () => {
    const rows = Array.from({ length: 401 }, (_, i) => ({
      heightM: 2000 + i * 100,
      density: Math.exp(-(((2000 + i * 100 - 22_000) / 5000) ** 2) / 2),
    }));
    const shell = [
      { heightM: 24_990, density: 0 },
      { heightM: 25_000, density: 3 },
      { heightM: 25_010, density: 0 },
    ];
    const given = {
      ...input,
      constituents: { ...constituents, table: tabulatedLayer(rows), shell: tabulatedLayer(shell) },
    };
    const { masses } = refractedPath(85, given);
    expectRelative(masses.table, masses.ozone, 1e-5); // chords of 100 m and the tails beyond 4 deviations
    const high = { ...input, altitudeM: 25_000 };
    const sine =
      (indexAt(input) * radius(input) * Math.sin(85 * radians)) / (indexAt(high) * radius(high));
    expectRelative(masses.shell, 1 / Math.sqrt(1 - sine * sine), 1e-6);
  });

  it("says where the ground is, and lets the grazing ray pass", () => {
    expectRefusal(
      () => refractedPath(90.001, input),
      RangeError,
      "refractedPath",
      "apparentZenithDeg",
      "0 to 90 degrees",
      "meets the ground at 0 m",
    );
    const high = { ...input, altitudeM: 4000 };
    expectRefusal(() => refractedPath(92.5, high), RangeError, "0 to 91.875", "92.5");
    const grazing = refractedPath(91.875, high);
    expectRelative(grazing.airMass * columnShare(4000), 2 * 38.158, 0.35);
    expectRefusal(
      () => apparentZenith(92, input),
      RangeError,
      "apparentZenith",
      "trueZenithDeg",
      "0 to 90.55",
      "the ground hides it",
    );
    expectAbsolute(apparentZenith(refractedPath(90, input).trueZenithDeg, input), 90, 1e-11);
    expect(apparentZenith(0, input)).toBe(0);
  });

  it("refuses a ray that a strong inversion bends back", () => {
    const duct = tabulatedProfile([
      { heightM: 0, temperatureK: 283, pressurePa: 101300, relativeHumidity: 0.9 },
      { heightM: 50, temperatureK: 303, pressurePa: 100715, relativeHumidity: 0.1 },
      { heightM: 3000, temperatureK: 280, pressurePa: 71800, relativeHumidity: 0.1 },
    ]);
    const given = { ...input, profile: duct };
    expectRefusal(() => refractedPath(90, given), RangeError, "bent back down", "90");
    expect(refractedPath(89, given).airMass).toBeGreaterThan(25);
  });

  it("refuses bad input", () => {
    expectRefusal(() => refractedPath(-1, input), RangeError, "0 to 120 degrees", "-1");
    expectRefusal(() => refractedPath(Number.NaN, input), RangeError, "NaN");
    expectRefusal(() => refractedPath("45" as never, input), TypeError, '"45"');
    expectRefusal(() => refractedPath(45, undefined as never), TypeError, "refractedPath", "input");
    const bad =
      (fields: object): (() => unknown) =>
      () =>
        refractedPath(45, { ...input, ...fields });
    expectRefusal(bad({ profile: dryStation }), TypeError, "standardProfile or tabulatedProfile");
    expectRefusal(bad({ altitudeM: -1 }), RangeError, "altitudeM", "0 to 80000 m");
    expectRefusal(bad({ wavelengthNm: 0.55 }), RangeError, "µm? multiply by 1000");
    expectRefusal(bad({ earthRadiusM: 6371 }), RangeError, "earthRadiusM", "km? multiply by 1000");
    expectRefusal(bad({ constituents: 5 }), TypeError, "constituents");
    expectRefusal(
      bad({ constituents: { smoke: {} } }),
      TypeError,
      "constituents.smoke",
      "gaussianLayer",
    );
    const low = tabulatedLayer([
      { heightM: 0, density: 1 },
      { heightM: 500, density: 1 },
    ]);
    expectRefusal(
      bad({ altitudeM: 600, constituents: { fog: low } }),
      RangeError,
      "constituents.fog",
      "above the observer",
    );
    expectRefusal(() => apparentZenith(Number.NaN, input), RangeError, "trueZenithDeg");
    expectRefusal(() => earthCurvatureRadius(91, 0), RangeError, "latitudeDeg", "-90 to 90");
    expectRefusal(() => earthCurvatureRadius(0, 361), RangeError, "azimuthDeg");
    expect(refractedPath(45, { ...input, constituents: {} }).masses).toEqual({});
  });
});

/** n of a profile at a height, written apart from src. */
function indexAt({ profile, altitudeM, wavelengthNm }: PathInput<string>): number {
  const { temperatureK, pressurePa, waterMoleFraction } = airAtHeight(altitudeM, profile);
  const { co2Ppm } = profile;
  return 1 + testRefractivity(wavelengthNm, temperatureK, pressurePa, waterMoleFraction, co2Ppm);
}

function radius({ earthRadiusM, altitudeM }: PathInput<string>): number {
  return earthRadiusM + altitudeM;
}

function columnShare(heightM: number): number {
  return standardAtmosphere(heightM).pressurePa / 101325;
}

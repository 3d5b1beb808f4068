import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  angleOfPolarisation,
  degreeOfPolarisation,
  illuminateSky,
  neutralPoints,
  prepareSky,
  rayleighPolarisation,
  skyRadiance,
  skyStokes,
  skyStokesMap,
  type LitSky,
  type Stokes,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const litSky = (depth: number, sun: number, groundAlbedo = 0.1): LitSky =>
  illuminateSky(
    prepareSky({
      layers: [{ rayleighDepth: depth, absorptionDepth: 0 }],
      depolarisation: 0.0279,
      groundAlbedo,
    }),
    sun,
  );

describe("degree and angle", () => {
  it("of known light", () => {
    expect(degreeOfPolarisation([2, 0, 0])).toBe(0);
    expect(degreeOfPolarisation([5, 3, -4])).toBe(1);
    const cases: [Stokes, number][] = [
      [[1, 1, 0], 0],
      [[1, -1, 0], 90],
      [[1, -1, -0], 90],
      [[1, 0, 1], 45],
      [[1, 0, -1], -45],
      [[1, -0.5, -0.5], -67.5],
    ];
    for (const [stokes, angle] of cases) expectAbsolute(angleOfPolarisation(stokes), angle, 1e-13);
  });

  it("turns with the vibration: Malus through a polariser", () => {
    fc.assert(
      fc.property(between(-89, 90), between(0.01, 1), (angle, degree) => {
        const twice = (2 * angle * Math.PI) / 180;
        const stokes: Stokes = [3, 3 * degree * Math.cos(twice), 3 * degree * Math.sin(twice)];
        expectRelative(degreeOfPolarisation(stokes), degree, 1e-15);
        // roundings, degrees: 2.3e-14 of the doubled angle, 1.3e-14 of Q and U, 2e-14 of the result, which is up to 90
        expectAbsolute(angleOfPolarisation(stokes), angle, 6e-14);
      }),
    );
  });

  it("refuses light that is none", () => {
    expectRefusal(() => degreeOfPolarisation([0, 0, 0]), RangeError, "stokes[0]");
    expectRefusal(() => degreeOfPolarisation([1, Number.NaN, 0]), RangeError, "(Q)");
    expectRefusal(() => degreeOfPolarisation([1, 0] as never), RangeError, "at least 3");
    expectRefusal(() => degreeOfPolarisation(1 as never), TypeError, "stokes");
    expectRefusal(() => angleOfPolarisation([1, 0, 0]), RangeError, "no angle");
    expectRefusal(() => angleOfPolarisation([-1, 0.1, 0]), RangeError, "stokes[0]");
  });

  it("of thin air is that of one scattering; thicker air is less polarised", () => {
    const direction = { viewZenithDeg: 50, relativeAzimuthDeg: 180, at: "ground" } as const;
    const degree = (depth: number): number =>
      degreeOfPolarisation(skyStokes(litSky(depth, 40, 0), direction));
    // second order changes the degree by a few times the depth
    expectAbsolute(degree(1e-7), rayleighPolarisation(90, 0.0279), 1e-6);
    expect(degree(0.1)).toBeLessThan(degree(1e-3));
    expect(degree(0.5)).toBeLessThan(degree(0.1));
    // at a right angle to the sun in its vertical plane the vibration is horizontal
    expect(angleOfPolarisation(skyStokes(litSky(0.1, 40), direction))).toBeCloseTo(90, 9);
  });

  it("vibrates square to the sun off its vertical plane, to both sides alike", () => {
    const sun = 70;
    for (const azimuth of [60, 90, 120]) {
      const [i, q, u] = skyStokes(litSky(1e-6, sun), {
        viewZenithDeg: 60,
        relativeAzimuthDeg: azimuth,
        at: "ground",
      });
      const mirrored = skyStokes(litSky(1e-6, sun), {
        viewZenithDeg: 60,
        relativeAzimuthDeg: -azimuth,
        at: "ground",
      });
      expectRelative(mirrored[0], i, 1e-14);
      expectRelative(mirrored[1], q, 1e-13);
      expectRelative(mirrored[2], -u, 1e-13);
    }
    // looking to where light travels at azimuth 90 from the sunbeam (sun to the observer's left when facing the light:
    // light going along +y is met facing -y, and the beam along +x comes from -x, on the right hand): the vibration's upper
    // end leans away from the line to the sun
    const angle = angleOfPolarisation(
      skyStokes(litSky(1e-6, 60), { viewZenithDeg: 89, relativeAzimuthDeg: 90, at: "ground" }),
    );
    // light along +y from the horizon, beam (sin 60, 0, -cos 60): vibration along their cross product, in the plane x z,
    // leaning from the vertical by 30° towards +x: as seen facing -y (+x on the left hand): counter-clockwise
    expectAbsolute(angle, 30, 1.2);
    expect(angle).toBeGreaterThan(0);
  });
});

describe("neutral points", () => {
  it("lie where they are commonly seen", () => {
    // common practice: Babinet and Arago some 15 to 25° from the sun and the antisolar point when the sun is low
    const low = neutralPoints(litSky(0.15, 85));
    expect(low.brewster).toBeUndefined();
    for (const point of [low.babinet!, low.arago!]) {
      expect(point.distanceDeg).toBeGreaterThan(14);
      expect(point.distanceDeg).toBeLessThan(26);
    }
    const high = neutralPoints(litSky(0.15, 40));
    expect(high.arago).toBeUndefined();
    expect(high.babinet!.viewZenithDeg).toBeLessThan(40);
    expect(high.brewster!.viewZenithDeg).toBeGreaterThan(40);
  });

  it("are unpolarised, and go to the sun as the air thins", () => {
    for (const [depth, sun, most] of [
      [0.2, 60, 2],
      [0.02, 20, 2],
      [0.5, 85, 3],
      [1, 45, 3],
    ] as const) {
      const lit = litSky(depth, sun);
      const found = Object.values(neutralPoints(lit)).filter((point) => point !== undefined);
      expect(found.length).toBeGreaterThanOrEqual(1);
      expect(found.length).toBeLessThanOrEqual(most);
      for (const point of found) {
        expectAbsolute(degreeOfPolarisation(skyStokes(lit, { ...point, at: "ground" })), 0, 1e-9);
      }
    }
    const distances = [0.3, 0.1, 0.03, 0.01].map(
      (depth) => neutralPoints(litSky(depth, 50, 0)).babinet!.distanceDeg,
    );
    for (let k = 1; k < 4; k++) expect(distances[k]).toBeLessThan(distances[k - 1]!);
    // once scattered light makes Q grow as the square of the distance, twice scattered light is there in proportion to
    // the depth (and its logarithm): the distance falls a little slower than its square root
    expect(distances[2]! / distances[3]!).toBeGreaterThan(1.3);
    expect(distances[2]! / distances[3]!).toBeLessThan(Math.sqrt(3));
  });

  it("give their directions, and their angles from the sun, Arago's from the point opposite", () => {
    for (const [sun, names] of [
      [85, ["babinet", "arago"]],
      [40, ["babinet", "brewster"]],
    ] as const) {
      const points = neutralPoints(litSky(0.15, sun));
      const low = (sun * Math.PI) / 180;
      for (const name of names) {
        const { viewZenithDeg, relativeAzimuthDeg, distanceDeg } = points[name]!;
        expect([0, 180]).toContain(relativeAzimuthDeg);
        const zenith = (viewZenithDeg * Math.PI) / 180;
        const side = Math.sin(zenith) * (relativeAzimuthDeg === 0 ? 1 : -1);
        const cosine = side * Math.sin(low) + Math.cos(zenith) * Math.cos(low);
        const away = (Math.acos(name === "arago" ? -cosine : cosine) * 180) / Math.PI;
        expectAbsolute(distanceDeg, away, 1e-9);
      }
    }
  });

  it("merge in the zenith with the sun there", () => {
    const near = neutralPoints(litSky(0.2, 1));
    expect(near.babinet!.distanceDeg).toBeLessThan(1);
    expect(near.brewster!.distanceDeg).toBeLessThan(1);
    const overhead = neutralPoints(litSky(0.2, 0));
    expect(overhead).toEqual({ babinet: undefined, brewster: undefined, arago: undefined });
    expectRefusal(() => neutralPoints({} as never), TypeError, "illuminateSky");
  });
});

describe("skyRadiance", () => {
  it("is I times irradiance over π", () => {
    const direction = { viewZenithDeg: 30, relativeAzimuthDeg: 77, at: "top" } as const;
    const lit = litSky(0.3, 50);
    expectRelative(
      skyRadiance(lit, direction, 1.5),
      (skyStokes(lit, direction)[0] * 1.5) / Math.PI,
      1e-15,
    );
    expect(skyRadiance(lit, direction, 0)).toBe(0);
    expectRefusal(() => skyRadiance(lit, direction, -1), RangeError, "irradiance");
    expectRefusal(() => skyRadiance(lit, direction, Number.NaN), RangeError, "irradiance");
  });
});

describe("skyStokesMap", () => {
  const lit = litSky(0.25, 65, 0.5);
  it("equals skyStokes one by one, into a given array or a new one", () => {
    const viewZenithsDeg = [0, 30, 30, 89.5, 12, 30];
    const relativeAzimuthsDeg = [0, 10, -200, 90, 359, 10];
    for (const at of ["ground", "top"] as const) {
      const out = new Float64Array(20).fill(7);
      const map = skyStokesMap(lit, { viewZenithsDeg, relativeAzimuthsDeg, at }, out);
      expect(map).toBe(out);
      expect(skyStokesMap(lit, { viewZenithsDeg, relativeAzimuthsDeg, at })).toEqual(
        out.slice(0, 18),
      );
      expect(out[18]).toBe(7);
      viewZenithsDeg.forEach((viewZenithDeg, i) => {
        const one = skyStokes(lit, {
          viewZenithDeg,
          relativeAzimuthDeg: relativeAzimuthsDeg[i]!,
          at,
        });
        for (let k = 0; k < 3; k++) expectAbsolute(map[3 * i + k]!, one[k]!, 1e-14);
      });
    }
  });

  it("gives NaN for NaN and refuses the rest", () => {
    const at = "ground";
    const map = skyStokesMap(lit, {
      viewZenithsDeg: [Number.NaN, 20, 20],
      relativeAzimuthsDeg: [0, Number.NaN, 5],
      at,
    });
    expect([...map].map(Number.isNaN)).toEqual([
      true,
      true,
      true,
      true,
      true,
      true,
      false,
      false,
      false,
    ]);
    const refused = (z: unknown, a: unknown, ...parts: string[]): void =>
      expectRefusal(
        () => skyStokesMap(lit, { viewZenithsDeg: z, relativeAzimuthsDeg: a, at } as never),
        typeof z === "number" ? TypeError : RangeError,
        ...parts,
      );
    refused([10, 90], [0, 0], "viewZenithsDeg[1]");
    refused([10, -1], [0, 0], "viewZenithsDeg[1]", "-1");
    refused([10], [1e9], "relativeAzimuthsDeg[0]");
    refused([10, 20], [0], "as long as");
    refused(10, [0], "viewZenithsDeg");
    expectRefusal(
      () =>
        skyStokesMap(
          lit,
          { viewZenithsDeg: [1], relativeAzimuthsDeg: [1], at },
          new Float64Array(2),
        ),
      RangeError,
      "out",
    );
  });
});

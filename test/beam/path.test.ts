import { describe, expect, it } from "vitest";
import {
  airColumn,
  airMassOnTruePath,
  beamAt,
  beamTable,
  beamTransmittance,
  beamTransmittances,
  clearBeam,
  constituentMassOnTruePath,
  exponentialLayer,
  gaussianLayer,
  preparePath,
  refractedPath,
  standardProfile,
} from "../../src/index.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { clearAir, seaLevel } from "./_states.js";

const input = {
  profile: standardProfile({
    pressurePa: 101325,
    temperatureK: 288.15,
    relativeHumidity: 0.5,
    altitudeM: 0,
    co2Ppm: 425,
  }),
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
};
const constituents = {
  ozone: gaussianLayer({ heightM: 22_000, standardDeviationM: 5000 }),
  water: exponentialLayer({ scaleHeightM: 2000 }),
  aerosol: exponentialLayer({ scaleHeightM: 1500 }),
};
const path = preparePath({ ...input, constituents });
const onPath = { ...clearAir, path };

describe("independent fixtures", () => {
  it("takes every mass from the path at the true angle, as the ray has it", () => {
    const ray = refractedPath(87, { ...input, constituents });
    const { masses } = clearBeam({ ...onPath, trueZenithDeg: ray.trueZenithDeg });
    expectRelative(masses.air, ray.airMass, 1e-9);
    expectRelative(masses.ozone, ray.masses.ozone, 1e-9);
    expectRelative(masses.water, ray.masses.water, 1e-9);
    expectRelative(masses.aerosol, ray.masses.aerosol, 1e-9);
    expect(masses.nitrogenDioxide).toBe(masses.ozone);
  });

  it("nitrogen dioxide has a layer of its own if the path has one", () => {
    const nitrogenDioxide = exponentialLayer({ scaleHeightM: 1000 });
    const more = preparePath({ ...input, constituents: { ...constituents, nitrogenDioxide } });
    const { masses } = clearBeam({ ...onPath, path: more, trueZenithDeg: 85 });
    expect(masses.nitrogenDioxide).toBe(constituentMassOnTruePath(85, more, "nitrogenDioxide"));
    expect(masses.nitrogenDioxide).toBeGreaterThan(masses.aerosol);
  });

  it("against the closed formulas: alike at 60°, ozone 2.4 % more at 88° (a thick layer, not a thin shell)", () => {
    const both = (zenith: number): [number, number][] => {
      const ours = clearBeam({ ...onPath, trueZenithDeg: zenith }).masses;
      const closed = clearBeam({ ...clearAir, trueZenithDeg: zenith }).masses;
      return [
        [ours.air, closed.air],
        [ours.ozone, closed.ozone],
        [ours.water, closed.water],
      ];
    };
    for (const [ours, closed] of both(60)) expectRelative(ours, closed, 5e-4);
    const [, [ours, closed]] = both(88) as [unknown, [number, number], unknown];
    expectAbsolute(ours / closed - 1, 0.025, 0.001);
  });
});

describe("properties", () => {
  it("beamAt follows the path, below 90° too, and a table fits all of them", () => {
    const noon = clearBeam({ ...onPath, trueZenithDeg: 30 });
    const table = beamTable([400, 550, 700], noon);
    for (const zenith of [0, 70, 89.5, 90, 90.4, path.horizonTrueZenithDeg]) {
      const beam = beamAt(noon, zenith);
      expect(beam.masses.air).toBe(airMassOnTruePath(zenith, path));
      expect(beam).toEqual(clearBeam({ ...onPath, trueZenithDeg: zenith }));
      const [, green] = beamTransmittances(table, beam);
      expectRelative(green!, beamTransmittance(550, beam), 1e-6);
    }
  });

  it("masses of one's own still win", () => {
    const masses = { air: 10, ozone: 8, nitrogenDioxide: 8.5, water: 11, aerosol: 11.5 };
    expect(clearBeam({ ...onPath, trueZenithDeg: 85, masses }).masses).toEqual(masses);
  });
});

describe("edges", () => {
  it("refuses a path without the constituents, from elsewhere, or not prepared", () => {
    const bare = preparePath({ ...input, constituents: { ozone: constituents.ozone } });
    const make =
      (fields: object): (() => unknown) =>
      () =>
        clearBeam({ ...onPath, trueZenithDeg: 60, ...fields });
    expectRefusal(make({ path: bare }), TypeError, "clearBeam", "water, aerosol missing");
    for (const left of ["ozone", "water", "aerosol"]) {
      const others = Object.entries(constituents).filter(([key]) => key !== left);
      const short = preparePath({ ...input, constituents: Object.fromEntries(others) });
      expectRefusal(make({ path: short }), TypeError, "clearBeam", `, ${left} missing`);
    }
    expectRefusal(make({ path: {} }), TypeError, "preparePath or pathInWeather");
    const column = airColumn({ pressurePa: 95000, altitudeM: 540, latitudeDeg: 45, co2Ppm: 425 });
    expectRefusal(make({ column }), RangeError, "the column's altitude, 540 m, got 0 m");
    const near = { ...seaLevel, altitudeM: 1.0005 };
    expectRefusal(make({ column: near }), RangeError, "1.0005 m, got 0 m");
    expect(make({ column: { ...seaLevel, altitudeM: 1 } })).not.toThrow();
    expectRefusal(make({ trueZenithDeg: 91 }), RangeError, "trueZenithDeg", "0 to 90.5", "91");
    const noon = clearBeam({ ...onPath, trueZenithDeg: 30 });
    expectRefusal(() => beamAt(noon, 91), RangeError, "beamAt", "0 to 90.5");
    expectRefusal(() => beamAt(noon, Number.NaN), RangeError, "NaN");
    expectRefusal(make({ path: undefined, trueZenithDeg: 90.2 }), RangeError, "0 to 90 degrees");
  });
});

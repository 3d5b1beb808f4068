import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airMassKastenWater,
  airMassShell,
  airMassYoung,
  beamAt,
  clearBeam,
  refractionSaemundsson,
  standardAtmosphere,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { beamAtZenith, clearAir, seaLevel, states } from "./_states.js";

const ownMasses = { air: 10, ozone: 8, nitrogenDioxide: 8.5, water: 11, aerosol: 11.5 };

describe("independent fixtures", () => {
  it("gives each constituent its own air mass, at 85° true", () => {
    const { masses } = beamAtZenith(85);
    expect(masses.air).toBe(airMassYoung(85));
    // sine rule in a shell at 22 km: an independent line of geometry
    const sine = (Math.sin((85 * Math.PI) / 180) * 6371.0088) / (6371.0088 + 22);
    expectRelative(masses.ozone, 1 / Math.cos(Math.asin(sine)), 1e-12);
    expect(masses.nitrogenDioxide).toBe(masses.ozone);
    // refraction at 85° is about 9.6' at 101 325 Pa and 288.15 K, so the apparent angle is 84.84°
    const arcmin = 1.02 / Math.tan(((5 + 10.3 / (5 + 5.11)) * Math.PI) / 180);
    const apparent = 85 - ((arcmin / 60) * (101325 / 101000) * 283) / 288.15;
    expectRelative(masses.water, airMassKastenWater(apparent), 1e-12);
    expect(masses.water / airMassKastenWater(85)).toBeLessThan(0.975); // the true angle would be 3 % off
    expect(masses.aerosol).toBe(masses.water);
    expectAbsolute(masses.air / masses.ozone, 1.21, 0.005); // the claim: air's mass for ozone is 21 % too much
  });
  it("takes pressure and standard temperature from the column", () => {
    fc.assert(
      fc.property(states, between(0, 90), (state, zenith) => {
        const beam = clearBeam({ ...state, trueZenithDeg: zenith });
        const { pressurePa, altitudeM } = state.column;
        const { temperatureK } = standardAtmosphere(altitudeM);
        const apparent = zenith - refractionSaemundsson(zenith, { pressurePa, temperatureK });
        const shell = { shellHeightM: state.ozoneHeightM, altitudeM };
        expect(beam.masses.ozone).toBe(airMassShell(zenith, shell));
        expectRelative(beam.masses.water, airMassKastenWater(apparent), 1e-14);
        expectRelative(beam.pressureAirMass, (airMassYoung(zenith) * pressurePa) / 101325, 1e-14);
        expectAbsolute(beam.slantWaterCm, state.waterCm * beam.masses.water, 1e-12);
      }),
    );
  });
  it("uses masses of your own as they are", () => {
    const beam = clearBeam({ ...clearAir, trueZenithDeg: 85, masses: ownMasses });
    expect(beam.masses).toEqual(ownMasses);
    expectRelative(beam.slantWaterCm, 1.4 * 11, 1e-15);
    expectRelative(beam.pressureAirMass, 10, 1e-15);
  });
});

describe("properties", () => {
  it("is re-pointed by beamAt to the record clearBeam makes, sharing the state", () => {
    fc.assert(
      fc.property(states, between(0, 90), between(0, 90), (state, first, second) => {
        const beam = clearBeam({ ...state, trueZenithDeg: first });
        const moved = beamAt(beam, second);
        expect(moved).toEqual(clearBeam({ ...state, trueZenithDeg: second }));
        expect(moved.state).toBe(beam.state);
      }),
    );
  });
  it("has masses that grow with the zenith angle", () => {
    fc.assert(
      fc.property(states, between(0, 89), (state, zenith) => {
        const here = clearBeam({ ...state, trueZenithDeg: zenith }).masses;
        const lower = clearBeam({ ...state, trueZenithDeg: zenith + 1 }).masses;
        for (const key of ["air", "ozone", "nitrogenDioxide", "water", "aerosol"] as const) {
          expect(lower[key]).toBeGreaterThan(here[key]);
        }
      }),
    );
  });
  it("keeps its state whatever happens to the input's aerosol record", () => {
    const aerosol = { opticalDepth: 0.1, referenceNm: 500, exponent: 1 };
    const beam = beamAtZenith(30, { aerosol });
    aerosol.opticalDepth = 5;
    expect(beam.state.aerosol.opticalDepth).toBe(0.1);
  });
});

describe("edges", () => {
  it("accepts the zenith and the horizon", () => {
    for (const mass of Object.values(beamAtZenith(0).masses)) expectRelative(mass, 1, 1e-4); // Kasten's formula gives 0.99992
    expect(beamAtZenith(90).masses.air).toBe(airMassYoung(90));
  });
  const input = { ...clearAir, trueZenithDeg: 30 };
  it.each([
    [{ trueZenithDeg: 90.1 }, RangeError, ["trueZenithDeg", "0 to 90 degrees", "90.1"]],
    [{ trueZenithDeg: Number.NaN }, RangeError, ["trueZenithDeg", "NaN"]],
    [{ trueZenithDeg: "30" }, TypeError, ["trueZenithDeg", '"30"']],
    [{ ozoneDu: -1 }, RangeError, ["ozoneDu", "0 to 1000 DU"]],
    [{ ozoneTemperatureK: -48 }, RangeError, ["ozoneTemperatureK", "°C? add 273.15"]],
    [{ ozoneHeightM: 22 }, RangeError, ["ozoneHeightM", "km? multiply by 1000"]],
    [{ nitrogenDioxideDu: 51 }, RangeError, ["nitrogenDioxideDu", "0 to 50 DU"]],
    [{ waterCm: 21 }, RangeError, ["waterCm", "0 to 20 cm"]],
    [{ aerosol: undefined }, TypeError, ["aerosol"]],
    [
      { aerosol: { opticalDepth: 0.1, referenceNm: 0.5, exponent: 1 } },
      RangeError,
      ["aerosol.referenceNm", "µm?"],
    ],
    [{ column: { pressurePa: 101325 } }, TypeError, ["column", "airColumn"]],
    [{ masses: { ...ownMasses, ozone: -1 } }, RangeError, ["masses.ozone", "0 to 1000"]],
    [{ masses: { air: 1 } }, TypeError, ["masses.ozone"]],
    [{ masses: 10 }, TypeError, ["masses"]],
  ])("refuses %j", (wrong, kind, parts) => {
    expectRefusal(() => clearBeam({ ...input, ...wrong } as never), kind, "clearBeam", ...parts);
  });
  it("refuses a layer below the site, and no record at all", () => {
    const column = { ...seaLevel, altitudeM: 9000 };
    expectRefusal(
      () => clearBeam({ ...input, column, ozoneHeightM: 5000 }),
      RangeError,
      "ozoneHeightM",
      "9001 to 100000 m",
    );
    expectRefusal(() => clearBeam({ ...input, ozoneHeightM: 999 }), RangeError, "1000 to 100000 m");
    expect(clearBeam({ ...input, ozoneHeightM: 1000 }).state.ozoneHeightM).toBe(1000);
    expectRefusal(() => clearBeam(undefined as never), TypeError, "clearBeam", "input");
    expectRefusal(() => beamAt({} as never, 30), TypeError, "beamAt", "clearBeam");
    expectRefusal(() => beamAt(beamAtZenith(30), 91), RangeError, "beamAt", "trueZenithDeg");
  });
});

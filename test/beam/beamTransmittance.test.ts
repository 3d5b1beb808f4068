import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  angstromOpticalDepth,
  type Beam,
  beamIrradiance,
  beamOpticalDepths,
  beamTransmittance,
  clearBeam,
  integrateSpectrum,
  mixedGasTransmittance,
  nitrogenDioxideOpticalDepth,
  ozoneOpticalDepth,
  rayleighOpticalDepth,
  solarIrradiance,
  tabulate,
  waterVapourTransmittance,
  wavelengthGrid,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { beamAtZenith, clearAir, states } from "./_states.js";

/** The constituents' transmittances from their public functions, multiplied one by one. */
function product(nm: number, { state, masses }: Beam): number {
  const { column, ozoneTemperatureK: kelvin } = state;
  let t = Math.exp(-masses.air * rayleighOpticalDepth(nm, column));
  if (nm <= 1098) t *= Math.exp(-masses.ozone * ozoneOpticalDepth(nm, state.ozoneDu, kelvin));
  if (nm <= 660)
    t *= Math.exp(
      -masses.nitrogenDioxide * nitrogenDioxideOpticalDepth(nm, state.nitrogenDioxideDu, kelvin),
    );
  t *= Math.exp(-masses.aerosol * angstromOpticalDepth(nm, state.aerosol));
  if (nm < 300) return t;
  t *= waterVapourTransmittance(nm, state.waterCm * masses.water);
  return t * mixedGasTransmittance(nm, (masses.air * column.pressurePa) / 101325);
}

describe("published values", () => {
  // ASTM G173-03: air mass 1.5 (true zenith angle 48.236°), 1.4164 cm of water, 343.8 DU, aerosol 0.084 at 500 nm; direct and
  // circumsolar 900.1 W m⁻² over 280-4000 nm and 1.3391 W m⁻² nm⁻¹ at 500 nm (from memory), solar constant 1366.1
  const beam = beamAtZenith(48.236, { ozoneDu: 343.8, waterCm: 1.4164, nitrogenDioxideDu: 0.2 });
  it("sums to the direct irradiance of ASTM G173 within 0.2 %", () => {
    const range = (from: number, to: number, f: (nm: number) => number): number =>
      integrateSpectrum(tabulate(f, wavelengthGrid(from, to, 1)), from, to);
    const visible = range(280, 1690, (nm) => beamIrradiance(nm, beam, 1));
    const infrared = range(
      1690,
      4000,
      (nm) =>
        solarIrradiance(nm) *
        waterVapourTransmittance(nm, beam.slantWaterCm) *
        mixedGasTransmittance(nm, beam.pressureAirMass) *
        Math.exp(-beam.masses.aerosol * angstromOpticalDepth(nm, beam.state.aerosol)),
    );
    // that standard's aerosol does not follow one exponent, its bands come from a finer model: a loose check of the whole
    expectRelative(visible + infrared, (900.1 * 1361) / 1366.1, 0.002); // -0.16 %
  });
  it("gives its value at 500 nm within 1 %", () => {
    // 5 nm bands of sunlight here against 1 nm there: a line or two
    expectRelative(beamIrradiance(500, beam, 1), (1.3391 * 1361) / 1366.1, 0.01);
  });
});

describe("independent fixtures", () => {
  it("is the product of the constituents' own transmittances", () => {
    fc.assert(
      fc.property(states, between(0, 88), between(280, 1690), (state, zenith, nm) => {
        const beam = clearBeam({ ...state, trueZenithDeg: zenith });
        const expected = product(nm, beam);
        // rounding of a depth of up to 700 in the exponent; smaller numbers lose digits
        if (expected > 1e-300) expectRelative(beamTransmittance(nm, beam), expected, 1e-12);
        if (expected > 1e-8) expectRelative(beamTransmittance(nm, beam), expected, 1e-13);
      }),
      { numRuns: 400 },
    );
  });
  it("is broken down by beamOpticalDepths into depths whose sum it is the exponential of", () => {
    fc.assert(
      fc.property(states, between(0, 90), between(280, 1690), (state, zenith, nm) => {
        const beam = clearBeam({ ...state, trueZenithDeg: zenith });
        const d = beamOpticalDepths(nm, beam);
        const sum = d.air + d.ozone + d.nitrogenDioxide + d.aerosol + d.water + d.mixedGases;
        if (sum < 600) expectRelative(beamTransmittance(nm, beam), Math.exp(-sum), 1e-12);
        expectRelative(d.air, beam.masses.air * rayleighOpticalDepth(nm, state.column), 1e-14);
        expectRelative(
          d.aerosol + 1,
          beam.masses.aerosol * angstromOpticalDepth(nm, state.aerosol) + 1,
          1e-14,
        );
        const { masses } = beam;
        const gas = state.ozoneTemperatureK;
        const near = (depth: number, own: number): void =>
          expectAbsolute(depth, own, 1e-13 * own + 1e-300);
        if (nm <= 1098) near(d.ozone, masses.ozone * ozoneOpticalDepth(nm, state.ozoneDu, gas));
        if (nm <= 660) {
          const { nitrogenDioxideDu } = state;
          const own = nitrogenDioxideOpticalDepth(nm, nitrogenDioxideDu, gas);
          near(d.nitrogenDioxide, masses.nitrogenDioxide * own);
        }
        if (nm < 300) return;
        const water = waterVapourTransmittance(nm, beam.slantWaterCm);
        expectAbsolute(Math.exp(-d.water), water, 1e-15);
        const mixed = mixedGasTransmittance(nm, beam.pressureAirMass);
        expectAbsolute(Math.exp(-d.mixedGases), mixed, 1e-15);
      }),
    );
  });
  it("falls on a plane at the square of the distance", () => {
    const beam = beamAtZenith(60);
    const expected = (solarIrradiance(500) * product(500, beam)) / (1.0167 * 1.0167);
    expectRelative(beamIrradiance(500, beam, 1.0167), expected, 1e-13);
  });
});

describe("properties", () => {
  it("obeys Bouguer's law in ozone, nitrogen dioxide and aerosol: equal amounts take equal shares", () => {
    const amount = (k: number, key: string): Beam => {
      if (key === "aerosol")
        return beamAtZenith(70, { aerosol: { ...clearAir.aerosol, opticalDepth: 0.1 * k } });
      return beamAtZenith(70, key === "ozone" ? { ozoneDu: 200 * k } : { nitrogenDioxideDu: k });
    };
    fc.assert(
      fc.property(
        between(305, 1690),
        fc.constantFrom("ozone", "nitrogenDioxide", "aerosol"),
        (nm, key) => {
          const [none, one, two] = [0, 1, 2].map((k) => beamTransmittance(nm, amount(k, key)));
          expectRelative(two! / one!, one! / none!, 1e-11); // quotients of numbers as small as 1e-4
        },
      ),
    );
  });
  it("never grows with any column", () => {
    const less = beamAtZenith(75);
    const more = [
      { ozoneDu: 400 },
      { nitrogenDioxideDu: 0.5 },
      { waterCm: 3 },
      { aerosol: { ...clearAir.aerosol, opticalDepth: 0.2 } },
      { column: { ...clearAir.column, pressurePa: 104_000, moleculesPerM2: 2.3e29 } },
    ].map((change) => beamAtZenith(75, change));
    fc.assert(
      fc.property(between(280, 1690), fc.constantFrom(...more), (nm, beam) => {
        expect(beamTransmittance(nm, beam)).toBeLessThanOrEqual(beamTransmittance(nm, less));
      }),
    );
    for (const beam of more) {
      const taken = [400, 600, 940].map(
        (nm) => beamTransmittance(nm, less) - beamTransmittance(nm, beam),
      );
      expect(Math.max(...taken)).toBeGreaterThan(1e-4);
    }
  });
  it("is scattering by molecules alone when nothing else is there, but for oxygen", () => {
    const empty = beamAtZenith(60, {
      ozoneDu: 0,
      nitrogenDioxideDu: 0,
      waterCm: 0,
      aerosol: { ...clearAir.aerosol, opticalDepth: 0 },
    });
    for (const nm of [300, 450, 650, 730, 850, 1100]) {
      const expected = Math.exp(-empty.masses.air * rayleighOpticalDepth(nm, clearAir.column));
      expectRelative(beamTransmittance(nm, empty), expected, 1e-14);
    }
    expect(beamOpticalDepths(762, empty).mixedGases).toBeGreaterThan(0.3);
  });
});

describe("edges", () => {
  const beam = beamAtZenith(30);
  it("counts a constituent outside its table as transparent", () => {
    expect(beamOpticalDepths(660, beam).nitrogenDioxide).toBeGreaterThan(0);
    expect(beamOpticalDepths(660.001, beam).nitrogenDioxide).toBe(0);
    expect(beamOpticalDepths(1098, beam).ozone).toBeGreaterThan(0);
    expect(beamOpticalDepths(1098.001, beam).ozone).toBe(0);
    expect(beamOpticalDepths(290, beam).water).toBe(0);
    expect(beamOpticalDepths(290, beam).mixedGases).toBe(0);
  });
  it("accepts both ends", () => {
    expect(beamTransmittance(280, beam)).toBeLessThan(1e-15); // ozone
    expect(beamTransmittance(1690, beam)).toBeGreaterThan(0.9);
  });
  it.each([
    ["beamTransmittance", beamTransmittance],
    ["beamOpticalDepths", beamOpticalDepths],
    ["beamIrradiance", (nm: number, b: Beam) => beamIrradiance(nm, b, 1)],
  ])("%s refuses what lies outside", (name, f) => {
    expectRefusal(() => f(279.9, beam), RangeError, name, "wavelengthNm", "280 to 1690 nm");
    expectRefusal(() => f(1690.1, beam), RangeError, "1690.1");
    expectRefusal(() => f(0.5, beam), RangeError, "µm?");
    expectRefusal(() => f(Number.NaN, beam), RangeError, "NaN");
    expectRefusal(() => f("500" as never, beam), TypeError, '"500"');
    expectRefusal(() => f(500, clearAir as never), TypeError, name, "beam", "clearBeam");
    expectRefusal(() => f(500, undefined as never), TypeError, "clearBeam");
  });
  it("refuses a sun that is not that far", () => {
    expectRefusal(
      () => beamIrradiance(500, beam, 1.5e8),
      RangeError,
      "beamIrradiance",
      "sunDistanceAu",
      "0.9 to 1.1 au",
    );
    expectRefusal(() => beamIrradiance(500, beam, undefined as never), TypeError, "sunDistanceAu");
  });
});

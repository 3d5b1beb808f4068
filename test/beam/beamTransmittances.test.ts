import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { attenuate, attenuationPowers, UNITS_PER_DEPTH } from "../../src/beam/_attenuate.js";
import {
  airColumn,
  type BeamState,
  beamAt,
  beamTable,
  beamTransmittance,
  beamTransmittances,
  clearBeam,
  wavelengthGrid,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { beamAtZenith, clearAir, states } from "./_states.js";

const beam = beamAtZenith(60);
const grid = wavelengthGrid(280, 1690, 5);

describe("a list", () => {
  it("gives the same bits as one call a wavelength, in any order", () => {
    const list = [1500, 300, 762.5, 500, 500.25];
    const all = beamTransmittances(list, beam);
    list.forEach((nm, i) => {
      expect(all[i]).toBe(beamTransmittance(nm, beam));
    });
  });
});

describe("a table", () => {
  it("is within 3e-7 of one call a wavelength for every sun, 1e-13 relative where no band absorbs", () => {
    fc.assert(
      fc.property(states, between(0, 90), (state, zenith) => {
        const first = clearBeam({ ...state, trueZenithDeg: 20 });
        const sun = beamAt(first, zenith);
        const all = beamTransmittances(beamTable(grid, first), sun);
        grid.forEach((nm, i) => {
          const one = beamTransmittance(nm, sun);
          // parabola in air mass to the power 0.55 through nodes an eighth of a natural logarithm apart
          expectAbsolute(all[i]!, one, 3e-7);
          if (nm < 570 && one > 1e-30) expectRelative(all[i]!, one, 1e-13); // rounding of the summed depth
        });
      }),
      { numRuns: 60 },
    );
  });
  it("needs that much: the worst of many suns is above 1e-7", () => {
    const table = beamTable(grid, beam);
    let worst = 0;
    for (let zenith = 0; zenith <= 90; zenith += 0.25) {
      const sun = beamAt(beam, zenith);
      const all = beamTransmittances(table, sun);
      grid.forEach((nm, i) => {
        worst = Math.max(worst, Math.abs(all[i]! - beamTransmittance(nm, sun)));
      });
    }
    expect(worst).toBeGreaterThan(1e-7);
    expect(worst).toBeLessThan(3e-7);
  });
  it("keeps the masses of ozone and nitrogen dioxide apart", () => {
    const masses = { air: 5, ozone: 4, nitrogenDioxide: 4.8, water: 5.1, aerosol: 5.2 };
    const own = clearBeam({ ...clearAir, nitrogenDioxideDu: 5, trueZenithDeg: 78, masses });
    const all = beamTransmittances(beamTable([400, 450, 1200], own), own);
    [400, 450].forEach((nm, i) => {
      expectRelative(all[i]!, beamTransmittance(nm, own), 1e-13);
    });
    expectAbsolute(all[2]!, beamTransmittance(1200, own), 3e-7);
  });
  it.each([0, 0.5, 0.8899, 0.89, 1, 79, 79.01, 1000])(
    "goes one by one outside its nodes: mass %d",
    (mass) => {
      const masses = { air: mass, ozone: 2, nitrogenDioxide: 2, water: mass, aerosol: 2 };
      const own = clearBeam({ ...clearAir, trueZenithDeg: 60, masses });
      const all = beamTransmittances(beamTable(grid, own), own);
      const inside = mass >= 0.89 && mass <= 79;
      expect(grid.some((nm, i) => all[i] !== beamTransmittance(nm, own))).toBe(inside);
      grid.forEach((nm, i) => {
        const one = beamTransmittance(nm, own);
        expectAbsolute(all[i]!, one, 3e-7);
      });
    },
  );
  it("works where no band absorbs, and without water", () => {
    const dry = beamAtZenith(60, { waterCm: 0 });
    const all = beamTransmittances(beamTable([320, 400, 720], dry), dry);
    [320, 400, 720].forEach((nm, i) => {
      expectRelative(all[i]!, beamTransmittance(nm, dry), 1e-13);
    });
  });
  it("fits every beam of an equal state, made apart", () => {
    const again = beamAtZenith(70, {
      column: airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 }),
      ozoneHeightM: 25_000,
    });
    const table = beamTable(grid, beam);
    expectRelative(beamTransmittances(table, again)[40]!, beamTransmittance(480, again), 1e-13);
  });
  it.each<[Partial<BeamState>, string, string]>([
    [{ ozoneDu: 345 }, "ozoneDu 344", "has 345"],
    [{ ozoneTemperatureK: 226 }, "ozoneTemperatureK 225", "226"],
    [{ nitrogenDioxideDu: 0.2 }, "nitrogenDioxideDu 0.1", "0.2"],
    [{ waterCm: 1.5 }, "waterCm 1.4", "1.5"],
    [{ aerosol: { ...clearAir.aerosol, opticalDepth: 0.1 } }, "opticalDepth 0.084", "0.1"],
    [{ aerosol: { ...clearAir.aerosol, exponent: 1 } }, "exponent 1.3", "1"],
    [{ aerosol: { ...clearAir.aerosol, referenceNm: 550 } }, "referenceNm 500", "550"],
    [{ column: { ...clearAir.column, pressurePa: 1e5 } }, "pressurePa 101325", "100000"],
    [{ column: { ...clearAir.column, co2Ppm: 400 } }, "co2Ppm 425", "400"],
    [{ column: { ...clearAir.column, moleculesPerM2: 1e29 } }, "moleculesPerM2", "1e+29"],
  ])("refuses a beam of another state: %j", (change, made, given) => {
    const table = beamTable([500, 940], beam);
    expectRefusal(
      () => beamTransmittances(table, beamAtZenith(60, change)),
      RangeError,
      "beamTransmittances",
      "beamTable",
      made,
      given,
    );
  });
});

describe("the exponential of the kernel", () => {
  it("is within 1e-15 of e^-depth plus what rounding the depth costs, to full opacity", () => {
    const powers = attenuationPowers();
    fc.assert(
      fc.property(between(0, 700), (depth) => {
        const values = Float64Array.of(depth * UNITS_PER_DEPTH, 7);
        attenuate(values, 1, powers);
        expectRelative(values[0]!, Math.exp(-depth), 1e-15 + 4e-16 * depth);
        expect(values[1]).toBe(7); // beyond the count nothing is touched
      }),
      { numRuns: 2000 },
    );
  });
  it("ends at 1 and at 0", () => {
    const values = Float64Array.of(0, 740 * UNITS_PER_DEPTH, 1000 * UNITS_PER_DEPTH, 1e300);
    attenuate(values, 4, attenuationPowers());
    expect(values[0]).toBe(1);
    expectRelative(values[1]!, Math.exp(-740), 0.1); // three bits are left of a number that small
    expect(values[2]).toBe(0);
    expect(values[3]).toBe(0);
  });
});

describe("out", () => {
  it("is filled and returned, its rest left alone", () => {
    const out = new Float64Array(4).fill(-1);
    expect(beamTransmittances([500, 600, 940], beam, out)).toBe(out);
    expect(out[3]).toBe(-1);
    const table = beamTable([500, 600, 940], beam);
    const second = new Float64Array(4).fill(-1);
    expect(beamTransmittances(table, beam, second)).toBe(second);
    expect(second[3]).toBe(-1);
    out.forEach((value, i) => {
      expectAbsolute(second[i]!, value, 3e-7);
    });
  });
  it("may be just long enough", () => {
    const out = new Float64Array(2);
    expect(beamTransmittances([500, 600], beam, out)).toBe(out);
  });
  it("is refused when short or of another kind", () => {
    const name = "beamTransmittances";
    expectRefusal(
      () => beamTransmittances([500, 600], beam, new Float64Array(1)),
      RangeError,
      name,
      "out",
      "at least 2",
    );
    expectRefusal(() => beamTransmittances([500], beam, [0] as never), TypeError, name, "out");
  });
});

describe("edges", () => {
  it("names the wavelength that is out of range, NaN included", () => {
    for (const f of [beamTransmittances, beamTable]) {
      expectRefusal(
        () => f([500, 1691], beam),
        RangeError,
        f.name,
        "wavelengthsNm[1]",
        "280 to 1690 nm",
        "1691",
      );
      expectRefusal(() => f([Number.NaN], beam), RangeError, "wavelengthsNm[0]", "NaN");
      expectRefusal(() => f(["500"] as never, beam), TypeError, "wavelengthsNm[0]");
      expectRefusal(() => f([], beam), RangeError, "wavelengthsNm", "at least 1");
      expectRefusal(() => f(500 as never, beam), TypeError, "wavelengthsNm");
      expectRefusal(() => f([500], clearAir as never), TypeError, "beam", "clearBeam");
    }
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airToVacuumWavelength,
  groupIndexCiddor,
  moistAir,
  refractiveIndexBirchDowns,
  refractiveIndexCiddor,
  refractiveIndexEdlen,
  refractiveIndexPeckReeder,
  vacuumToAirWavelength,
} from "../../src/index.js";
import { airAt } from "../_air.js";
import { airState, between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const standard = airAt(15, 101325, 0, 450);
const humid = airAt(20, 101325, 0.5, 450);

describe("published values", () => {
  it("moist laboratory air measured by Birch & Downs, as listed in Ciddor 1996 (from memory): 27394.0e-8", () => {
    // 633 nm, 19.526 °C, 102 094.8 Pa, vapour 1065 Pa, 510 ppm; a measurement: within the 2e-8 the paper states for its formula
    const saturated = airAt(19.526, 102_094.8, 1, 510).vapourPressurePa;
    const air = airAt(19.526, 102_094.8, 1065 / saturated, 510);
    expectAbsolute(air.vapourPressurePa, 1065, 1e-9);
    expectAbsolute((refractiveIndexCiddor(633, air) - 1) * 1e8, 27394.0, 2);
  });
  it("standard air of Edlén 1966 at 644 nm: (n - 1) 1e8 = 27 638 in the visible (from memory, 1e-8 digits)", () => {
    // 15 °C, 760 torr, 300 ppm: A + B/(130 - s) + C/(38.9 - s) with density factor 1 by the author's normalisation, to 1e-6
    const s = (1 / 0.6438469) ** 2;
    const printed = 8342.13 + 2406030 / (130 - s) + 15997 / (38.9 - s);
    expectRelative(
      (refractiveIndexEdlen(643.8469, airAt(15, 101325, 0, 300)) - 1) * 1e8,
      printed,
      3e-6,
    );
  });
  it("Birch & Downs 1994 in the state they normalise to: density factor 1 at 15 °C, 101 325 Pa", () => {
    const s = (1 / 0.633) ** 2;
    const printed = 8342.54 + 2406147 / (130 - s) + 15998 / (38.9 - s);
    expectRelative((refractiveIndexBirchDowns(633, standard) - 1) * 1e8, printed, 8e-6); // 0.003661/°C is printed to 5e-7: 15 of them
  });
  it("sodium light in standard air: 1.000277 (handbooks, from memory, last digit)", () => {
    expectAbsolute(refractiveIndexPeckReeder(589.3), 1.000277, 5e-7);
    expectAbsolute(refractiveIndexCiddor(589.3, standard), 1.000277, 5e-7);
  });
  it("wavelength in air of the hydrogen alpha line: 656.46 nm in vacuum, 656.28 in air (common tables)", () => {
    expectAbsolute(vacuumToAirWavelength(656.461, standard), 656.28, 0.005);
  });
});

describe("independent fixtures", () => {
  it("Peck & Reeder written in micrometres", () => {
    for (const um of [0.23, 0.4, 0.55, 1, 1.69]) {
      const n =
        1 + (8060.51 + 2480990 / (132.274 - um ** -2) + 17455.7 / (39.32957 - um ** -2)) / 1e8;
      expectAbsolute(refractiveIndexPeckReeder(um * 1000), n, 1e-15);
    }
  });
  it("Birch & Downs in hectopascals", () => {
    // the same formula with pressure in hPa: 1e-8 becomes 1e-6, 96095.43 becomes 960.9543, 1e-10 becomes 1e-8
    const [t, p, um] = [23.5, 985, 0.48];
    const air = airAt(t, p * 100, 0.4, 500);
    const s = um ** -2;
    const ns = (8342.54 + 2406147 / (130 - s) + 15998 / (38.9 - s)) * 1e-8 * (1 + 0.54e-6 * 50);
    const dry = (ns * p * (1 + 1e-6 * (0.601 - 0.00972 * t) * p)) / 960.9543 / (1 + 0.003661 * t);
    const n = 1 + dry - (air.vapourPressurePa / 100) * (3.7345 - 0.0401 * s) * 1e-8;
    expectAbsolute(refractiveIndexBirchDowns(480, air), n, 1e-14);
  });
  it("Edlén with pressures in pascals", () => {
    const [t, p, um] = [18, 95_000, 0.7];
    const air = airAt(t, p, 0.8, 800);
    const [s, torr] = [um ** -2, 101325 / 760];
    const ns = (8342.13 + 2406030 / (130 - s) + 15997 / (38.9 - s)) * 1e-8;
    const dry =
      (ns * (p / torr) * (1 + (p / torr) * (0.817 - 0.0133 * t) * 1e-6)) /
      (720.775 * (1 + 0.003661 * t));
    const n = 1 + dry - (air.vapourPressurePa / torr) * (5.722 - 0.0457 * s) * 1e-8;
    expectAbsolute(refractiveIndexEdlen(700, air), n, 1e-14);
  });
  it("the group index is n - wavelength dn/dwavelength, by central differences", () => {
    for (const nm of [310, 400, 550, 800, 1600]) {
      const slope =
        (refractiveIndexCiddor(nm + 0.05, humid) - refractiveIndexCiddor(nm - 0.05, humid)) / 0.1;
      // rounding of the difference: 2.2e-16 / 0.1 nm times 1600 nm = 4e-12
      expectAbsolute(
        groupIndexCiddor(nm, humid),
        refractiveIndexCiddor(nm, humid) - nm * slope,
        1e-11,
      );
    }
  });
  it("phase in place of group index is 1075e-8 low at 550 nm (size from the plan)", () => {
    expectAbsolute(
      (groupIndexCiddor(550, standard) - refractiveIndexCiddor(550, standard)) * 1e8,
      1075,
      2,
    );
  });
});

describe("the three formulas agree where all hold", () => {
  const worst = (index: typeof refractiveIndexCiddor, humidity: number): number => {
    let most = 0;
    for (let t = 10; t <= 30; t += 5) {
      for (let p = 90_000; p <= 110_000; p += 5_000) {
        for (let nm = 350; nm <= 650; nm += 50) {
          const air = airAt(t, p, humidity, 450);
          most = Math.max(most, Math.abs(index(nm, air) - refractiveIndexCiddor(nm, air)));
        }
      }
    }
    return most;
  };
  it("as their comments say", () => {
    expect(worst(refractiveIndexBirchDowns, 0.6)).toBeLessThan(4e-8);
    expect(worst(refractiveIndexEdlen, 0.6)).toBeLessThan(2.1e-7);
    expect(worst(refractiveIndexEdlen, 0)).toBeLessThan(3e-8);
    const hot = airAt(50, 101325, 1, 450);
    expectAbsolute(
      refractiveIndexBirchDowns(633, hot) - refractiveIndexCiddor(633, hot),
      -5.0e-7,
      0.1e-7,
    );
    const dry300 = airAt(15, 101325, 0, 300);
    for (let nm = 300; nm <= 1690; nm += 10) {
      expectAbsolute(refractiveIndexPeckReeder(nm), refractiveIndexCiddor(nm, dry300), 1.1e-8);
    }
  });
});

describe("properties", () => {
  it("air to vacuum and back", () => {
    fc.assert(
      fc.property(airState, between(302, 1680), (state, nm) => {
        const air = moistAir(state);
        expectRelative(airToVacuumWavelength(vacuumToAirWavelength(nm, air), air), nm, 1e-12);
        expect(vacuumToAirWavelength(nm, air)).toBeLessThan(nm);
      }),
    );
  });
  it("group above phase; every index above 1; dry (n - 1) grows with pressure", () => {
    fc.assert(
      fc.property(airState, between(300, 1690), (state, nm) => {
        const air = moistAir(state);
        expect(groupIndexCiddor(nm, air)).toBeGreaterThan(refractiveIndexCiddor(nm, air));
        for (const index of [refractiveIndexBirchDowns, refractiveIndexEdlen]) {
          const low = moistAir({ ...state, relativeHumidity: 0 });
          const high = moistAir({
            ...state,
            relativeHumidity: 0,
            pressurePa: state.pressurePa * 1.1,
          });
          expect(index(nm, low)).toBeGreaterThan(1);
          expect(index(nm, high)).toBeGreaterThan(index(nm, low));
        }
      }),
    );
  });
  it("Edlén ignores CO2, the others do not", () => {
    fc.assert(
      fc.property(airState, between(300, 1690), (state, nm) => {
        const [none, much] = [
          moistAir({ ...state, co2Ppm: 0 }),
          moistAir({ ...state, co2Ppm: 2000 }),
        ];
        expect(refractiveIndexEdlen(nm, none)).toBe(refractiveIndexEdlen(nm, much));
        expect(refractiveIndexBirchDowns(nm, none)).toBeLessThan(
          refractiveIndexBirchDowns(nm, much),
        );
        expect(refractiveIndexCiddor(nm, none)).toBeLessThan(refractiveIndexCiddor(nm, much));
      }),
    );
  });
});

describe("edges", () => {
  it.each([
    ["groupIndexCiddor", groupIndexCiddor, 300, 1690],
    ["refractiveIndexBirchDowns", refractiveIndexBirchDowns, 300, 1690],
    ["refractiveIndexEdlen", refractiveIndexEdlen, 200, 2000],
    ["airToVacuumWavelength", airToVacuumWavelength, 300, 1688],
  ])("%s", (name, index, low, high) => {
    for (const nm of [low, high]) expect(index(nm, humid)).toBeGreaterThan(1);
    for (const nm of [low - 0.01, high + 0.01, Number.NaN, 0.5]) {
      expectRefusal(() => index(nm, humid), RangeError, name, `${low} to ${high} nm`, String(nm));
    }
    expectRefusal(() => index(0.5, humid), RangeError, "µm? multiply by 1000");
    expectRefusal(() => index(500, { pressurePa: 101325 } as never), TypeError, "moistAir");
    expectRefusal(() => index(500, undefined as never), TypeError, "moistAir");
    expectRefusal(() => index("500" as never, humid), TypeError, name);
  });
  it("vacuumToAirWavelength and refractiveIndexPeckReeder", () => {
    expectRefusal(() => vacuumToAirWavelength(0.5, humid), RangeError, "300 to 1690 nm");
    expectRefusal(
      () => refractiveIndexPeckReeder(0.55),
      RangeError,
      "refractiveIndexPeckReeder",
      "230 to 1690 nm",
      "µm",
    );
    expectRefusal(
      () => refractiveIndexPeckReeder(null as never),
      TypeError,
      "refractiveIndexPeckReeder",
    );
  });
});

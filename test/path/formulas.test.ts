import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airMassKastenWater,
  airMassKastenYoung,
  airMassPickering,
  airMassShell,
  airMassYoung,
  refractionBennett,
  refractionSaemundsson,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const weather = { pressurePa: 101_000, temperatureK: 283 };
const ozone = { shellHeightM: 22_000, altitudeM: 0 };
const radians = Math.PI / 180;

describe("published values", () => {
  // Kasten & Young 1989, table 2, air mass of the standard atmosphere by elevation (from memory), and their formula's error there
  it.each([
    [0, 38.087, 4.4e-3],
    [1, 26.26, 2.0e-3],
    [3, 15.163, 1.1e-3],
    [5, 10.316, 1.0e-3],
    [10, 5.584, 4e-4],
  ])("Kasten & Young at %d° elevation", (elevation, mass, tolerance) => {
    expectRelative(airMassKastenYoung(90 - elevation), mass, tolerance);
  });
  it("their formula at the horizon: 37.92 (from memory, last digit)", () => {
    expectAbsolute(airMassKastenYoung(90), 37.92, 0.005);
  });
  it("Young 1994 at the true horizon: 31.7 (from memory, last digit)", () => {
    expectAbsolute(airMassYoung(90), 31.7, 0.05);
  });
  it("Bennett: 34.5′ at the horizon; Sæmundsson: 28.98′ at true elevation 0 (Meeus, Astronomical Algorithms, from memory)", () => {
    expectAbsolute(refractionBennett(90, weather) * 60, 34.48, 0.005);
    expectAbsolute(refractionSaemundsson(90, weather) * 60, 28.98, 0.005);
  });
  it("Meeus's example 16.a: sun's lower limb at apparent elevation 0.5°: 28.754′ (from memory, last digit)", () => {
    expectAbsolute(refractionBennett(89.5, weather) * 60, 28.754, 6e-4);
  });
  it("common practice: the horizon sun stands about half a degree higher than it is", () => {
    const degrees = refractionBennett(90, { pressurePa: 101_325, temperatureK: 288.15 });
    expect(degrees).toBeGreaterThan(0.5);
    expect(degrees).toBeLessThan(0.62);
  });
});

describe("independent fixtures", () => {
  it("the formulas written in elevation and with degrees throughout", () => {
    for (const h of [0.3, 2, 7, 20, 45, 80]) {
      const z = 90 - h;
      expectRelative(
        airMassKastenYoung(z),
        1 / (Math.sin(h * radians) + 0.50572 * (h + 6.07995) ** -1.6364),
        1e-13,
      );
      expectRelative(
        airMassKastenWater(z),
        1 / (Math.sin(h * radians) + 0.0548 * (h + 2.65) ** -1.452),
        1e-12,
      );
      const c = Math.sin(h * radians);
      const young =
        (1.002432 * c ** 2 + 0.148386 * c + 0.0096467) /
        (c ** 3 + 0.149864 * c ** 2 + 0.0102963 * c + 0.000303978);
      expectRelative(airMassYoung(z), young, 1e-12);
      expectAbsolute(
        refractionBennett(z, weather) * 60,
        1 / Math.tan((h + 7.31 / (h + 4.4)) * radians),
        1e-12,
      );
      expectAbsolute(
        refractionSaemundsson(z, weather) * 60,
        1.02 / Math.tan((h + 10.3 / (h + 5.11)) * radians),
        1e-12,
      );
    }
  });
  it("the shell by the sine rule", () => {
    for (const z of [0, 30, 70, 85, 90]) {
      const inner = Math.asin(Math.sin(z * radians) * ((6371008.8 + 1620) / (6371008.8 + 22_000)));
      expectRelative(
        airMassShell(z, { shellHeightM: 22_000, altitudeM: 1620 }),
        1 / Math.cos(inner),
        1e-12,
      );
    }
  });
  it("water's mass against a straight ray through 2 km of exponential layer, as its comment says", () => {
    const straight = (z: number): number => {
      let sum = 0;
      const [steps, top] = [40_000, 80_000];
      for (let i = 0; i < steps; i++) {
        const h = ((i + 0.5) * top) / steps;
        const sine = (6371008.8 / (6371008.8 + h)) * Math.sin(z * radians);
        sum += Math.exp(-h / 2000) / Math.sqrt(1 - sine * sine);
      }
      return (sum * top) / steps / 2000;
    };
    for (const [z, off] of [
      [30, 0],
      [75, 0.001],
      [85, 0.0052],
      [89, 0.0383],
    ] as const) {
      expectAbsolute(airMassKastenWater(z) / straight(z) - 1, off, 3e-4);
    }
  });
  it("true and apparent forms agree once the refraction is taken off", () => {
    for (let z = 0; z <= 85; z += 5) {
      const apparent = Math.max(0, z - refractionSaemundsson(z, weather));
      expectRelative(airMassYoung(z), airMassKastenYoung(apparent), z <= 80 ? 7e-4 : 2e-3);
      expectAbsolute(
        refractionSaemundsson(z, weather) * 60,
        refractionBennett(apparent, weather) * 60,
        0.07,
      );
    }
  });
  it("the two refractions agree within 0.07′ down to the horizon", () => {
    for (let z = 0; z <= 90.5; z += 0.1) {
      const lift = refractionSaemundsson(z, weather);
      if (z - lift < 0 || z - lift > 90) continue;
      expectAbsolute(lift * 60, refractionBennett(z - lift, weather) * 60, 0.07);
    }
  });
  it("a true angle in an apparent-angle formula is 2.6 % off at 85° and 19 % at 90° (sizes from the plan)", () => {
    expectAbsolute(airMassKastenYoung(85) / airMassYoung(85) - 1, 0.026, 2e-3);
    expectAbsolute(airMassKastenYoung(90) / airMassYoung(90) - 1, 0.19, 6e-3);
  });
});

describe("properties", () => {
  it("every mass grows from 1 and stays below sec z", () => {
    fc.assert(
      fc.property(between(0, 89.9), (z) => {
        for (const mass of [
          airMassKastenYoung,
          airMassYoung,
          airMassKastenWater,
          (a: number) => airMassShell(a, ozone),
        ]) {
          expect(mass(z + 0.1)).toBeGreaterThan(mass(z));
          expect(mass(z)).toBeLessThanOrEqual((1 / Math.cos(z * radians)) * (1 + 2e-3));
          expect(mass(z)).toBeGreaterThan(0.9996);
        }
      }),
    );
  });
  it("higher layers have smaller masses: ozone, air, water", () => {
    fc.assert(
      fc.property(between(60, 89), (z) => {
        expect(airMassShell(z, ozone)).toBeLessThan(airMassKastenYoung(z));
        expect(airMassKastenYoung(z)).toBeLessThan(airMassKastenWater(z));
        expect(airMassShell(z, { shellHeightM: 30_000, altitudeM: 0 })).toBeLessThan(
          airMassShell(z, ozone),
        );
      }),
    );
  });
  it("refraction follows pressure over temperature and falls with height above the horizon", () => {
    fc.assert(
      fc.property(
        between(5, 89),
        between(50_000, 110_000),
        between(230, 320),
        (z, pressurePa, temperatureK) => {
          for (const refraction of [refractionSaemundsson, refractionBennett]) {
            const r = refraction(z, { pressurePa, temperatureK });
            expectRelative(
              refraction(z, { pressurePa: pressurePa / 2, temperatureK }),
              r / 2,
              1e-14,
            );
            expectRelative(
              refraction(z, { pressurePa, temperatureK: temperatureK * 1.1 }),
              r / 1.1,
              1e-14,
            );
            expect(refraction(z + 0.5, { pressurePa, temperatureK })).toBeGreaterThan(r);
          }
        },
      ),
    );
  });
});

describe("edges", () => {
  it.each([
    ["airMassKastenYoung", airMassKastenYoung, "apparentZenithDeg"],
    ["airMassYoung", airMassYoung, "trueZenithDeg"],
    ["airMassKastenWater", airMassKastenWater, "apparentZenithDeg"],
    ["airMassShell", (z: number) => airMassShell(z, ozone), "trueZenithDeg"],
    ["refractionBennett", (z: number) => refractionBennett(z, weather), "apparentZenithDeg"],
  ])("%s", (name, quantity, argument) => {
    expectAbsolute(quantity(0), name === "refractionBennett" ? 0 : 1, 3e-4);
    expect(Number.isFinite(quantity(90))).toBe(true);
    for (const z of [-0.1, 90.1, Number.NaN])
      expectRefusal(() => quantity(z), RangeError, name, argument, "0 to 90 degrees", String(z));
    expectRefusal(() => quantity("45" as never), TypeError, name, argument);
  });
  it("refractionSaemundsson reaches the apparent horizon", () => {
    expectAbsolute(90.6 - refractionSaemundsson(90.6, weather), 90, 0.05);
    expectRefusal(() => refractionSaemundsson(90.7, weather), RangeError, "0 to 90.6 degrees");
  });
  it("Pickering's lift close to the horizon and on it", () => {
    for (const h of [0, 0.0005, 0.5]) {
      const lifted = h + 244 / (165 + 47 * h ** 1.1);
      expectRelative(airMassPickering(90 - h), 1 / Math.sin((lifted * Math.PI) / 180), 2e-13); // 90 - h is off by 7e-15°
    }
  });
  it("the surface state and the shell", () => {
    for (const refraction of [refractionSaemundsson, refractionBennett]) {
      expectRefusal(
        () => refraction(45, { pressurePa: 1010, temperatureK: 283 }),
        RangeError,
        "pressurePa",
        "hPa",
      );
      expectRefusal(
        () => refraction(45, { pressurePa: 101_000, temperatureK: 10 }),
        RangeError,
        "temperatureK",
        "°C",
      );
      expectRefusal(() => refraction(45, undefined as never), TypeError, "surface");
    }
    expectRefusal(
      () => airMassShell(45, { shellHeightM: 22, altitudeM: 0 }),
      RangeError,
      "shellHeightM",
      "km? multiply by 1000",
    );
    expectRefusal(
      () => airMassShell(45, { shellHeightM: 3000, altitudeM: 3000 }),
      RangeError,
      "shellHeightM",
      "3001 to 100000 m",
    );
    expectRefusal(
      () => airMassShell(45, { shellHeightM: 22_000, altitudeM: 20_001 }),
      RangeError,
      "altitudeM",
    );
    expectRefusal(() => airMassShell(45, undefined as never), TypeError, "shell");
  });
});

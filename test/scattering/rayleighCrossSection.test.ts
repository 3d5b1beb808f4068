import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airNumberDensity,
  depolarisation,
  kingFactor,
  rayleighCrossSection,
  rayleighScatteringCoefficient,
} from "../../src/index.js";
import { airAt } from "../_air.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

describe("published values", () => {
  // Bates 1984, Planet. Space Sci. 32, 785, table 1 (from memory), 1e-26 cm², four digits; the two papers differ by up to 0.1 %
  it.each([
    [400, 1.673],
    [500, 0.6665],
    [550, 0.451],
    [700, 0.1692],
  ])("Bates at %d nm", (nm, expected) => {
    expectRelative(rayleighCrossSection(nm, 360) * 1e30, expected, 1e-3);
  });
  it("closing fit of Bodhaine et al. 1999, equation 29, 250 to 850 nm: 8e-5", () => {
    for (let nm = 250; nm <= 850; nm += 10) {
      const [l, i] = [(nm / 1000) ** 2, (1000 / nm) ** 2];
      const fit =
        (1.0455996 - 341.29061 * i - 0.9023085 * l) / (1 + 0.0027059889 * i - 85.968563 * l);
      expectRelative(rayleighCrossSection(nm, 360), fit * 1e-32, 8e-5);
    }
  });
  // King factor of air by Bates 1984 (from memory, three decimals)
  it.each([
    [400, 1.051],
    [500, 1.049],
    [550, 1.049],
    [700, 1.048],
  ])("King factor at %d nm", (nm, expected) => {
    expectAbsolute(kingFactor(nm, 330), expected, 5e-4);
  });
  it("depolarisation of air for natural light: 0.0279 to 0.0297 in the visible (Young 1981; Bates 1984, from memory)", () => {
    expectAbsolute(depolarisation(700, 330), 0.0279, 1e-4);
    expectAbsolute(depolarisation(400, 330), 0.0297, 1e-4);
  });
});

describe("independent fixtures", () => {
  it("equation 22 in centimetres and micrometres, with the paper's numbers", () => {
    for (const [um, co2] of [
      [0.23, 0],
      [0.35, 360],
      [0.55, 425],
      [1.0, 1000],
      [1.69, 2000],
    ] as const) {
      const n300 =
        (8060.51 + 2480990 / (132.274 - um ** -2) + 17455.7 / (39.32957 - um ** -2)) * 1e-8;
      const n = 1 + n300 * (1 + 0.54 * (co2 * 1e-6 - 0.0003));
      const c = co2 * 1e-4;
      const fn2 = 1.034 + 3.17e-4 * um ** -2;
      const fo2 = 1.096 + 1.385e-3 * um ** -2 + 1.448e-4 * um ** -4;
      const king = (78.084 * fn2 + 20.946 * fo2 + 0.934 + c * 1.15) / (78.084 + 20.946 + 0.934 + c);
      const cm = um * 1e-4;
      const sigma =
        (24 * Math.PI ** 3 * (n ** 2 - 1) ** 2) / (cm ** 4 * 2.546899e19 ** 2 * (n ** 2 + 2) ** 2);
      expectRelative(kingFactor(um * 1000, co2), king, 1e-12);
      expectRelative(rayleighCrossSection(um * 1000, co2), sigma * king * 1e-4, 1e-7); // the plan's; rounding of n² - 1 is 1e-12
    }
  });
  it("King's relation backwards", () => {
    for (const nm of [230, 500, 1690]) {
      const rho = depolarisation(nm, 425);
      expectRelative((6 + 3 * rho) / (6 - 7 * rho), kingFactor(nm, 425), 1e-14);
    }
  });
  it("what naive versions get wrong, in the sizes the plan computed", () => {
    const sigma = rayleighCrossSection(550, 360);
    expectAbsolute(1 / kingFactor(400, 360) - 1, -0.049, 5e-4); // no King factor
    expectAbsolute((sigma * (550 / 400) ** 4) / rayleighCrossSection(400, 360) - 1, -0.037, 5e-4); // pure fourth power
  });
  it("common practice: violet and blue (380-490 nm) scatter over four times as much as orange and red (590-750 nm)", () => {
    const mean = (from: number, to: number): number => {
      let sum = 0;
      for (let nm = from; nm <= to; nm++) sum += rayleighCrossSection(nm, 425);
      return sum / (to - from + 1);
    };
    const ratio = mean(380, 490) / mean(590, 750);
    expect(ratio).toBeGreaterThan(4);
    expect(ratio).toBeLessThan(6);
  });
});

describe("scattering coefficient", () => {
  it("Bates's 0.4510e-26 cm² times 2.547e25 m-3 in standard air", () => {
    expectRelative(
      rayleighScatteringCoefficient(550, airAt(15, 101325, 0, 360)),
      0.451e-30 * 2.547e25,
      1e-3,
    );
  });
  it("is the product of cross-section and number density, whatever the weather", () => {
    fc.assert(
      fc.property(between(230, 1690), between(-40, 50), between(0, 1), (nm, celsius, humidity) => {
        const air = airAt(celsius, 90_000, humidity, 425);
        expectRelative(
          rayleighScatteringCoefficient(nm, air),
          rayleighCrossSection(nm, 425) * airNumberDensity(air),
          1e-12,
        );
      }),
    );
  });
});

describe("properties", () => {
  it("falls with wavelength, faster than its fourth power; depolarisation and King factor fall too; CO2 raises all", () => {
    fc.assert(
      fc.property(between(230, 1600), between(0, 1900), (nm, co2) => {
        expect(rayleighCrossSection(nm + 10, co2) * ((nm + 10) / nm) ** 4).toBeLessThan(
          rayleighCrossSection(nm, co2),
        );
        expect(kingFactor(nm + 10, co2)).toBeLessThan(kingFactor(nm, co2));
        expect(depolarisation(nm + 10, co2)).toBeLessThan(depolarisation(nm, co2));
        expect(rayleighCrossSection(nm, co2 + 100)).toBeGreaterThan(rayleighCrossSection(nm, co2));
        expect(kingFactor(nm, co2 + 100)).toBeGreaterThan(kingFactor(nm, co2));
      }),
    );
  });
});

describe("edges", () => {
  it.each([
    ["rayleighCrossSection", rayleighCrossSection],
    ["kingFactor", kingFactor],
    ["depolarisation", depolarisation],
  ])("%s", (name, quantity) => {
    for (const nm of [230, 1690]) expect(quantity(nm, 0)).toBeGreaterThan(0);
    for (const nm of [229.9, 1690.1, Number.NaN])
      expectRefusal(() => quantity(nm, 400), RangeError, name, "230 to 1690 nm", String(nm));
    expectRefusal(() => quantity(0.55, 400), RangeError, "µm? multiply by 1000");
    // the slip is named exactly where a thousand times the value would be in range
    for (const um of [0.23, 1.69])
      expectRefusal(() => quantity(um, 400), RangeError, `got ${um} (µm? multiply by 1000)`);
    for (const um of [0.2299, 1.6901])
      expect(() => quantity(um, 400)).toThrow(new RegExp(`got ${um}$`));
    expectRefusal(() => quantity(550, 2001), RangeError, "co2Ppm", "0 to 2000 ppm", "2001");
    expectRefusal(() => quantity(550, Number.NaN), RangeError, "co2Ppm");
    expectRefusal(() => quantity("550" as never, 400), TypeError, name);
    expectRefusal(() => quantity(550, -1), RangeError, "co2Ppm", "-1");
    expectRefusal(() => quantity(550, "400" as never), TypeError, "co2Ppm", '"400"');
    expectRefusal(() => quantity(550, undefined as never), TypeError, "co2Ppm");
  });
  it("rayleighScatteringCoefficient", () => {
    expectRefusal(
      () => rayleighScatteringCoefficient(0.5, airAt(15, 101325, 0, 400)),
      RangeError,
      "230 to 1690 nm",
      "µm",
    );
    expectRefusal(
      () => rayleighScatteringCoefficient(500, undefined as never),
      TypeError,
      "moistAir",
    );
    expectRefusal(() => rayleighScatteringCoefficient(500, {} as never), TypeError, "moistAir");
  });
});

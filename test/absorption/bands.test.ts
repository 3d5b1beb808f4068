import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mixedGasTransmittance, waterVapourTransmittance } from "../../src/index.js";
import { between } from "../_generators.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const table = referenceTable("absorption-bird-riordan-1986.csv") as Record<string, number[]>;
/** Bird & Riordan 1986, written with the power operator. */
const water = (a: number, cm: number): number =>
  Math.exp((-0.2385 * a * cm) / (1 + 20.07 * a * cm) ** 0.45);
const mixed = (a: number, mass: number): number =>
  Math.exp((-1.41 * a * mass) / (1 + 118.93 * a * mass) ** 0.45);

describe("published values", () => {
  it("follows the paper's formula with the coefficient of every row", () => {
    expect(table.wavelength_nm).toHaveLength(122);
    table.wavelength_nm!.forEach((nm, i) => {
      // exponential and power each to a few units of the last place, times a depth of up to 60
      expectRelative(waterVapourTransmittance(nm, 3), water(table.a_water![i]!, 3), 1e-12);
      expectRelative(mixedGasTransmittance(nm, 1.5), mixed(table.a_mixed![i]!, 1.5), 1e-12);
    });
  });
});

describe("independent fixtures", () => {
  // worked by hand with a pocket calculator's digits: 55 x 2 = 110, 1 + 20.07 x 110 = 2208.7, ^0.45 = 31.98, depth 0.8204
  it("absorbs 56 % at 937 nm in 2 cm", () => {
    expectRelative(waterVapourTransmittance(937, 2), Math.exp(-0.8204), 1e-4); // four digits carried
  });
  // 4 x 1.5 = 6, 1 + 118.93 x 6 = 714.58, ^0.45 = 19.24, depth 0.4396
  it("absorbs 36 % at 762.5 nm at air mass 1.5", () => {
    expectRelative(mixedGasTransmittance(762.5, 1.5), Math.exp(-0.4397), 2e-4); // four digits carried
  });
  it("puts 0.03 of false depth at 778 nm, beside the oxygen band", () => {
    expectAbsolute(-Math.log(mixedGasTransmittance(778, 1)), 0.03, 0.005);
  });
  it("takes the coefficient, not the transmittance, as a straight line between rows", () => {
    // 942.5 nm lies half way between 937 (55) and 948 (45)
    expectRelative(waterVapourTransmittance(942.5, 1), water(50, 1), 1e-13);
    expectRelative(mixedGasTransmittance(765, 1), mixed((4 + 0.35) / 2, 1), 1e-13);
  });
});

describe("properties", () => {
  it("stays in 0 to 1, falls with the amount, and saturates: each further amount takes less", () => {
    fc.assert(
      fc.property(between(300, 4000), between(0.01, 45), (nm, amount) => {
        for (const f of [waterVapourTransmittance, mixedGasTransmittance]) {
          const [one, two] = [f(nm, amount), f(nm, amount + 10)];
          expect(one).toBeLessThanOrEqual(1);
          expect(two).toBeLessThanOrEqual(one);
          expect(two).toBeGreaterThanOrEqual(0);
          expect(Math.log(f(nm, 2 * amount))).toBeGreaterThanOrEqual(
            2 * Math.log(one) - 1e-9 * Math.abs(Math.log(one)),
          );
        }
      }),
    );
  });
  it("is clear where the rows say so", () => {
    expect(waterVapourTransmittance(500, 50)).toBe(1);
    expect(mixedGasTransmittance(730, 38)).toBe(1);
    expect(waterVapourTransmittance(937, 0)).toBe(1);
    expect(mixedGasTransmittance(762.5, 0)).toBe(1);
  });
});

describe("edges", () => {
  it("accepts both ends", () => {
    expect(waterVapourTransmittance(300, 1)).toBe(1);
    expectRelative(waterVapourTransmittance(4000, 1), water(0.0045, 1), 1e-13);
    expectRelative(mixedGasTransmittance(4000, 1), mixed(0.025, 1), 1e-13);
    expect(waterVapourTransmittance(2700, 2000)).toBeGreaterThanOrEqual(0);
  });
  it.each([
    ["waterVapourTransmittance", waterVapourTransmittance, "slantWaterCm", "0 to 2000 cm", 2001],
    ["mixedGasTransmittance", mixedGasTransmittance, "pressureAirMass", "0 to 100", 101],
  ] as const)("%s refuses what lies outside", (name, f, amount, range, tooMuch) => {
    expectRefusal(() => f(299.9, 1), RangeError, name, "wavelengthNm", "300 to 4000 nm", "299.9");
    expectRefusal(() => f(4000.1, 1), RangeError, "4000.1");
    expectRefusal(() => f(0.94, 1), RangeError, "µm?");
    expectRefusal(() => f(940, -0.1), RangeError, amount, range, "-0.1");
    expectRefusal(() => f(940, tooMuch), RangeError, amount, range);
    expectRefusal(() => f(940, Number.NaN), RangeError, "NaN");
    expectRefusal(() => f(940, "1" as never), TypeError, '"1"');
  });
});

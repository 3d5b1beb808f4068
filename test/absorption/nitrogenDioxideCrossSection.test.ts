import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { nitrogenDioxideCrossSection } from "../../src/index.js";
import { between } from "../_generators.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const table = referenceTable("nitrogen-dioxide-cross-section.csv") as Record<string, number[]>;
const cm2 = (nm: number, kelvin: number): number => nitrogenDioxideCrossSection(nm, kelvin) * 1e4;

describe("published values", () => {
  it("returns IUPAC's bands to 495 nm and JPL's beyond, at their centres", () => {
    table.wavelength_nm!.forEach((nm, i) => {
      if (nm <= 495) {
        expectRelative(cm2(nm, 220), table.iupac_220K![i]!, 1e-14); // the same number by way of units
        expectRelative(cm2(nm, 298), table.iupac_298K![i]!, 1e-14);
      } else {
        expectRelative(cm2(nm, 220), table.jpl_294K![i]!, 1e-14);
        expectRelative(cm2(nm, 294), table.jpl_294K![i]!, 1e-14);
      }
    });
  });
  it("is within -0.1 and +3.5 % of JPL where both recommendations exist", () => {
    const ratios = table.wavelength_nm!.flatMap((nm, i) =>
      nm >= 400 && nm <= 495 ? [table.jpl_294K![i]! / cm2(nm, 298)] : [],
    );
    expect(ratios).toHaveLength(20);
    expectAbsolute(Math.min(...ratios), 0.999, 0.0005); // the claim's last digit
    expectAbsolute(Math.max(...ratios), 1.035, 0.0005);
  });
  it.each([
    [400, 6.0e-19, 0.08], // from memory, at one digit; structure within the band
    [450, 4.9e-19, 0.03],
  ])("is known to be about that at %d nm", (nm, sigma, tolerance) => {
    expectRelative(cm2(nm, 298), sigma, tolerance);
  });
});

describe("independent fixtures", () => {
  it("is bilinear, written out: 402 nm at 250 K, and across the join at 497 nm", () => {
    const at400 = 6.32e-19 + (30 / 78) * (6.385e-19 - 6.32e-19);
    const at405 = 5.617e-19 + (30 / 78) * (5.768e-19 - 5.617e-19);
    expectRelative(cm2(402, 250), at400 + 0.4 * (at405 - at400), 1e-14);
    const at495 = 2.863e-19 + (30 / 78) * (2.93e-19 - 2.863e-19);
    expectRelative(cm2(497, 250), at495 + 0.4 * (1.82e-19 - at495), 1e-14);
  });
});

describe("properties", () => {
  it("is positive, and continuous", () => {
    fc.assert(
      fc.property(between(280, 659.99), between(200, 298), (nm, kelvin) => {
        const here = cm2(nm, kelvin);
        expect(here).toBeGreaterThan(0);
        expect(Math.abs(cm2(nm + 1e-7, kelvin) / here - 1)).toBeLessThan(1e-6);
      }),
    );
  });
  it("loses its dependence on temperature from 495 to 500 nm", () => {
    const effect = (nm: number): number => cm2(nm, 298) - cm2(nm, 220);
    expectRelative(effect(498), 0.4 * effect(495), 1e-9); // difference of near numbers
    expect(effect(500)).toBe(0);
  });
});

describe("edges", () => {
  it("accepts both ends and refuses what lies beyond", () => {
    expectRelative(cm2(280, 298), 5.27e-20, 1e-14);
    expectRelative(cm2(660, 298), 5.66e-21, 1e-14);
    const name = "nitrogenDioxideCrossSection";
    expectRefusal(
      () => nitrogenDioxideCrossSection(279.9, 220),
      RangeError,
      name,
      "wavelengthNm",
      "280 to 660 nm",
    );
    expectRefusal(() => nitrogenDioxideCrossSection(660.1, 220), RangeError, "660.1");
    expectRefusal(() => nitrogenDioxideCrossSection(0.4, 220), RangeError, "µm?");
    expectRefusal(() => nitrogenDioxideCrossSection(400, 199), RangeError, "200 to 298 K");
    expectRefusal(() => nitrogenDioxideCrossSection(400, Number.NaN), RangeError, "NaN");
    expectRefusal(() => nitrogenDioxideCrossSection(null as never, 220), TypeError, "null");
  });
});

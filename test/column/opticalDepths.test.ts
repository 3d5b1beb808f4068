import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  angstromOpticalDepth,
  nitrogenDioxideCrossSection,
  nitrogenDioxideOpticalDepth,
  ozoneCrossSection,
  ozoneOpticalDepth,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

describe("ozoneOpticalDepth", () => {
  it("is about 0.041 for 300 DU at the Chappuis peak (5.14e-21 cm² times 8.06e18 per cm²)", () => {
    expectAbsolute(ozoneOpticalDepth(602, 300, 293), 0.0414, 0.0008); // bands of 1 nm here, 5 nm there
  });
  it("counts a Dobson unit as 0.01 mm of gas at 0 °C and 1 atm", () => {
    // ideal gas: 101325 Pa x 1e-5 m / (k x 273.15 K) molecules per m²
    const molecules = (101325 * 1e-5) / (1.380649e-23 * 273.15);
    const expected = ozoneCrossSection(310, 240) * 312 * molecules;
    expectRelative(ozoneOpticalDepth(310, 312, 240), expected, 1e-14);
  });
  it("is nothing without ozone", () => expect(ozoneOpticalDepth(600, 0, 225)).toBe(0));
  it("refuses what lies outside", () => {
    const name = "ozoneOpticalDepth";
    expectRefusal(() => ozoneOpticalDepth(1099, 300, 225), RangeError, name, "186 to 1098 nm");
    expectRefusal(() => ozoneOpticalDepth(600, 1001, 225), RangeError, "ozoneDu", "0 to 1000 DU");
    expectRefusal(() => ozoneOpticalDepth(600, -1, 225), RangeError, "ozoneDu");
    expectRefusal(() => ozoneOpticalDepth(600, 300, 199), RangeError, "temperatureK");
    expectRefusal(() => ozoneOpticalDepth(600, "300" as never, 225), TypeError, "ozoneDu");
  });
});

describe("nitrogenDioxideOpticalDepth", () => {
  it("is 0.002 to 0.004 at 400 nm for clean columns of 2e15 to 6e15 per cm² (from memory)", () => {
    expect(nitrogenDioxideOpticalDepth(400, 2e15 / 2.6868e16, 220)).toBeGreaterThan(0.001);
    expect(nitrogenDioxideOpticalDepth(400, 6e15 / 2.6868e16, 220)).toBeLessThan(0.004);
  });
  it("is cross-section times molecules", () => {
    const molecules = (0.1 * 101325 * 1e-5) / (1.380649e-23 * 273.15);
    const expected = nitrogenDioxideCrossSection(432, 230) * molecules;
    expectRelative(nitrogenDioxideOpticalDepth(432, 0.1, 230), expected, 1e-14);
  });
  it("refuses what lies outside", () => {
    const name = "nitrogenDioxideOpticalDepth";
    expectRefusal(
      () => nitrogenDioxideOpticalDepth(661, 0.1, 220),
      RangeError,
      name,
      "280 to 660 nm",
    );
    expectRefusal(
      () => nitrogenDioxideOpticalDepth(400, 51, 220),
      RangeError,
      "columnDu",
      "0 to 50 DU",
    );
    expectRefusal(() => nitrogenDioxideOpticalDepth(400, 0.1, 299), RangeError, "temperatureK");
  });
});

describe("angstromOpticalDepth", () => {
  const haze = { opticalDepth: 0.2, referenceNm: 500, exponent: 1.3 };
  it("is the formula through logarithms", () => {
    const expected = Math.exp(Math.log(0.2) - 1.3 * (Math.log(870) - Math.log(500)));
    expectRelative(angstromOpticalDepth(870, haze), expected, 1e-14); // a few units of the last place
    expect(angstromOpticalDepth(500, haze)).toBe(0.2);
    expectRelative(angstromOpticalDepth(1000, { ...haze, exponent: 1 }), 0.1, 1e-15);
    expectRelative(angstromOpticalDepth(250, { ...haze, exponent: 2 }), 0.8, 1e-15);
  });
  it("does not care which wavelength is the reference", () => {
    fc.assert(
      fc.property(between(300, 1690), between(300, 1690), between(-1, 3), (nm, other, exponent) => {
        const first = { opticalDepth: 0.1, referenceNm: 500, exponent };
        const moved = {
          opticalDepth: angstromOpticalDepth(other, first),
          referenceNm: other,
          exponent,
        };
        expectRelative(angstromOpticalDepth(nm, moved), angstromOpticalDepth(nm, first), 1e-13);
      }),
    );
  });
  it("refuses what lies outside", () => {
    const name = "angstromOpticalDepth";
    expectRefusal(() => angstromOpticalDepth(185, haze), RangeError, name, "186 to 4000 nm");
    expectRefusal(
      () => angstromOpticalDepth(500, { ...haze, referenceNm: 0.5 }),
      RangeError,
      "aerosol.referenceNm",
      "µm?",
    );
    expectRefusal(
      () => angstromOpticalDepth(500, { ...haze, opticalDepth: -0.1 }),
      RangeError,
      "aerosol.opticalDepth",
    );
    expectRefusal(
      () => angstromOpticalDepth(500, { ...haze, exponent: 6 }),
      RangeError,
      "aerosol.exponent",
      "-2 to 5",
    );
    expectRefusal(() => angstromOpticalDepth(500, 0.2 as never), TypeError, "aerosol");
    expectRefusal(
      () => angstromOpticalDepth(500, { ...haze, exponent: undefined as never }),
      TypeError,
      "aerosol.exponent",
    );
  });
});

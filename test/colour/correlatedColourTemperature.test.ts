import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  cie1931Observer,
  correlatedColourTemperature,
  planckRadiance,
  solarIrradiance,
  spectrumToXyz,
  tabulate,
  wavelengthGrid,
  type Xyz,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRefusal } from "../_tolerance.js";
import { spectrumOf } from "../spectrum/_spectra.js";

const grid = wavelengthGrid(360, 830, 1);
const blackBody = (temperatureK: number): Xyz =>
  spectrumToXyz(
    tabulate((w) => planckRadiance(w, temperatureK), grid),
    cie1931Observer,
  );
const uv = ([x, y, z]: Xyz): [number, number] => {
  const d = x + 15 * y + 3 * z;
  return [(4 * x) / d, (6 * y) / d];
};
/** X, Y, Z with Y = 1 at a place in the CIE 1960 diagram. */
const fromUv = (u: number, v: number): Xyz => [(3 * u) / (2 * v), 1, (4 - u - 10 * v) / (2 * v)];
/** A light `duv` off the black bodies, square to their curve, whose direction comes from two near temperatures. */
function offLocus(temperatureK: number, duv: number): Xyz {
  const [u, v] = uv(blackBody(temperatureK));
  const [warm, cool] = [0.99999, 1.00001].map((f) => uv(blackBody(temperatureK * f)));
  const [du, dv] = [warm![0] - cool![0], warm![1] - cool![1]];
  const length = Math.hypot(du, dv);
  return fromUv(u - (duv * dv) / length, v + (duv * du) / length);
}

describe("published values", () => {
  const lines = referenceTable("planckian-isotherms-robertson.csv");
  const rows = lines.mired!.flatMap((mired, i) =>
    mired >= 20
      ? [[mired, lines.u_exact![i]!, lines.v_exact![i]!, lines.slope_exact![i]!] as const]
      : [],
  );
  // isotemperature lines of Robertson 1968, recomputed to nine digits with the constant of the 2019 SI
  it.each(rows)("isotemperature line at %d mired", (mired, u, v, slope) => {
    for (const duv of [-0.02, -0.005, 0, 0.005, 0.02]) {
      const along = Math.sign(slope) === -1 ? -1 : 1; // v grows along the positive side
      const du = (along * duv) / Math.sqrt(1 + slope * slope);
      const light = fromUv(u + du, v + slope * du);
      if (light[2] < 0) continue; // beyond the edge of what light can be: below 2600 K there is little room above
      const found = correlatedColourTemperature(light);
      // u, v to 5e-10 over 2.7e-4 per mired, slope to 1e-7 of a right angle times 0.02
      expectAbsolute(1e6 / found.temperatureK, mired, 1e-5 + (duv === 0 ? 0 : 2e-5));
      expectAbsolute(found.duv, duv, 2e-9);
    }
  });
  it("illuminant A 2855.5 K on today's scale, D65 0.0032 above the black bodies", () => {
    const table = referenceTable("cie-illuminants-5nm.csv");
    const of = (name: string) =>
      correlatedColourTemperature(
        spectrumToXyz(spectrumOf(table.wavelength_nm!, table[name]!), cie1931Observer),
      );
    // 2848 K at c2 = 1.4350e-2 is 2855.496 K at 1.438777e-2; the 5 nm table drawn as straight lines reads 0.13 K high
    expectAbsolute(of("A").temperatureK, 2855.496, 0.2);
    expectAbsolute(of("A").duv, 0, 1e-5);
    expectAbsolute(of("D65").temperatureK, 6503.5, 1.5); // commonly given as 6503 or 6504 K
    expectAbsolute(of("D65").duv, 0.0032, 5e-5); // common practice
  });
  it("the sun outside the air: 5925 to 5933 K", () => {
    const xyz = spectrumToXyz(tabulate(solarIrradiance, grid), cie1931Observer);
    const { temperatureK } = correlatedColourTemperature(xyz);
    expect(temperatureK).toBeGreaterThan(5925);
    expect(temperatureK).toBeLessThan(5933);
  });
});

describe("lights made from Planck's law", () => {
  it("0.01 K and 1e-7 from 1000 to 50 000 K on the curve", () => {
    for (let temperatureK = 1000; temperatureK < 50_000; temperatureK *= 1.013) {
      const found = correlatedColourTemperature(blackBody(temperatureK));
      expectAbsolute(found.temperatureK, temperatureK, 1e-6);
      expectAbsolute(found.duv, 0, 1e-12);
    }
  });
  it("and off the curve (properties)", () => {
    fc.assert(
      fc.property(
        between(Math.log(1000), Math.log(50_000)),
        between(-0.0499, 0.0499),
        (ln, duv) => {
          const temperatureK = Math.exp(ln);
          const light = offLocus(temperatureK, duv);
          fc.pre(light[2] >= 0); // no light lies beyond the spectral colours
          const found = correlatedColourTemperature(light);
          expectAbsolute(found.temperatureK, temperatureK, 0.01);
          expectAbsolute(found.duv, duv, 1e-7);
        },
      ),
    );
  });
  it("the older constant 0.014388 m K reads 0.1 K off at 6500 K", () => {
    const older = tabulate((w) => 1 / (w ** 5 * Math.expm1(0.014388e9 / (w * 6500))), grid);
    const { temperatureK } = correlatedColourTemperature(spectrumToXyz(older, cie1931Observer));
    expectAbsolute(temperatureK, (6500 * 0.014387768775) / 0.014388, 1e-3);
  });
});

describe("properties", () => {
  it("does not depend on brightness", () => {
    fc.assert(
      fc.property(between(1100, 40_000), between(1e-6, 1e6), (temperatureK, factor) => {
        const [x, y, z] = offLocus(temperatureK, -0.01);
        const one = correlatedColourTemperature([x, y, z]);
        const other = correlatedColourTemperature([factor * x, factor * y, factor * z]);
        expectAbsolute(other.temperatureK / one.temperatureK, 1, 1e-10);
      }),
      { numRuns: 30 },
    );
  });
  it("is positive on the greenish side", () => {
    const [x, y, z] = blackBody(5000);
    expect(correlatedColourTemperature([x, 1.03 * y, z]).duv).toBeGreaterThan(0.001);
    expect(correlatedColourTemperature([x, 0.97 * y, z]).duv).toBeLessThan(-0.001);
  });
});

describe("edges", () => {
  it("takes both ends of its range and refuses what lies beyond", () => {
    expectAbsolute(correlatedColourTemperature(blackBody(1000)).temperatureK, 1000, 0.01);
    expectAbsolute(correlatedColourTemperature(blackBody(50_000)).temperatureK, 50_000, 0.01);
    for (const temperatureK of [950, 999, 999.98, 50_000.05, 50_100, 80_000, 1e6]) {
      expectRefusal(
        () => correlatedColourTemperature(blackBody(temperatureK)),
        RangeError,
        "1000 to 50000 K",
        "chromaticity 0.",
      );
    }
    expectAbsolute(correlatedColourTemperature(offLocus(4000, 0.04999)).duv, 0.04999, 1e-7);
    expectAbsolute(correlatedColourTemperature(offLocus(4000, -0.04999)).duv, -0.04999, 1e-7);
    expectRefusal(() => correlatedColourTemperature(offLocus(4000, 0.05003)), RangeError, "0.05");
    expectRefusal(() => correlatedColourTemperature(offLocus(4000, -0.05003)), RangeError, "0.05");
  });
  it.each([
    ["deep blue", 0.15, 0.05],
    ["green", 0.2, 0.7],
    ["deep red", 0.73, 0.27],
    ["purple", 0.3, 0.1],
    ["bluer than any black body", 0.22, 0.22],
  ])("refuses %s", (_name, x, y) => {
    expectRefusal(() => correlatedColourTemperature([x / y, 1, (1 - x - y) / y]), RangeError);
  });
  it("refuses bad input", () => {
    expectRefusal(() => correlatedColourTemperature([0, 0, 0]), RangeError, "xyz", "0, 0, 0");
    expectRefusal(() => correlatedColourTemperature([Number.NaN, 1, 1]), RangeError, "NaN");
    expectRefusal(() => correlatedColourTemperature([1, Number.POSITIVE_INFINITY, 1]), RangeError);
    for (const xyz of [
      [-1e-9, 1, 1],
      [1, 1, -1e-9],
      [1, 0, 1],
      [1, 1, Number.POSITIVE_INFINITY],
    ] as const)
      expectRefusal(() => correlatedColourTemperature(xyz), RangeError, "must be a colour");
    const green = [0.25, 0.5, 0.25] as const;
    expectRefusal(() => correlatedColourTemperature(green), RangeError, "chromaticity 0.25, 0.5");
    const yellow = [0, 0.75, 0] as const; // no light, but a colour: it is its distance that is refused
    expectRefusal(() => correlatedColourTemperature(yellow), RangeError, "chromaticity 0, 1");
    expectRefusal(() => correlatedColourTemperature([1, 1] as never), RangeError, "3");
    expectRefusal(() => correlatedColourTemperature("D65" as never), TypeError, "xyz");
  });
});

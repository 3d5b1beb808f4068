import Color from "colorjs.io";
import { converter } from "culori";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  cie1931Observer,
  decodeSrgb,
  encodeSrgb,
  fitToDisplay,
  linearSrgbToXyz,
  type Rgb,
  solarIrradiance,
  spectrumToXyz,
  srgbHex,
  tabulate,
  wavelengthGrid,
  type Xyz,
  xyzToLinearSrgb,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const triple = (low: number, high: number): fc.Arbitrary<[number, number, number]> =>
  fc.tuple(between(low, high), between(low, high), between(low, high));
const near = (actual: readonly number[], expected: readonly number[], tolerance: number): void => {
  expect(actual).toHaveLength(3);
  actual.forEach((v, i) => {
    expectAbsolute(v, expected[i]!, tolerance);
  });
};
const culoriLinear = converter("lrgb");
const culoriEncoded = converter("rgb");
const culoriXyz = converter("xyz65");
const parts = ({ r, g, b }: Record<string, number>): number[] => [r!, g!, b!];
const colorjs = (from: string, to: string, coords: readonly number[]): number[] =>
  new Color(from, coords as Rgb).to(to).coords.map(Number);

describe("published values", () => {
  it("the matrix printed to four decimals in IEC 61966-2-1", () => {
    near(xyzToLinearSrgb([1, 0, 0]), [3.2406, -0.9689, 0.0557], 3.8e-4); // their print differs by up to 3.7e-4
    near(xyzToLinearSrgb([0, 1, 0]), [-1.5372, 1.8758, -0.204], 3.8e-4);
    near(xyzToLinearSrgb([0, 0, 1]), [-0.4986, 0.0415, 1.057], 3.8e-4);
    near(linearSrgbToXyz([1, 0, 0]), [0.4124, 0.2126, 0.0193], 5e-5); // printed to 1e-4
    near(linearSrgbToXyz([0, 1, 0]), [0.3576, 0.7152, 0.1192], 5e-5);
    near(linearSrgbToXyz([0, 0, 1]), [0.1805, 0.0722, 0.9505], 5e-5);
  });
  it("primaries and white: the chromaticities that define them", () => {
    const corners: [Rgb, number, number][] = [
      [[1, 0, 0], 0.64, 0.33],
      [[0, 1, 0], 0.3, 0.6],
      [[0, 0, 1], 0.15, 0.06],
      [[1, 1, 1], 0.3127, 0.329],
    ];
    for (const [rgb, x, y] of corners) {
      const xyz = linearSrgbToXyz(rgb);
      const sum = xyz[0] + xyz[1] + xyz[2];
      expectRelative(xyz[0] / sum, x, 1e-15);
      expectRelative(xyz[1] / sum, y, 1e-15);
    }
    expectAbsolute(linearSrgbToXyz([1, 1, 1])[1], 1, 2e-16);
  });
  it("both ends of the curve", () => {
    near(encodeSrgb([0, 1, -1]), [0, 1, -1], 2e-16);
    near(decodeSrgb([0, 1, -1]), [0, 1, -1], 2e-16);
    near(
      encodeSrgb([0.0031308, 0.0031308, 0.0031308]),
      [0.040449936, 0.040449936, 0.040449936],
      1e-15,
    );
  });
});

describe("independent fixtures: culori and colorjs.io", () => {
  it("XYZ to linear and encoded sRGB and back, 1e-12", () => {
    fc.assert(
      fc.property(triple(-0.5, 2), (xyz) => {
        const [x, y, z] = xyz;
        const linear = xyzToLinearSrgb(xyz);
        near(linear, parts(culoriLinear({ mode: "xyz65", x, y, z })), 1e-12);
        near(linear, colorjs("xyz-d65", "srgb-linear", xyz), 1e-12);
        near(encodeSrgb(linear), parts(culoriEncoded({ mode: "xyz65", x, y, z })), 1e-12);
        near(encodeSrgb(linear), colorjs("xyz-d65", "srgb", xyz), 1e-12);
      }),
    );
    fc.assert(
      fc.property(triple(-0.5, 1.5), (encoded) => {
        const [r, g, b] = encoded;
        const linear = decodeSrgb(encoded);
        near(linear, parts(culoriLinear({ mode: "rgb", r, g, b })), 1e-12);
        near(linear, colorjs("srgb", "srgb-linear", encoded), 1e-12);
        const { x, y, z } = culoriXyz({ mode: "rgb", r, g, b });
        near(linearSrgbToXyz(linear), [x!, y!, z!], 1e-12);
        near(linearSrgbToXyz(linear), colorjs("srgb", "xyz-d65", encoded), 1e-12);
      }),
    );
  });
  it("takes the same branch close to both joints", () => {
    for (const c of [
      0.0031307, 0.0031308, 0.0031309, 0.003132, 0.0404499, 0.04045, 0.0404501, 0.0405,
    ]) {
      const grey: Rgb = [c, -c, c];
      near(encodeSrgb(grey), colorjs("srgb-linear", "srgb", grey), 1e-15);
      near(decodeSrgb(grey), colorjs("srgb", "srgb-linear", grey), 1e-15);
    }
  });
  it("[X, Y, Z] of sunlight goes into either library for any other space: Oklab, 1e-12 apart", () => {
    const [X, Y, Z] = spectrumToXyz(
      tabulate(solarIrradiance, wavelengthGrid(360, 830, 1)),
      cie1931Observer,
    );
    const relative: Xyz = [X / Y, 1, Z / Y];
    const { l, a, b } = converter("oklab")({
      mode: "xyz65",
      x: relative[0],
      y: relative[1],
      z: relative[2],
    });
    near([l!, a!, b!], colorjs("xyz-d65", "oklab", relative), 1e-12);
    expect(b).toBeGreaterThan(0); // sunlight is yellower than the display's white
  });
});

describe("properties", () => {
  it("there and back", () => {
    fc.assert(
      fc.property(triple(-2, 2), (three) => {
        near(xyzToLinearSrgb(linearSrgbToXyz(three)), three, 1e-14);
        near(linearSrgbToXyz(xyzToLinearSrgb(three)), three, 1e-14);
        // the two thresholds of the standard leave 3e-8 between the branches
        near(decodeSrgb(encodeSrgb(three)), three, 3.1e-8);
        near(encodeSrgb(decodeSrgb(three)), three, 3.1e-8 * 12.92);
      }),
    );
    fc.assert(
      fc.property(triple(-0.0031, 0.0031), (dark) => {
        near(decodeSrgb(encodeSrgb(dark)), dark, 1e-14);
      }),
    );
    fc.assert(
      fc.property(triple(0.0032, 4), (bright) => {
        near(decodeSrgb(encodeSrgb(bright)), bright, 1e-14);
        near(
          encodeSrgb(bright.map((v) => -v) as Rgb),
          encodeSrgb(bright).map((v) => -v),
          0,
        );
        near(
          decodeSrgb(bright.map((v) => -v) as Rgb),
          decodeSrgb(bright).map((v) => -v),
          0,
        );
      }),
    );
  });
  it("the matrix times its inverse is the identity to 1e-14", () => {
    for (let i = 0; i < 3; i++) {
      const unit: Xyz = [0, 0, 0];
      unit[i] = 1;
      near(linearSrgbToXyz(xyzToLinearSrgb(unit)), unit, 1e-14);
      near(xyzToLinearSrgb(linearSrgbToXyz(unit)), unit, 1e-14);
    }
  });
  it("the curve rises, and 0 to 1 stays within 0 to 1", () => {
    fc.assert(
      fc.property(between(0, 1), (c) => {
        const [here, above] = encodeSrgb([c, c + 1e-6, 0]);
        expect(here).toBeGreaterThanOrEqual(0);
        expect(here).toBeLessThanOrEqual(1);
        expect(above).toBeGreaterThan(here);
      }),
    );
  });
  it("both sides of the joints", () => {
    const [below, above] = encodeSrgb([0.0031308, 0.0031308000001, 0]);
    expectAbsolute(below, above, 4e-8); // 12.92 × 3e-9 and the gap of the standard
    const [low, high] = decodeSrgb([0.04045, 0.0404500001, 0]);
    expectAbsolute(low, high, 4e-9);
  });
});

describe("fitToDisplay", () => {
  const luminance = (rgb: Rgb): number => linearSrgbToXyz(rgb)[1];
  it("leaves displayable colours as they are, to the last bit", () => {
    fc.assert(
      fc.property(triple(0, 1), (rgb) => {
        expect(fitToDisplay(rgb)).toEqual(rgb);
      }),
    );
  });
  it("brings any light in, keeps its luminance unless it is too bright, and its hue", () => {
    fc.assert(
      fc.property(triple(-1, 3), (rgb) => {
        const grey = luminance(rgb);
        fc.pre(grey >= 1e-3);
        const shown = fitToDisplay(rgb);
        for (const part of shown) {
          expect(part).toBeGreaterThanOrEqual(0);
          expect(part).toBeLessThanOrEqual(1);
        }
        const most = Math.max(...shown);
        if (most < 1) expectRelative(luminance(shown), grey, 1e-13);
        else expect(luminance(shown)).toBeLessThanOrEqual(grey * (1 + 1e-13));
        // what is left of the colour points the same way from grey: cross product of the differences
        const [a, b] = [rgb, shown].map((c) => [c[0]! - c[1]!, c[1]! - c[2]!]);
        expectAbsolute(a![0]! * b![1]! - a![1]! * b![0]!, 0, 1e-13);
        if (Math.min(...rgb) < 0) expectAbsolute(Math.min(...shown), 0, 1e-15);
        else if (Math.max(...rgb) > 1) expectAbsolute(most, 1, 1e-15);
      }),
    );
  });
  it("takes brightness away from a light a display is too weak for, all parts alike", () => {
    for (const rgb of [
      [1.5, 0.0005, 0.5],
      [0.2, 1.0005, 0],
    ] as const) {
      const most = Math.max(...rgb);
      fitToDisplay(rgb).forEach((part, i) => {
        expectAbsolute(part, rgb[i]! / most, 1e-15);
      });
    }
  });
  it("shows black as black, passes NaN on, and refuses bad input", () => {
    expect(fitToDisplay([0, 0, 0])).toEqual([0, 0, 0]);
    expect(fitToDisplay([Number.NaN, 0.5, 0.5])).toEqual([Number.NaN, Number.NaN, Number.NaN]);
    expectRefusal(() => fitToDisplay([-1, -1, -1]), RangeError, "luminance 0 or more", "got -");
    expectRefusal(() => fitToDisplay([1, 1] as never), RangeError, "linear");
  });
});

describe("srgbHex", () => {
  it("rounds to 8 bits", () => {
    expect(srgbHex([0, 0.5, 1])).toBe("#0080ff");
    expect(srgbHex([0.0019, 0.002, 254.4 / 255])).toBe("#0001fe");
    expect(srgbHex([-0, 0.06, 0.04])).toBe("#000f0a");
  });
  it("agrees with a straight division for all 256 steps", () => {
    for (let i = 0; i < 256; i++) {
      expect(Number.parseInt(srgbHex([i / 255, 0, 0]).slice(1, 3), 16)).toBe(i);
      expect(Number.parseInt(srgbHex([0, 0, i / 255]).slice(5), 16)).toBe(i);
    }
  });
  it("refuses what a display cannot show", () => {
    expectRefusal(() => srgbHex([1.01, 0, 0]), RangeError, "encoded[0]", "0 to 1", "1.01");
    expectRefusal(() => srgbHex([0, -0.01, 0]), RangeError, "encoded[1]");
    expectRefusal(() => srgbHex([0, 0, Number.NaN]), RangeError, "encoded[2]", "NaN");
    expectRefusal(() => srgbHex([255, 128, 0]), RangeError, "255");
  });
});

describe("bad input and NaN", () => {
  it.each([
    ["xyzToLinearSrgb", xyzToLinearSrgb, "xyz"],
    ["linearSrgbToXyz", linearSrgbToXyz, "linear"],
    ["encodeSrgb", encodeSrgb, "linear"],
    ["decodeSrgb", decodeSrgb, "encoded"],
    ["fitToDisplay", fitToDisplay, "linear"],
    ["srgbHex", srgbHex, "encoded"],
  ] as [string, (three: Rgb) => unknown, string][])("%s", (name, call, argument) => {
    expectRefusal(() => call(undefined as never), TypeError, name, argument);
    expectRefusal(() => call([1, 2] as never), RangeError, name, argument, "got 2");
    expectRefusal(() => call([0, 0, 0, 0] as never), RangeError, name, argument, "got 4");
    for (const i of [0, 1, 2]) {
      const three = [0, 1, 2].map((j) => (i === j ? "1" : 0));
      expectRefusal(() => call(three as never), TypeError, name, `${argument}[${i}]`);
    }
  });
  it("NaN keeps to its place where places are apart", () => {
    expect(encodeSrgb([Number.NaN, 1, 0])[0]).toBeNaN();
    expect(encodeSrgb([Number.NaN, 1, 0])[2]).toBe(0);
    expect(decodeSrgb([0, Number.NaN, 0])[1]).toBeNaN();
    expect(xyzToLinearSrgb([Number.NaN, 1, 1])[0]).toBeNaN();
  });
});

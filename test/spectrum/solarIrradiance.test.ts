import { describe, expect, it } from "vitest";
import { integrateSpectrum, solarIrradiance, tabulate, wavelengthGrid } from "../../src/index.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { spectrumOf } from "./_spectra.js";

const bands = referenceTable("solar-band-means.csv");
const { from_nm, to_nm, recommended } = bands as Record<string, number[]>;

/** Mean over a band: Gauss-Legendre with three points, exact for a parabola. */
function meanOver(from: number, to: number): number {
  const [middle, half] = [(from + to) / 2, ((to - from) / 2) * Math.sqrt(0.6)];
  const ends = solarIrradiance(middle - half) + solarIrradiance(middle + half);
  return (5 * ends + 8 * solarIrradiance(middle)) / 18;
}

describe("published values", () => {
  it("keeps the mean of each of the 234 bands", () => {
    expect(from_nm).toHaveLength(234);
    from_nm!.forEach((from, i) => {
      expectRelative(meanOver(from, to_nm![i]!), recommended![i]!, 1e-12);
    });
  });
  it("gives 1342.75 W m⁻² from 280 to 4000 nm", () => {
    const sum = from_nm!.reduce(
      (w, from, i) => w + meanOver(from, to_nm![i]!) * (to_nm![i]! - from),
      0,
    );
    expectAbsolute(sum, 1342.75, 0.005); // half of the last digit printed in the table's header
    // the whole Sun: ASTM E490 scaled has 6.70 below 280 nm and 11.70 above 4000 nm
    expectAbsolute(sum + 6.7 + 11.7, 1361, 0.2); // G173 and E490 differ by 0.31 in this range
  });
});

describe("independent fixtures", () => {
  const sun = tabulate(solarIrradiance, wavelengthGrid(280, 4000, 0.5));
  // Bands that do not share the edges of the embedded ones. The last number is the largest relative difference allowed:
  // half of what lies between the two standards (up to 4.7 % per band below 400 nm, 3.7 % to 900 nm, 3.6 % beyond 2500 nm),
  // and what lines next to a shifted edge add
  it.each([
    ["solar-extraterrestrial-astm-g173.csv", 283, 383, 20, 0.035],
    ["solar-extraterrestrial-astm-g173.csv", 403, 903, 20, 0.007],
    ["solar-extraterrestrial-astm-g173.csv", 907, 2407, 50, 0.007],
    ["solar-extraterrestrial-astm-e490.csv", 283, 383, 20, 0.035],
    ["solar-extraterrestrial-astm-e490.csv", 403, 903, 20, 0.011],
    ["solar-extraterrestrial-astm-e490.csv", 907, 2407, 50, 0.007],
    ["solar-extraterrestrial-astm-e490.csv", 2450, 3950, 250, 0.018],
  ])("band sums of %s from %d to %d nm in steps of %d", (file, start, stop, width, most) => {
    const { wavelength_nm, irradiance_W_m2_nm } = referenceTable(file);
    const scaled = irradiance_W_m2_nm!.map((e) => (e * 1361) / 1366.1);
    const standard = spectrumOf(wavelength_nm!, scaled);
    for (let from = start; from + width <= stop; from += width) {
      const expected = integrateSpectrum(standard, from, from + width);
      expectRelative(integrateSpectrum(sun, from, from + width), expected, most);
    }
  });
});

describe("properties", () => {
  it("is positive everywhere and continuous, at band edges and where the width changes", () => {
    for (let wavelengthNm = 280; wavelengthNm <= 4000; wavelengthNm += 0.25) {
      expect(solarIrradiance(wavelengthNm)).toBeGreaterThan(0.005);
    }
    for (const edge of [...from_nm!.slice(1), 1000, 2500]) {
      expectAbsolute(solarIrradiance(edge - 1e-10), solarIrradiance(edge), 1e-10);
    }
  });
  it("is not shifted by half a nanometre: a mean keeps its centre", () => {
    // over the smooth infrared the curve follows the straight line through neighbouring means
    for (const edge of [1220, 1600, 2200]) {
      const i = from_nm!.indexOf(edge);
      expectRelative(solarIrradiance(edge), (recommended![i - 1]! + recommended![i]!) / 2, 1e-12);
    }
    // where the width changes, the line through the centres: 2.5 and 10 nm, 10 and 50 nm from the edge
    const line = (below: number, above: number, at: number): number => {
      const i = from_nm!.indexOf(at);
      return (above * recommended![i - 1]! + below * recommended![i]!) / (above + below);
    };
    expectRelative(solarIrradiance(1000), line(2.5, 10, 1000), 1e-12);
    expectRelative(solarIrradiance(2500), line(10, 50, 2500), 1e-12);
  });
});

describe("shape", () => {
  it("is one parabola in each band, from edge to edge", () => {
    from_nm!.forEach((from, i) => {
      const width = to_nm![i]! - from;
      const [a, b, c] = [0.25, 0.5, 0.75].map((t) => solarIrradiance(from + t * width));
      for (const t of [1e-3, 0.02, 0.98, 0.999]) {
        const [p, q, r] = [
          8 * (t - 0.5) * (t - 0.75),
          -16 * (t - 0.25) * (t - 0.75),
          8 * (t - 0.25) * (t - 0.5),
        ];
        expectRelative(solarIrradiance(from + t * width), p * a! + q * b! + r * c!, 1e-11);
      }
    });
  });
});

describe("edges", () => {
  it("takes both ends and refuses what lies beyond", () => {
    expectRelative(solarIrradiance(280), (3 * recommended![0]! - recommended![1]!) / 2, 1e-12);
    expectRelative(solarIrradiance(4000), (3 * recommended![233]! - recommended![232]!) / 2, 1e-12);
    expectRefusal(() => solarIrradiance(279.9), RangeError, "280 to 4000 nm", "279.9");
    expectRefusal(() => solarIrradiance(4000.1), RangeError, "4000.1");
    expectRefusal(() => solarIrradiance(0.5), RangeError, "µm? multiply by 1000");
    expectRefusal(() => solarIrradiance(Number.NaN), RangeError, "NaN");
    expectRefusal(() => solarIrradiance("500" as never), TypeError, '"500"');
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  bandMean,
  gaussianPassband,
  integrateSpectrum,
  resampleSpectrum,
  tabulate,
  wavelengthGrid,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { anySpectrum, endsOf, hatSum, spectrumOf } from "./_spectra.js";

const roof = spectrumOf([400, 500, 700], [0, 1, 0]);

describe("integrateSpectrum", () => {
  it("gives areas that can be read off a drawing", () => {
    expect(integrateSpectrum(roof, 400, 700)).toBe(150);
    expect(integrateSpectrum(roof, 400, 500)).toBe(50);
    expect(integrateSpectrum(roof, 450, 600)).toBe(37.5 + 75);
    expect(integrateSpectrum(roof, 420, 440)).toBeCloseTo(6, 13);
    expect(integrateSpectrum(roof, 500, 500)).toBe(0);
    expect(integrateSpectrum(roof, 700, 700)).toBe(0);
  });
  it("adds up over neighbouring intervals (properties)", () => {
    fc.assert(
      fc.property(anySpectrum, between(0, 1), between(0, 1), (spectrum, a, b) => {
        const [first, last] = endsOf(spectrum);
        const [low, high] = [Math.min(a, b), Math.max(a, b)].map((t) => first + (last - first) * t);
        const whole = integrateSpectrum(spectrum, first, last);
        const parts =
          integrateSpectrum(spectrum, first, low!) +
          integrateSpectrum(spectrum, low!, high!) +
          integrateSpectrum(spectrum, high!, last);
        expectRelative(parts, whole, 1e-13); // rounding of some 60 additions
      }),
    );
  });
  it("agrees with ten thousand midpoints of hat functions", () => {
    fc.assert(
      fc.property(anySpectrum, between(0, 0.4), between(0.6, 1), (spectrum, a, b) => {
        const [first, last] = endsOf(spectrum);
        const [low, high] = [first + (last - first) * a, first + (last - first) * b];
        let sum = 0;
        for (let i = 0; i < 10_000; i++)
          sum += hatSum(spectrum, low + ((high - low) * (i + 0.5)) / 1e4);
        // the midpoint rule errs only in cells with a corner, by at most an eighth of the change of slope times the cell squared
        const { wavelengthsNm: w, values: v } = spectrum;
        const slopes = Array.from(v.slice(1), (y, i) => (y - v[i]!) / (w[i + 1]! - w[i]!));
        const bends = slopes.slice(1).reduce((all, s, i) => all + Math.abs(s - slopes[i]!), 0);
        const cell = (high - low) / 1e4;
        const midpoints = sum * cell;
        const most = (bends * cell * cell) / 8 + 1e-12 * Math.abs(midpoints);
        expectAbsolute(integrateSpectrum(spectrum, low, high), midpoints, most);
      }),
      { numRuns: 20 },
    );
  });
  it("gives NaN only where a NaN is touched", () => {
    const holed = spectrumOf([400, 500, 600, 700], [1, 1, Number.NaN, 1]);
    expect(integrateSpectrum(holed, 400, 500)).toBe(100);
    expect(integrateSpectrum(holed, 400, 501)).toBeNaN();
    expect(integrateSpectrum(holed, 650, 700)).toBeNaN();
  });
  it("takes any wavelength above zero", () => {
    const short = spectrumOf([0.0005, 1], [2, 2]);
    expectRelative(integrateSpectrum(short, 0.0005, 1), 1.999, 1e-15);
  });
  it("refuses bad input", () => {
    expectRefusal(
      () => integrateSpectrum(spectrumOf([0, 500], [1, 1]), 400, 500),
      RangeError,
      "spectrum.wavelengthsNm[0]",
      "above 0 nm",
    );
    expectRefusal(
      () => integrateSpectrum(roof, 399, 500),
      RangeError,
      "399 to 500 nm",
      "400 to 700",
    );
    expectRefusal(() => integrateSpectrum(roof, 400, 701), RangeError, "701");
    expectRefusal(() => integrateSpectrum(roof, 500, 400), RangeError, "toNm", "400");
    expectRefusal(() => integrateSpectrum(roof, Number.NaN, 500), RangeError, "fromNm", "NaN");
    expectRefusal(() => integrateSpectrum(roof, 400, "700" as never), TypeError, "toNm");
    expectRefusal(() => integrateSpectrum(undefined as never, 1, 2), TypeError, "spectrum");
    expectRefusal(() => integrateSpectrum({} as never, 1, 2), TypeError, "spectrum.wavelengthsNm");
    expectRefusal(
      () => integrateSpectrum({ wavelengthsNm: Float64Array.of(1, 2) } as never, 1, 2),
      TypeError,
      "spectrum.values",
    );
    expectRefusal(
      () => integrateSpectrum(spectrumOf([400, 500], [1, 2, 3]), 400, 500),
      RangeError,
      "as many as its wavelengths (2), got 3",
    );
    expectRefusal(
      () => integrateSpectrum(spectrumOf([500, 400], [1, 2]), 400, 500),
      RangeError,
      "spectrum.wavelengthsNm[1]",
    );
    expectRefusal(
      () => integrateSpectrum(spectrumOf([400], [1]), 400, 400),
      RangeError,
      "at least 2",
    );
  });
});

describe("resampleSpectrum", () => {
  it("draws straight lines and keeps samples to the last bit", () => {
    const odd = spectrumOf([400, 500, 700], [0.1, 0.7, 0.3]);
    const same = resampleSpectrum(odd, [400, 500, 700]);
    expect([...same.values]).toEqual([0.1, 0.7, 0.3]);
    expect([...resampleSpectrum(roof, [450, 500, 650, 700]).values]).toEqual([0.5, 1, 0.25, 0]);
  });
  it("agrees with a sum of hat functions (properties)", () => {
    fc.assert(
      fc.property(
        anySpectrum,
        fc.array(between(0, 1), { minLength: 1, maxLength: 9 }),
        (spectrum, places) => {
          const [first, last] = endsOf(spectrum);
          const grid = [...new Set(places)]
            .sort((a, b) => a - b)
            .map((t) => Math.min(first + (last - first) * t, last));
          const rising = grid.filter((w, i) => i === 0 || w > grid[i - 1]!);
          const { values } = resampleSpectrum(spectrum, rising);
          for (let i = 0; i < rising.length; i++) {
            // (λ - λ0) / gap loses at most 1e-13 nm of 0.1 nm between neighbours
            expectAbsolute(values[i]!, hatSum(spectrum, rising[i]!), 4e-12);
          }
        },
      ),
    );
  });
  it("is 1e-15 exact on a line", () => {
    const line = spectrumOf([400, 800], [4, 8]);
    for (const w of wavelengthGrid(400, 800, 7)) {
      expectRelative(resampleSpectrum(line, [w]).values[0]!, w / 100, 1e-15);
    }
  });
  it("keeps a NaN to its own place and the lines that end there", () => {
    const holed = spectrumOf([400, 500, 600, 700], [1, 2, Number.NaN, 3]);
    const { values } = resampleSpectrum(holed, [400, 500, 550, 600, 650, 700]);
    expect([...values]).toEqual([1, 2, Number.NaN, Number.NaN, Number.NaN, 3]);
  });
  it("refuses to extrapolate and refuses bad input", () => {
    expectRefusal(() => resampleSpectrum(roof, [399, 500]), RangeError, "cover 399 to 500 nm");
    expectRefusal(() => resampleSpectrum(roof, [500, 700.1]), RangeError, "700.1");
    expectRefusal(() => resampleSpectrum(roof, [500, 500]), RangeError, "wavelengthsNm[1]");
    expectRefusal(() => resampleSpectrum(roof, []), RangeError, "at least 1");
    expectRefusal(() => resampleSpectrum(null as never, [500]), TypeError, "spectrum");
  });
});

describe("bandMean", () => {
  it("gives means that can be worked out by hand", () => {
    const line = spectrumOf([300, 900], [300, 900]);
    // the mean of λ is the centre of gravity of the passband: a triangle's is the mean of its corners
    expectRelative(bandMean(line, roof), (400 + 500 + 700) / 3, 1e-14);
    expectRelative(bandMean(line, spectrumOf([410, 420], [7, 7])), 415, 1e-14);
    // roof times roof: a third of the width times the peak's square, over half of the width times the peak
    expectRelative(bandMean(roof, roof), 2 / 3, 1e-14);
  });
  it("does not depend on the height of the passband, and a flat spectrum keeps its value (properties)", () => {
    fc.assert(
      fc.property(anySpectrum, between(0.01, 50), (passband, height) => {
        const [first, last] = endsOf(passband);
        const flat = spectrumOf([first, (first + last) / 2, last], [3, 3, 3]);
        expectRelative(bandMean(flat, passband), 3, 1e-13);
        const taller = { ...passband, values: passband.values.map((v) => v * height) };
        const slope = spectrumOf([first, last], [1, 2]);
        expectRelative(bandMean(slope, taller), bandMean(slope, passband), 1e-13);
      }),
    );
  });
  it("agrees with a fine midpoint sum of products of hat functions (independent)", () => {
    fc.assert(
      fc.property(anySpectrum, anySpectrum, (spectrum, passband) => {
        const [first, last] = endsOf(passband);
        const wide = spectrumOf(
          [1, ...spectrum.wavelengthsNm, 3000],
          [0.5, ...spectrum.values, 0.7],
        );
        let [sum, area] = [0, 0];
        for (let i = 0; i < 4000; i++) {
          const w = first + ((last - first) * (i + 0.5)) / 4000;
          sum += hatSum(wide, w) * hatSum(passband, w);
          area += hatSum(passband, w);
        }
        expectRelative(bandMean(wide, passband), sum / area, 1e-4); // midpoint rule at corners
      }),
      { numRuns: 30 },
    );
  });
  it("takes a passband with a gap in its middle, to both its ends", () => {
    const line = spectrumOf([400, 600], [4, 6]);
    // each half is a triangle: its mean lies a third of 100 nm from the end
    expectRelative(
      bandMean(line, spectrumOf([400, 500, 600], [3, 0, 1])),
      (3 * (4 + 1 / 3) + 6 - 1 / 3) / 4,
      1e-14,
    );
  });
  it("takes a passband however narrow", () => {
    const line = spectrumOf([400, 700], [4, 7]);
    expectRelative(
      bandMean(line, spectrumOf([500, 500.00005, 500.0001], [0, 1, 0])),
      5.0000005,
      1e-12,
    );
  });
  it("needs the spectrum only where the passband is not zero", () => {
    const padded = spectrumOf([300, 350, 400, 500, 700, 800, 900], [0, 0, 0, 1, 0, 0, 0]);
    const line = spectrumOf([400, 700], [400, 700]);
    expectRelative(bandMean(line, padded), 1600 / 3, 1e-14);
    const short = spectrumOf([401, 700], [400, 700]);
    expectRefusal(() => bandMean(short, padded), RangeError, "cover 400 to 700 nm", "401");
  });
  it("passes a NaN of the spectrum on if the passband sees it, and refuses passbands without area", () => {
    const holed = spectrumOf([300, 350, 400, 900], [1, Number.NaN, 1, 1]);
    expect(bandMean(holed, roof)).toBe(1);
    expect(bandMean(holed, spectrumOf([390, 500], [1, 1]))).toBeNaN();
    const flat = spectrumOf([300, 900], [1, 1]);
    expectRefusal(
      () => bandMean(flat, spectrumOf([400, 500], [0, 0])),
      RangeError,
      "positive area",
    );
    expectRefusal(() => bandMean(flat, spectrumOf([400, 500], [1, -2])), RangeError, "-50 nm");
    expectRefusal(
      () => bandMean(flat, spectrumOf([400, 500, 600], [1, Number.NaN, 1])),
      RangeError,
      "positive area, got NaN",
    );
    expectRefusal(() => bandMean(flat, 500 as never), TypeError, "passband");
    expectRefusal(() => bandMean(500 as never, roof), TypeError, "spectrum");
  });
});

describe("gaussianPassband", () => {
  it("is one half at half the width and follows the definition", () => {
    const channel = gaussianPassband(870, 12);
    expect(channel.values[125]).toBe(1);
    expect(channel.wavelengthsNm[125]).toBe(870);
    expectRelative(channel.values[100]!, 0.5, 1e-15);
    expectRelative(channel.values[150]!, 0.5, 1e-15);
    channel.wavelengthsNm.forEach((w, i) => {
      const sigma = 12 / (2 * Math.sqrt(2 * Math.log(2)));
      expectRelative(channel.values[i]!, Math.exp(-(((w - 870) / sigma) ** 2) / 2), 1e-13);
    });
    expect(channel.values[0]).toBeLessThan(3e-8);
    expectAbsolute(channel.wavelengthsNm[0]!, 870 - 30, 1e-12);
  });
  it("has the mean and nearly the variance of the true bell", () => {
    fc.assert(
      fc.property(between(300, 2000), between(0.5, 80), (centre, width) => {
        const channel = gaussianPassband(centre, width);
        const grid = wavelengthGrid(centre - 3 * width, centre + 3 * width, width / 400);
        expectAbsolute(
          bandMean(
            tabulate((w) => w - centre, grid),
            channel,
          ),
          0,
          1e-11,
        );
        const variance = bandMean(
          tabulate((w) => (w - centre) ** 2, grid),
          channel,
        );
        const excess = (variance * 8 * Math.log(2)) / (width * width) - 1;
        expect(excess).toBeGreaterThan(0);
        expect(excess).toBeLessThan(4.1e-4); // (width / 50)² / 6 over width² / (8 ln 2) = 3.7e-4, and the grid's own 6e-6
      }),
      { numRuns: 20 },
    );
  });
  it("refuses bad input", () => {
    expectRefusal(() => gaussianPassband(0.5, 10), RangeError, "centreNm", "µm?");
    expectRefusal(() => gaussianPassband(500, 0), RangeError, "fullWidthHalfMaximumNm");
    expectRefusal(() => gaussianPassband(500, 200), RangeError, "166.6");
    expectRefusal(() => gaussianPassband(500, Number.NaN), RangeError, "NaN");
    expectRefusal(() => gaussianPassband("500" as never, 10), TypeError, "centreNm");
    expect(gaussianPassband(300, 100).wavelengthsNm[0]).toBe(50);
  });
});

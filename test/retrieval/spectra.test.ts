import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { propagate, resampleSpectrum, resampleWithCovariance } from "../../src/index.js";
import { between } from "../_generators.js";
import { randomOf } from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const wavelengthsNm = Float64Array.of(400, 410, 425, 450);
const values = Float64Array.of(1, 1.4, 1.1, 2);
const u = [0.1, 0.2, 0.15, 0.3];
const covariance = Float64Array.from({ length: 16 }, (_, k) => {
  const [i, j] = [Math.floor(k / 4), k % 4];
  return u[i]! * u[j]! * (i === j ? 1 : 0.4);
});
const spectrum = { wavelengthsNm, values, covariance };
const targets = [400, 403, 410, 420, 424, 449];

describe("resampleWithCovariance: independent fixtures", () => {
  it("is the whole matrix product, weights by hand", () => {
    const weights = [
      [1, 0, 0, 0],
      [0.7, 0.3, 0, 0],
      [0, 1, 0, 0],
      [0, 1 / 3, 2 / 3, 0],
      [0, 1 / 15, 14 / 15, 0],
      [0, 0, 0.04, 0.96],
    ];
    const result = resampleWithCovariance(spectrum, targets);
    weights.forEach((row, k) => {
      expectRelative(
        result.values[k]!,
        row.reduce((sum, w, i) => sum + w * values[i]!, 0),
        1e-14,
      );
      weights.forEach((other, l) => {
        const expected = row.reduce(
          (sum, w, i) => sum + other.reduce((s, v, j) => s + w * v * covariance[i * 4 + j]!, 0),
          0,
        );
        expectRelative(result.covariance[k * 6 + l]!, expected, 1e-14);
      });
    });
  });
  it("is the law of propagation at one wavelength", () => {
    const law = propagate(
      ({ a, b }) => 0.7 * a + 0.3 * b,
      {
        a: { value: 1, standardUncertainty: 0.1 },
        b: { value: 1.4, standardUncertainty: 0.2 },
      },
      { correlations: [{ between: ["a", "b"], coefficient: 0.4 }] },
    );
    const { covariance: found } = resampleWithCovariance(spectrum, [403]);
    expectRelative(Math.sqrt(found[0]!), law.standardUncertainty, 1e-9);
  });
  it("states the spread of 4000 simulated spectra", () => {
    const { normal } = randomOf(12);
    const found: number[][] = [];
    for (let trial = 0; trial < 4000; trial++) {
      const common = normal();
      const drawn = values.map(
        (v, i) => v + u[i]! * (Math.sqrt(0.4) * common + Math.sqrt(0.6) * normal()),
      );
      found.push(Array.from(resampleSpectrum({ wavelengthsNm, values: drawn }, targets).values));
    }
    const stated = resampleWithCovariance(spectrum, targets);
    const off = (k: number): number[] => found.map((row) => row[k]! - stated.values[k]!);
    targets.forEach((_, k) => {
      const spread = Math.sqrt(off(k).reduce((sum, x) => sum + x * x, 0) / 4000);
      expectRelative(spread, Math.sqrt(stated.covariance[k * 6 + k]!), 0.05); // 4000 draws: 1.1 %
    });
    const shared = off(3).reduce((sum, x, i) => sum + x * off(4)[i]!, 0) / 4000;
    expectRelative(shared, stated.covariance[3 * 6 + 4]!, 0.08);
  });
});

describe("resampleWithCovariance: properties", () => {
  it("keeps values as resampleSpectrum does, and a covariance that is symmetric and no larger than its diagonal allows", () => {
    fc.assert(
      fc.property(fc.array(between(400, 450), { minLength: 2, maxLength: 8 }), (list) => {
        const grid = [...new Set(list)].sort((a, b) => a - b);
        const result = resampleWithCovariance(spectrum, grid);
        const plain = resampleSpectrum(spectrum, grid);
        grid.forEach((_, k) => {
          expectRelative(result.values[k]!, plain.values[k]!, 1e-14);
          grid.forEach((_, l) => {
            const c = result.covariance[k * grid.length + l]!;
            expect(c).toBe(result.covariance[l * grid.length + k]);
            const bound = Math.sqrt(
              result.covariance[k * grid.length + k]! * result.covariance[l * grid.length + l]!,
            );
            expect(Math.abs(c)).toBeLessThanOrEqual(bound * (1 + 1e-12));
          });
        });
      }),
    );
  });
  it("changes nothing on its own grid", () => {
    const same = resampleWithCovariance(spectrum, wavelengthsNm);
    expect(same.values).toEqual(values);
    expect(same.covariance).toEqual(covariance);
  });
});

describe("resampleWithCovariance: edges", () => {
  it("keeps a NaN to where its sample counts", () => {
    const holed = { ...spectrum, values: Float64Array.of(1, Number.NaN, 1.1, 2) };
    const result = resampleWithCovariance(holed, [400, 405, 425, 440]);
    expect(Array.from(result.values, Number.isNaN)).toEqual([false, true, false, false]);
    expectAbsolute(result.values[0]!, 1, 0);
  });
  it("refuses what cannot be", () => {
    expectRefusal(
      () => resampleWithCovariance({ ...spectrum, covariance: new Float64Array(4) }, [410]),
      RangeError,
      "resampleWithCovariance",
      "square",
    );
    expectRefusal(
      () => resampleWithCovariance({ wavelengthsNm, values } as never, [410]),
      TypeError,
      "covariance",
    );
    expectRefusal(() => resampleWithCovariance(spectrum, [399]), RangeError, "must cover");
    expectRefusal(
      () => resampleWithCovariance(spectrum, [420, 410]),
      RangeError,
      "wavelengthsNm[1]",
    );
    expectRefusal(() => resampleWithCovariance(spectrum, []), RangeError, "at least 1");
  });
});

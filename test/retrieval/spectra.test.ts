import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airColumn,
  beamIrradiance,
  clearBeam,
  propagate,
  removeAtmosphere,
  resampleSpectrum,
  resampleWithCovariance,
  solarIrradiance,
  tabulate,
  wavelengthGrid,
} from "../../src/index.js";
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
    const gap = covariance.map((c, k) => (k === 5 ? Number.NaN : c)); // the variance at 410 nm
    const spread = resampleWithCovariance({ ...spectrum, covariance: gap }, [400, 405, 425, 440]);
    const variances = [0, 5, 10, 15].map((k) => spread.covariance[k]!);
    expect(variances.map(Number.isNaN)).toEqual([false, true, false, false]);
    const late = { ...spectrum, values: Float64Array.of(1, 1.4, Number.NaN, 2) };
    expect(resampleWithCovariance(late, [450]).values[0]).toBe(2);
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

const column = airColumn({ pressurePa: 90000, altitudeM: 1000, latitudeDeg: 45, co2Ppm: 425 });
const air = {
  column,
  trueZenithDeg: 60,
  ozoneDu: 320,
  ozoneTemperatureK: 225,
  ozoneHeightM: 22000,
  nitrogenDioxideDu: 0.1,
  waterCm: 1,
};
const aerosolOf = (opticalDepth: number) => ({ opticalDepth, referenceNm: 500, exponent: 1.3 });
const beam = clearBeam({ ...air, aerosol: aerosolOf(0.1) });
const grid = wavelengthGrid(300, 800, 25);
const ground = tabulate((nm) => beamIrradiance(nm, beam, 1), grid);
const aerosolPart = (nm: number): number => 0.01 * (500 / nm) ** 1.3 * beam.masses.aerosol;
const options = {
  standardUncertainties: ground.values.map((v) => 0.01 * v),
  slantDepthUncertainties: [aerosolPart],
  leastTransmittance: 0.01,
};

describe("removeAtmosphere", () => {
  it("gives back the sunlight that the beam dimmed", () => {
    const outside = removeAtmosphere(ground, beam, options);
    grid.forEach((nm, i) => {
      if (outside.refused.includes(i)) return;
      expectRelative(outside.values[i]!, solarIrradiance(nm), 1e-12);
    });
  });
  it("is the law of propagation on two wavelengths and their ratio", () => {
    const outside = removeAtmosphere(ground, beam, options);
    const n = grid.length;
    const [i, j] = [4, 16]; // 400 and 700 nm
    const [a, b] = [i, j].map((k) => ({
      m: ground.values[k]!,
      t: outside.transmittances[k]!,
      d: aerosolPart(grid[k]!),
    }));
    const inputs = {
      ma: { value: a!.m, standardUncertainty: 0.01 * a!.m },
      mb: { value: b!.m, standardUncertainty: 0.01 * b!.m },
      haze: { value: 0, standardUncertainty: 1 },
    };
    const one = propagate(({ ma, haze }) => (ma / a!.t) * Math.exp(haze * a!.d), inputs, {
      derivatives: { haze: ({ ma }) => (ma / a!.t) * a!.d },
    });
    expectRelative(outside.standardUncertainties[i]!, one.standardUncertainty, 1e-7);
    const ratio = propagate(
      ({ ma, mb, haze }) => (ma / a!.t / (mb / b!.t)) * Math.exp(haze * (a!.d - b!.d)),
      inputs,
      {
        derivatives: { haze: ({ ma, mb }) => (ma / a!.t / (mb / b!.t)) * (a!.d - b!.d) },
      },
    );
    const [va, vb] = [outside.values[i]!, outside.values[j]!];
    const c = outside.covariance;
    const relative =
      c[i * n + i]! / va ** 2 + c[j * n + j]! / vb ** 2 - (2 * c[i * n + j]!) / (va * vb);
    expectRelative(Math.sqrt(relative), ratio.standardUncertainty / ratio.value, 1e-7);
    expect(c[j * n + i]).toBe(c[i * n + j]);
  });
  it("states the spread of 2000 simulated spectra: noise, and an aerosol depth that is wrong", () => {
    const { normal } = randomOf(31);
    const nms = [400, 500, 700];
    const found: number[][] = [];
    const truth = tabulate((nm) => beamIrradiance(nm, beam, 1), nms);
    const call = { ...options, standardUncertainties: truth.values.map((v) => 0.01 * v) };
    const stated = removeAtmosphere(truth, beam, call);
    for (let trial = 0; trial < 2000; trial++) {
      const believed = clearBeam({ ...air, aerosol: aerosolOf(0.1 + 0.01 * normal()) });
      const values = truth.values.map((v) => v * (1 + 0.01 * normal()));
      found.push(Array.from(removeAtmosphere({ ...truth, values }, believed, call).values));
    }
    nms.forEach((_, k) => {
      const spread = Math.sqrt(
        found.reduce((sum, row) => sum + (row[k]! - stated.values[k]!) ** 2, 0) / 2000,
      );
      expectRelative(spread, stated.standardUncertainties[k]!, 0.06); // 2000 draws: 1.6 %
    });
    const shared =
      found.reduce(
        (sum, row) => sum + (row[0]! - stated.values[0]!) * (row[2]! - stated.values[2]!),
        0,
      ) / 2000;
    expectRelative(shared, stated.covariance[2]!, 0.15);
  });
  it("refuses to divide by too little, at those wavelengths alone", () => {
    const low = clearBeam({ ...air, trueZenithDeg: 85, aerosol: aerosolOf(0.1) });
    const dark = tabulate((nm) => beamIrradiance(nm, low, 1), grid);
    const outside = removeAtmosphere(dark, low, options);
    expect(outside.refused).toContain(0); // 300 nm through eight masses of ozone
    expect(outside.refused).not.toContain(16);
    for (const i of outside.refused) {
      expect(outside.transmittances[i]).toBeLessThan(0.01);
      expect(outside.values[i]).toBeNaN();
      expect(outside.standardUncertainties[i]).toBeNaN();
      expect(outside.covariance[i * grid.length + 16]).toBeNaN();
    }
    expect(outside.covariance[16 * grid.length + 15]).toBeGreaterThan(0);
    const none = { ...options, leastTransmittance: 1 };
    expectRefusal(
      () => removeAtmosphere(dark, low, none),
      RangeError,
      "removeAtmosphere",
      "at some wavelength",
    );
  });
  it("gives NaN where the measurement is NaN, and there alone", () => {
    const holed = { ...ground, values: ground.values.map((v, i) => (i === 7 ? Number.NaN : v)) };
    const outside = removeAtmosphere(holed, beam, options);
    expect(outside.values[7]).toBeNaN();
    expect(outside.standardUncertainties[7]).toBeNaN();
    expect(outside.values[8]).toBeGreaterThan(0);
    expect(outside.standardUncertainties[8]).toBeGreaterThan(0);
  });
  it("scales with the measurement", () => {
    fc.assert(
      fc.property(between(0.01, 100), (scale) => {
        const scaled = removeAtmosphere(
          { ...ground, values: ground.values.map((v) => v * scale) },
          beam,
          {
            ...options,
            standardUncertainties: options.standardUncertainties.map((u) => u * scale),
          },
        );
        const one = removeAtmosphere(ground, beam, options);
        expectRelative(scaled.values[10]!, scale * one.values[10]!, 1e-13);
        expectRelative(
          scaled.standardUncertainties[10]!,
          scale * one.standardUncertainties[10]!,
          1e-13,
        );
      }),
      { numRuns: 20 },
    );
  });
  it("refuses what cannot be", () => {
    const call =
      (change: object): (() => unknown) =>
      () =>
        removeAtmosphere(ground, beam, { ...options, ...change });
    expectRefusal(
      call({ standardUncertainties: [1] }),
      RangeError,
      "standardUncertainties",
      "as many",
    );
    expectRefusal(
      call({ standardUncertainties: ground.values.map(() => -1) }),
      RangeError,
      "standardUncertainties[0]",
    );
    expectRefusal(call({ slantDepthUncertainties: [0.1] }), TypeError, "function");
    expectRefusal(call({ leastTransmittance: 0 }), RangeError, "leastTransmittance");
    expectRefusal(call({ leastTransmittance: 5 }), RangeError, "percent");
    expectRefusal(() => removeAtmosphere(ground, {} as never, options), TypeError, "clearBeam");
    expectRefusal(() => removeAtmosphere({} as never, beam, options), TypeError, "spectrum");
    const wide = { wavelengthsNm: Float64Array.of(200, 400), values: Float64Array.of(1, 1) };
    expectRefusal(
      () => removeAtmosphere(wide, beam, { ...options, standardUncertainties: [1, 1] }),
      RangeError,
      "280",
    );
  });
});

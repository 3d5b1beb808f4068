import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  chromaticity,
  cie1931Observer,
  cie1931Observer5nm,
  cie1964Observer,
  correlatedColourTemperature,
  daylightIlluminant,
  type Observer,
  planckRadiance,
  resampleSpectrum,
  type Spectrum,
  solarIrradiance,
  spectraToXyz,
  spectrumToXyz,
  tabulate,
  wavelengthGrid,
} from "../../src/index.js";
import {
  FIRST_COMPONENT,
  MEAN_COMPONENT,
  SECOND_COMPONENT,
} from "../../src/colour/_daylightComponents.js";
import { between } from "../_generators.js";
import { referenceTable } from "../_referenceTable.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { hatSum, spectrumOf } from "../spectrum/_spectra.js";

const illuminants = referenceTable("cie-illuminants-5nm.csv");
const illuminant = (name: string): Spectrum =>
  spectrumOf(illuminants.wavelength_nm!, illuminants[name]!);
const xy = (spectrum: Spectrum, observer: Observer): [number, number] =>
  chromaticity(spectrumToXyz(spectrum, observer));
const sun = tabulate(solarIrradiance, wavelengthGrid(360, 830, 1));

describe("published values", () => {
  it.each([
    // printed in CIE 15; reproduced by the 5 nm sum of 380 to 780 nm
    ["A", "5 nm, 380-780", cie1931Observer5nm, 0.44758, 0.40745],
    ["D50", "5 nm, 380-780", cie1931Observer5nm, 0.34567, 0.35851],
    ["D55", "5 nm, 380-780", cie1931Observer5nm, 0.33243, 0.34744],
    ["D65", "5 nm, 380-780", cie1931Observer5nm, 0.31272, 0.32903],
    ["D75", "5 nm, 380-780", cie1931Observer5nm, 0.29903, 0.31488],
    // the 1 nm sum of 360 to 830 nm
    ["A", "1 nm, 360-830", cie1931Observer, 0.44756, 0.40743],
    ["D50", "1 nm, 360-830", cie1931Observer, 0.34568, 0.3585],
    ["D65", "1 nm, 360-830", cie1931Observer, 0.31273, 0.32902],
  ])("white point %s, %s", (name, _summation, observer, x, y) => {
    const point = xy(illuminant(name), observer);
    expectAbsolute(point[0], x, 7e-6); // printed to 1e-5: half of the last digit, and the illuminant's own rounding
    expectAbsolute(point[1], y, 7e-6);
  });
  it("the two tables of the 1931 observer lie within 1.5e-5 of each other", () => {
    for (const name of ["A", "D50", "D65"]) {
      const [fine, coarse] = [cie1931Observer, cie1931Observer5nm].map((o) =>
        xy(illuminant(name), o),
      );
      for (const i of [0, 1]) expectAbsolute(coarse![i]!, fine![i]!, 1.5e-5);
    }
  });
  it("D65 of the 1964 observer", () => {
    const point = xy(illuminant("D65"), cie1964Observer);
    expectAbsolute(point[0], 0.31382, 1e-5); // CIE 15 (from memory), printed to 1e-5 by the 5 nm sum
    expectAbsolute(point[1], 0.331, 1e-5);
  });
  it("D65 over its Y is the usual 0.95047, 1, 1.08883 (1 nm sum)", () => {
    const [x, y, z] = spectrumToXyz(illuminant("D65"), cie1931Observer);
    expectAbsolute(x / y, 0.95047, 5e-6);
    expectAbsolute(z / y, 1.08883, 1e-5); // printed to 1e-5
  });
  it("equal energy: the sums printed with the tables, and 0.33331, 0.33329", () => {
    const flat = tabulate(() => 1, wavelengthGrid(360, 830, 1));
    const xyz = spectrumToXyz(flat, cie1931Observer);
    [106.8654695, 106.8569171, 106.8922513].forEach((sum, i) => {
      expectRelative(xyz[i]! / 683.002, sum, 5e-10); // printed to ten digits
    });
    const point = chromaticity(xyz);
    expectAbsolute(point[0], 0.33331, 5e-6);
    expectAbsolute(point[1], 0.33329, 5e-6);
    const wide = spectrumToXyz(flat, cie1964Observer);
    [116.6485195, 116.6618771, 116.6739805].forEach((sum, i) => {
      expectRelative(wide[i]! / 683.002, sum, 5e-10);
    });
    const coarse = spectrumToXyz(flat, cie1931Observer5nm);
    [21.37153, 21.37133, 21.37154].forEach((sum, i) => {
      expectAbsolute(coarse[i]! / (5 * 683.002), sum, 5e-6); // printed to 1e-5
    });
  });
  it("a watt of light at 555 nm is 683.002 lm", () => {
    const line = spectrumOf([360, 554, 555, 556, 830], [0, 0, 1, 0, 0]);
    expectAbsolute(spectrumToXyz(line, cie1931Observer)[1], 683.002, 1e-9);
  });
  it("sunlight outside the air: 132.6 to 132.9 klx, x 0.3235, y 0.3326", () => {
    for (const observer of [cie1931Observer, cie1931Observer5nm]) {
      const xyz = spectrumToXyz(sun, observer);
      expect(xyz[1]).toBeGreaterThan(132_600);
      expect(xyz[1]).toBeLessThan(132_900);
      const point = chromaticity(xyz);
      expectAbsolute(point[0], 0.3235, 1e-4); // three measured spectra lie within 1e-4 of each other
      expectAbsolute(point[1], 0.3326, 1e-4);
    }
  });
  it("a black body of 5772 K as large as the sun is 5.7 % dimmer", () => {
    const solidAngle = 6.7943107064622e-5; // sr, nominal radius at 1 au (IAU 2015 resolution B3)
    const black = tabulate((w) => planckRadiance(w, 5772) * solidAngle, sun.wavelengthsNm);
    const ratio = spectrumToXyz(black, cie1931Observer)[1] / spectrumToXyz(sun, cie1931Observer)[1];
    expectAbsolute(ratio, 1 - 0.057, 1e-3);
  });
  it("leaving out the shift from vacuum to air wavelengths costs at most 1e-4 in x and y", () => {
    for (const light of [sun, illuminant("D65"), illuminant("A")]) {
      const inAir = { ...light, wavelengthsNm: light.wavelengthsNm.map((w) => w / 1.000278) };
      const [here, there] = [xy(light, cie1931Observer), xy(inAir, cie1931Observer)];
      expectAbsolute(here[0], there[0], 1e-4);
      expectAbsolute(here[1], there[1], 1e-4);
    }
  });
});

describe("independent fixtures", () => {
  it.each([
    ["cie-1931-2deg-1nm.csv", cie1931Observer, 360, 830],
    ["cie-1931-2deg-5nm.csv", cie1931Observer5nm, 380, 780],
    ["cie-1964-10deg-1nm.csv", cie1964Observer, 360, 830],
  ])("the embedded table equals %s digit by digit", (file, observer, from, to) => {
    const table = referenceTable(file);
    const rows = table.wavelength_nm!.flatMap((w, i) => (w >= from && w <= to ? [i] : []));
    expect(observer.x).toHaveLength(rows.length);
    rows.forEach((i, row) => {
      expect(observer.startNm + row * observer.stepNm).toBe(table.wavelength_nm![i]);
      expect(observer.x[row]).toBe(table.xbar![i]);
      expect(observer.y[row]).toBe(table.ybar![i]);
      expect(observer.z[row]).toBe(table.zbar![i]);
    });
  });
  const bumpy = (w: number): number => 1 + Math.sin(w / 7) / 2;
  it.each([
    ["the observer's own grid", wavelengthGrid(360, 830, 1)],
    ["a part of it", wavelengthGrid(380, 780, 1)],
    ["more than it", wavelengthGrid(300, 1100, 1)],
    ["5 nm", wavelengthGrid(380, 780, 5)],
    ["just 400 to 700 nm", wavelengthGrid(400, 700, 10)],
    ["half a step off", wavelengthGrid(359.5, 830.5, 1)],
    ["finer", wavelengthGrid(360, 830, 0.25)],
    ["tenths", wavelengthGrid(379.9, 780.1, 0.1)],
    ["uneven", Float64Array.of(390, 400, 401, 455.5, 500, 612.3, 700, 900)],
    ["two points", Float64Array.of(400, 700)],
  ])("plain sums of hat functions: %s", (_name, grid) => {
    const spectrum = tabulate(bumpy, grid);
    for (const observer of [cie1931Observer, cie1931Observer5nm, cie1964Observer]) {
      const sums = [0, 0, 0];
      observer.x.forEach((_, row) => {
        const w = observer.startNm + row * observer.stepNm;
        if (w < grid[0]! || w > grid.at(-1)!) return;
        const value =
          grid.length > 1000 ? resampleSpectrum(spectrum, [w]).values[0]! : hatSum(spectrum, w);
        sums[0]! += value * observer.x[row]!;
        sums[1]! += value * observer.y[row]!;
        sums[2]! += value * observer.z[row]!;
      });
      const bulk = spectraToXyz(spectrum.values, grid, observer);
      spectrumToXyz(spectrum, observer).forEach((value, i) => {
        expectRelative(value, sums[i]! * 683.002 * observer.stepNm, 1e-13); // rounding of 471 terms
        expectRelative(bulk[i]!, value, 1e-13);
      });
    }
  });
});

describe("properties", () => {
  const grid = wavelengthGrid(380, 780, 5);
  const light = fc
    .array(between(0, 3), { minLength: 81, maxLength: 81 })
    .map((values) => ({ wavelengthsNm: grid, values: Float64Array.from(values) }));
  it("adds up, scales, and is never negative", () => {
    fc.assert(
      fc.property(light, light, between(0.1, 10), (a, b, factor) => {
        const both = {
          wavelengthsNm: grid,
          values: a.values.map((v, i) => v + factor * b.values[i]!),
        };
        const [p, q, sum] = [a, b, both].map((s) => spectrumToXyz(s, cie1931Observer5nm));
        for (let i = 0; i < 3; i++) {
          expect(p![i]).toBeGreaterThanOrEqual(0);
          expectRelative(sum![i]!, p![i]! + factor * q![i]!, 1e-13);
        }
      }),
    );
  });
  it("does not change when a point is added on a straight line (the path off the grid agrees with the one on it)", () => {
    fc.assert(
      fc.property(light, between(380.01, 779.99), (spectrum, extra) => {
        fc.pre(extra % 5 !== 0);
        const points = [...grid, extra].sort((a, b) => a - b);
        const more = resampleSpectrum(spectrum, points);
        const onGrid = spectrumToXyz(spectrum, cie1931Observer5nm);
        spectrumToXyz(more, cie1931Observer5nm).forEach((v, i) => {
          expectRelative(v, onGrid[i]!, 1e-12);
        });
      }),
    );
  });
  it("fills many at once as it does one by one, into a given array", () => {
    fc.assert(
      fc.property(fc.array(light, { minLength: 1, maxLength: 5 }), (lights) => {
        const all = Float64Array.from(lights.flatMap((l) => [...l.values]));
        const out = new Float64Array(3 * lights.length);
        expect(spectraToXyz(all, grid, cie1931Observer, out)).toBe(out);
        expect(spectraToXyz(all, grid, cie1931Observer)).toEqual(out);
        lights.forEach((l, s) => {
          spectrumToXyz(l, cie1931Observer).forEach((v, i) => {
            expectRelative(out[3 * s + i]!, v, 1e-13);
          });
        });
      }),
      { numRuns: 20 },
    );
  });
});

describe("edges", () => {
  it("counts missing ends as zero", () => {
    const padded = spectrumOf([360, 399.9999, 400, 700, 700.0001, 830], [0, 0, 1, 1, 0, 0]);
    const bare = spectrumOf([400, 700], [1, 1]);
    spectrumToXyz(bare, cie1931Observer).forEach((v, i) => {
      expectRelative(v, spectrumToXyz(padded, cie1931Observer)[i]!, 1e-13);
    });
  });
  it("takes an observer of one's own, with a step that is no binary fraction", () => {
    const rows = 4001;
    const own = {
      startNm: 380,
      stepNm: 0.1,
      x: new Float64Array(rows).fill(1),
      y: new Float64Array(rows).fill(2),
      z: new Float64Array(rows).fill(3),
    };
    const flat = tabulate(() => 1, wavelengthGrid(380, 780, 0.1));
    spectrumToXyz(flat, own).forEach((v, i) => {
      expectRelative(v, (i + 1) * rows * 0.1 * 683.002, 1e-12);
    });
  });
  it("passes NaN on where it is used and ignores it elsewhere", () => {
    const holed = tabulate((w) => (w === 500 ? Number.NaN : 1), wavelengthGrid(300, 900, 5));
    expect(spectrumToXyz(holed, cie1931Observer)).toEqual([Number.NaN, Number.NaN, Number.NaN]);
    expect(spectrumToXyz(holed, cie1931Observer5nm)[1]).toBeNaN();
    const beyond = tabulate((w) => (w === 900 ? Number.NaN : 1), wavelengthGrid(300, 900, 5));
    expect(spectrumToXyz(beyond, cie1931Observer)[1]).toBeGreaterThan(0);
    const two = Float64Array.from([...beyond.values, ...holed.values]);
    const xyz = spectraToXyz(two, beyond.wavelengthsNm, cie1931Observer);
    expect(xyz[1]).toBeGreaterThan(0);
    expect(xyz[4]).toBeNaN();
  });
  it("refuses bad input", () => {
    const bad =
      (spectrum: unknown, observer: unknown = cie1931Observer) =>
      () =>
        spectrumToXyz(spectrum as Spectrum, observer as Observer);
    expectRefusal(bad(undefined), TypeError, "spectrumToXyz", "spectrum");
    expectRefusal(bad({}), TypeError, "spectrum");
    expectRefusal(bad([400, 700]), TypeError, "spectrum");
    expectRefusal(bad(spectrumOf([400, 700], [1])), TypeError, "spectrum");
    expectRefusal(bad(sun, null), TypeError, "observer");
    expectRefusal(() => spectrumToXyz(sun, {} as never), TypeError, "observer");
    expectRefusal(bad(sun, { ...cie1931Observer, stepNm: 0 }), TypeError, "observer");
    expectRefusal(bad(spectrumOf([400.1, 700], [1, 1])), RangeError, "400 to 700 nm", "400.1");
    expectRefusal(bad(spectrumOf([400, 699.9], [1, 1])), RangeError, "699.9");
    expectRefusal(bad(spectrumOf([0.4, 0.7], [1, 1])), RangeError, "0.4 to 0.7");
    expectRefusal(bad(spectrumOf([780, 380], [1, 1])), RangeError, "780 to 380");
    expectRefusal(bad(spectrumOf([380, 500, 450, 780], [1, 1, 1, 1])), RangeError, "must rise");
    expectRefusal(bad(spectrumOf([380, 500, 500, 780], [1, 1, 1, 1])), RangeError, "must rise");
    expectRefusal(bad(spectrumOf([400, 400, 780], [1, 1, 1])), RangeError, "must rise");
    expectRefusal(bad(spectrumOf([380, Number.NaN, 780], [1, 1, 1])), RangeError, "must rise");
    const swapped = wavelengthGrid(380, 780, 1);
    [swapped[100], swapped[101]] = [swapped[101]!, swapped[100]!];
    expectRefusal(bad(tabulateRaw(swapped)), RangeError, "must rise");
  });
  it("refuses bad input in bulk", () => {
    const grid = wavelengthGrid(380, 780, 5);
    const one = new Float64Array(81);
    expectRefusal(
      () => spectraToXyz([1] as never, grid, cie1931Observer),
      TypeError,
      "Float64Array",
    );
    expectRefusal(() => spectraToXyz(one, grid, cie1931Observer, [] as never), TypeError, "out");
    expectRefusal(
      () => spectraToXyz(new Float64Array(80), grid, cie1931Observer),
      RangeError,
      "81",
    );
    expectRefusal(
      () => spectraToXyz(one, grid, cie1931Observer, new Float64Array(2)),
      RangeError,
      "got 81 and 2",
    );
    const { startNm, stepNm, ...rows } = cie1931Observer;
    const unfit = [
      {},
      undefined,
      { ...rows, startNm },
      { ...rows, stepNm },
      { ...cie1931Observer, stepNm: 0 },
      { ...cie1931Observer, y: undefined },
      { ...cie1931Observer, z: rows.x.subarray(1) },
      { startNm, stepNm, x: [1], y: [1], z: [1] },
    ];
    for (const observer of unfit)
      expectRefusal(() => spectraToXyz(one, grid, observer as never), TypeError, "observer");
    expectRefusal(
      () =>
        spectraToXyz(
          one,
          grid.map((w) => w + 30),
          cie1931Observer,
        ),
      RangeError,
      "400 to 700",
    );
    expectRefusal(
      () => spectraToXyz(one, grid.slice().reverse(), cie1931Observer),
      RangeError,
      "[1]",
    );
    expect(spectraToXyz(new Float64Array(0), grid, cie1931Observer)).toHaveLength(0);
  });
});

describe("daylightIlluminant", () => {
  it.each([
    ["D50", 5000],
    ["D55", 5500],
    ["D65", 6500],
    ["D75", 7500],
  ])("rebuilds %s", (name, nominal) => {
    const made = daylightIlluminant((nominal * 1.4388) / 1.438);
    expect([...made.wavelengthsNm]).toEqual(illuminants.wavelength_nm);
    // D65 as printed by the CIE, the others by this formula to 4 decimals
    made.values.forEach((v, i) => {
      expectAbsolute(v, illuminants[name]![i]!, name === "D65" ? 8.6e-4 : 5.1e-5);
    });
  });
  it("lies on the daylight locus at the temperature asked for (properties)", () => {
    fc.assert(
      fc.property(between(4000, 25_000), (temperatureK) => {
        const [x, y] = xy(daylightIlluminant(temperatureK), cie1931Observer5nm);
        // three rounded decimals of M1 and M2 are 2e-5 in x and y; the locus formula itself reproduces to 1e-4
        expectAbsolute(y, -3 * x * x + 2.87 * x - 0.275, 2e-4);
        expect(daylightIlluminant(temperatureK).values[52]).toBe(100);
      }),
    );
  });
  it("is the published formula with M1 and M2 of three decimals, at 2600 temperatures", () => {
    // CIE 15:2004, section 3.1 (from memory), in powers of T as printed there
    const near7000 = Array.from({ length: 500 }, (_, i) => 6995 + 0.02 * i);
    for (const T of [...wavelengthGrid(4000, 25_000, 10), ...near7000]) {
      const x =
        T <= 7000
          ? -4.607e9 / T ** 3 + 2.9678e6 / T ** 2 + 0.09911e3 / T + 0.244063
          : -2.0064e9 / T ** 3 + 1.9018e6 / T ** 2 + 0.24748e3 / T + 0.23704;
      const y = -3 * x ** 2 + 2.87 * x - 0.275;
      const m = 0.0241 + 0.2562 * x - 0.7341 * y;
      const m1 = (1000 * (-1.3515 - 1.7703 * x + 5.9114 * y)) / m;
      const m2 = (1000 * (0.03 - 31.4424 * x + 30.0717 * y)) / m;
      if ([m1, m2].some((v) => Math.abs(v - Math.floor(v) - 0.5) < 1e-9)) continue; // a tie
      const { values } = daylightIlluminant(T);
      for (const i of [0, 30, 106]) {
        const [s0, s1, s2] = [MEAN_COMPONENT, FIRST_COMPONENT, SECOND_COMPONENT].map((c) => c[i]!);
        const expected = s0! + (Math.round(m1) / 1000) * s1! + (Math.round(m2) / 1000) * s2!;
        expectAbsolute(values[i]!, expected, 1e-11);
      }
    }
  });
  it("embeds the components as printed", () => {
    const printed = referenceTable("cie-daylight-components-5nm.csv");
    expect(MEAN_COMPONENT).toEqual(printed.S0);
    expect(FIRST_COMPONENT).toEqual(printed.S1);
    expect(SECOND_COMPONENT).toEqual(printed.S2);
  });
  it.each([4000, 4500, 5500, 6999, 7001, 8000, 10_000, 15_000, 20_000, 25_000])(
    "has the colour temperature asked for: %d K",
    (temperatureK) => {
      // the published cubics follow the daylight locus to about 4e-4 of the temperature (found here by another way: Planck's law)
      const xyz = spectrumToXyz(daylightIlluminant(temperatureK), cie1931Observer);
      const found = correlatedColourTemperature(xyz);
      expectRelative(found.temperatureK, temperatureK, 5e-4);
      expectAbsolute(found.duv, 0.003, 5e-4); // daylight lies some 0.003 above the black bodies (common practice)
    },
  );
  it("keeps it within 5e-4 to 20 000 K and 1e-3 to 25 000 K, in steps of about 2 K near 6500 K", () => {
    const own = (T: number): number =>
      correlatedColourTemperature(spectrumToXyz(daylightIlluminant(T), cie1931Observer))
        .temperatureK;
    for (let T = 4000; T <= 25_000; T *= 1.005) {
      expectRelative(own(T), T, T <= 20_000 ? 5e-4 : 1e-3);
    }
    const near = Array.from({ length: 501 }, (_, i) => own(6490 + 0.04 * i));
    const steps = near.slice(1).map((t, i) => t - near[i]!);
    expectAbsolute(Math.max(...steps), 2.1, 0.3); // one step of M1 or M2, or both at once
  });
  it.each([
    [5000, 0.34567, 0.35851],
    [5500, 0.33243, 0.34744],
    [6500, 0.31272, 0.32903],
    [7500, 0.29903, 0.31488],
  ])(
    "D illuminant of nominal %d K: white point as the CIE prints it (5 nm, 380-780)",
    (nominal, x, y) => {
      const point = xy(daylightIlluminant((nominal * 1.4388) / 1.438), cie1931Observer5nm);
      expectAbsolute(point[0], x, 7e-6); // printed to 1e-5
      expectAbsolute(point[1], y, 7e-6);
    },
  );
  it("joins at 7000 K, and takes both ends", () => {
    const [below, above] = [6999.999, 7000.001].map((t) =>
      xy(daylightIlluminant(t), cie1931Observer5nm),
    );
    expectAbsolute(below![0], above![0], 5e-5); // the published branches miss each other by 2e-5, the rounding adds its own
    expectRefusal(() => daylightIlluminant(3999), RangeError, "4000 to 25000 K", "3999");
    expectRefusal(() => daylightIlluminant(25_001), RangeError, "25001");
    expectRefusal(() => daylightIlluminant(Number.NaN), RangeError, "NaN");
    expectRefusal(() => daylightIlluminant("D65" as never), TypeError, '"D65"');
    expect(daylightIlluminant(4000).values).toHaveLength(107);
    expect(daylightIlluminant(25_000).values).toHaveLength(107);
  });
});

describe("chromaticity", () => {
  it("divides by the sum (properties)", () => {
    fc.assert(
      fc.property(between(0, 2), between(0.001, 2), between(0, 2), (x, y, z) => {
        const point = chromaticity([x, y, z]);
        expectRelative(point[0] * (x + y + z) + 1, x + 1, 1e-15);
        expectRelative(point[1] * (x + y + z) + 1, y + 1, 1e-15);
      }),
    );
  });
  it("is 1e-15 off the ratios taken one by one (properties)", () => {
    fc.assert(
      fc.property(between(1e-3, 2), between(1e-3, 2), between(0, 2), (x, y, z) => {
        const point = chromaticity([x, y, z]);
        expectAbsolute(point[0], 1 / (1 + y / x + z / x), 1e-15);
        expectAbsolute(point[1], 1 / (1 + x / y + z / y), 1e-15);
      }),
    );
  });
  it("passes NaN on, and refuses black and bad input", () => {
    expect(chromaticity([Number.NaN, 1, 1])[0]).toBeNaN();
    expectRefusal(() => chromaticity([0, 0, 0]), RangeError, "black", "got 0");
    expectRefusal(() => chromaticity([-1, 0, 0.5]), RangeError, "xyz", "-0.5");
    expectRefusal(() => chromaticity([1, 1] as never), RangeError, "xyz", "3");
    expectRefusal(() => chromaticity([1, 1, 1, 1] as never), RangeError, "3 numbers, got 4");
    expectRefusal(() => chromaticity([1, "1", 1] as never), TypeError, "xyz[1]");
    expectRefusal(() => chromaticity(["1", 1, 1] as never), TypeError, "xyz[0]");
    expect(chromaticity([1e-4, 1e-4, 2e-4])).toEqual([0.25, 0.25]);
    expectRefusal(() => chromaticity(undefined as never), TypeError, "xyz");
  });
});

function tabulateRaw(wavelengthsNm: Float64Array): Spectrum {
  return { wavelengthsNm, values: wavelengthsNm.map(() => 1) };
}

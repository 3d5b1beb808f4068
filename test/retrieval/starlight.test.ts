import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airColumn,
  airMassKastenYoung,
  airMassShell,
  coverageFactor,
  extinctionFit,
  magnitudeToOpticalDepth,
  modelExtinction,
  opticalDepthToMagnitude,
  planckRadiance,
  rayleighOpticalDepth,
  refractionBennett,
  type StarObservation,
  tabulate,
  wavelengthGrid,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { randomOf } from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 400 });
const clear = (nm: number): number => rayleighOpticalDepth(nm, column);
const star = (temperatureK: number, colourIndex: number) => ({
  spectrum: tabulate((nm) => planckRadiance(nm, temperatureK), wavelengthGrid(300, 800, 5)),
  colourIndex,
});
/** A bell cut where a glass filter would end: 1.2 widths from its centre. */
const filter = (centreNm: number, width: number) =>
  tabulate(
    (nm) => Math.exp(-4 * Math.LN2 * ((nm - centreNm) / width) ** 2),
    wavelengthGrid(centreNm - 1.2 * width, centreNm + 1.2 * width, width / 90),
  );
const hotAndCool = [star(12000, -0.1), star(4500, 1.1)];

/** A night in one band with the terms given; every tenth observation may be spoilt. */
function night(
  seed: number,
  noise: number,
  spoilt: boolean,
  second = -0.03,
  transform = 0.05,
): StarObservation[] {
  const { uniform, normal } = randomOf(seed);
  return Array.from({ length: 60 }, (_, i) => {
    const [airMass, colourIndex, catalogueMagnitude] = [
      1 + 1.5 * uniform(),
      -0.2 + 1.6 * uniform(),
      7 + 4 * uniform(),
    ];
    const cloud = spoilt && i % 10 === 3 ? 0.15 + 0.3 * uniform() : 0;
    const model = 2.1 + 0.26 * airMass + second * colourIndex * airMass + transform * colourIndex;
    const magnitude = catalogueMagnitude + model + cloud + noise * normal();
    return {
      band: "B",
      magnitude,
      standardUncertainty: 0.01,
      airMass,
      catalogueMagnitude,
      colourIndex,
    };
  });
}

describe("published values", () => {
  it("has 1.0857 magnitudes in a unit of optical depth", () => {
    expectAbsolute(opticalDepthToMagnitude(1), 1.0857, 0.00005); // common practice, printed to 0.0001
    expectRelative(opticalDepthToMagnitude(1), 2.5 / Math.log(10), 1e-15);
    expectRelative(magnitudeToOpticalDepth(1), Math.log(10) / 2.5, 1e-15);
    expectRelative(opticalDepthToMagnitude(1), 2.5 / Math.log(10), 1e-15);
  });
  it("gives Hayes & Latham's Rayleigh extinction at 550 nm and sea level", () => {
    // Hayes & Latham 1975, Astrophys. J. 197, 593 (from memory): 9.4977e-3 λ^-4 c² magnitudes, c their index term
    const s = 1 / 0.55 ** 2;
    const index = 0.23465 + 107.6 / (146 - s) + 0.93161 / (41 - s);
    const published = 9.4977e-3 * s * s * index * index;
    const { extinction } = modelExtinction({
      passband: filter(550, 1),
      stars: hotAndCool,
      opticalDepth: clear,
      airMasses: [1, 2],
    });
    // they took an older, larger depolarisation: a King factor of 1.060 instead of 1.048 is 1.1 %
    expectRelative(extinction, published, 0.0115);
  });
  it("predicts the small negative second order of a blue band, almost none of a visual one", () => {
    const at = (nm: number): number =>
      modelExtinction({
        passband: filter(nm, 90),
        stars: hotAndCool,
        opticalDepth: clear,
        airMasses: [1, 1.5, 2],
      }).secondOrder;
    // common practice: -0.02 to -0.04 in B per magnitude of B - V for air with aerosol and real stars, 0 in V
    expect(at(440)).toBeLessThan(-0.012);
    expect(at(440)).toBeGreaterThan(-0.03);
    expect(Math.abs(at(550))).toBeLessThan(0.008);
  });
});

describe("independent fixtures", () => {
  it("fits by the normal equations, solved by elimination", () => {
    const stars = night(3, 0.01, false);
    const [fit] = extinctionFit(stars, { secondOrder: true, colourTerm: true });
    expect(fit!.rejected.length).toBeLessThanOrEqual(1);
    const used = stars.filter((_, i) => !fit!.rejected.some(({ index }) => index === i));
    const rows = used.map((s) => [1, s.airMass, s.colourIndex * s.airMass, s.colourIndex]);
    const y = used.map((s) => s.magnitude - s.catalogueMagnitude);
    const system = [0, 1, 2, 3].map((i) => [
      ...[0, 1, 2, 3].map((j) => rows.reduce((sum, row) => sum + row[i]! * row[j]!, 0)),
      rows.reduce((sum, row, k) => sum + row[i]! * y[k]!, 0),
      ...[0, 1, 2, 3].map((j) => (i === j ? 1 : 0)),
    ]);
    for (let i = 0; i < 4; i++) {
      const pivot = system[i]![i]!;
      system[i] = system[i]!.map((v) => v / pivot);
      for (let k = 0; k < 4; k++) {
        const factor = system[k]![i]!;
        if (k !== i) system[k] = system[k]!.map((v, c) => v - factor * system[i]![c]!);
      }
    }
    const x = system.map((row) => row[4]!);
    const squares = rows.reduce(
      (sum, row, k) => sum + (y[k]! - row.reduce((s, a, i) => s + a * x[i]!, 0)) ** 2,
      0,
    );
    const variance = squares / (used.length - 4);
    const found = [fit!.zeroPoint, fit!.extinction, fit!.secondOrder, fit!.colourTerm];
    found.forEach((coefficient, i) => {
      expectAbsolute(coefficient.value, x[i]!, 1e-10);
      expectRelative(
        coefficient.standardUncertainty,
        Math.sqrt(variance * system[i]![5 + i]!),
        1e-9,
      );
    });
    expectRelative(fit!.covariance[1]!, variance * system[0]![6]!, 1e-8);
    expectRelative(fit!.scatter, Math.sqrt(variance), 1e-10);
  });

  it("covers the truth over 300 nights with one outlier in ten, and reports the outliers", () => {
    const truth = [2.1, 0.26, -0.03, 0.05];
    const inside = [0, 0, 0, 0];
    for (let seed = 1; seed <= 300; seed++) {
      const stars = night(seed, 0.012, true);
      const [fit] = extinctionFit(stars, { secondOrder: true, colourTerm: true });
      const places = fit!.rejected.map(({ index }) => index);
      // 0.15 magnitudes and more are twelve times the noise: every one is found
      expect([3, 13, 23, 33, 43, 53].every((i) => places.includes(i))).toBe(true);
      expect(places.length).toBeLessThanOrEqual(10);
      const k = coverageFactor(0.95, 60 - places.length - 4);
      const found = [fit!.zeroPoint, fit!.extinction, fit!.secondOrder, fit!.colourTerm];
      found.forEach(({ value, standardUncertainty }, i) => {
        if (Math.abs(value - truth[i]!) <= k * standardUncertainty) inside[i]! += 1;
      });
    }
    for (const count of inside) {
      // 95 % of 300 with a standard error of 1.3 %; rejection of the farthest noise takes up to 1 %
      expect(count / 300).toBeGreaterThan(0.91);
      expect(count / 300).toBeLessThan(0.98);
    }
  });

  it.each([440, 550])(
    "leaves the aerosol: a night made by brute-force sums over its band at %d nm, less the model",
    (centre) => {
      const band = filter(centre, 90);
      const aerosol = (nm: number): number => 0.06 * (nm / 440) ** -1.2;
      // magnitudes by plain sums every 0.5 nm, Rayleigh as a power law of its own
      const rayleighPower = (nm: number): number => 0.2437 * (nm / 440) ** -4.09;
      const response = (nm: number): number => Math.exp(-4 * Math.LN2 * ((nm - centre) / 90) ** 2);
      const planck = (nm: number, t: number): number =>
        nm ** -5 / Math.expm1(1.4387769e7 / (nm * t));
      const dimming = (t: number, airMass: number): number => {
        let [through, outside] = [0, 0];
        for (let nm = centre - 108; nm <= centre + 108; nm += 0.5) {
          const light = response(nm) * planck(nm, t);
          outside += light;
          through += light * Math.exp(-airMass * (rayleighPower(nm) + aerosol(nm)));
        }
        return -2.5 * Math.log10(through / outside);
      };
      const kinds = [
        [12000, -0.1],
        [7500, 0.3],
        [4500, 1.1],
      ] as const;
      const observations = kinds.flatMap(([t, colourIndex], k) =>
        [1, 1.3, 1.7, 2.1, 2.5].map((airMass) => ({
          band: "B",
          magnitude: 9 + k + 1.8 + dimming(t, airMass),
          standardUncertainty: 0.01,
          airMass,
          catalogueMagnitude: 9 + k,
          colourIndex,
        })),
      );
      const [fit] = extinctionFit(observations, { secondOrder: true, colourTerm: true });
      const model = modelExtinction({
        passband: band,
        stars: kinds.map(([t, colour]) => star(t, colour)),
        opticalDepth: rayleighPower,
        airMasses: [1, 1.3, 1.7, 2.1, 2.5],
      });
      const left = magnitudeToOpticalDepth(fit!.extinction.value - model.extinction);
      // the aerosol's own band mean lies a few per cent off its depth at the centre: redder than Rayleigh is what it dims
      expectAbsolute(left, aerosol(centre), 0.002);
      expectAbsolute(fit!.secondOrder.value, model.secondOrder, 0.002);
      // with the aerosol in the model nothing is left: two sums of the same integral
      const whole = modelExtinction({
        passband: band,
        stars: kinds.map(([t, colour]) => star(t, colour)),
        opticalDepth: (nm) => rayleighPower(nm) + aerosol(nm),
        airMasses: [1, 1.3, 1.7, 2.1, 2.5],
      });
      expectAbsolute(whole.extinction, fit!.extinction.value, 2e-4);
      expectAbsolute(whole.secondOrder, fit!.secondOrder.value, 2e-4);
    },
  );
});

describe("one air mass for all", () => {
  it("is 2 % too much for ozone where the air mass is 3", () => {
    const apparent = 70.69;
    const trueZenith =
      apparent + refractionBennett(apparent, { pressurePa: 101325, temperatureK: 288 });
    expectRelative(airMassKastenYoung(apparent), 3, 1e-3);
    const ozone = airMassShell(trueZenith, { shellHeightM: 22_000, altitudeM: 0 });
    expectAbsolute(3 / ozone - 1, 0.02, 0.005);
  });
});

describe("properties", () => {
  it("recovers exact nights, whatever the terms", () => {
    fc.assert(
      fc.property(
        between(0.05, 0.6),
        between(-0.06, 0.02),
        between(-0.2, 0.2),
        (k, second, transform) => {
          const stars = night(1, 0, false, second, transform).map((s) => ({
            ...s,
            magnitude: s.magnitude + (k - 0.26) * s.airMass,
          }));
          const [fit] = extinctionFit(stars, { secondOrder: true, colourTerm: true });
          expectAbsolute(fit!.extinction.value, k, 1e-10);
          expectAbsolute(fit!.secondOrder.value, second, 1e-10);
          expectAbsolute(fit!.colourTerm.value, transform, 1e-10);
        },
      ),
      { numRuns: 30 },
    );
  });
  it("keeps bands apart and does not ask for order", () => {
    const blue = night(5, 0.01, false);
    const red = night(6, 0.01, false).map((s) => ({
      ...s,
      band: "R",
      magnitude: s.magnitude - 0.1 * s.airMass,
    }));
    const mixed = blue.flatMap((s, i) => [red[59 - i]!, s]);
    const terms = { secondOrder: false, colourTerm: true };
    const both = extinctionFit(mixed, terms);
    expect(both.map(({ band }) => band)).toEqual(["R", "B"]);
    expectRelative(
      both[1]!.extinction.value,
      extinctionFit(blue, terms)[0]!.extinction.value,
      1e-9,
    );
    expectRelative(both[0]!.extinction.value, extinctionFit(red, terms)[0]!.extinction.value, 1e-9);
    expect(both[0]!.secondOrder).toEqual({ value: 0, standardUncertainty: 0 });
    // the second order left out acts as -0.03 × 1.75, the mean air mass; 60 stars of 0.01 give the term to 0.0035: three of those
    expectAbsolute(both[1]!.colourTerm.value, 0.05 - 0.03 * 1.75, 0.01);
    expect(both[1]!.colourTerm.standardUncertainty).toBeGreaterThan(0.001);
  });
  it("scales errors by the scatter, not by the stated uncertainties' size", () => {
    const stars = night(7, 0.01, false);
    const wide = stars.map((s) => ({ ...s, standardUncertainty: 0.5 }));
    const terms = { secondOrder: false, colourTerm: true };
    const [a, b] = [stars, wide].map((list) => extinctionFit(list, terms)[0]!);
    expectRelative(a!.extinction.standardUncertainty, b!.extinction.standardUncertainty, 1e-9);
    expectRelative(a!.scatter, b!.scatter, 1e-9);
  });
  it("finds no second order in grey air", () => {
    const grey = modelExtinction({
      passband: filter(440, 90),
      stars: hotAndCool,
      opticalDepth: () => 0.3,
      airMasses: [1, 2, 3],
    });
    expectAbsolute(grey.extinction, opticalDepthToMagnitude(0.3), 1e-6);
    expectAbsolute(grey.secondOrder, 0, 1e-6);
  });
});

describe("edges", () => {
  const terms = { secondOrder: true, colourTerm: true };
  const stars = night(1, 0.01, false);
  it("works with three stars more than terms over 0.5 of air mass, and refuses less", () => {
    const few = (count: number, range: number) => () =>
      extinctionFit(
        Array.from({ length: count }, (_, i) => {
          const airMass = 1 + (range * i) / (count - 1);
          const magnitude = 0.2 * airMass + 0.01 * Math.sin(5 * i);
          return { ...stars[0]!, airMass, magnitude, catalogueMagnitude: 0 };
        }),
        { secondOrder: false, colourTerm: false },
      );
    expect(few(5, 0.5)()[0]!.rejected).toEqual([]);
    expectRefusal(few(4, 0.5), RangeError, "in B must be at least 5, got 4");
    const narrow = "in B must span at least 0.5 of air mass, got 0.400";
    expectRefusal(few(6, 0.4), RangeError, narrow);
    expect(few(6, 0.4)).toThrow(/0\.400$/);
  });
  it("refuses what cannot be", () => {
    expectRefusal(
      () => extinctionFit(stars.slice(0, 6), terms),
      RangeError,
      "extinctionFit",
      "at least 7",
    );
    expectRefusal(
      () =>
        extinctionFit(
          stars.map((s) => ({ ...s, airMass: 1.2 })),
          terms,
        ),
      RangeError,
      "span at least 0.5",
    );
    expectRefusal(
      () =>
        extinctionFit(
          stars.map((s) => ({ ...s, colourIndex: 0.6 })),
          terms,
        ),
      RangeError,
      "stars of other colours",
    );
    expectRefusal(
      () => extinctionFit([{ ...stars[0]!, band: undefined as never }], terms),
      TypeError,
      "observations[0].band",
    );
    expectRefusal(
      () => extinctionFit([{ ...stars[0]!, magnitude: Number.NaN }], terms),
      RangeError,
      "observations[0].magnitude",
    );
    expectRefusal(
      () => extinctionFit([{ ...stars[0]!, standardUncertainty: 0 }], terms),
      RangeError,
      "standardUncertainty",
    );
    expectRefusal(() => extinctionFit([], terms), RangeError, "at least 1");
    expectRefusal(() => extinctionFit(stars, undefined as never), TypeError, "terms");
    const model = {
      passband: filter(440, 90),
      stars: hotAndCool,
      opticalDepth: clear,
      airMasses: [1, 2],
    };
    expectRefusal(
      () => modelExtinction({ ...model, stars: hotAndCool.slice(0, 1) }),
      RangeError,
      "at least 2",
    );
    expectRefusal(
      () => modelExtinction({ ...model, airMasses: [1, 1] }),
      RangeError,
      "must differ",
    );
    expectRefusal(
      () => modelExtinction({ ...model, opticalDepth: 1 as never }),
      TypeError,
      "function",
    );
    expectRefusal(() => opticalDepthToMagnitude(Number.NaN), RangeError, "opticalDepth");
    expectRefusal(() => magnitudeToOpticalDepth("1" as never), TypeError, "magnitude");
  });
});

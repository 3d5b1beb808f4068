import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  calibrationAt,
  calibrationDrift,
  combinedCalibration,
  coverageFactor,
  langleyFit,
  propagate,
  reducedSignals,
  transferredCalibration,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { type DayTruth, randomOf, stationDay, SUMMIT } from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { masses, morningFit } from "./_reduction.js";

const green = [{ nm: 500, constant: 2.05 }] as const;
const morning: Omit<DayTruth, "seed" | "aerosol500"> = {
  dayOfYear: 110,
  station: SUMMIT,
  channels: green,
  ozoneDu: 290,
  nitrogenDioxideDu: 0.1,
  exponent: 1.2,
  noise: 1e-3,
  fromHour: 6.7,
  toHour: 10,
  stepMinutes: 2,
};
/** A morning whose haze drifts as a parabola of the time from noon. */
const drifting = (seed: number, spread: number): DayTruth => {
  const { uniform, normal } = randomOf(seed);
  const [base, bend] = [0.03 + 0.02 * uniform(), spread * normal()];
  return { ...morning, seed, aerosol500: (hour) => base + bend * ((hour - 12) / 6) ** 2 };
};

describe("published values", () => {
  it("adds variance by Paule & Mandel's rule, solved by hand for two errors", () => {
    // logs 0, 0.03 and 0.06 with equal errors e: chi-square = 0.0018 / (e² + v) = 2, so v = 0.0009 - e²
    const mornings = [0, 0.03, 0.06].map((x) => ({
      constant: Math.exp(x),
      constantStandardError: 0.01 * Math.exp(x),
    }));
    const combined = combinedCalibration(mornings);
    expectRelative(combined.constant, Math.exp(0.03), 1e-14);
    expectRelative(combined.betweenMornings, Math.sqrt(0.0008), 1e-9);
    expectRelative(combined.standardUncertainty / combined.constant, Math.sqrt(0.0009 / 3), 1e-9);
    // table of Student's t: 4.303 at 95 % and 2 degrees of freedom
    expectRelative(combined.expandedUncertainty / combined.standardUncertainty, 4.303, 1e-4);
  });
});

describe("independent fixtures", () => {
  it("covers the truth where the fit errors alone do not", () => {
    let [byFit, byScatter, sets] = [0, 0, 0];
    for (let set = 0; set < 300; set++) {
      const fits = Array.from({ length: 6 }, (_, k) => {
        const day = stationDay(drifting(100 * set + k + 1, 0.002));
        return morningFit(day, 0, 500, SUMMIT, morning);
      });
      const combined = combinedCalibration(fits);
      const off = Math.abs(combined.constant - green[0].constant);
      sets += 1;
      if (off <= 1.96 * combined.fitStandardError) byFit += 1;
      if (off <= combined.expandedUncertainty) byScatter += 1;
    }
    // 95 % of 300 with a standard error of 1.3 %: 92 to 98 %
    expect(byScatter / sets).toBeGreaterThan(0.92);
    expect(byScatter / sets).toBeLessThan(0.985);
    expect(byFit / sets).toBeLessThan(0.5);
    expect(byFit / sets).toBeGreaterThan(0.15);
  });

  it("finds a parabola of haze straight: one morning's own scatter does not see it", () => {
    const truth = { ...drifting(5, 0), noise: 1e-4 };
    const bent = { ...truth, aerosol500: (hour: number) => 0.04 + 0.01 * ((hour - 12) / 6) ** 2 };
    const [plain, drift] = [truth, bent].map((t) =>
      morningFit(stationDay(t), 0, 500, SUMMIT, morning),
    );
    expectRelative(plain!.constant, green[0].constant, 1e-3);
    const error = Math.abs(drift!.constant / green[0].constant - 1);
    expect(error).toBeGreaterThan(0.004);
    expect(drift!.constantStandardError / drift!.constant).toBeLessThan(0.2 * error);
  });

  it("leaves out one spoilt morning of six", () => {
    const good = [2.001, 1.998, 2.003, 2.0, 1.999];
    const mornings = [...good, 2.2].map((constant) => ({ constant, constantStandardError: 0.002 }));
    const { constant, rejected, degreesOfFreedom } = combinedCalibration(mornings);
    expect(rejected.map(({ index }) => index)).toEqual([5]);
    expect(rejected[0]!.reason).toContain("modified z-score");
    expect(degreesOfFreedom).toBe(4);
    expectAbsolute(constant, 2.0002, 0.0003);
  });

  it("recovers drifts and states their errors", () => {
    const scores: number[] = [];
    const rates: number[] = [];
    for (let seed = 1; seed <= 400; seed++) {
      const { normal } = randomOf(seed);
      const drift = calibrationDrift(
        [0, 60, 150, 220, 300, 390].map((timeDays) => ({
          timeDays,
          constant: 1.7 * Math.exp(-4e-5 * timeDays + 0.003 * normal()),
          standardUncertainty: 1.7 * 0.002,
        })),
      );
      const at = calibrationAt(365, drift);
      scores.push((at.constant - 1.7 * Math.exp(-4e-5 * 365)) / at.standardUncertainty);
      rates.push((drift.relativeDriftPerDay + 4e-5) / Math.sqrt(drift.covariance[1][1]));
    }
    const inside = (list: number[]): number =>
      list.filter((x) => Math.abs(x) <= coverageFactor(0.95, 4)).length / list.length;
    // never below 95 % less one standard error of 1.1 %; above it because the added variance cannot be negative
    for (const list of [scores, rates]) {
      expect(inside(list)).toBeGreaterThan(0.94);
      expect(inside(list)).toBeLessThan(0.996);
    }
  });

  it("follows a drifting instrument through three campaigns of simulated mornings", () => {
    const perDay = -4e-5;
    const campaigns = [
      [20, 7.4],
      [160, 5.9],
      [300, 7.1],
    ].map(([dayOfYear, fromHour]) => {
      const fits = Array.from({ length: 5 }, (_, k) => {
        const date = dayOfYear! + k;
        const truth = {
          ...drifting(date * 7, 0.001),
          dayOfYear: date,
          fromHour: fromHour!,
          toHour: 11,
        };
        const day = stationDay({ ...truth, drift: Math.expm1(perDay * date) });
        return morningFit(day, 0, 500, SUMMIT, morning);
      });
      const { constant, standardUncertainty } = combinedCalibration(fits);
      return { timeDays: dayOfYear! + 2, constant, standardUncertainty };
    });
    const drift = calibrationDrift(campaigns);
    expectAbsolute(drift.relativeDriftPerDay, perDay, 3 * Math.sqrt(drift.covariance[1][1]));
    expectRelative(drift.relativeDriftPerDay, perDay, 0.3);
    for (const timeDays of [30, 200, 365]) {
      const { constant, expandedUncertainty } = calibrationAt(timeDays, drift);
      expectAbsolute(
        constant,
        green[0].constant * Math.exp(perDay * timeDays),
        expandedUncertainty,
      );
      expectRelative(constant, green[0].constant * Math.exp(perDay * timeDays), 0.0025);
    }
  });

  it("finds the drift by the normal equations, at both ends and between", () => {
    const dates = [3, 40, 200];
    const constants = [2, 1.97, 1.96];
    const drift = calibrationDrift(
      dates.map((timeDays, i) => ({ timeDays, constant: constants[i]!, standardUncertainty: 0.1 })),
    );
    // errors far above the scatter: weights (constant / 0.1)²
    const w = constants.map((c) => (c / 0.1) ** 2);
    const s = (f: (i: number) => number): number => w.reduce((sum, wi, i) => sum + wi * f(i), 0);
    const [s0, sx, sxx] = [s(() => 1), s((i) => dates[i]!), s((i) => dates[i]! ** 2)];
    const [sy, sxy] = [
      s((i) => Math.log(constants[i]!)),
      s((i) => dates[i]! * Math.log(constants[i]!)),
    ];
    const slope = (s0 * sxy - sx * sy) / (s0 * sxx - sx * sx);
    expect(drift.addedScatter).toBe(0);
    expectRelative(drift.relativeDriftPerDay, slope, 1e-10);
    expectRelative(drift.timeDays, sx / s0, 1e-10);
    expectRelative(drift.covariance[0][0], 1 / s0, 1e-10);
    expectRelative(drift.covariance[1][1], s0 / (s0 * sxx - sx * sx), 1e-10);
    expectRelative(
      calibrationAt(3, drift).constant,
      Math.exp((sy + slope * (3 * s0 - sx)) / s0),
      1e-12,
    );
  });

  it("carries a calibration to a second instrument through wandering haze", () => {
    const scores: number[] = [];
    for (let seed = 1; seed <= 200; seed++) {
      const channels = [
        { nm: 500, constant: 2.05 },
        { nm: 502, constant: 0.83 },
      ];
      const wander = (hour: number): number => 0.1 * (1 + 0.2 * Math.sin(7 * hour + seed));
      const day = stationDay({ ...morning, seed, channels, aerosol500: wander });
      const all = day.zenithsDeg.map((z) => masses(z, SUMMIT));
      const used = all.map((_, i) => i).filter((i) => all[i]!.air > 1.5 && all[i]!.air < 6);
      const transfer = transferredCalibration({
        signals: used.map((i) => day.signals[1]![i]!),
        referenceSignals: used.map((i) => day.signals[0]![i]!),
        airMasses: used.map((i) => all[i]!.air),
        referenceConstant: 2.05,
        referenceStandardUncertainty: 0,
      });
      expectRelative(transfer.constant, 0.83, 0.003);
      scores.push((transfer.constant - 0.83) / transfer.standardUncertainty);
    }
    const spread = Math.sqrt(scores.reduce((sum, x) => sum + x * x, 0) / scores.length);
    expectAbsolute(spread, 1, 0.15); // 200 draws: 5 %, three of those
  });

  it("budgets the transfer as propagation of its ratio does", () => {
    const airMasses = Array.from({ length: 12 }, (_, i) => 1.5 + 0.3 * i);
    const { normal } = randomOf(3);
    const referenceSignals = airMasses.map((m) => 2 * Math.exp(-0.2 * m));
    const signals = airMasses.map((m) => 3 * Math.exp(-0.21 * m + 0.001 * normal()));
    const transfer = transferredCalibration({
      signals,
      referenceSignals,
      airMasses,
      referenceConstant: 2,
      referenceStandardUncertainty: 0.01,
    });
    const ratio = langleyFit({
      airMasses,
      signals: signals.map((s, i) => s / referenceSignals[i]!),
    });
    const law = propagate(({ r, c }) => r * c, {
      r: { value: ratio.constant, standardUncertainty: ratio.constantStandardError },
      c: { value: 2, standardUncertainty: 0.01 },
    });
    expectRelative(transfer.constant, law.value, 1e-12);
    expectRelative(transfer.standardUncertainty, law.standardUncertainty, 1e-7);
    expectRelative(transfer.opticalDepthDifference, ratio.opticalDepth, 1e-9);
  });

  it("reduces signals by distance and each constituent's own mass", () => {
    const reduced = reducedSignals([2, Number.NaN, 3], {
      sunDistanceAu: [1.01, 1, 1],
      terms: [
        { opticalDepth: [0.1, 0.1, 0.2], airMasses: [2, 2, 3] },
        { opticalDepth: 0.05, airMasses: [1, 2, 4] },
      ],
    });
    expectRelative(reduced[0]!, 2 * 1.01 ** 2 * Math.exp(0.1 * 2 + 0.05), 1e-15);
    expect(reduced[1]).toBeNaN();
    expectRelative(reduced[2]!, 3 * Math.exp(0.6 + 0.2), 1e-15);
  });
});

describe("properties", () => {
  it("reduces signals to rounding at any slant depth", () => {
    fc.assert(
      fc.property(between(0, 1), between(0.1, 20), between(0.9, 1.1), (depth, mass, au) => {
        const terms = [{ opticalDepth: depth, airMasses: [mass] }];
        const [reduced] = reducedSignals([1], { sunDistanceAu: au, terms });
        const slant = depth * mass;
        // the exponential to 1 ulp and two products, each half; more where the slant depth's own rounding counts
        expectRelative(reduced!, au * au * Math.exp(slant), 5e-16 * (1 + slant));
      }),
    );
  });
  const set = fc.array(
    fc.record({ constant: between(1.9, 2.1), constantStandardError: between(0.001, 0.02) }),
    {
      minLength: 3,
      maxLength: 12,
    },
  );
  it("scales with the signal", () => {
    fc.assert(
      fc.property(set, between(0.01, 100), (mornings, scale) => {
        const scaled = mornings.map((m) => ({
          constant: m.constant * scale,
          constantStandardError: m.constantStandardError * scale,
        }));
        const [one, other] = [combinedCalibration(mornings), combinedCalibration(scaled)];
        expectRelative(other.constant, scale * one.constant, 1e-9);
        expectRelative(other.standardUncertainty, scale * one.standardUncertainty, 1e-6);
        expect(other.rejected.length).toBe(one.rejected.length);
      }),
    );
  });
  it("does not ask for the order of the mornings", () => {
    fc.assert(
      fc.property(set, (mornings) => {
        const one = combinedCalibration(mornings);
        const other = combinedCalibration(mornings.slice().reverse());
        expectRelative(other.constant, one.constant, 1e-9);
        expectRelative(other.standardUncertainty, one.standardUncertainty, 1e-6);
      }),
    );
  });
  it("does not ask for the order of the readings", () => {
    const day = stationDay(drifting(9, 0.002));
    const all = day.zenithsDeg.map((z) => masses(z, SUMMIT).air);
    const constantOf = (order: number[]): number =>
      langleyFit({
        airMasses: order.map((i) => all[i]!),
        signals: order.map((i) => day.signals[0]![i]!),
      }).constant;
    const order = all.map((_, i) => i);
    const shuffled = order.slice().sort((a, b) => ((a * 37) % 101) - ((b * 37) % 101));
    expectRelative(constantOf(shuffled), constantOf(order), 1e-12);
  });
  it("is not moved by a known constituent added to the readings and to the model", () => {
    fc.assert(
      fc.property(between(0, 0.5), (depth) => {
        const airMasses = Array.from({ length: 20 }, (_, i) => 1.5 + 0.2 * i);
        const own = airMasses.map((m) => m * 0.95);
        const signals = airMasses.map(
          (m, i) => 2 * Math.exp(-0.1 * m) * (1 + 1e-3 * Math.sin(9 * i)),
        );
        const dimmed = signals.map((s, i) => s * Math.exp(-depth * own[i]!));
        const terms = [{ opticalDepth: depth, airMasses: own }];
        const reduced = reducedSignals(dimmed, { sunDistanceAu: 1, terms });
        expectRelative(
          langleyFit({ airMasses, signals: reduced }).constant,
          langleyFit({ airMasses, signals }).constant,
          1e-12,
        );
      }),
    );
  });
});

describe("limits", () => {
  /** Mornings whose constants have these logarithms, with one relative error. */
  const mornings = (logs: readonly number[], error: number) =>
    logs.map((x) => ({ constant: Math.exp(x), constantStandardError: error * Math.exp(x) }));
  const left = (logs: readonly number[], error: number): number[] =>
    combinedCalibration(mornings(logs, error)).rejected.map(({ index }) => index);

  it("leaves out mornings beyond a modified z-score of 3.5, from five mornings on", () => {
    // median 0, median distance 0.01
    const with5 = (z: number): number[] =>
      left([-0.01, -0.005, 0, 0.01, (0.01 * z) / 0.6745], 1e-6);
    expect(with5(3.5 * 1.0001)).toEqual([4]);
    expect(with5(3.5 * 0.9999)).toEqual([]);
    expect(left([-0.01, 0, 0.01, 10], 1e-6)).toEqual([]);
    const [one] = combinedCalibration(mornings([0, 0, 0, 0, 0.05], 0.01)).rejected;
    expect(one!.reason).toBe("modified z-score 5.0 from the median of all mornings");
  });
  it("counts no distance as far that is within 3.5 of the morning's own error", () => {
    expect(left([0, 0, 0, 0, 0.035 * 1.0001], 0.01)).toEqual([4]);
    expect(left([0, 0, 0, 0, 0.035 * 0.9999], 0.01)).toEqual([]);
  });
  it("says what the fits alone would: their error over the root of their number", () => {
    const { fitStandardError, constant } = combinedCalibration(
      mornings([0.1, 0.2, 0.3, 0.4], 0.01),
    );
    expectRelative(fitStandardError, 0.005 * constant, 1e-12);
  });
  it("covers 95 % of a drift by Student's factor, two degrees of freedom less than calibrations", () => {
    const factor = (count: number): number => {
      const drift = calibrationDrift(
        mornings(
          Array.from({ length: count }, () => 0.3),
          0.01,
        ).map((m, timeDays) => ({
          timeDays,
          constant: m.constant,
          standardUncertainty: m.constantStandardError,
        })),
      );
      expect(drift.degreesOfFreedom).toBe(count - 2);
      expect([drift.covariance[0][1], drift.covariance[1][0]]).toEqual([0, 0]);
      const at = calibrationAt(1, drift);
      return at.expandedUncertainty / at.standardUncertainty;
    };
    // table of Student's t: half of the last digit
    expectAbsolute(factor(3), 12.7062, 5e-5);
    expectAbsolute(factor(4), 4.3027, 5e-5);
  });
  it("takes signals of any size above 0", () => {
    const airMasses = Array.from({ length: 10 }, (_, i) => 1 + 0.3 * i);
    const { constant, rejected } = transferredCalibration({
      signals: airMasses.map((x) => 1e-6 * Math.exp(-x)),
      referenceSignals: airMasses.map((x) => 2e-6 * Math.exp(-x)),
      airMasses,
      referenceConstant: 2e-6,
      referenceStandardUncertainty: 0,
    });
    expect(rejected).toEqual([]);
    expectRelative(constant, 1e-6, 1e-12);
  });
  it("reduces by distances of 0.9 to 1.1 au and depths of -100 to 100", () => {
    const reduced = (sunDistanceAu: number, opticalDepth: number) => (): Float64Array =>
      reducedSignals([1], { sunDistanceAu, terms: [{ opticalDepth, airMasses: [1] }] });
    expectRelative(reduced(1.1, 100)()[0]!, 1.21 * Math.exp(100), 1e-13);
    expectRelative(reduced(0.9, -100)()[0]!, 0.81 * Math.exp(-100), 1e-13);
    expectRefusal(reduced(1.1005, 0), RangeError, "sunDistanceAu");
    expectRefusal(reduced(0.8995, 0), RangeError, "sunDistanceAu");
    expectRefusal(reduced(1, 100.05), RangeError, "terms[0].opticalDepth");
    expectRefusal(reduced(1, -100.05), RangeError, "terms[0].opticalDepth");
  });
});

describe("edges", () => {
  const m = { constant: 2, constantStandardError: 0.01 };
  it("adds nothing where mornings agree better than their errors", () => {
    const { betweenMornings, standardUncertainty, rejected } = combinedCalibration([m, m, m, m, m]);
    expect(betweenMornings).toBe(0);
    expectRelative(standardUncertainty, 0.01 / Math.sqrt(5), 1e-12);
    expect(rejected).toEqual([]);
  });
  it("refuses what cannot be", () => {
    expectRefusal(
      () => combinedCalibration([m, m]),
      RangeError,
      "combinedCalibration",
      "at least 3",
    );
    expectRefusal(
      () => combinedCalibration([m, m, { ...m, constant: -1 }]),
      RangeError,
      "mornings[2].constant",
    );
    expectRefusal(() => combinedCalibration([m, m, 2 as never]), TypeError, "mornings[2]");
    expectRefusal(() => combinedCalibration(undefined as never), TypeError, "mornings");
    const c = { timeDays: 1, constant: 2, standardUncertainty: 0.01 };
    expectRefusal(() => calibrationDrift([c, c, c]), RangeError, "different dates");
    expectRefusal(() => calibrationDrift([c, c]), RangeError, "at least 3");
    expectRefusal(
      () => calibrationDrift([c, c, { ...c, timeDays: Number.NaN }]),
      RangeError,
      "timeDays",
    );
    const drift = calibrationDrift([c, { ...c, timeDays: 11 }, { ...c, timeDays: 21 }]);
    expect(calibrationAt(31, drift).constant).toBeCloseTo(2, 10);
    expectRefusal(() => calibrationAt(31.1, drift), RangeError, "timeDays", "-9 to 31");
    expectRefusal(() => calibrationAt(5, c as never), TypeError, "calibrationDrift");
    const list = [1, 2, 3, 4, 5, 6, 7, 8];
    const transfer = {
      signals: list,
      referenceSignals: list,
      airMasses: list,
      referenceConstant: 1,
      referenceStandardUncertainty: 0,
    };
    expectRefusal(
      () => transferredCalibration({ ...transfer, referenceSignals: [1] }),
      RangeError,
      "referenceSignals",
    );
    expectRefusal(
      () => transferredCalibration({ ...transfer, airMasses: list.map(() => 2) }),
      RangeError,
      "span at least 1",
    );
    expectRefusal(
      () => transferredCalibration({ ...transfer, referenceConstant: 0 }),
      RangeError,
      "referenceConstant",
    );
    expectRefusal(
      () => reducedSignals([1], { sunDistanceAu: 2, terms: [] }),
      RangeError,
      "0.9 to 1.1",
    );
    expectRefusal(
      () => reducedSignals([1], { sunDistanceAu: 1, terms: [{ opticalDepth: 1, airMasses: [] }] }),
      RangeError,
      "terms[0].airMasses",
    );
    expectRefusal(
      () => reducedSignals("1" as never, { sunDistanceAu: 1, terms: [] }),
      TypeError,
      "signals",
    );
  });
  it("leaves out pairs that are not positive", () => {
    const airMasses = Array.from({ length: 12 }, (_, i) => 1 + 0.3 * i);
    const signals = airMasses.map((x, i) => (i === 3 ? Number.NaN : Math.exp(-x)));
    const { rejected, constant } = transferredCalibration({
      signals,
      referenceSignals: airMasses.map((x) => 2 * Math.exp(-x)),
      airMasses,
      referenceConstant: 2,
      referenceStandardUncertainty: 0.02,
    });
    expect(rejected).toEqual([3]);
    expectRelative(constant, 1, 1e-12);
  });
});

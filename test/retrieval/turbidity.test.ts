import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type AerosolOpticalDepth,
  aerosolOpticalDepth,
  airMassKastenWater,
  airMassKastenYoung,
  airMassPerDegree,
  airMassShell,
  monteCarlo,
  opticalDepthCovariance,
  opticalDepthCriterion,
  propagate,
  refractionSaemundsson,
  residualOpticalDepth,
  seededRandom,
  zenithStandardUncertainty,
} from "../../src/index.js";
import { between } from "../_generators.js";
import {
  CHANNELS,
  type Day,
  nitrogenDioxideDepth,
  ozoneDepth,
  randomOf,
  stationDay,
  SUMMIT,
  sunZenithDeg,
} from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { masses, rayleigh } from "./_reduction.js";

/** The budget from which the errors of every simulated day are drawn. */
const SPREAD = {
  calibration: 0.004,
  pressure: 0.003,
  ozoneDu: 12,
  nitrogenDioxideDu: 0.05,
  zenithDeg: 0.02,
  noise: 0.001,
};
type Errors = typeof SPREAD;
const NONE: Errors = {
  calibration: 0,
  pressure: 0,
  ozoneDu: 0,
  nitrogenDioxideDu: 0,
  zenithDeg: 0,
  noise: 0,
};
const LATITUDE = SUMMIT.latitudeDeg;

/** One simulated day with 9 readings, noise included. */
function day(seed: number, noise: number): Day {
  return stationDay({
    seed,
    dayOfYear: 60 + (seed % 200),
    station: SUMMIT,
    channels: CHANNELS,
    ozoneDu: 290,
    nitrogenDioxideDu: 0.1,
    aerosol500: (hour) => 0.08 + 0.02 * Math.sin(hour + seed),
    exponent: 1.3,
    noise,
    fromHour: 8,
    toHour: 16,
    stepMinutes: 60,
  });
}

/** What an analyst makes of it who is wrong by `errors` (for the day) and `calibration` (by channel). */
function retrieved(
  data: Day,
  errors: Omit<Errors, "noise" | "calibration">,
  calibration: readonly number[],
): AerosolOpticalDepth[][] {
  const shell = { shellHeightM: 22000, altitudeM: SUMMIT.altitudeM };
  const pressurePa = SUMMIT.pressurePa * (1 + errors.pressure);
  return CHANNELS.map(({ nm, constant }, c) => {
    const depth = rayleigh(nm, SUMMIT, pressurePa);
    return data.signals[c]!.map((signal, i) => {
      const zenith = data.zenithsDeg[i]! + errors.zenithDeg;
      const apparent = zenith - refractionSaemundsson(zenith, SUMMIT);
      const mass = masses(zenith, SUMMIT);
      const high = airMassPerDegree((z) => airMassShell(z, shell), zenith);
      const air = airMassPerDegree(airMassKastenYoung, apparent);
      const [ozone, nitrogen] = [ozoneDepth(nm, 1), nitrogenDioxideDepth(nm, 1)];
      const ozoneDu = 290 + errors.ozoneDu;
      const nitrogenDu = 0.1 + errors.nitrogenDioxideDu;
      const on = (
        name: string,
        opticalDepth: number,
        u: number,
        airMass: number,
        slope: number,
      ) => ({ name, opticalDepth, standardUncertainty: u, airMass, airMassPerDeg: slope });
      return aerosolOpticalDepth({
        signal,
        signalStandardUncertainty: SPREAD.noise * signal,
        constant: constant * (1 + calibration[c]!),
        constantStandardUncertainty: SPREAD.calibration * constant,
        sunDistanceAu: data.sunDistanceAu,
        airMass: mass.aerosol,
        airMassPerDeg: airMassPerDegree(airMassKastenWater, apparent),
        zenithStandardUncertaintyDeg: SPREAD.zenithDeg,
        terms: [
          on("Rayleigh", depth, SPREAD.pressure * depth, mass.air, air),
          on("ozone", ozone * ozoneDu, ozone * SPREAD.ozoneDu, mass.ozone, high),
          on(
            "nitrogen dioxide",
            nitrogen * nitrogenDu,
            nitrogen * SPREAD.nitrogenDioxideDu,
            mass.ozone,
            high,
          ),
        ],
      });
    });
  });
}

/** The day of `seed` with errors drawn from `spread`. */
function drawn(seed: number, spread: Errors): { data: Day; results: AerosolOpticalDepth[][] } {
  const { normal } = randomOf(seed + 5000);
  const data = day(seed, spread.noise);
  const errors = {
    pressure: spread.pressure * normal(),
    ozoneDu: spread.ozoneDu * normal(),
    nitrogenDioxideDu: spread.nitrogenDioxideDu * normal(),
    zenithDeg: spread.zenithDeg * normal(),
  };
  const calibration = CHANNELS.map(() => spread.calibration * normal());
  return { data, results: retrieved(data, errors, calibration) };
}

describe("published values", () => {
  it("has the criterion's two ends", () => {
    expect(opticalDepthCriterion(1)).toBe(0.015); // 0.005 + 0.010 (World Meteorological Organization, from memory)
    expect(opticalDepthCriterion(5)).toBe(0.007);
  });
  it("covers 95 % by 1.959964 standard uncertainties, with few calibrations by Student's factor", () => {
    const factor = (constantDegreesOfFreedom?: number): number => {
      const { expandedUncertainty, standardUncertainty } = aerosolOpticalDepth({
        ...plain,
        signalStandardUncertainty: 0,
        ...(constantDegreesOfFreedom && { constantDegreesOfFreedom }),
      });
      return expandedUncertainty / standardUncertainty;
    };
    // tables of the normal and of Student's distribution: half of the last digit
    expectAbsolute(factor(), 1.959964, 5e-7);
    expectAbsolute(factor(4), 2.7764, 5e-5);
  });
  it("makes 1 % of the constant 0.01 of depth at air mass 1", () => {
    const { budget } = aerosolOpticalDepth({ ...plain, constantStandardUncertainty: 0.02 });
    expectRelative(budget[1]!.contribution, 0.01, 1e-12); // common practice: 1 % is 0.01 / m
  });
});

const plain = {
  signal: 1.5,
  signalStandardUncertainty: 0.001,
  constant: 2,
  constantStandardUncertainty: 0.01,
  sunDistanceAu: 1,
  airMass: 1,
  airMassPerDeg: 0,
  zenithStandardUncertaintyDeg: 0,
  terms: [],
};

describe("coverage on 200 simulated days", () => {
  const days = Array.from({ length: 200 }, (_, i) => drawn(i + 1, SPREAD));
  const exact = days.map((_, i) =>
    retrieved(
      day(i + 1, 0),
      NONE,
      CHANNELS.map(() => 0),
    ),
  );

  it("holds the truth in 93 to 97 % of readings, pooled over channels", () => {
    const inside = CHANNELS.map(() => 0);
    let count = 0;
    for (const { data, results } of days) {
      results.forEach((channel, c) => {
        channel.forEach((result, i) => {
          const off = Math.abs(result.opticalDepth - data.aerosolDepths[c]![i]!);
          if (off <= result.expandedUncertainty) inside[c]! += 1;
        });
      });
      count += results[0]!.length;
    }
    const pooled = inside.reduce((sum, n) => sum + n, 0) / (count * CHANNELS.length);
    expect(pooled).toBeGreaterThan(0.93);
    expect(pooled).toBeLessThan(0.97);
    // one channel has 200 independent calibrations: 95 % within three standard errors of 1.5 %
    for (const n of inside) expectAbsolute(n / count, 0.95, 0.047);
  });

  it.each([
    ["constant", "calibration"],
    ["Rayleigh", "pressure"],
    ["ozone", "ozoneDu"],
    ["nitrogen dioxide", "nitrogenDioxideDu"],
    ["zenith angle", "zenithDeg"],
    ["signal", "noise"],
  ] as const)("states the line %s as large as its error alone makes it", (line, error) => {
    // the reading at 8 h (large air mass) in every channel where the line matters at all
    const alone = { ...NONE, [error]: SPREAD[error] };
    const offs = Array.from({ length: 200 }, (_, seed) => {
      const { results } = drawn(seed + 1, alone);
      return results.map(([result], c) => {
        const row = result!.budget.find(({ input }) => input === line)!;
        return (result!.opticalDepth - exact[seed]![c]![0]!.opticalDepth) / row.contribution;
      });
    });
    const channels = CHANNELS.map((_, c) => c).filter((c) =>
      offs.every((off) => Number.isFinite(off[c])),
    );
    for (const c of channels) {
      const spread = Math.sqrt(offs.reduce((sum, off) => sum + off[c]! ** 2, 0) / offs.length);
      expectAbsolute(spread, 1, 0.15); // a standard deviation from 200 draws is good to 5 %: three of those
    }
    expect(channels.length).toBeGreaterThanOrEqual(3);
  });

  it("adds up: the lines' squares are the variance, the shares one", () => {
    for (const { results } of days.slice(0, 10)) {
      for (const { budget, standardUncertainty } of results.flat()) {
        const squares = budget.reduce((sum, row) => sum + row.contribution ** 2, 0);
        expectRelative(Math.sqrt(squares), standardUncertainty, 1e-12);
        expectAbsolute(
          budget.reduce((sum, row) => sum + row.share, 0),
          1,
          1e-12,
        );
      }
    }
  });
});

describe("independent fixtures", () => {
  const zenith = 65;
  const reading = {
    ...plain,
    constantDegreesOfFreedom: 3,
    sunDistanceAu: 1.012,
    airMass: airMassKastenWater(zenith),
    airMassPerDeg: airMassPerDegree(airMassKastenWater, zenith),
    zenithStandardUncertaintyDeg: 0.03,
    terms: [
      {
        name: "Rayleigh",
        opticalDepth: 0.1,
        standardUncertainty: 0.0003,
        airMass: airMassKastenYoung(zenith),
        airMassPerDeg: airMassPerDegree(airMassKastenYoung, zenith),
      },
    ],
  };
  const inputs = {
    signal: { value: 1.5, standardUncertainty: 0.001 },
    constant: { value: 2, standardUncertainty: 0.01 },
    zenith: { value: zenith, standardUncertainty: 0.03 },
    rayleigh: { value: 0.1, standardUncertainty: 0.0003 },
  };
  const model = (v: Record<keyof typeof inputs, number>): number =>
    (Math.log(v.constant / (v.signal * 1.012 * 1.012)) -
      v.rayleigh * airMassKastenYoung(v.zenith)) /
    airMassKastenWater(v.zenith);

  it("is the law of propagation on the model written out", () => {
    const [result, law] = [aerosolOpticalDepth(reading), propagate(model, inputs)];
    expectRelative(result.opticalDepth, law.value, 1e-12);
    result.budget.forEach((row, i) => {
      // airMassPerDegree is a difference over 0.02°: 1e-4
      expectRelative(row.sensitivity, law.budget[i]!.sensitivity, 1e-4);
      expect(Math.abs(row.share - law.budget[i]!.share)).toBeLessThan(1e-4);
    });
    expectRelative(result.standardUncertainty, law.standardUncertainty, 1e-4);
    const share = law.budget[1]!.share;
    expectRelative(result.degreesOfFreedom, 3 / share ** 2, 1e-3);
  });
  it("is Monte Carlo within 2 %", () => {
    const trials = monteCarlo(model, inputs, {
      random: seededRandom(4),
      digits: 3,
      mostTrials: 200_000,
    });
    expectRelative(
      aerosolOpticalDepth(reading).standardUncertainty,
      trials.standardUncertainty,
      0.02,
    );
  });
  it("is the residual optical depth", () => {
    const { terms, airMass } = reading;
    const signal = 1.5 * 1.012 * 1.012;
    expectRelative(
      aerosolOpticalDepth(reading).opticalDepth,
      residualOpticalDepth(signal, 2, { terms, airMass }),
      1e-12,
    );
  });
  it("meets the criterion or not by its expanded uncertainty", () => {
    const good = aerosolOpticalDepth({ ...plain, constantStandardUncertainty: 0.015 });
    expect(good.meetsCriterion).toBe(good.expandedUncertainty <= 0.015);
    expect(good.meetsCriterion).toBe(true);
    expect(
      aerosolOpticalDepth({ ...plain, constantStandardUncertainty: 0.016 }).meetsCriterion,
    ).toBe(false);
  });
  it("correlates channels through shared lines only", () => {
    const depths = [reading, { ...reading, constant: 1.8 }].map(aerosolOpticalDepth);
    const covariance = opticalDepthCovariance(depths, ["Rayleigh"]);
    const [a, b] = depths.map(({ budget }) => budget[3]!.sensitivity * 0.0003);
    expectRelative(covariance[1]!, a! * b!, 1e-14);
    expect(covariance[2]).toBe(covariance[1]);
    expectRelative(covariance[0]!, depths[0]!.standardUncertainty ** 2, 1e-14);
    expect(opticalDepthCovariance(depths, [])[1]).toBe(0);
    // a line that one channel alone has is shared with nobody
    const without = opticalDepthCovariance(
      [depths[0]!, aerosolOpticalDepth(plain), depths[1]!],
      ["Rayleigh"],
    );
    for (const k of [1, 3, 5, 7]) expect(without[k]).toBe(0);
    expect(without[2]).toBe(covariance[1]);
  });
  it.each([
    [9.2, 120],
    [6.5, 172],
    [11.3, 355],
  ])(
    "turns clock and position into zenith angle at %d h of day %d as differences of the sun's place do",
    (hour, date) => {
      const z = (h: number, latitude: number): number => sunZenithDeg(date, h, latitude);
      const perHour = (z(hour + 1e-4, LATITUDE) - z(hour - 1e-4, LATITUDE)) / 2e-4;
      const perDegree = (z(hour, LATITUDE + 1e-3) - z(hour, LATITUDE - 1e-3)) / 2e-3;
      // azimuth from north: the latitude derivative is minus its cosine; the sun is east in the morning
      const sunAzimuthDeg = (Math.acos(-perDegree) * 180) / Math.PI;
      const sight = { latitudeDeg: LATITUDE, sunAzimuthDeg };
      const of = (s: number, lat: number, lon: number): number =>
        zenithStandardUncertainty({
          ...sight,
          timeStandardUncertaintyS: s,
          latitudeStandardUncertaintyDeg: lat,
          longitudeStandardUncertaintyDeg: lon,
        });
      expectRelative(of(10, 0, 0), (Math.abs(perHour) * 10) / 3600, 1e-6);
      expectRelative(of(0, 0, 0.01), (Math.abs(perHour) * 0.01) / 15, 1e-6);
      expectRelative(of(0, 0.01, 0), Math.abs(perDegree) * 0.01, 1e-6);
      expectRelative(
        of(10, 0.02, 0.01),
        Math.hypot(of(10, 0, 0), of(0, 0.02, 0), of(0, 0, 0.01)),
        1e-12,
      );
    },
  );
  it("differentiates an air mass", () => {
    const secant = (z: number): number => 1 / Math.cos((z * Math.PI) / 180);
    for (const z of [0, 0.005, 0.01, 1, 30, 60, 80, 85]) {
      const exact = (secant(z) * Math.tan((z * Math.PI) / 180) * Math.PI) / 180;
      // 0.02° across: third derivative term, (0.01 / 5)² at 85°; one-sided near 0: up to 0.005° of 3.05e-4 per degree squared
      expectAbsolute(airMassPerDegree(secant, z), exact, z < 0.01 ? 1.6e-6 : 5e-6 * exact);
    }
  });
});

describe("properties", () => {
  it("does not see the scale of the signal", () => {
    fc.assert(
      fc.property(between(0.001, 1000), between(0.3, 1.9), (scale, signal) => {
        const one = aerosolOpticalDepth({ ...plain, signal });
        const other = aerosolOpticalDepth({
          ...plain,
          signal: signal * scale,
          signalStandardUncertainty: plain.signalStandardUncertainty * scale,
          constant: plain.constant * scale,
          constantStandardUncertainty: plain.constantStandardUncertainty * scale,
        });
        expectAbsolute(other.opticalDepth, one.opticalDepth, 1e-12);
        expectRelative(other.standardUncertainty, one.standardUncertainty, 1e-12);
      }),
    );
  });
  it("is not moved by an exactly known constituent added to reading and model", () => {
    fc.assert(
      fc.property(between(0, 1), between(1, 6), (opticalDepth, airMass) => {
        const term = {
          name: "gas",
          opticalDepth,
          standardUncertainty: 0,
          airMass,
          airMassPerDeg: 0.1,
        };
        const signal = plain.signal * Math.exp(-opticalDepth * airMass);
        const dimmed = aerosolOpticalDepth({ ...plain, signal, terms: [term] });
        expectAbsolute(dimmed.opticalDepth, aerosolOpticalDepth(plain).opticalDepth, 1e-12);
      }),
    );
  });
});

describe("edges", () => {
  it("refuses what cannot be", () => {
    const bad =
      (change: object): (() => unknown) =>
      () =>
        aerosolOpticalDepth({ ...plain, ...change });
    expectRefusal(bad({ signal: 0 }), RangeError, "aerosolOpticalDepth", "signal", "0");
    expectRefusal(bad({ signal: Number.NaN }), RangeError, "signal", "NaN");
    expectRefusal(bad({ signalStandardUncertainty: -1 }), RangeError, "signalStandardUncertainty");
    expectRefusal(bad({ constant: "2" }), TypeError, "constant");
    expectRefusal(bad({ constantDegreesOfFreedom: 0 }), RangeError, "constantDegreesOfFreedom");
    expectRefusal(bad({ sunDistanceAu: 1.5 }), RangeError, "0.9 to 1.1 au");
    expectRefusal(bad({ airMass: 60 }), RangeError, "zenith angle?");
    expectRefusal(bad({ terms: undefined }), TypeError, "terms");
    expectRefusal(bad({ terms: [{ opticalDepth: 1 }] }), TypeError, "terms[0].name");
    expectRefusal(() => aerosolOpticalDepth(undefined as never), TypeError, "reading");
    expectRefusal(() => opticalDepthCriterion(0), RangeError, "airMass");
    expectRefusal(
      () => opticalDepthCovariance([aerosolOpticalDepth(plain)], ["ozone"]),
      TypeError,
      "ozone",
    );
    expectRefusal(() => airMassPerDegree(2 as never, 3), TypeError, "function");
    expectRefusal(() => airMassPerDegree(airMassKastenYoung, 91), RangeError, "0 to 90");
    expectRefusal(() => zenithStandardUncertainty({} as never), TypeError, "latitudeDeg");
  });
  it("has no uncertainty where nothing is uncertain", () => {
    const exact = aerosolOpticalDepth({
      ...plain,
      signalStandardUncertainty: 0,
      constantStandardUncertainty: 0,
    });
    expect(exact.standardUncertainty).toBe(0);
    expect(exact.degreesOfFreedom).toBe(Number.POSITIVE_INFINITY);
    expect(exact.expandedUncertainty).toBe(0);
  });
  it("takes air masses above 0, to 50", () => {
    expectRelative(opticalDepthCriterion(50), 0.0052, 1e-15);
    expectRelative(opticalDepthCriterion(1e-4), 100.005, 1e-15);
    expectRefusal(
      () => opticalDepthCriterion(50.02),
      RangeError,
      "above 0, to 50",
      "zenith angle?",
    );
    expectRefusal(() => opticalDepthCriterion(0), RangeError, "above 0, to 50");
  });
  it("takes the difference over 0.02°, inside 0 to 90°", () => {
    // of (z - z0)³ it is 0.01², of (z - z0)² nothing, but at the ends 0.01; rounding of 50 ± 0.01 is 1e-14
    for (const z0 of [0.02, 50, 89.98]) {
      expectAbsolute(
        airMassPerDegree((z) => (z - z0) ** 3, z0),
        1e-4,
        1e-11,
      );
      expectAbsolute(
        airMassPerDegree((z) => (z - z0) ** 2, z0),
        0,
        1e-11,
      );
    }
    expectAbsolute(
      airMassPerDegree((z) => z ** 2, 0),
      0.01,
      1e-15,
    );
    expectAbsolute(
      airMassPerDegree((z) => (z - 90) ** 2, 90),
      -0.01,
      1e-11,
    );
  });
  it("ends at the limits of its angles", () => {
    expect(airMassPerDegree(airMassKastenYoung, 90)).toBeGreaterThan(1);
    expectAbsolute(airMassPerDegree(airMassKastenYoung, 0), 0, 1e-5);
  });
});

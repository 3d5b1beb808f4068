import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type ArchiveChannel,
  type ArchiveReadings,
  aerosolOpticalDepth,
  aerosolOpticalDepths,
  airMassKastenWater,
  airMassKastenYoung,
  airMassPerDegree,
  airMassShell,
  cloudScreening,
} from "../../src/index.js";
import { between } from "../_generators.js";
import {
  CHANNELS,
  nitrogenDioxideDepth,
  ozoneDepth,
  rayleighDepth,
  stationDay,
  SUMMIT,
} from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { emptyResult } from "../../src/retrieval/_archive.js";
import { screenDays } from "../../src/retrieval/_screenDays.js";
import { masses } from "./_reduction.js";

const settings = {
  pressureRelativeUncertainty: 0.002,
  ozoneStandardUncertaintyDu: 10,
  zenithStandardUncertaintyDeg: 0.02,
  screeningChannel: 2,
  windowMinutes: 9,
};
const channels: ArchiveChannel[] = CHANNELS.map(({ nm, constant }) => ({
  constant,
  constantRelativeUncertainty: 0.004,
  signalRelativeUncertainty: 0.001,
  rayleighDepthPerPa: rayleighDepth(nm, SUMMIT) / SUMMIT.pressurePa,
  ozoneDepthPerDu: ozoneDepth(nm, 1),
  otherDepth: nitrogenDioxideDepth(nm, 0.1),
}));

/** Two days end to end, with a cloud on the second. */
function archive(): { readings: ArchiveReadings; aerosol: number[][]; cloud: number[] } {
  const days = [0, 1].map((d) =>
    stationDay({
      seed: 40 + d,
      dayOfYear: 150 + d,
      station: SUMMIT,
      channels: CHANNELS,
      ozoneDu: 290,
      nitrogenDioxideDu: 0.1,
      aerosol500: () => 0.08 + 0.03 * d,
      exponent: 1.3,
      noise: 5e-4,
      fromHour: 8,
      toHour: 16,
      stepMinutes: 2,
      cloud: (hour) => (d === 1 && hour > 12 && hour < 13 ? 0.4 + 0.3 * Math.sin(40 * hour) : 0),
    }),
  );
  const all = days.flatMap((day, d) =>
    day.hours.map((hour, i) => ({
      minutes: d * 1440 + hour * 60,
      signals: CHANNELS.map((_, c) => day.signals[c]![i]!),
      distance: day.sunDistanceAu,
      mass: masses(day.zenithsDeg[i]!, SUMMIT),
      aerosol: CHANNELS.map((_, c) => day.aerosolDepths[c]![i]!),
      cloud: day.cloudDepths[i]!,
    })),
  );
  const list = (of: (row: (typeof all)[number]) => number): Float64Array =>
    Float64Array.from(all, of);
  return {
    readings: {
      timesMinutes: list(({ minutes }) => minutes),
      signals: Float64Array.from(all.flatMap(({ signals }) => signals)),
      sunDistancesAu: list(({ distance }) => distance),
      pressuresPa: list(() => SUMMIT.pressurePa),
      ozoneDu: list(() => 290),
      airMasses: list(({ mass }) => mass.air),
      ozoneAirMasses: list(({ mass }) => mass.ozone),
      aerosolAirMasses: list(({ mass }) => mass.aerosol),
    },
    aerosol: all.map(({ aerosol }) => aerosol),
    cloud: all.map(({ cloud }) => cloud),
  };
}

describe("independent fixtures", () => {
  const { readings, aerosol, cloud } = archive();
  const result = aerosolOpticalDepths(readings, channels, settings);

  it("gives what aerosolOpticalDepth gives, reading by reading", () => {
    for (let i = 0; i < readings.timesMinutes.length; i += 17) {
      channels.forEach((channel, c) => {
        const flat = (m: number): number => (m * Math.sqrt(m * m - 1) * Math.PI) / 180;
        const [air, ozone, own] = [
          readings.airMasses[i]!,
          readings.ozoneAirMasses[i]!,
          readings.aerosolAirMasses[i]!,
        ];
        const rayleigh = channel.rayleighDepthPerPa * readings.pressuresPa[i]!;
        const signal = readings.signals[i * 6 + c]!;
        const single = aerosolOpticalDepth({
          signal,
          signalStandardUncertainty: 0.001 * signal,
          constant: channel.constant,
          constantStandardUncertainty: 0.004 * channel.constant,
          sunDistanceAu: readings.sunDistancesAu[i]!,
          airMass: own,
          airMassPerDeg: flat(own),
          zenithStandardUncertaintyDeg: 0.02,
          terms: [
            {
              name: "air",
              opticalDepth: rayleigh,
              standardUncertainty: 0.002 * rayleigh,
              airMass: air,
              airMassPerDeg: flat(air),
            },
            {
              name: "high",
              opticalDepth: 290 * channel.ozoneDepthPerDu + channel.otherDepth,
              standardUncertainty: 10 * channel.ozoneDepthPerDu,
              airMass: ozone,
              airMassPerDeg: flat(ozone),
            },
          ],
        });
        expectAbsolute(result.opticalDepths[i * 6 + c]!, single.opticalDepth, 1e-12);
        expectRelative(result.standardUncertainties[i * 6 + c]!, single.standardUncertainty, 1e-10);
      });
    }
  });

  it("finds the simulated haze, and screens the cloud of the second day alone", () => {
    let [clear, kept] = [0, 0];
    aerosol.forEach((depths, i) => {
      if (cloud[i] !== 0) {
        if (cloud[i]! > 0.05) expect(result.screening[i]).not.toBe(0);
        return;
      }
      clear += 1;
      if (result.screening[i] === 0) kept += 1;
      depths.forEach((depth, c) => {
        // Rayleigh depths of one origin, air masses of two (5e-4 × 0.4), noise of 5e-4: under 0.003
        expectAbsolute(result.opticalDepths[i * 6 + c]!, depth, 0.003);
      });
    });
    expect(kept / clear).toBeGreaterThan(0.95);
  });

  it("screens each day as cloudScreening does", () => {
    const { timesMinutes } = readings;
    const half = timesMinutes.length / 2;
    for (const [from, to] of [
      [0, half],
      [half, 2 * half],
    ] as const) {
      const depths = Array.from(
        { length: half },
        (_, k) => result.opticalDepths[(from + k) * 6 + 2]!,
      );
      const codes = cloudScreening(timesMinutes.subarray(from, to), depths, 9);
      expect(result.screening.slice(from, to)).toEqual(codes);
    }
  });
});

describe("the slope of a flat atmosphere", () => {
  const flat = (m: number): number => (m * Math.sqrt(m * m - 1) * Math.PI) / 180;
  it.each([30, 60, 75, 80.4])("is near a spherical one's at %d°", (zenith) => {
    for (const airMass of [airMassKastenYoung, airMassKastenWater]) {
      expectRelative(flat(airMass(zenith)), airMassPerDegree(airMass, zenith), 0.06); // as the comment says
    }
    const shell = (z: number): number => airMassShell(z, { shellHeightM: 22_000, altitudeM: 0 });
    expectRelative(flat(shell(zenith)), airMassPerDegree(shell, zenith), 0.12);
  });
});

describe("properties", () => {
  const { readings } = archive();
  it("treats readings one by one: any part gives what the whole gives", () => {
    const whole = aerosolOpticalDepths(readings, channels, settings);
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 300 }),
        fc.integer({ min: 1, max: 100 }),
        (from, count) => {
          const cut = <K extends keyof ArchiveReadings>(key: K, width = 1): Float64Array =>
            readings[key].subarray(from * width, (from + count) * width);
          const part: ArchiveReadings = {
            timesMinutes: cut("timesMinutes"),
            signals: cut("signals", 6),
            sunDistancesAu: cut("sunDistancesAu"),
            pressuresPa: cut("pressuresPa"),
            ozoneDu: cut("ozoneDu"),
            airMasses: cut("airMasses"),
            ozoneAirMasses: cut("ozoneAirMasses"),
            aerosolAirMasses: cut("aerosolAirMasses"),
          };
          const { opticalDepths } = aerosolOpticalDepths(part, channels, settings);
          expect(opticalDepths).toEqual(whole.opticalDepths.slice(from * 6, (from + count) * 6));
        },
      ),
      { numRuns: 20 },
    );
  });
  it("does not see the scale of a channel", () => {
    fc.assert(
      fc.property(between(0.01, 100), (scale) => {
        const scaled = { ...readings, signals: readings.signals.map((s) => s * scale) };
        const constants = channels.map((channel) => ({
          ...channel,
          constant: channel.constant * scale,
        }));
        const other = aerosolOpticalDepths(scaled, constants, settings).opticalDepths;
        const one = aerosolOpticalDepths(readings, channels, settings).opticalDepths;
        for (let i = 0; i < one.length; i += 97) expectAbsolute(other[i]!, one[i]!, 1e-12);
      }),
      { numRuns: 20 },
    );
  });
});

describe("edges", () => {
  const { readings } = archive();
  /** Readings of one channel with all air masses alike. */
  const alike = (count: number, signal: number, airMass: number): ArchiveReadings => {
    const all = (value: number): Float64Array => new Float64Array(count).fill(value);
    return {
      timesMinutes: Float64Array.from({ length: count }, (_, i) => i),
      signals: all(signal),
      sunDistancesAu: all(1),
      pressuresPa: all(SUMMIT.pressurePa),
      ozoneDu: all(300),
      airMasses: all(airMass),
      ozoneAirMasses: all(airMass),
      aerosolAirMasses: all(airMass),
    };
  };
  const alone = { ...settings, screeningChannel: 0 };
  it("takes any signal above 0", () => {
    const dim = { ...channels[2]!, constant: 1e-6 };
    const { opticalDepths } = aerosolOpticalDepths(alike(1, 1e-7, 1), [dim], alone);
    const known = dim.rayleighDepthPerPa * SUMMIT.pressurePa + 300 * dim.ozoneDepthPerDu;
    expectAbsolute(opticalDepths[0]!, Math.LN10 - known - dim.otherDepth, 1e-14);
  });
  it("does not ask for the zenith angle where the sun is overhead, air masses a little below 1 included", () => {
    for (const airMass of [1, 0.9997]) {
      const of = (zenithStandardUncertaintyDeg: number): number =>
        aerosolOpticalDepths(alike(1, 1, airMass), channels.slice(0, 1), {
          ...alone,
          zenithStandardUncertaintyDeg,
        }).standardUncertainties[0]!;
      expect(of(1)).toBe(of(0));
    }
  });
  it("screens an archive of one reading", () => {
    const one = aerosolOpticalDepths(alike(1, 0.1, 1), channels.slice(0, 1), alone);
    expect(Array.from(one.screening)).toEqual([3]);
  });
  it("parts days by gaps of more than three hours", () => {
    // the last reading of the first day is far off that day's mean, not off the mean of both
    const depths = Float64Array.from({ length: 41 }, (_, i) => (i < 20 ? 5 : i === 20 ? 5.1 : 6));
    const screened = (gap: number): number => {
      const times = depths.map((_, i) => (i <= 20 ? i : i + gap - 1));
      const result = { ...emptyResult(41, 1), opticalDepths: depths };
      screenDays(times, 1, { ...alone, windowMinutes: 4 }, result);
      expect(Array.from(result.screening).filter((code) => code !== 0).length).toBeLessThan(2);
      return result.screening[20]!;
    };
    expect(screened(180)).toBe(0);
    expect(screened(180.1)).toBe(4);
  });
  it("gives NaN where a signal is none, and fills the arrays it is given", () => {
    const signals = readings.signals.slice();
    signals[6 * 5 + 2] = Number.NaN;
    signals[6 * 7 + 2] = -1;
    signals[6 * 9 + 1] = 0;
    const count = readings.timesMinutes.length;
    const out = {
      opticalDepths: new Float64Array(count * 6),
      standardUncertainties: new Float64Array(count * 6),
      screening: new Uint8Array(count),
    };
    const result = aerosolOpticalDepths({ ...readings, signals }, channels, settings, out);
    expect(result.opticalDepths).toBe(out.opticalDepths);
    for (const k of [6 * 5 + 2, 6 * 7 + 2, 6 * 9 + 1]) expect(out.opticalDepths[k]).toBeNaN();
    expect(out.opticalDepths[6 * 5 + 1]).toBeGreaterThan(0);
    expect([out.screening[5], out.screening[7], out.screening[9]]).toEqual([1, 1, 0]);
  });
  it("takes an empty archive", () => {
    const none = new Float64Array(0);
    const empty = Object.fromEntries(Object.keys(readings).map((key) => [key, none]));
    expect(aerosolOpticalDepths(empty as never, channels, settings).screening.length).toBe(0);
  });
  it("refuses what cannot be", () => {
    const call =
      (change: object, extra: object = {}): (() => unknown) =>
      () =>
        aerosolOpticalDepths({ ...readings, ...change }, channels, { ...settings, ...extra });
    expectRefusal(
      call({ signals: new Float64Array(3) }),
      RangeError,
      "aerosolOpticalDepths",
      "readings.signals",
    );
    expectRefusal(call({ ozoneDu: new Float64Array(3) }), RangeError, "readings.ozoneDu");
    expectRefusal(call({ ozoneDu: undefined }), TypeError, "readings.ozoneDu");
    expectRefusal(call({}, { screeningChannel: 6 }), RangeError, "screeningChannel");
    expectRefusal(call({}, { screeningChannel: 0.5 }), RangeError, "screeningChannel", "whole");
    const late = readings.timesMinutes.slice();
    late[3] = late[2]!;
    expectRefusal(call({ timesMinutes: late }), RangeError, "timesMinutes[3]");
    expectRefusal(call({}, { windowMinutes: 0 }), RangeError, "windowMinutes");
    expectRefusal(
      call({}, { pressureRelativeUncertainty: -1 }),
      RangeError,
      "pressureRelativeUncertainty",
    );
    expectRefusal(
      () =>
        aerosolOpticalDepths(
          readings,
          [{ ...channels[0]!, constant: 0 }, ...channels.slice(1)],
          settings,
        ),
      RangeError,
      "channels[0].constant",
    );
    expectRefusal(
      () => aerosolOpticalDepths(readings, channels, settings, { screening: [] } as never),
      TypeError,
      "out.opticalDepths",
    );
    expectRefusal(
      () => aerosolOpticalDepths(undefined as never, channels, settings),
      TypeError,
      "readings",
    );
  });
});

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  bandTransmittance,
  gaussianPassband,
  MOLECULES_PER_DOBSON_UNIT,
  type OzoneChannel,
  type OzoneColumn,
  type OzonePath,
  ozoneColumn,
  ozoneCrossSection,
  precipitableWater,
  propagate,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { nitrogenDioxideDepth, randomOf, stationDay, SUMMIT } from "../_stationDays.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { masses, rayleigh } from "./_reduction.js";

const N = MOLECULES_PER_DOBSON_UNIT;
const flat = { wavelengthsNm: Float64Array.of(250, 1100), values: Float64Array.of(1, 1) };
const path: OzonePath = {
  sunDistanceAu: 1,
  ozoneAirMass: 2,
  ozoneAirMassRelativeUncertainty: 0.002,
  aerosolAirMass: 2,
  aerosolPowers: [0],
  knownRelativeUncertainty: 0.003,
  crossSectionRelativeUncertainty: 0.01,
};

/** A triangle of 2 nm at half maximum, as the instrument has it (81 wavelengths of equal weight) and as its maker prints it. */
const lines = (nm: number): number[] =>
  Array.from({ length: 81 }, (_, i) => {
    const u = (i + 0.5) / 81;
    return nm + 2 * (u < 0.5 ? Math.sqrt(2 * u) - 1 : 1 - Math.sqrt(2 - 2 * u));
  });
const printed = (nm: number) => ({
  wavelengthsNm: Float64Array.from({ length: 41 }, (_, i) => nm + (i - 20) / 10),
  values: Float64Array.from({ length: 41 }, (_, i) => 1 - Math.abs(i - 20) / 20),
});

/** A simulated ultraviolet pair, analysed with cross-sections averaged over the band or taken at its centre. */
function pair(nms: readonly number[], averaged: boolean): OzoneColumn[] {
  const day = stationDay({
    seed: 1,
    dayOfYear: 150,
    station: SUMMIT,
    channels: nms.map((nm) => ({ nm, constant: 1, passbandNm: lines(nm) })),
    ozoneDu: 300,
    nitrogenDioxideDu: 0.1,
    aerosol500: () => 0.1,
    exponent: 0,
    noise: 0,
    fromHour: 8,
    toHour: 12,
    stepMinutes: 120,
  });
  return day.zenithsDeg.map((zenith, i) => {
    const m = masses(zenith, SUMMIT);
    const known = (x: number): number =>
      rayleigh(x, SUMMIT) * m.air + nitrogenDioxideDepth(x, 0.1) * m.ozone;
    const ozone = (x: number): number => ozoneCrossSection(x, 218) * N * 300 * m.ozone;
    const channels = nms.map((nm, c): OzoneChannel => {
      const without = bandTransmittance(printed(nm), flat, known);
      const through = bandTransmittance(printed(nm), flat, (x) => known(x) + ozone(x));
      return {
        wavelengthNm: nm,
        signal: day.signals[c]![i]!,
        signalStandardUncertainty: 1e-3 * day.signals[c]![i]!,
        constant: 1,
        constantStandardUncertainty: 0.01,
        knownSlantDepth: averaged ? -Math.log(without) : known(nm),
        crossSectionM2: averaged
          ? Math.log(without / through) / (N * 300 * m.ozone)
          : ozoneCrossSection(nm, 218),
      };
    });
    const { sunDistanceAu } = day;
    return ozoneColumn(channels, {
      ...path,
      sunDistanceAu,
      ozoneAirMass: m.ozone,
      aerosolAirMass: m.aerosol,
    });
  });
}

/** Channels of a column and a smooth aerosol without noise. */
function visible(nms: readonly number[], relative: number, ozoneDu = 300): OzoneChannel[] {
  return nms.map((wavelengthNm) => {
    const crossSectionM2 = ozoneCrossSection(wavelengthNm, 225);
    const aerosol = 0.03 + 0.05 * (500 / wavelengthNm);
    const slant = 2 * (crossSectionM2 * N * ozoneDu + aerosol) + 0.1;
    return {
      wavelengthNm,
      crossSectionM2,
      signal: Math.exp(-slant),
      signalStandardUncertainty: 0,
      constant: 1,
      constantStandardUncertainty: relative,
      knownSlantDepth: 0.1,
    };
  });
}

/** Standard uncertainty of ozone, DU, from calibrations of 0.4 % alone. */
const ofCalibration = (
  nms: readonly number[],
  aerosolPowers: readonly number[],
  airMass: number,
): number =>
  ozoneColumn(visible(nms, 0.004), {
    ...path,
    aerosolPowers,
    ozoneAirMass: airMass,
    aerosolAirMass: airMass,
    ozoneAirMassRelativeUncertainty: 0,
    knownRelativeUncertainty: 0,
    crossSectionRelativeUncertainty: 0,
  }).standardUncertainty;

describe("published values", () => {
  it.each([
    [412, 500, 610, 675, 778, 862],
    [440, 500, 610, 675, 870],
  ])("carries 18 to 32 DU from 0.4 percent calibrations (%d, %d, %d, %d nm ...)", (...nms) => {
    for (const aerosolPowers of [
      [0, -1],
      [-1, -2],
      [0, -1, -2],
    ]) {
      const standardUncertainty = ofCalibration(nms, aerosolPowers, 2);
      // sizes computed for the plan of this function: 13 to 30 DU; 32 where three powers meet five channels
      expect(standardUncertainty).toBeGreaterThan(18);
      expect(standardUncertainty).toBeLessThan(32);
      // the slant column of ozone is what the calibrations blur
      expectRelative(ofCalibration(nms, aerosolPowers, 3), (standardUncertainty * 2) / 3, 1e-9);
    }
  });
  it.each([
    [412, 500, 675, 778, 862],
    [440, 500, 675, 870],
    [368, 412, 500, 675, 778, 862],
  ])(
    "says how weak the visible fit is without a channel near 610 nm (%d, %d, %d, %d nm ...)",
    (...nms) => {
      for (const aerosolPowers of [
        [0, -1],
        [-1, -2],
      ]) {
        const standardUncertainty = ofCalibration(nms, aerosolPowers, 2);
        expect(standardUncertainty).toBeGreaterThan(53);
        expect(standardUncertainty).toBeLessThan(63);
      }
      expect(ofCalibration(nms, [0, -1, -2], 2)).toBeGreaterThan(85);
    },
  );
});

describe("independent fixtures", () => {
  it.each([
    [306, 317],
    [306, 325],
    [305, 320],
    [308, 324],
  ])("finds 300 DU with a pair at %d and %d nm, 2 nm wide", (...nms) => {
    // the simulated day has its own air masses, Rayleigh depths and cross-sections
    for (const { ozoneDu } of pair(nms, true)) expectAbsolute(ozoneDu, 300, 1);
  });
  it.each([
    [306, 317],
    [306, 325],
    [305, 320],
  ])("is off by 5 to 12.6 DU with cross-sections at the centres of %d and %d nm", (...nms) => {
    for (const { ozoneDu } of pair(nms, false)) {
      expect(Math.abs(ozoneDu - 300)).toBeGreaterThan(5);
      expect(Math.abs(ozoneDu - 300)).toBeLessThan(12.7);
    }
  });
  it("is the pair solved by hand, and its budget the law of propagation", () => {
    const channels = visible([306, 320], 0.01).map((channel) => ({
      ...channel,
      signalStandardUncertainty: 0.002 * channel.signal,
      signal: channel.signal * 1.01,
    }));
    const [a, b] = channels as [OzoneChannel, OzoneChannel];
    const result = ozoneColumn(channels, path);
    const law = propagate(
      (v) =>
        (Math.log(v.ca / v.sa) -
          Math.log(v.cb / v.sb) -
          v.known * (a.knownSlantDepth - b.knownSlantDepth)) /
        (v.mass * v.scale * (a.crossSectionM2 - b.crossSectionM2) * N * 2),
      {
        sa: { value: a.signal, standardUncertainty: a.signalStandardUncertainty },
        ca: { value: 1, standardUncertainty: 0.01 },
        sb: { value: b.signal, standardUncertainty: b.signalStandardUncertainty },
        cb: { value: 1, standardUncertainty: 0.01 },
        known: { value: 1, standardUncertainty: 0.003 },
        mass: { value: 1, standardUncertainty: 0.002 },
        scale: { value: 1, standardUncertainty: 0.01 },
      },
    );
    expectRelative(result.ozoneDu, law.value, 1e-12);
    expectRelative(result.standardUncertainty, law.standardUncertainty, 1e-7);
    result.budget.forEach((row, i) => {
      expectAbsolute(row.contribution, law.budget[i]!.contribution, 1e-6);
    });
    expect(result.budget.map(({ input }) => input)).toContain("constant 306 nm");
  });
  it.each([
    [[306, 320], [0]],
    [
      [412, 500, 610, 675, 778, 862],
      [0, -1],
    ],
  ])("states the spread of 400 simulated readings at %j", (nms, aerosolPowers) => {
    const { normal } = randomOf(6);
    const exact = {
      ...path,
      aerosolPowers,
      knownRelativeUncertainty: 0,
      ozoneAirMassRelativeUncertainty: 0,
      crossSectionRelativeUncertainty: 0,
    };
    const found: number[] = [];
    let stated = 0;
    for (let trial = 0; trial < 400; trial++) {
      const channels = visible(nms, 0.004).map((channel) => ({
        ...channel,
        constant: 1 + 0.004 * normal(),
        signal: channel.signal * (1 + 0.001 * normal()),
        signalStandardUncertainty: 0.001 * channel.signal,
      }));
      const result = ozoneColumn(channels, exact);
      found.push(result.ozoneDu);
      stated = result.standardUncertainty;
    }
    // about their mean: a flat aerosol is not the one put in
    const mean = found.reduce((sum, x) => sum + x, 0) / 400;
    const spread = Math.sqrt(found.reduce((sum, x) => sum + (x - mean) ** 2, 0) / 399);
    expectRelative(spread, stated, 0.1); // 400 draws: 3.5 %, three of those
  });
  it("inverts its water model, its budget the law of propagation", () => {
    const reading = {
      signal: 0.5,
      signalStandardUncertainty: 0.001,
      constant: 1,
      constantStandardUncertainty: 0.01,
      sunDistanceAu: 1.01,
      airMass: 2.5,
      knownSlantDepth: 0.1,
      knownSlantStandardUncertainty: 0.01,
      bandFactor: 0.55,
      bandFactorStandardUncertainty: 0.01,
      bandExponent: 0.6,
      bandExponentStandardUncertainty: 0.01,
    };
    const result = precipitableWater(reading);
    const through = Math.exp(-0.55 * (2.5 * result.waterCm) ** 0.6 - 0.1) / 1.01 ** 2;
    expectRelative(through, 0.5, 1e-12);
    const law = propagate(
      ({ s, c, k, a, b }) => ((Math.log(c / (s * 1.01 ** 2)) - k) / a) ** (1 / b) / 2.5,
      {
        s: { value: 0.5, standardUncertainty: 0.001 },
        c: { value: 1, standardUncertainty: 0.01 },
        k: { value: 0.1, standardUncertainty: 0.01 },
        a: { value: 0.55, standardUncertainty: 0.01 },
        b: { value: 0.6, standardUncertainty: 0.01 },
      },
    );
    expectRelative(result.standardUncertainty, law.standardUncertainty, 1e-6);
    result.budget.forEach((row, i) => {
      expectRelative(row.sensitivity, law.budget[i]!.sensitivity, 1e-5);
    });
  });
  it("averages a Gaussian band over a slope and a bend in closed form", () => {
    // exp(-(a + b x)) over a normal curve of variance v is exp(-a + b² v / 2); width 20 nm at half maximum
    const band = gaussianPassband(500, 20);
    const v = (20 / 2.3548200450309493) ** 2;
    const through = bandTransmittance(band, flat, (nm) => 0.5 + 0.01 * (nm - 500));
    // the printed curve's straight lines add 4e-4 to the variance: 4e-4 × 0.01² v / 2 = 1.4e-6
    expectRelative(through, Math.exp(-0.5 + 0.5e-4 * v), 3e-6);
    // a source that slopes as exp(c x) moves the band's centre by c v
    const source = {
      wavelengthsNm: Float64Array.from({ length: 201 }, (_, i) => 400 + i),
      values: Float64Array.from({ length: 201 }, (_, i) => Math.exp(0.02 * (i - 100))),
    };
    const tilted = bandTransmittance(band, source, (nm) => 0.01 * (nm - 500));
    expectRelative(tilted, Math.exp(0.5e-4 * v - 0.01 * 0.02 * v), 5e-6); // straight lines between exponentials 1 nm apart
  });
});

describe("the nodes of a band", () => {
  const curve = (wavelengthsNm: number[], values: number[]) => ({
    wavelengthsNm: Float64Array.from(wavelengthsNm),
    values: Float64Array.from(values),
  });
  it("sums straight passband, source and transmittance exactly between them", () => {
    const [p, s] = [
      curve([490, 500, 512, 520], [0, 1, 0.5, 0]),
      curve([480, 505, 530], [1, 2, 1.5]),
    ];
    const through = (nm: number): number => 0.3 + 0.01 * (nm - 490);
    const passband = (nm: number): number =>
      nm < 500 ? (nm - 490) / 10 : nm < 512 ? 1 - (nm - 500) / 24 : (520 - nm) / 16;
    const source = (nm: number): number => (nm < 505 ? 1 + (nm - 480) / 25 : 2 - (nm - 505) / 50);
    // two Gauss points between nodes do cubics exactly as well
    const nodes = [490, 500, 505, 512, 520];
    let [above, below] = [0, 0];
    for (let k = 1; k < nodes.length; k++) {
      const [mid, half] = [(nodes[k]! + nodes[k - 1]!) / 2, (nodes[k]! - nodes[k - 1]!) / 2];
      for (const nm of [mid - half / Math.sqrt(3), mid + half / Math.sqrt(3)]) {
        above += half * passband(nm) * source(nm) * through(nm);
        below += half * passband(nm) * source(nm);
      }
    }
    expectRelative(
      bandTransmittance(p, s, (nm) => -Math.log(through(nm))),
      above / below,
      1e-14,
    );
  });
  it("lie where the passband is open: no source and no depth is asked for beyond", () => {
    const p = curve([300, 310, 490, 500, 510, 800, 900], [0, 0, 0, 1, 0, 0, 0]);
    const s = curve([490, 510], [1, 1]);
    const depth = (nm: number): number => (nm > 490 && nm < 510 ? 0.5 : Number.NaN);
    expectRelative(bandTransmittance(p, s, depth), Math.exp(-0.5), 1e-15);
    const short = (from: number, to: number) => () =>
      bandTransmittance(p, curve([from, to], [1, 1]), depth);
    expectRefusal(short(490.1, 510), RangeError, "cover 490 to 510 nm");
    expectRefusal(short(490, 509.9), RangeError, "cover 490 to 510 nm");
  });
  it("are those of the whole passband where it is closed", () => {
    const closed = curve([500, 510], [0, 0]);
    expectRefusal(
      () => bandTransmittance(closed, curve([500, 510], [1, 1]), () => 1),
      RangeError,
      "light within the passband",
    );
  });
});

describe("properties", () => {
  it("recovers any column and smooth aerosol without noise", () => {
    fc.assert(
      fc.property(between(100, 600), (ozoneDu) => {
        const result = ozoneColumn(visible([412, 500, 610, 675, 862], 0.004, ozoneDu), {
          ...path,
          aerosolPowers: [0, -1],
        });
        expectAbsolute(result.ozoneDu, ozoneDu, 1e-8);
        expectAbsolute(result.aerosolOpticalDepths[1]!, 0.08, 1e-12);
      }),
    );
  });
  it("does not see the scale of a channel", () => {
    fc.assert(
      fc.property(between(0.01, 100), (scale) => {
        const channels = visible([306, 320], 0.01);
        const scaled = channels.map((channel, i) =>
          i === 0
            ? {
                ...channel,
                signal: channel.signal * scale,
                constant: scale,
                constantStandardUncertainty: 0.01 * scale,
              }
            : channel,
        );
        const [one, other] = [channels, scaled].map((list) => ozoneColumn(list, path));
        expectAbsolute(other!.ozoneDu, one!.ozoneDu, 1e-8);
        expectRelative(other!.standardUncertainty, one!.standardUncertainty, 1e-9);
      }),
    );
  });
  it("passes all light where there is no depth, and less through more", () => {
    fc.assert(
      fc.property(between(0, 3), between(5, 60), (depth, width) => {
        const band = gaussianPassband(500, width);
        expect(bandTransmittance(band, flat, () => 0)).toBe(1);
        expectRelative(
          bandTransmittance(band, flat, () => depth),
          Math.exp(-depth),
          1e-12,
        );
      }),
    );
  });
});

describe("edges", () => {
  const channels = visible([306, 320], 0.01);
  it("refuses what cannot be", () => {
    const call =
      (change: object, extra: object = {}): (() => unknown) =>
      () =>
        ozoneColumn([channels[0]!, { ...channels[1]!, ...change }], { ...path, ...extra });
    expectRefusal(call({ signal: -1 }), RangeError, "ozoneColumn", "channels[1].signal");
    expectRefusal(call({ crossSectionM2: 2e-19 }), RangeError, "crossSectionM2", "m²");
    expectRefusal(call({ constantStandardUncertainty: 0 }), RangeError, "one standard uncertainty");
    expectRefusal(call({}, { aerosolPowers: [0, -1] }), RangeError, "at least 3");
    expectRefusal(call({}, { ozoneAirMass: 0 }), RangeError, "ozoneAirMass");
    expectRefusal(call({}, { knownRelativeUncertainty: 2 }), RangeError, "percent");
    expectRefusal(
      call({ crossSectionM2: channels[0]!.crossSectionM2 }),
      RangeError,
      "tell ozone from the aerosol",
    );
    expectRefusal(() => ozoneColumn(channels, undefined as never), TypeError, "path");
    expectRefusal(() => ozoneColumn([channels[0]!], path), RangeError, "at least 2");
  });
  it("refuses water from a reading that shows none", () => {
    const reading = {
      signal: 0.95,
      signalStandardUncertainty: 0,
      constant: 1,
      constantStandardUncertainty: 0,
      sunDistanceAu: 1,
      airMass: 1,
      knownSlantDepth: 0.1,
      knownSlantStandardUncertainty: 0,
      bandFactor: 0.5,
      bandFactorStandardUncertainty: 0,
      bandExponent: 0.6,
      bandExponentStandardUncertainty: 0,
    };
    expectRefusal(() => precipitableWater(reading), RangeError, "absorption by water");
    // slant depth s of water: (s / 0.5)^(1 / 0.6) cm; 16 digits of 1 less 6
    const little = { ...reading, signal: Math.exp(-1e-6), knownSlantDepth: 0 };
    expectRelative(precipitableWater(little).waterCm, 2e-6 ** (1 / 0.6), 1e-9);
    expectRefusal(
      () => precipitableWater({ ...reading, bandExponent: 0 }),
      RangeError,
      "bandExponent",
    );
    expectRefusal(() => precipitableWater({} as never), TypeError, "signal");
  });
  it("refuses bands without light", () => {
    const band = gaussianPassband(500, 10);
    const depth = (): number => 1;
    const dark = { wavelengthsNm: Float64Array.of(300, 900), values: Float64Array.of(0, 0) };
    expectRefusal(
      () => bandTransmittance(band, dark, depth),
      RangeError,
      "light within the passband",
    );
    const short = { wavelengthsNm: Float64Array.of(495, 900), values: Float64Array.of(1, 1) };
    expectRefusal(() => bandTransmittance(band, short, depth), RangeError, "source must cover");
    expectRefusal(() => bandTransmittance(band, flat, 1 as never), TypeError, "function");
    expectRefusal(() => bandTransmittance({} as never, flat, depth), TypeError, "passband");
  });
});

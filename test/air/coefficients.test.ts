/** Formulas written out a second time, in states in which every coefficient shows: `npm run nudge` found these unguarded. */
import { describe, expect, it } from "vitest";
import { gravity, moistAir, refractiveIndexCiddor, standardAtmosphere } from "../../src/index.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

describe("Ciddor 1996 with absolute densities, hot and wet, at the ends of the spectrum", () => {
  /** Compressibility by equation 12, Celsius and powers. */
  const z = (p: number, t: number, x: number): number => {
    const c = t - 273.15;
    const a0 = 1.58123e-6 - 2.9331e-8 * c + 1.1043e-10 * c ** 2;
    const mixed = a0 + (5.707e-6 - 2.051e-8 * c) * x + (1.9898e-4 - 2.376e-6 * c) * x ** 2;
    return 1 - (p / t) * mixed + (p / t) ** 2 * (1.83e-11 - 0.765e-8 * x ** 2);
  };
  /** p M / (Z R T), the share of one constituent. */
  const density = (p: number, t: number, x: number, molar: number, share: number): number =>
    (p * molar * share) / (z(p, t, x) * 8.31451 * t);

  it.each([
    [300, 350, 90_000, 1, 2000],
    [300, 350, 90_000, 1, 0],
    [400, 330, 110_000, 0.9, 2000],
    [1690, 370, 120_000, 0.8, 450],
  ])("%d nm, %d K, %d Pa, humidity %d, %d ppm", (nm, t, p, humidity, co2) => {
    const air = moistAir({
      pressurePa: p,
      temperatureK: t,
      relativeHumidity: humidity,
      co2Ppm: co2,
    });
    const x = air.waterMoleFraction;
    const dryMolar = 1e-3 * (28.9635 + 12.011e-6 * (co2 - 400));
    const s = (1000 / nm) ** 2;
    const dry = 5792105 / (238.0185 - s) + 167917 / (57.362 - s);
    const dryCo2 = dry * (1 + 0.534e-6 * (co2 - 450));
    const wet = 1.022 * (295.235 + 2.6422 * s - 0.03238 * s ** 2 + 0.004028 * s ** 3);
    const a = density(p, t, x, dryMolar, 1 - x) / density(101325, 288.15, 0, dryMolar, 1);
    const w = density(p, t, x, 0.018015, x) / density(1333, 293.15, 1, 0.018015, 1);
    // the same sums in another order
    expectAbsolute(refractiveIndexCiddor(nm, air), 1 + 1e-8 * (a * dryCo2 + w * wet), 2e-15);
  });
});

describe("WGS 84 from its defining constants", () => {
  const [a, flattening, gm, spin] = [6378137, 1 / 298.257223563, 3.986004418e14, 7.292115e-5];
  const b = a * (1 - flattening);
  const [equator, pole] = [9.7803253359, 9.8321849378];

  it.each([
    [0, 80_000],
    [45, 86_000],
    [90, 40_000],
    [-30, -5000],
  ])("%d°, %d m", (latitude, altitude) => {
    const s2 = Math.sin((latitude * Math.PI) / 180) ** 2;
    // Somigliana in the form with both gravities
    const surface =
      (a * equator * (1 - s2) + b * pole * s2) / Math.sqrt(a * a * (1 - s2) + b * b * s2);
    const m = (spin ** 2 * a ** 2 * b) / gm;
    const h = altitude / a;
    const factor = 1 - 2 * (1 + flattening + m - 2 * flattening * s2) * h + 3 * h * h;
    // the gravities are printed to 1e-10
    expectRelative(gravity(latitude, altitude), surface * factor, 3e-11);
  });
});

describe("US Standard Atmosphere 1976, table 8: molar mass over its sea-level value, every 500 m from 80 km (from memory)", () => {
  const ratios = [
    ...[1, 0.999996, 0.999989, 0.999971, 0.999941, 0.999909, 0.99987],
    ...[0.999829, 0.999786, 0.999741, 0.999694, 0.999641, 0.999579],
  ];
  /** Molecular-scale temperature of the last layer, from its own definition. */
  const molecular = (z: number): number =>
    214.65 - 0.002 * ((6356766 * z) / (6356766 + z) - 71_000);

  it("is the ratio of the temperatures, linear between the rows", () => {
    for (const [i, ratio] of ratios.entries()) {
      const z = 80_000 + 500 * i;
      expectRelative(standardAtmosphere(z).temperatureK / molecular(z), ratio, 1e-14);
      if (i === 0) continue;
      const middle = standardAtmosphere(z - 250).temperatureK / molecular(z - 250);
      expectRelative(middle, (ratio + ratios[i - 1]!) / 2, 1e-14);
    }
    expect(standardAtmosphere(80_050).temperatureK).toBeLessThan(molecular(80_050) * (1 - 3e-7));
  });
});

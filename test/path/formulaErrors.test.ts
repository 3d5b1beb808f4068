/** What each published formula is off by against the refracted ray: the sizes their comments give, both as limits and as signs. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airMassHardie,
  airMassKasten,
  airMassKastenWater,
  airMassKastenYoung,
  airMassPickering,
  airMassRozenberg,
  airMassShell,
  airMassYoung,
  airMassYoungIrvine,
  apparentZenith,
  exponentialLayer,
  gaussianLayer,
  type RefractedPath,
  refractedPath,
  refractionBennett,
  refractionSaemundsson,
  standardProfile,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const constituents = {
  ozone: gaussianLayer({ heightM: 22_000, standardDeviationM: 5000 }),
  water: exponentialLayer({ scaleHeightM: 2000 }),
};
const dry = {
  pressurePa: 101325,
  temperatureK: 288.15,
  relativeHumidity: 0,
  altitudeM: 0,
  co2Ppm: 425,
};
const input = {
  profile: standardProfile(dry),
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
  constituents,
};
const ray = (zenith: number): RefractedPath<"ozone" | "water"> => refractedPath(zenith, input);
const radians = Math.PI / 180;
const everyDegree = (most: number): number[] => Array.from({ length: most + 1 }, (_, i) => i);

describe("air mass of air against the ray", () => {
  // formula of the apparent angle; [to this angle, within per cent]; [at this angle, per cent off]
  it.each([
    [
      "airMassKastenYoung",
      airMassKastenYoung,
      [89.5, 0.17],
      [
        [86, -0.164],
        [90, -0.625],
      ],
    ],
    [
      "airMassHardie",
      airMassHardie,
      [70, 0.08],
      [
        [80, 0.239],
        [84, -0.197],
        [85, -1.055],
      ],
    ],
    [
      "airMassKasten",
      airMassKasten,
      [85, 0.08],
      [
        [88, 0.481],
        [90, -4.318],
      ],
    ],
    [
      "airMassPickering",
      airMassPickering,
      [82, 0.08],
      [
        [85, 0.138],
        [88, 1.01],
        [90, 1.549],
      ],
    ],
    [
      "airMassRozenberg",
      airMassRozenberg,
      [89, 1.0],
      [
        [60, 0.285],
        [88, -0.974],
        [90, 4.827],
      ],
    ],
  ] as const)("%s", (_name, formula, [to, within], points) => {
    for (const z of [...everyDegree(Math.floor(to)), to]) {
      expect(Math.abs(formula(z) / ray(z).airMass - 1) * 100).toBeLessThanOrEqual(within);
    }
    for (const [z, off] of points) {
      // the last digit of the size as written here
      expectAbsolute((formula(z) / ray(z).airMass - 1) * 100, off, 0.001);
    }
  });

  it("formulas of the true angle: Young within 0.06 %, Young & Irvine within 0.07 % to 80°", () => {
    for (const z of [...everyDegree(89), 89.4]) {
      const { trueZenithDeg, airMass } = ray(z);
      if (trueZenithDeg <= 90) {
        expect(Math.abs(airMassYoung(trueZenithDeg) / airMass - 1)).toBeLessThanOrEqual(6e-4);
      }
      if (trueZenithDeg <= 80) {
        expect(Math.abs(airMassYoungIrvine(trueZenithDeg) / airMass - 1)).toBeLessThanOrEqual(7e-4);
      }
    }
  });

  it("a true angle in Rozenberg's formula: 2.8 % at 85°, 16 % at 89°", () => {
    for (const [z, off] of [
      [85, 0.028],
      [89, 0.158],
    ] as const) {
      const { trueZenithDeg, airMass } = ray(z);
      expectAbsolute(airMassRozenberg(trueZenithDeg) / airMass - 1, off, 5e-4);
    }
  });
});

describe("other constituents against the ray", () => {
  it("ozone has 17 % less than air at 85°: its own formula says so, the air's gives 21 % too much", () => {
    expectAbsolute(airMassKastenYoung(85) / ray(85).masses.ozone - 1, 0.21, 0.005);
    const shell = { shellHeightM: 22_000, altitudeM: 0 };
    expectAbsolute(airMassShell(85, shell) / airMassYoung(85) - 1, -0.17, 0.005);
  });

  it("Kasten's water: within 0.06 % to 85°, -0.2 % at 89°, -2.9 % at the horizon", () => {
    for (const z of everyDegree(85)) {
      expect(Math.abs(airMassKastenWater(z) / ray(z).masses.water - 1)).toBeLessThanOrEqual(6e-4);
    }
    expectAbsolute(airMassKastenWater(89) / ray(89).masses.water - 1, -0.00204, 1e-5);
    expectAbsolute(airMassKastenWater(90) / ray(90).masses.water - 1, -0.0291, 1e-4);
  });

  it("a thin shell for a thick ozone layer, by true angle", () => {
    const shell = { shellHeightM: 22_000, altitudeM: 0 };
    const off = (apparent: number): number => {
      const { trueZenithDeg, masses } = ray(apparent);
      return (airMassShell(trueZenithDeg, shell) / masses.ozone - 1) * 100;
    };
    for (const z of everyDegree(75)) expect(Math.abs(off(z))).toBeLessThanOrEqual(0.01);
    expectAbsolute(off(80), -0.041, 0.001);
    const seen = (trueZenith: number): number => apparentZenith(trueZenith, input);
    expectAbsolute(off(seen(85)), -0.524, 0.002);
    expectAbsolute(off(seen(88)), -2.434, 0.002);
    expectAbsolute(off(seen(90)), -5.615, 0.002);
  });
});

describe("refraction against the ray in the formulas' own weather", () => {
  const surface = { pressurePa: 101_000, temperatureK: 283 };
  const cool = {
    profile: standardProfile({ ...dry, ...surface, relativeHumidity: 0.5 }),
    altitudeM: 0,
    wavelengthNm: 575,
    earthRadiusM: 6371000,
  };
  it("Bennett: within 6.1″ to 87°, +20″ at 89°, +44″ at the horizon", () => {
    const off = (z: number): number =>
      (refractionBennett(z, surface) - refractedPath(z, cool).refractionDeg) * 3600;
    for (const z of everyDegree(87)) expect(Math.abs(off(z))).toBeLessThanOrEqual(6.1);
    expectAbsolute(off(89), 19.7, 0.1);
    expectAbsolute(off(90), 44.3, 0.1);
    expectAbsolute(refractionBennett(0, surface) * 3600, -0.081, 0.001); // where 0 is right
  });
  it("Sæmundsson: within 9.7″ to 88°, +11″ at 89°, +31″ at 90° true", () => {
    for (const [z, seconds] of [
      [45, 2.92],
      [80, 9.64],
      [88, 5.08],
    ] as const) {
      const { trueZenithDeg, refractionDeg } = refractedPath(z, cool);
      const off = (refractionSaemundsson(trueZenithDeg, surface) - refractionDeg) * 3600;
      expectAbsolute(off, seconds, 0.01);
    }
    for (const z of everyDegree(87)) {
      const { trueZenithDeg, refractionDeg } = refractedPath(z, cool);
      const off = (refractionSaemundsson(trueZenithDeg, surface) - refractionDeg) * 3600;
      expect(Math.abs(off)).toBeLessThanOrEqual(9.7);
    }
    for (const [z, seconds] of [
      [89, 11.26],
      [90, 30.67],
    ] as const) {
      const truth = z - apparentZenith(z, cool);
      expectAbsolute((refractionSaemundsson(z, surface) - truth) * 3600, seconds, 0.01);
    }
    expectAbsolute(refractionSaemundsson(0, surface) * 3600, -0.116, 0.001); // where 0 is right
  });
});

describe("the formulas themselves", () => {
  it("written again, in elevation", () => {
    for (const h of [5, 12, 30, 65, 88]) {
      const z = 90 - h;
      const x = 1 / Math.sin(h * radians);
      const hardie = x - 0.0018167 * (x - 1) - 0.002875 * (x - 1) ** 2 - 0.0008083 * (x - 1) ** 3;
      expectRelative(airMassHardie(z), hardie, 1e-12);
      if (h >= 10) expectRelative(airMassYoungIrvine(z), x - 0.0012 * (x ** 3 - x), 1e-12);
      expectRelative(airMassKasten(z), 1 / (1 / x + 0.15 * (h + 3.885) ** -1.253), 1e-12);
      const lifted = (h + 244 / (165 + 47 * h ** 1.1)) * radians;
      expectRelative(airMassPickering(z), 1 / Math.sin(lifted), 1e-12);
      expectRelative(airMassRozenberg(z), x / (1 + 0.025 * x * Math.exp(-11 / x)), 1e-12);
    }
  });
  it("at the horizon: Rozenberg 40 by its own words, Pickering 38.75 (1 / sin of 244/165 degrees)", () => {
    expectAbsolute(airMassRozenberg(90), 40, 1e-12);
    expectAbsolute(airMassPickering(90), 1 / Math.sin((244 / 165) * radians), 1e-12);
    // no jump where the power of 0 would be
    expectRelative(airMassPickering(90 - 1e-9), airMassPickering(90), 1e-8);
  });
  it("grow from 1 at the zenith", () => {
    fc.assert(
      fc.property(between(0, 79), (z) => {
        for (const formula of [
          airMassHardie,
          airMassYoungIrvine,
          airMassKasten,
          airMassPickering,
          airMassRozenberg,
        ]) {
          expect(formula(z + 0.5)).toBeGreaterThan(formula(z));
          expectAbsolute(formula(0), 1, 7e-4);
        }
      }),
      { numRuns: 30 },
    );
  });
  it("refuse what is out of range", () => {
    for (const [formula, name, most] of [
      [airMassHardie, "airMassHardie", 85],
      [airMassYoungIrvine, "airMassYoungIrvine", 80],
      [airMassKasten, "airMassKasten", 90],
      [airMassPickering, "airMassPickering", 90],
      [airMassRozenberg, "airMassRozenberg", 90],
    ] as const) {
      expect(formula(most)).toBeGreaterThan(5);
      expectRefusal(() => formula(most + 0.1), RangeError, name, `0 to ${most} degrees`);
      expectRefusal(() => formula(-0.1), RangeError, name);
      expectRefusal(() => formula(Number.NaN), RangeError, name, "NaN");
      expectRefusal(() => formula("5" as never), TypeError, name);
    }
  });
});

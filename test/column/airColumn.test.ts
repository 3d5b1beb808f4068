import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  airColumn,
  airColumnBodhaine,
  gravity,
  rayleighCrossSection,
  rayleighOpticalDepth,
  standardAtmosphere,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

const seaLevel = { pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 360 };
const site = fc.record({
  pressurePa: between(20_000, 110_000),
  altitudeM: between(-400, 15_000),
  latitudeDeg: between(-90, 90),
  co2Ppm: between(0, 2000),
});

describe("published values", () => {
  it("closing fit of Bodhaine et al. 1999, equation 30, sea level, 45°, 250 to 850 nm: 1e-4", () => {
    const column = airColumnBodhaine(seaLevel);
    for (let nm = 250; nm <= 850; nm += 10) {
      const [l, i] = [(nm / 1000) ** 2, (1000 / nm) ** 2];
      const fit =
        (0.002152 * (1.0455996 - 341.29061 * i - 0.9023085 * l)) /
        (1 + 0.0027059889 * i - 85.968563 * l);
      expectRelative(rayleighOpticalDepth(nm, column), fit, 1e-4); // 0.0021520 is printed to 2e-5, the fit is good to 8e-5
    }
  });
  it("2.15e25 molecules per cm² above sea level (handbooks, from memory, last digit)", () => {
    expectAbsolute(airColumn(seaLevel).moleculesPerM2, 2.15e29, 0.005e29);
  });
});

describe("independent fixtures", () => {
  // a trapezium every 20 m through the standard densities, with this library's gravity, which has tests of its own
  const fine = (latitudeDeg: number, altitudeM: number): number => {
    let [mass, weight] = [0, 0];
    const n = Math.round((86_000 - altitudeM) / 20);
    for (let i = 0; i <= n; i++) {
      const z = altitudeM + ((86_000 - altitudeM) * i) / n;
      const share = (i === 0 || i === n ? 0.5 : 1) * standardAtmosphere(z).densityKgM3;
      mass += share;
      weight += share * gravity(latitudeDeg, z);
    }
    return weight / mass;
  };
  it.each([
    [45, 0, 101325],
    [40, 1620, 83_420],
    [-75, 2800, 68_000],
    [0, 12_000, 19_400],
  ])("latitude %d, %d m", (latitudeDeg, altitudeM, pressurePa) => {
    const molarMass = (28.9595 + 15.0556 * 425e-6) / 1000;
    const expected = (pressurePa / fine(latitudeDeg, altitudeM) / molarMass) * 6.02214076e23;
    expectRelative(
      airColumn({ pressurePa, altitudeM, latitudeDeg, co2Ppm: 425 }).moleculesPerM2,
      expected,
      1e-6,
    );
  });
  it.each([
    [1620, 40],
    [20_000, 0],
  ])("the shortcut written in cgs, as printed: %d m, latitude %d", (z, lat) => {
    const c = 425e-6;
    const cos2 = Math.cos((2 * lat * Math.PI) / 180);
    const zc = 0.73737 * z + 5517.56;
    const g0 = 980.616 * (1 - 0.0026373 * cos2 + 0.0000059 * cos2 ** 2);
    const g =
      g0 -
      (3.085462e-4 + 2.27e-7 * cos2) * zc +
      (7.254e-11 + 1e-13 * cos2) * zc ** 2 -
      (1.517e-17 + 6e-20 * cos2) * zc ** 3;
    const perCm2 = (834_200 * 6.0221367e23) / ((15.0556 * c + 28.9595) * g);
    const column = airColumnBodhaine({
      pressurePa: 83_420,
      altitudeM: z,
      latitudeDeg: lat,
      co2Ppm: 425,
    });
    expectRelative(column.moleculesPerM2, perCm2 * 1e4, 1e-13);
  });
  it("the shortcut is 5.7e-4 low at sea level, 1.0e-3 at 9 km; surface gravity is 0.23 % low", () => {
    const low = (s: typeof seaLevel): number =>
      airColumnBodhaine(s).moleculesPerM2 / airColumn(s).moleculesPerM2 - 1;
    expectAbsolute(low(seaLevel), -5.7e-4, 1e-5);
    expectAbsolute(
      low({ ...seaLevel, pressurePa: 30_000, altitudeM: 9000, latitudeDeg: 60 }),
      -1.03e-3,
      1e-5,
    );
    const molarMass = (28.9595 + 15.0556 * 360e-6) / 1000;
    const surface = (101325 * 6.02214076e23) / (molarMass * gravity(45, 0));
    expectAbsolute(surface / airColumn(seaLevel).moleculesPerM2 - 1, -0.0023, 1e-4);
  });
});

describe("properties", () => {
  it("is proportional to pressure; grows with height at the same pressure, falls towards the poles and with CO2", () => {
    fc.assert(
      fc.property(site, (s) => {
        for (const column of [airColumn, airColumnBodhaine]) {
          const n = column(s).moleculesPerM2;
          expectRelative(
            column({ ...s, pressurePa: s.pressurePa / 2 }).moleculesPerM2,
            n / 2,
            1e-14,
          );
          expect(column({ ...s, altitudeM: s.altitudeM + 1000 }).moleculesPerM2).toBeGreaterThan(n);
          expect(column({ ...s, latitudeDeg: 90 }).moleculesPerM2).toBeLessThanOrEqual(n);
          expect(column({ ...s, co2Ppm: 2000 }).moleculesPerM2).toBeLessThanOrEqual(n);
          expect(column(s)).toMatchObject(s);
        }
      }),
    );
  });
  it("optical depth is cross-section times column", () => {
    fc.assert(
      fc.property(site, between(230, 1690), (s, nm) => {
        const column = airColumn(s);
        expectRelative(
          rayleighOpticalDepth(nm, column),
          rayleighCrossSection(nm, s.co2Ppm) * column.moleculesPerM2,
          1e-14,
        );
      }),
    );
  });
});

describe("edges", () => {
  it.each([
    ["airColumn", airColumn],
    ["airColumnBodhaine", airColumnBodhaine],
  ])("%s", (name, column) => {
    expectRefusal(
      () => column({ ...seaLevel, pressurePa: 1013 }),
      RangeError,
      name,
      "pressurePa",
      "hPa? multiply by 100",
    );
    expectRefusal(
      () => column({ ...seaLevel, altitudeM: 20_001 }),
      RangeError,
      "altitudeM",
      "-500 to 20000 m",
    );
    expectRefusal(() => column({ ...seaLevel, latitudeDeg: 91 }), RangeError, "latitudeDeg", "91");
    expectRefusal(() => column({ ...seaLevel, co2Ppm: Number.NaN }), RangeError, "co2Ppm", "NaN");
    expectRefusal(() => column({ pressurePa: 101325 } as never), TypeError, name, "undefined");
    expectRefusal(() => column(null as never), TypeError, name);
    for (const latitudeDeg of [-90, 90])
      expect(column({ ...seaLevel, latitudeDeg }).moleculesPerM2).toBeGreaterThan(2e29);
  });
  it("rayleighOpticalDepth", () => {
    const column = airColumn(seaLevel);
    expectRefusal(
      () => rayleighOpticalDepth(0.5, column),
      RangeError,
      "rayleighOpticalDepth",
      "230 to 1690 nm",
      "µm",
    );
    expectRefusal(() => rayleighOpticalDepth(500, seaLevel as never), TypeError, "airColumn");
    expectRefusal(() => rayleighOpticalDepth(500, undefined as never), TypeError, "airColumn");
  });
});

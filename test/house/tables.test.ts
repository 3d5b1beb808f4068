/** Every table of the sources, number by number, against the copy of its source in test/reference or its definition. */
import { describe, expect, it } from "vitest";
import { referenceTable } from "../_referenceTable.js";
import { filesUnder, numberArrays, textOf, treeOf } from "../_source.js";
import { TABLE_LENGTH } from "./_rules.js";

const tables = new Map<string, number[]>(
  filesUnder("src", ".ts").flatMap((path) =>
    [...numberArrays(treeOf(path, textOf(path)), TABLE_LENGTH)].map(
      ([name, values]) => [`${path}: ${name}`, values] as const,
    ),
  ),
);

/** Numbers of a column, in the embedded unit (`scale` a power of ten), of the rows whose first column lies in [from, to]. */
function column(file: string, name: string, scale = 1, from = 0, to = Infinity): number[] {
  const table = referenceTable(file);
  const first = Object.values(table)[0]!;
  const values = table[name];
  if (values === undefined) throw new Error(`${file} has no column ${name}`);
  return values
    .filter((_, i) => first[i]! >= from && first[i]! <= to)
    .map((value) => value * scale);
}

/** Cold ozone at 1 nm averaged over the five bands around a centre. */
function coldMean(centreNm: number): number {
  const five = column("ozone-cross-section-1nm-cold.csv", "sigma", 1, centreNm - 2, centreNm + 2);
  return five.reduce((sum, value) => sum + value, 0) / 5;
}

/** The 218 K column of ozone, filled up: below 197 nm from 293 K, from 345 nm on from the cold source. */
function ozoneLower(): number[] {
  const of = (name: string): number[] => column(JPL, name, 1e20, 186, 424);
  const [lower, warm, cold] = [of("sigma_218K"), of("sigma_293K"), of("sigma_cold")];
  return lower.map((value, i) =>
    Number.isNaN(value) ? [warm[i]!, cold[i]!][i < 6 ? 0 : 1]! : value,
  );
}

/** 2^(k / 128) to 60 digits, as a whole number of 10^-60. */
function powersOfTwo(): bigint[] {
  const one = 10n ** 60n;
  let step = 2n * one;
  for (let i = 0; i < 7; i++) step = squareRoot(step * one);
  const powers = [one];
  while (powers.length < 128) powers.push((powers.at(-1)! * step) / one);
  return powers;
}

function squareRoot(n: bigint): bigint {
  let x = n;
  for (let y = (x + 1n) / 2n; y < x; y = (x + n / x) / 2n) x = y;
  return x;
}

const JPL = "ozone-cross-section-jpl.csv";
const BIRD = "absorption-bird-riordan-1986.csv";
const NO2 = "nitrogen-dioxide-cross-section.csv";
const DAYLIGHT = "cie-daylight-components-5nm.csv";
const observer = (file: string, from: number, to: number): number[][] =>
  ["xbar", "ybar", "zbar"].map((name) => column(file, name, 1, from, to));

/** What each table must be. */
const EXPECTED: Record<string, () => number[]> = {
  "src/_exp.ts: FRACTIONS": () => powersOfTwo().map((power) => Number(`${power}e-60`)),
  "src/_exp.ts: FINE": () => Array.from({ length: 32 }, (_, k) => 2 ** k),
  "src/_exp.ts: COARSE": () => Array.from({ length: 64 }, (_, k) => 2 ** (32 * (k - 32))),
  "src/spectrum/_solarBandMeans.ts: SOLAR_BAND_MEANS": () =>
    column("solar-band-means.csv", "recommended"),
  "src/absorption/_birdRiordanTable.ts: BAND_WAVELENGTHS_NM": () => column(BIRD, "wavelength_nm"),
  "src/absorption/_birdRiordanTable.ts: WATER_COEFFICIENTS": () => column(BIRD, "a_water"),
  "src/absorption/_birdRiordanTable.ts: MIXED_GAS_COEFFICIENTS": () => column(BIRD, "a_mixed"),
  "src/absorption/_nitrogenDioxideTable.ts: NITROGEN_DIOXIDE_220K": () =>
    column(NO2, "iupac_220K", 1e20, 280, 495),
  "src/absorption/_nitrogenDioxideTable.ts: NITROGEN_DIOXIDE_298K": () =>
    column(NO2, "iupac_298K", 1e20, 280, 495),
  "src/absorption/_nitrogenDioxideTable.ts: NITROGEN_DIOXIDE_BEYOND": () =>
    column(NO2, "jpl_294K", 1e20, 500),
  "src/absorption/_ozoneUltraviolet.ts: OZONE_CENTRES_NM": () =>
    column(JPL, "centre_nm", 1, 0, 425),
  "src/absorption/_ozoneUltraviolet.ts: OZONE_LOWER": ozoneLower,
  "src/absorption/_ozoneUltraviolet.ts: OZONE_293K": () => column(JPL, "sigma_293K", 1e20, 0, 424),
  "src/absorption/_ozoneVisible.ts: OZONE_COLD": () =>
    column("ozone-cross-section-1nm-cold.csv", "sigma", 1e24, 425),
  "src/absorption/_ozoneVisible.ts: OZONE_WARM_OVER_COLD": () => {
    const centres = column(JPL, "centre_nm", 1, 425);
    const warm = column(JPL, "sigma_293K", 1, 425);
    return centres.map((nm, i) => Number((warm[i]! / coldMean(nm)).toFixed(4)));
  },
  "src/colour/_daylightComponents.ts: MEAN_COMPONENT": () => column(DAYLIGHT, "S0"),
  "src/colour/_daylightComponents.ts: FIRST_COMPONENT": () => column(DAYLIGHT, "S1"),
  "src/colour/_daylightComponents.ts: SECOND_COMPONENT": () => column(DAYLIGHT, "S2"),
  ...observerTables("cie1931Observer", "cie-1931-2deg-1nm.csv", 360, 830),
  ...observerTables("cie1931Observer5nm", "cie-1931-2deg-5nm.csv", 380, 780),
  ...observerTables("cie1964Observer", "cie-1964-10deg-1nm.csv", 360, 830),
};

function observerTables(
  name: string,
  file: string,
  from: number,
  to: number,
): Record<string, () => number[]> {
  const entries = ["x", "y", "z"].map(
    (axis, k) =>
      [`src/colour/${name}.ts: ${name}.${axis}`, () => observer(file, from, to)[k]!] as const,
  );
  return Object.fromEntries(entries);
}

const sum = (values: readonly number[]): number =>
  values.reduce((total, value) => total + value, 0);

describe("the tables of the sources", () => {
  it("are all accounted for", () => {
    expect([...tables.keys()].sort()).toEqual(Object.keys(EXPECTED).sort());
  });

  it.each(Object.entries(EXPECTED))("%s", (name, expected) => {
    const values = tables.get(name) ?? [];
    const truth = expected();
    expect(values).toHaveLength(truth.length);
    // a change of unit by a power of ten may round once: 2 ulp; half an ulp for what is copied or made exactly
    const off = values.map((value, i) => Math.abs(value - truth[i]!) / (Math.abs(truth[i]!) || 1));
    expect(
      off.flatMap((o, i) => (o <= 4.5e-16 ? [] : [`${i}: ${values[i]}, not ${truth[i]}`])),
    ).toEqual([]);
    expect(Math.abs(sum(values) - sum(truth))).toBeLessThanOrEqual(
      1e-15 * sum(truth.map(Math.abs)),
    );
  });
});

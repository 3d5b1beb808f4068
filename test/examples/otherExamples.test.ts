import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { SETTINGS } from "../../examples/year/channels.js";
import type { DaySummary } from "../../examples/year/dayBuffer.js";
import { reduceYear } from "../../examples/year/reduceYear.js";
import { writeYear } from "../../examples/year/writeYear.js";
import { expectAbsolute } from "../_tolerance.js";
import { ROOT } from "../_source.js";

const run = (name: string): string[] =>
  execFileSync(`${ROOT}node_modules/.bin/tsx`, [`${ROOT}examples/${name}`], {
    cwd: ROOT,
    encoding: "utf8",
  }).split("\n");
/** Numbers of the line that begins with `head`. */
const numbersOf = (lines: readonly string[], head: string, which = 0): number[] => {
  const found = lines.filter((line) => line.trim().startsWith(`${head} `))[which]!;
  return found.trim().slice(head.length).split(/[ ±]+/).filter(Boolean).map(Number);
};

describe("starlight", () => {
  const lines = run("starlight.ts");
  // what the night was made of (examples/starlight/README.md): 0.045 at 550 nm, exponent 1.25, at the middle of each band
  it.each([
    ["blue", 0.045 * (440 / 550) ** -1.25],
    ["visual", 0.045],
    ["red", 0.045 * (660 / 550) ** -1.25],
  ])("finds the aerosol of the %s band within what it states", (band, truth) => {
    const [, , depth, wide] = numbersOf(lines, band, 1);
    expectAbsolute(depth!, truth, wide! + 0.001); // the band's mean lies up to 0.001 off its middle
    expect(wide).toBeLessThan(0.012);
  });
  it("names the spoilt measurements", () => {
    const spoilt = lines.filter((line) => line.startsWith("- line"));
    expect(spoilt.length).toBeGreaterThanOrEqual(4);
    expect(spoilt.length).toBeLessThanOrEqual(12);
  });
});

describe("spectroradiometer", () => {
  it("finds the sunlight it was made from within what it states, and says where it would not divide", () => {
    const lines = run("spectroradiometer.ts");
    for (const nm of [325, 400, 500, 650, 870]) {
      const [found, wide, ...rest] = numbersOf(lines, String(nm));
      const table = rest.at(-2)!;
      expectAbsolute(found!, table, wide!);
      expect(wide! / found!).toBeLessThan(0.06);
    }
    expect(lines.find((line) => line.startsWith("Not divided"))).toMatch(/: 286, .* 30\d nm$/);
  });
});

describe("the year", () => {
  const folder = mkdtempSync(join(tmpdir(), "airlight-year-"));
  let days: DaySummary[] = [];
  const shares: number[] = [];
  beforeAll(async () => {
    await writeYear(join(folder, "year.csv"), () => undefined);
    days = await reduceYear(join(folder, "year.csv"), (share) => shares.push(share));
  });
  afterAll(() => {
    rmSync(folder, { recursive: true });
  });
  it("streams every day, its progress rising to the end", () => {
    expect(days.map(({ day }) => day)).toEqual(Array.from({ length: 365 }, (_, i) => i));
    expect(shares.length).toBeGreaterThan(20);
    expect(shares.at(-1)).toBe(1);
    expect(shares.every((share, i) => i === 0 || share >= shares[i - 1]!)).toBe(true);
  });
  it("keeps the clear readings and finds haze as it was made: 0.012 to 0.102", () => {
    const [readings, clear] = (["readings", "clear"] as const).map((key) =>
      days.reduce((sum, day) => sum + day[key], 0),
    );
    expect(readings).toBeGreaterThan(200_000);
    expect(clear! / readings!).toBeGreaterThan(0.9);
    for (const { depth, standardUncertainty } of days) {
      expect(depth).toBeGreaterThan(0.0115);
      expect(depth).toBeLessThan(0.1025);
      // 0.4 % of the constant over air masses 1 to 7, the other lines less
      expect(standardUncertainty).toBeGreaterThan(0.001);
      expect(standardUncertainty).toBeLessThan(0.0045);
    }
    expect(SETTINGS.screeningChannel).toBe(2);
  });
});

import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { exp } from "../src/_numeric.js";
import { between } from "./_generators.js";
import { ulpsApart } from "./_tolerance.js";

const { rows } = JSON.parse(
  readFileSync(new URL("reference/exp-60-digits.json", import.meta.url), "utf8"),
) as { rows: [number, number, number][] };

/** Unit in the last place of a normal double. */
const ulp = (value: number): number => 2 ** (Math.floor(Math.log2(value)) - 52);

describe("60-digit decimals", () => {
  it("is within 1 ulp of the true value at every point of the fixture", () => {
    let worst = 0;
    for (const [x, nearest, rest] of rows) {
      const error = Math.abs(exp(x) - nearest - rest) / ulp(nearest);
      worst = Math.max(worst, error);
      expect(error, `exp(${x})`).toBeLessThanOrEqual(1.0); // the accuracy stated in src/_exp.ts
    }
    expect(rows.length).toBeGreaterThan(200);
    expect(worst).toBeGreaterThan(0.5); // a fixture that only shows the easy points would prove little
  });
  it("is within 1 ulp beside each of the 128 table entries, on both sides of zero", () => {
    // the built-in exponential is good to better than 1 ulp: together at most 2
    let worst = 0;
    for (let k = -1280; k <= 1280; k++) {
      const x = (k * Math.LN2) / 128;
      worst = Math.max(worst, ulpsApart(exp(x), Math.exp(x)));
    }
    expect(worst).toBeLessThanOrEqual(2);
  });
});

describe("against the built-in exponential", () => {
  it("sweep of the whole normal range: at most 2 ulp apart, most of the time none", () => {
    let same = 0;
    let count = 0;
    let worst = 0;
    for (let x = -708; x < 709.7; x += 0.01234567) {
      const [ours, theirs] = [exp(x), Math.exp(x)];
      if (ours === theirs) same++;
      else worst = Math.max(worst, ulpsApart(ours, theirs));
      count++;
    }
    expect(worst).toBeLessThanOrEqual(2); // 1 of ours, under 1 of theirs
    expect(same / count).toBeGreaterThan(0.5);
  });
  it("both sides of ±700, where the far branch takes over", () => {
    for (const edge of [700, -700]) {
      for (const x of [edge * (1 - 2e-16), edge, edge * (1 + 2e-16), edge * 1.001]) {
        expect(ulpsApart(exp(x), Math.exp(x))).toBeLessThanOrEqual(2);
      }
    }
  });
});

describe("properties", () => {
  it("exp(a + b) = exp(a) exp(b), exp(-x) = 1 / exp(x)", () => {
    fc.assert(
      fc.property(between(-300, 300), between(-300, 300), (a, b) => {
        const sum = exp(a + b);
        // rounding of a + b is worth up to 600 × 1.1e-16
        expect(Math.abs(sum - exp(a) * exp(b)) / sum).toBeLessThan(8e-14);
        expect(Math.abs(exp(-a) * exp(a) - 1)).toBeLessThan(5e-16);
      }),
    );
  });
  it("does not fall as x rises, from one double to the next (2 ulp of slack at steps of the table)", () => {
    fc.assert(
      fc.property(between(-700, 700), between(1e-12, 1e-3), (x, rise) => {
        expect(exp(x + rise)).toBeGreaterThanOrEqual(exp(x) * (1 - 4.5e-16));
      }),
    );
  });
});

describe("edges", () => {
  it("is exactly 1 at both zeros and below half a unit of 1", () => {
    expect(exp(0)).toBe(1);
    expect(exp(-0)).toBe(1);
    expect(exp(5e-324)).toBe(1);
    expect(exp(-5e-324)).toBe(1);
    expect(exp(1e-17)).toBe(1);
    expect(exp(-1e-17)).toBe(1);
  });
  it("passes NaN on", () => {
    expect(exp(Number.NaN)).toBeNaN();
  });
  it("overflows where the true value does", () => {
    expect(exp(709.782712893384)).toBeLessThan(Number.POSITIVE_INFINITY);
    expect(exp(709.782712893384)).toBeGreaterThan(1.797e308);
    expect(exp(709.7827128933841)).toBe(Number.POSITIVE_INFINITY);
    expect(exp(710)).toBe(Number.POSITIVE_INFINITY);
    expect(exp(1e308)).toBe(Number.POSITIVE_INFINITY);
    expect(exp(Number.POSITIVE_INFINITY)).toBe(Number.POSITIVE_INFINITY);
  });
  it("underflows through the subnormal numbers to zero", () => {
    // below 2.2e-308 the last place is 5e-324 everywhere: two of them for two roundings
    for (let x = -708.3; x > -745.1; x -= 0.01) {
      expect(Math.abs(exp(x) - Math.exp(x)) / ulpOrLeast(Math.exp(x))).toBeLessThanOrEqual(2);
    }
    expect(exp(-745.1332191019411)).toBe(5e-324);
    expect(exp(-745.1332191019412)).toBeLessThanOrEqual(5e-324);
    expect(exp(-745.2)).toBe(0);
    expect(exp(-1e308)).toBe(0);
    expect(exp(Number.NEGATIVE_INFINITY)).toBe(0);
    expect(Object.is(exp(Number.NEGATIVE_INFINITY), -0)).toBe(false);
  });
});

function ulpOrLeast(value: number): number {
  return Math.max(ulp(value), Number.MIN_VALUE);
}

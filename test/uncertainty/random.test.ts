import { describe, expect, it } from "vitest";
import { coverageFactor, seededRandom } from "../../src/index.js";
import { normalQuantile } from "../../src/_normalQuantile.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";

describe("seededRandom", () => {
  it.each([20261201, 6])("is xoshiro128** seeded by SplitMix32, in big integers: %d", (seed) => {
    const mask = 0xffffffffn;
    const rotate = (x: bigint, by: bigint): bigint => ((x << by) | (x >> (32n - by))) & mask;
    let counter = BigInt(seed);
    const fill = (): bigint => {
      counter = (counter + 0x9e3779b9n) & mask;
      let z = ((counter ^ (counter >> 16n)) * 0x85ebca6bn) & mask;
      z = ((z ^ (z >> 13n)) * 0xc2b2ae35n) & mask;
      return z ^ (z >> 16n);
    };
    const s = [fill(), fill(), fill(), fill()] as [bigint, bigint, bigint, bigint];
    const next = (): bigint => {
      const result = (rotate((s[1] * 5n) & mask, 7n) * 9n) & mask;
      const t = (s[1] << 9n) & mask;
      s[2] ^= s[0];
      s[3] ^= s[1];
      s[1] ^= s[2];
      s[0] ^= s[3];
      s[2] ^= t;
      s[3] = rotate(s[3], 11n);
      return result;
    };
    const random = seededRandom(seed);
    for (let i = 0; i < 1000; i++) {
      const expected = Number(((next() >> 5n) << 26n) | (next() >> 6n)) / 2 ** 53;
      expect(random()).toBe(expected);
    }
  });

  it.each([0, 1, 2, 4294967295])("is even and uncorrelated from seed %d", (seed) => {
    const random = seededRandom(seed);
    const count = 1_000_000;
    const bins = new Float64Array(100);
    let [sum, squares, products, last] = [0, 0, 0, random()];
    for (let i = 0; i < count; i++) {
      const u = random();
      bins[Math.floor(u * 100)]! += 1;
      sum += u - 0.5;
      squares += (u - 0.5) ** 2;
      products += (u - 0.5) * (last - 0.5);
      last = u;
    }
    // four standard errors: of the mean, of the variance 1/12, of the lag-one product
    expectAbsolute(sum / count, 0, (4 * Math.sqrt(1 / 12)) / 1000);
    expectAbsolute(squares / count, 1 / 12, (4 * Math.sqrt(1 / 180)) / 1000);
    expectAbsolute(products / count, 0, 4 / 12 / 1000);
    const chiSquare = bins.reduce((total, n) => total + (n - count / 100) ** 2 / (count / 100), 0);
    expectAbsolute(chiSquare, 99, 4 * Math.sqrt(2 * 99));
  });

  it("refuses a seed that is not a whole number of 32 bits", () => {
    expectRefusal(() => seededRandom(1.5), RangeError, "seededRandom", "whole", "1.5");
    expectRefusal(() => seededRandom(-1), RangeError, "0 to 4294967295");
    expectRefusal(() => seededRandom("1" as never), TypeError, '"1"');
  });
});

describe("quantiles", () => {
  // 40-digit values: root of the complementary error function, mpmath 1.3.0
  it.each([
    [1e-300, -37.04709629936119923654704],
    [1e-100, -21.27345356096532429417952],
    [1e-20, -9.262340089798407579572095],
    [1e-8, -5.612001244174788727930121],
    [0.001, -3.090232306167813535358005],
    [0.07, -1.475791028179170685608678],
    [0.0751, -1.438825392752539982435914],
    [0.3, -0.5244005127080408159694544],
    [0.7, 0.5244005127080406563136292],
    [0.925, 1.43953147093845622906332],
    [0.9999, 3.719016485455708386722759],
  ])("normal at %d", (probability, quantile) => {
    expectRelative(normalQuantile(probability), quantile, 1e-15 * 2);
  });
  // GUM 2008 table G.2, printed to 0.01 (from memory)
  it.each([
    [0.95, 1, 12.71],
    [0.95, 5, 2.57],
    [0.95, 10, 2.23],
    [0.99, 16, 2.92],
    [0.9545, 20, 2.13],
    [0.6827, 3, 1.2],
  ])("Student's t at %d with %d degrees of freedom", (probability, degrees, factor) => {
    expectAbsolute(coverageFactor(probability, degrees), factor, 0.005);
  });
  // 40-digit values: root of the incomplete beta function, mpmath 1.3.0
  it.each([
    [0.95, 1, 12.706204736174693314],
    [0.95, 2, 4.3026527297494617894],
    [0.95, 3, 3.1824463052837084359],
    [0.99, 16.7, 2.9046809384293585668],
    [0.6827, 2.5, 1.2443491967856956223],
    [0.99, 1000, 2.5807546980659507706],
    [0.95, 99999, 1.9599877077718443991],
    [0.95, 1e6, 1.9599663568141066553],
    [0.999, 1, 636.61924876871905078],
    [0.05, 4, 0.066728494700756976855],
  ])("Student's t to 1e-12 at %d, %d", (probability, degrees, factor) => {
    expectRelative(coverageFactor(probability, degrees), factor, 1e-12);
  });
  // 20-digit values as above: small probabilities and thousands of degrees of freedom, and both ends of the range
  it.each([
    [0.9, 9999, 1.6450060333112995964, 5e-12],
    [0.3, 9999, 0.38533153097705624897, 5e-12],
    [0.001, 9999, 0.0012533458018687057904, 5e-12],
    [0.9999, 1, 6366.1976713166369204, 1e-12],
    [0.9999, 2.5, 46.024215246951951507, 1e-12],
    [1e-6, 4, 1.3333333333338271002e-6, 1e-10],
    [1 - 1e-12, 1, 636633855803.55930338, 1e-4],
    [1 - 1e-12, 30, 11.722018886810610596, 1e-4],
  ])("Student's t at %d, %d to %d", (probability, degrees, factor, error) => {
    expectRelative(coverageFactor(probability, degrees), factor, error);
  });
  it("joins the expansion and the root at 10 000 degrees of freedom", () => {
    expectRelative(coverageFactor(0.95, 10000.001), coverageFactor(0.95, 9999.999), 1e-10);
    expectRelative(coverageFactor(0.95, Infinity), 1.9599639845400545, 1e-15);
  });
  it("refuses what cannot be", () => {
    expectRefusal(() => coverageFactor(95, 3), RangeError, "coverageFactor", "percent");
    expectRefusal(() => coverageFactor(0.95, 0), RangeError, "degreesOfFreedom");
    expectRefusal(() => coverageFactor(0.95, Number.NaN), RangeError, "NaN");
  });
});

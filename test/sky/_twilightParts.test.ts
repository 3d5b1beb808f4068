import { describe, expect, it } from "vitest";
import { standardAtmosphere } from "../../src/index.js";
import { gaussNodes, halfRangeNodes } from "../../src/sky/_nodes.js";
import { outwardDepth } from "../../src/sky/_outwardDepth.js";
import { ray, sightRay } from "../../src/sky/_rays.js";
import { coefficientAt, shellAir } from "../../src/sky/_shellAir.js";
import { outward, slantTable, sunlightAt } from "../../src/sky/_slantDepth.js";
import { onceScattered } from "../../src/sky/_singleSight.js";
import { sumOrders } from "../../src/sky/_sumOrders.js";
import {
  ANGLES,
  findPlace,
  gridAngle,
  gridColumn,
  gridHeight,
  HEIGHTS,
  NODES,
  TENSORS,
  UNKNOWNS,
} from "../../src/sky/_twilightGrid.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

const ALTITUDE_M = 500;
const GROUND_M = 6_371_500;
const air = shellAir(0.3, 0.02, ALTITUDE_M);
const sky = { air, table: slantTable(air) };
const scatteringAt = (heightM: number): number => coefficientAt(air.lnScattering, heightM);
const extinctionAt = (heightM: number): number => coefficientAt(air.lnExtinction, heightM);
/** Simpson's rule. */
function integral(f: (x: number) => number, from: number, to: number, steps: number): number {
  let sum = 0;
  for (let i = 0; i <= steps; i++)
    sum += (i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2) * f(from + ((to - from) * i) / steps);
  return (sum * (to - from)) / (3 * steps);
}

describe("air in shells", () => {
  it("stands on an Earth of 6371 km and changes its gradient where the standard atmosphere does", () => {
    expect(air.groundM).toBe(GROUND_M);
    const bases = [11_000, 20_000, 32_000, 47_000, 51_000, 71_000].map(
      (h) => (6_356_766 * h) / (6_356_766 - h), // US Standard Atmosphere 1976, equation 18 (from memory)
    );
    [...bases, 86_000].forEach((heightM, i) => {
      expectAbsolute(air.kinks[i]!, heightM - ALTITUDE_M, 1e-6);
    });
    expect(air.kinks).toHaveLength(7);
  });
  it("thins out as the standard atmosphere does, and above 86 km at the rate of the last kilometre", () => {
    const density = (heightM: number): number => standardAtmosphere(heightM).numberDensityM3;
    for (const heightM of [0, 100, 5000, 30_000, 85_500]) {
      const ratio = density(heightM + ALTITUDE_M) / density(ALTITUDE_M);
      expectRelative(scatteringAt(heightM) / scatteringAt(0), ratio, 1e-12);
    }
    const rate = Math.log(density(85_000) / density(86_000)) / 1000;
    for (const heightM of [90_000, 119_900])
      expectRelative(
        scatteringAt(heightM - ALTITUDE_M) / scatteringAt(86_000 - ALTITUDE_M),
        Math.exp(-rate * (heightM - 86_000)),
        1e-12,
      );
  });
  it("adds up to the depths asked for", () => {
    // Simpson's points lie on the table's steps and halfway: its exponentials are followed to (100 m / 6 km)^4 / 2880
    expectRelative(integral(scatteringAt, 0, 120_000, 2400), 0.3, 1e-10);
    // the logarithm of a sum is not straight between steps: at worst (1 / 6 km + 1 / 5 km)² (100 m)² / 48
    expectRelative(integral(extinctionAt, 0, 120_000, 2400), 0.32, 2.8e-5);
  });
  it("holds ozone whose column above h goes as 1 / (1 + exp((h - 20 km) / 5 km))", () => {
    const share = (heightM: number): number => 1 / (1 + Math.exp((heightM - 20_000) / 5000));
    const all = share(ALTITUDE_M) - share(120_000 + ALTITUDE_M);
    const ozone = (heightM: number): number => extinctionAt(heightM) - scatteringAt(heightM);
    for (const [from, to] of [
      [0, 10_000],
      [10_000, 19_500],
      [19_500, 40_000],
    ] as const) {
      const part = share(from + ALTITUDE_M) - share(to + ALTITUDE_M);
      // 2.8e-5 of what ozone and air share half and half, less of the rest
      expectAbsolute(integral(ozone, from, to, 400), (0.02 * part) / all, 1e-6);
    }
  });
  it("holds nothing but ozone where there are no molecules: to the last digits the depth asked for, and its shape", () => {
    const bare = shellAir(1e-14, 0.02, ALTITUDE_M);
    const ozone = (heightM: number): number => coefficientAt(bare.lnExtinction, heightM);
    // near the layer's middle neighbours alike to 1e-3 are averaged: 1e-6 / 12 of a twentieth of it
    expectRelative(integral(ozone, 0, 120_000, 2400), 0.02, 1e-8);
    const slope = (heightM: number): number => {
      const x = Math.exp((heightM + ALTITUDE_M - 20_000) / 5000);
      return x / ((1 + x) * (1 + x));
    };
    for (const heightM of [0, 8000, 19_500, 33_300])
      expectRelative(ozone(heightM) / ozone(12_000), slope(heightM) / slope(12_000), 1e-9);
  });
  it("is read off between steps along straight logarithms, and held at its ends", () => {
    const table = Float64Array.of(0, 1, 3);
    expectRelative(coefficientAt(table, 150), Math.exp(2), 1e-15);
    expectRelative(coefficientAt(table, 25), Math.exp(0.25), 1e-15);
    expect(coefficientAt(table, -5)).toBe(1);
    expectRelative(coefficientAt(table, 1e6), Math.exp(3), 1e-5); // held a millionth of a step before the end
  });
});

describe("rays", () => {
  const nodes = gaussNodes(24);
  /** Height over the ground at a distance along a straight line, from two coordinates. */
  const heightOn = (heightM: number, cosine: number, path: number): number =>
    Math.hypot(GROUND_M + heightM + path * cosine, path * Math.sqrt(1 - cosine * cosine)) -
    GROUND_M;
  it.each([
    [0, 1],
    [0, 0.02],
    [8000, 0.0005],
    [8000, -0.0005],
    [8000, 0.5],
    [8000, -0.02],
    [8000, -0.5],
    [60_000, -0.1],
  ])("from %d m at cosine %d: heights of points, and light lost on the way", (heightM, cosine) => {
    const { paths, heights, weights, groundPath, fromGround } = ray(sky, heightM, cosine, nodes);
    for (const k of [0, 7, 23, paths.length - 1])
      expectAbsolute(heights[k]!, heightOn(heightM, cosine, paths[k]!), 1e-6);
    const hits = groundPath >= 0;
    expect(hits).toBe(cosine < -Math.sqrt(1 - (GROUND_M / (GROUND_M + heightM)) ** 2));
    if (hits) expectAbsolute(heightOn(heightM, cosine, groundPath), 0, 1e-6);
    const end = hits ? groundPath : 2_000_000;
    const inside = (path: number): number => {
      const h = heightOn(heightM, cosine, path);
      return h < 116_000 ? extinctionAt(h) : 0;
    };
    const depth = integral((root) => 2 * root * inside(root * root), 0, Math.sqrt(end), 20_000);
    if (hits) expectRelative(fromGround, Math.exp(-depth), 2e-4);
    else expect(fromGround).toBe(0);
    // what pure scattering takes out is what it would send to the start
    const clear = shellAir(0.3, 0, ALTITUDE_M);
    const pure = ray({ air: clear, table: slantTable(clear) }, heightM, cosine, nodes);
    const lost = pure.weights.reduce((sum, w) => sum + w, 0);
    const scattered = (path: number): number => {
      const h = heightOn(heightM, cosine, path);
      return h < 116_000 ? coefficientAt(clear.lnScattering, h) : 0;
    };
    const own = integral((root) => 2 * root * scattered(root * root), 0, Math.sqrt(end), 20_000);
    expectAbsolute(lost, 1 - Math.exp(-own), 3e-4);
    expect(weights).toHaveLength(paths.length);
  });
  it("a line of sight ends at 116 km", () => {
    const { heights } = sightRay(sky, 0.3, gaussNodes(40), 0);
    expect(Math.max(...heights)).toBeLessThan(116_000);
    expectAbsolute(Math.max(...heights), 116_000, 30); // the last of 40 points lies a thousandth of the last 30 km before the end
  });
});

describe("optical depths to the top", () => {
  it.each([0, 500, 3700, 12_345, 55_500])("from %d m, at every slope", (heightM) => {
    for (const cosine of [0, 0.003, 0.05, 0.3, 0.77, 1]) {
      const radius = GROUND_M + heightM;
      const end = Math.sqrt((radius * cosine) ** 2 + (GROUND_M + 120_000) ** 2 - radius * radius);
      const along = (root: number): number =>
        2 *
        root *
        extinctionAt(
          Math.sqrt(radius * radius + root ** 4 + 2 * radius * cosine * root * root) - GROUND_M,
        );
      const exact = integral(along, 0, Math.sqrt(end - radius * cosine), 4000);
      // the kinks of a table of 100 m; a hundredth of the 0.5 % stated for the sky
      expectRelative(outwardDepth(air, heightM, cosine), exact, 5e-5);
      expectRelative(outward(sky.table, heightM, cosine), exact, 3e-4);
    }
  });
  it("sunlight: e to the minus depth above the horizon, twice the half ray below it, none in the shadow", () => {
    expectRelative(
      sunlightAt(sky.table, 3000, 0.5),
      Math.exp(-outward(sky.table, 3000, 0.5)),
      1e-14,
    );
    const cosine = -0.05;
    const radius = GROUND_M + 20_000;
    const lowest = radius * Math.sqrt(1 - cosine * cosine) - GROUND_M;
    const depth = 2 * outward(sky.table, lowest, 0) - outward(sky.table, 20_000, -cosine);
    expectRelative(sunlightAt(sky.table, 20_000, cosine), Math.exp(-depth), 1e-14);
    expect(sunlightAt(sky.table, 20_000, -0.2)).toBe(0);
    expect(sunlightAt(sky.table, 0, 0)).toBeGreaterThan(0);
  });
  it("a sight straight up under a set sun starts where it leaves the shadow", () => {
    // overhead the shadow of a sun at cosine c ends at R (1 / sine - 1); above it sunlight is scattered, below none
    const sun = -0.1;
    const edge = GROUND_M * (1 / Math.sqrt(1 - sun * sun) - 1);
    const found = onceScattered(sky, sun, 1, sun, gaussNodes(24));
    const seen = (heightM: number): number =>
      sunlightAt(sky.table, heightM, sun) *
      scatteringAt(heightM) *
      Math.exp(outward(sky.table, heightM, 1) - outward(sky.table, 0, 1));
    expectRelative(found, integral(seen, edge + 1e-3, 116_000, 20_000), 2e-3);
  });
});

describe("the grid of heights and suns", () => {
  it("covers 0 to 116 km, closer near the ground, and 0 to 110 degrees, closer as the sun sinks", () => {
    expect(gridHeight(0)).toBe(0);
    expectAbsolute(gridHeight(HEIGHTS - 1), 116_000, 1e-9);
    expectAbsolute(gridHeight(5), 116_000 / 9, 1e-9);
    const angles = Array.from({ length: ANGLES }, (_, j) => gridAngle(j));
    expect(angles.slice(0, 13)).toEqual([0, 20, 40, 60, 63, 66, 69, 72, 75, 78, 81, 84, 85]);
    expect(angles.at(-1)).toBe(110);
    expect(NODES).toBe(HEIGHTS * ANGLES);
    expect(TENSORS).toBe(4 * NODES);
    expect(UNKNOWNS).toBe(TENSORS + ANGLES);
  });
  it("finds the place of every point again", () => {
    const ln = Float64Array.from({ length: NODES }, (_, k) => k / 10);
    const place = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
    const cosine = (angle: number): number => Math.cos((angle * Math.PI) / 180);
    for (let j = 0; j < ANGLES - 1; j++) {
      const [from, to] = [gridAngle(j), gridAngle(j + 1)];
      expectAbsolute(gridColumn(cosine(from + 1e-9)), j, j === 0 ? 1e-8 : 1e-6);
      // a quarter on: of the cosine while the sun is high, of the angle in twilight
      const [here, next] = [cosine(from), cosine(to)];
      const quarter = to <= 84 ? 0.75 * here + 0.25 * next : cosine(0.75 * from + 0.25 * to);
      for (let i = 0; i < HEIGHTS - 1; i++) {
        const root = (i + 0.4) / (HEIGHTS - 1);
        findPlace(116_000 * root * root, quarter, ln, place);
        expect(place.node).toBe(i * ANGLES + j);
        expectAbsolute(place.s00, 0.6 * 0.75, 1e-9);
        expectAbsolute(place.s01, 0.6 * 0.25, 1e-9);
        expectAbsolute(place.s10, 0.4 * 0.75, 1e-9);
        expectAbsolute(place.s11, 0.4 * 0.25, 1e-9);
        const step = to <= 84 ? Math.log(0.75 + 0.25 * Math.exp(0.1)) : 0.025;
        expectAbsolute(place.ln, 0.1 * (place.node + 0.4 * ANGLES) + step, 1e-9);
      }
    }
  });
  it("keeps places beyond its ends inside", () => {
    const place = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
    findPlace(-1, -1, new Float64Array(NODES), place);
    expect(place.node).toBe(ANGLES - 2);
    expectAbsolute(place.s01, 1, 1e-5);
    findPlace(1e6, 1.0000001, new Float64Array(NODES), place);
    expect(place.node).toBe((HEIGHTS - 2) * ANGLES);
    expectAbsolute(place.s10, 1, 1e-5);
    expect(gridColumn(-1.0000001)).toBeLessThan(ANGLES - 1);
  });
});

describe("sums and nodes", () => {
  it("sums all orders of a small system as its inverse does", () => {
    // (1 - K)⁻¹ of K = [[0.5, 0.2], [0.1, 0.3]] is [[0.7, 0.2], [0.1, 0.5]] / 0.33
    const total = sumOrders(Float64Array.of(1, 2), Float64Array.of(0.5, 0.2, 0.1, 0.3));
    expectRelative(total[0]!, 1.1 / 0.33, 3e-5); // stops where an order adds less than 1e-5
    expectRelative(total[1]!, 1.1 / 0.33, 3e-5);
  });
  it("nodes integrate every power their number allows", () => {
    for (const count of [1, 2, 8, 16]) {
      const gauss = gaussNodes(count);
      for (let power = 0; power < 2 * count; power++) {
        const sum = gauss.cosines.reduce((s, c, i) => s + gauss.weights[i]! * c ** power, 0);
        expectRelative(sum, 1 / (power + 1), (power + 5) * 1e-15); // each factor brings the rounding of its node
      }
      const crowded = halfRangeNodes(count);
      for (let power = 0; 3 * power <= 2 * count - 3; power++) {
        const sum = crowded.cosines.reduce((s, c, i) => s + crowded.weights[i]! * c ** power, 0);
        expectRelative(sum, 1 / (power + 1), (3 * power + 7) * 1e-15); // three factors to a power, two to a weight
      }
    }
  });
});

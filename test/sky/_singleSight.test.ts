import { describe, expect, it } from "vitest";
import { gaussNodes } from "../../src/sky/_nodes.js";
import { coefficientAt, shellAir } from "../../src/sky/_shellAir.js";
import { onceScattered } from "../../src/sky/_singleSight.js";
import { outward, slantTable, sunlightAt } from "../../src/sky/_slantDepth.js";
import { expectRelative } from "../_tolerance.js";

type Vector = readonly [number, number, number];
const GROUND_M = 6_371_500;
const air = shellAir(0.3, 0.02, 500);
const sky = { air, table: slantTable(air) };

const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
/** Unit vector at an angle from the vertical, degrees, and an azimuth from the sun's. */
function direction(zenithDeg: number, azimuthDeg: number): Vector {
  const [zenith, azimuth] = [(zenithDeg * Math.PI) / 180, (azimuthDeg * Math.PI) / 180];
  return [
    Math.sin(zenith) * Math.cos(azimuth),
    Math.sin(zenith) * Math.sin(azimuth),
    Math.cos(zenith),
  ];
}

/** Place at a distance along a line of sight from the ground. */
const placeAt = (view: Vector, path: number): Vector => [
  path * view[0],
  path * view[1],
  GROUND_M + path * view[2],
];

/** Whether the Earth hides the sun from a place: behind the middle and nearer to the sun's axis than the ground. */
function isHidden(place: Vector, sun: Vector): boolean {
  const along = dot(place, sun);
  return along < 0 && dot(place, place) - along * along < GROUND_M * GROUND_M;
}

/** Where a line of sight leaves the shadow, by halving; 0 if it starts outside. */
function shadowEdge(view: Vector, sun: Vector): number {
  if (!isHidden(placeAt(view, 1e-3), sun)) return 0;
  let [low, high] = [0, 3e6];
  for (let i = 0; i < 80; i++) {
    const middle = 0.5 * (low + high);
    if (isHidden(placeAt(view, middle), sun)) low = middle;
    else high = middle;
  }
  return high;
}

/** Light that reaches the eye from a distance, per metre. */
function seenFrom(path: number, view: Vector, sun: Vector): number {
  const place = placeAt(view, path);
  const radius = Math.sqrt(dot(place, place));
  const heightM = radius - GROUND_M;
  const lost =
    outward(sky.table, 0, view[2]) - outward(sky.table, heightM, dot(place, view) / radius);
  const scattered = coefficientAt(air.lnScattering, heightM) * Math.exp(-lost);
  return scattered * sunlightAt(sky.table, heightM, dot(place, sun) / radius);
}

describe("sunlight scattered once along a slanted sight", () => {
  it.each([
    [96, 60, 0],
    [96, 60, 90],
    [96, 60, 180],
    [93, 80, 180],
    [94, 85, 0],
    [91, 20, 60],
    [90, 45, 0],
    [80, 70, 30],
  ])(
    "sun %d° from the vertical, sight %d° from it and %d° from the sun",
    (sunDeg, viewDeg, azimuthDeg) => {
      const [sun, view] = [direction(sunDeg, 0), direction(viewDeg, azimuthDeg)];
      const edge = shadowEdge(view, sun);
      expect(edge > 0).toBe(sunDeg > 90);
      const end =
        Math.sqrt((GROUND_M * view[2]) ** 2 + 116_000 * (2 * GROUND_M + 116_000)) -
        GROUND_M * view[2];
      // Simpson's rule in the root of the distance from the shadow's edge, where light comes in steeply
      const steps = 20_000;
      const last = Math.sqrt(end - edge);
      let sum = 0;
      for (let i = 1; i <= steps; i++) {
        const root = (last * i) / steps;
        sum +=
          (i === steps ? 1 : i % 2 === 1 ? 4 : 2) *
          2 *
          root *
          seenFrom(edge + root * root, view, sun);
      }
      const found = onceScattered(sky, sun[2], view[2], dot(sun, view), gaussNodes(64));
      expectRelative(found, (sum * last) / (3 * steps), 2e-7); // both integrals step over the kinks of a table of 100 m
    },
  );
});

it("a sight away from the sun and lower than the sun is deep leaves the shadow above the air: no light", () => {
  for (const [sunDeg, viewDeg] of [
    [96, 89],
    [93, 89.9],
    [92, 88], // along the shadow
  ] as const) {
    const [sun, view] = [direction(sunDeg, 0), direction(viewDeg, 180)];
    expect(isHidden(placeAt(view, 1.1e6), sun)).toBe(true); // the air ends before
    expect(onceScattered(sky, sun[2], view[2], dot(sun, view), gaussNodes(8))).toBe(0);
  }
});

import { describe, expect, it } from "vitest";
import { COMPONENTS, emission } from "../../src/sky/_emission.js";
import { higherAlong } from "../../src/sky/_higherSight.js";
import { addLater } from "../../src/sky/_laterField.js";
import { higherOrders } from "../../src/sky/_higherOrders.js";
import { gaussNodes } from "../../src/sky/_nodes.js";
import type { Probe } from "../../src/sky/_probe.js";
import { visitRays } from "../../src/sky/_probes.js";
import { ray, sightRay } from "../../src/sky/_rays.js";
import { shellAir } from "../../src/sky/_shellAir.js";
import { slantTable, sunlightAt } from "../../src/sky/_slantDepth.js";
import { addSunlit } from "../../src/sky/_sunlitField.js";
import {
  ANGLES,
  findPlace,
  gridAngle,
  gridHeight,
  HEIGHTS,
  NODES,
  TENSORS,
  UNKNOWNS,
} from "../../src/sky/_twilightGrid.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

type Vector = readonly [number, number, number];
type Matrix = readonly number[]; // 3 x 3, row by row

const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const along = (a: Vector, scale: number, b: Vector): Vector => [
  a[0] + scale * b[0],
  a[1] + scale * b[1],
  a[2] + scale * b[2],
];
const unit = (a: Vector): Vector => along([0, 0, 0], 1 / Math.sqrt(dot(a, a)), a);
const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const outer = (a: Vector, b: Vector): Matrix => a.flatMap((x) => b.map((y) => x * y));
const sum = (...all: Matrix[]): Matrix => all[0]!.map((_, k) => all.reduce((s, m) => s + m[k]!, 0));
const times = (scale: number, m: Matrix): Matrix => m.map((x) => scale * x);
const form = (a: Vector, m: Matrix, b: Vector): number =>
  a.reduce((s, x, i) => s + b.reduce((t, y, j) => t + x * m[3 * i + j]! * y, 0), 0);
const trace = (m: Matrix): number => m[0]! + m[4]! + m[8]!;
const UNIT: Matrix = [1, 0, 0, 0, 1, 0, 0, 0, 1];

/** What air in a field of tensor `m` sends along a and b: of dipoles 3/(8π) a m b, of the rest a third of the trace. */
const sends = (m: Matrix, dipole: number, a: Vector, b: Vector): number =>
  (3 / (8 * Math.PI)) * (dipole * form(a, m, b) + (a === b ? ((1 - dipole) / 3) * trace(m) : 0));
/** xx, yy, zz and xz in a frame of its own. */
const basis = (x: Vector, y: Vector, z: Vector): Matrix[] => [
  outer(x, x),
  outer(y, y),
  outer(z, z),
  sum(outer(x, z), outer(z, x)),
];
/** The four components kept of a tensor at the place itself. */
const kept = (m: Matrix): number[] => [m[0]!, m[4]!, m[8]!, m[2]!];
const field = (a: number, b: number, g: number, e1: Vector, e2: Vector): Matrix =>
  sum(
    times(a, outer(e1, e1)),
    times(b, outer(e2, e2)),
    times(g, sum(outer(e1, e2), outer(e2, e1))),
  );

const DIPOLE = 0.94;
const ALBEDO = 0.4;
const air = shellAir(0.3, 0.02, 0);
const sky = { air, table: slantTable(air) };

/** A probe from row `row` in a direction, with its vectors. */
function probeOf(row: number, column: number, view: number, azimuth: number) {
  const heightM = gridHeight(row);
  const angle = (gridAngle(column) * Math.PI) / 180;
  const sunward: Vector = [Math.sin(angle), 0, Math.cos(angle)];
  const side = Math.sqrt(1 - view * view);
  const [c, s] = [Math.cos(azimuth), Math.sin(azimuth)];
  const sight: Vector = [side * c, side * s, view];
  const e1: Vector = [view * c, view * s, -side];
  const e2: Vector = [-s, c, 0];
  const probe: Probe = {
    ...{ row, column, groundM: air.groundM, radius: air.groundM + heightM, solid: 0.37, view },
    ray: ray(sky, heightM, view, gaussNodes(2)),
    ...{
      sun: sunward[2],
      between: dot(sight, sunward),
      sun1: dot(e1, sunward),
      sun2: dot(e2, sunward),
    },
    ...{ x1: e1[0], y1: e1[1], z1: e1[2], x2: e2[0], y2: e2[1] },
  };
  return { probe, sunward, sight, e1, e2 };
}
const CASES = [
  [0, 3, 0.6, 0.7],
  [0, 12, 0.05, 2.5],
  [5, 6, -0.5, 1.1],
  [9, 8, 0.3, 2.9],
  [11, 2, -0.9, 0.2],
] as const;

describe("light scattered again and again, against tensors in three dimensions", () => {
  it("emission of every component of the field", () => {
    const parts = new Float64Array(3 * COMPONENTS);
    for (const [sunAngle, theta, phi] of [
      [0.3, 1.1, 0.4],
      [1.5, 0.2, 2.2],
      [1.8, 2.6, -1],
    ] as const) {
      const sunward: Vector = [Math.sin(sunAngle), 0, Math.cos(sunAngle)];
      const e1: Vector = [
        Math.cos(theta) * Math.cos(phi),
        Math.cos(theta) * Math.sin(phi),
        -Math.sin(theta),
      ];
      const e2: Vector = [-Math.sin(phi), Math.cos(phi), 0];
      emission(dot(e1, sunward), dot(e2, sunward), e1[2], sunward[2], DIPOLE, parts);
      basis([1, 0, 0], [0, 1, 0], [0, 0, 1]).forEach((m, c) => {
        expectAbsolute(parts[c]!, sends(m, DIPOLE, e1, e1), 1e-16);
        expectAbsolute(parts[COMPONENTS + c]!, sends(m, DIPOLE, e2, e2), 1e-16);
        expectAbsolute(parts[2 * COMPONENTS + c]!, sends(m, DIPOLE, e1, e2), 1e-16);
      });
    }
  });
  it.each(CASES.flatMap((each) => [[ALBEDO, ...each] as const, [0, ...each] as const]))(
    "sunlight that one ray brings over ground of albedo %d: row %d, sun %d",
    (albedo, row, column, view, azimuth) => {
      const { probe, sunward, sight, e1, e2 } = probeOf(row, column, view, azimuth);
      const out = new Float64Array(UNKNOWNS);
      addSunlit(sky, probe, DIPOLE, albedo, out);
      // a beam of flux π, unpolarised
      const beam = times(Math.PI / 2, sum(UNIT, times(-1, outer(sunward, sunward))));
      const at = (path: number): Vector => along([0, 0, probe.radius], path, sight);
      const cosineAt = (path: number): number => dot(unit(at(path)), sunward);
      const { paths, heights, weights, groundPath, fromGround } = probe.ray;
      const light = paths.reduce(
        (s, path, k) => s + weights[k]! * sunlightAt(sky.table, heights[k]!, cosineAt(path)),
        0,
      );
      const [a, b, g] = [
        sends(beam, DIPOLE, e1, e1),
        sends(beam, DIPOLE, e2, e2),
        sends(beam, DIPOLE, e1, e2),
      ];
      let met = times(light, field(a, b, g, e1, e2));
      const low = groundPath >= 0 ? Math.max(0, cosineAt(groundPath)) : 0;
      // the ground's radiance: albedo times irradiance over π, half in each vibration
      const lit = (albedo / 2) * low * (low > 0 ? sunlightAt(sky.table, 0, low) : 0) * fromGround;
      met = times(probe.solid, sum(met, field(lit, lit, 0, e1, e2)));
      kept(met).forEach((value, c) => {
        expectAbsolute(out[COMPONENTS * (row * ANGLES + column) + c]!, value, 1e-13);
      });
      expectAbsolute(out[TENSORS + column]!, row === 0 ? view * trace(met) : 0, 1e-13);
      expect(trace(met)).toBeGreaterThan(1e-4);
    },
  );
  it("light of every order that one ray brings", () => {
    const kernel = new Float64Array(UNKNOWNS * UNKNOWNS);
    const lnReference = Float64Array.from({ length: NODES }, (_, k) => Math.sin(k));
    const lnGround = Float64Array.from({ length: ANGLES }, (_, k) => Math.cos(k));
    const target = { dipole: DIPOLE, albedo: ALBEDO, lnReference, lnGround, kernel };
    for (const [row, column, view, azimuth] of CASES) {
      const { probe, sunward, sight, e1, e2 } = probeOf(row, column, view, azimuth);
      const here = row * ANGLES + column;
      const expected = new Map<number, number>();
      const add = (to: number, from: number, value: number): void =>
        void expected.set(to * UNKNOWNS + from, (expected.get(to * UNKNOWNS + from) ?? 0) + value);
      const meets = (from: number, met: Matrix): void => {
        for (const [c, value] of kept(met).entries()) add(COMPONENTS * here + c, from, value);
      };
      const place = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
      const { paths, heights, weights, groundPath, fromGround } = probe.ray;
      paths.forEach((path, k) => {
        const up = unit(along([0, 0, probe.radius], path, sight));
        const x = unit(along(sunward, -dot(sunward, up), up));
        findPlace(heights[k]!, dot(sunward, up), lnReference, place);
        const share = weights[k]! * probe.solid * Math.exp(place.ln - lnReference[here]!);
        const corners = [
          [0, place.s00],
          [1, place.s01],
          [ANGLES, place.s10],
          [ANGLES + 1, place.s11],
        ] as const;
        basis(x, cross(up, x), up).forEach((m, c) => {
          const [a, b, g] = [
            sends(m, DIPOLE, e1, e1),
            sends(m, DIPOLE, e2, e2),
            sends(m, DIPOLE, e1, e2),
          ];
          for (const [step, corner] of corners) {
            const from = COMPONENTS * (place.node + step) + c;
            const met = times(share * corner, field(a, b, g, e1, e2));
            meets(from, met);
            const onto = view * Math.exp(lnReference[here]! - lnGround[column]!);
            if (row === 0) add(TENSORS + column, from, onto * trace(met));
          }
        });
      });
      if (groundPath >= 0) {
        const cosine = dot(unit(along([0, 0, probe.radius], groundPath, sight)), sunward);
        const angle = (Math.acos(cosine) * 180) / Math.PI;
        const angles = Array.from({ length: ANGLES }, (_, k) => gridAngle(k));
        const j = angles.filter((deg) => deg <= angle).length - 1;
        const [from, to] = [gridAngle(j), gridAngle(j + 1)].map((deg) =>
          Math.cos((deg * Math.PI) / 180),
        );
        const u = angle < 84 ? (from! - cosine) / (from! - to!) : angle - gridAngle(j);
        const [lower, upper] = [lnGround[j]!, lnGround[j + 1]!];
        const own =
          angle < 84
            ? Math.log((1 - u) * Math.exp(lower) + u * Math.exp(upper))
            : (1 - u) * lower + u * upper;
        const ln = own - lnReference[here]!;
        // irradiance 1 leaves as radiance albedo / π, half in each vibration
        const lit = (ALBEDO / (2 * Math.PI)) * fromGround * probe.solid * Math.exp(ln);
        meets(TENSORS + j, field((1 - u) * lit, (1 - u) * lit, 0, e1, e2));
        meets(TENSORS + j + 1, field(u * lit, u * lit, 0, e1, e2));
      }
      addLater(probe, target);
      for (const [at, value] of expected) {
        expectAbsolute(kernel[at]!, value, 1e-12);
        kernel[at] = 0;
      }
    }
    expect(kernel.every((value) => value === 0)).toBe(true);
  });
  it("a line of sight through the field of all orders", () => {
    const lnReference = Float64Array.from({ length: NODES }, (_, k) => Math.sin(k));
    const tensors = Float64Array.from({ length: TENSORS }, (_, k) => Math.cos(3 * k));
    const nodes = gaussNodes(3);
    for (const [column, view, azimuth] of [
      [2, 0.7, 0.4],
      [14, 0.03, 2],
      [20, 0.95, -1],
    ] as const) {
      const { sunward, sight, e1, e2 } = probeOf(0, column, view, azimuth);
      const cosines = { sun: sunward[2], view, between: dot(sight, sunward) };
      const given = { ...cosines, theta: dot(e1, sunward), phi: dot(e2, sunward) };
      const found = higherAlong(sky, { lnReference, tensors }, DIPOLE, given, nodes);
      const { paths, heights, weights } = sightRay(sky, view, nodes, 0);
      const place = { node: 0, s00: 0, s01: 0, s10: 0, s11: 0, ln: 0 };
      const expected = [0, 0, 0];
      paths.forEach((path, k) => {
        const up = unit(along([0, 0, air.groundM], path, sight));
        const x = unit(along(sunward, -dot(sunward, up), up));
        findPlace(heights[k]!, dot(sunward, up), lnReference, place);
        basis(x, cross(up, x), up).forEach((m, c) => {
          const at = COMPONENTS * place.node + c;
          const tensor =
            place.s00 * tensors[at]! +
            place.s01 * tensors[at + 4]! +
            place.s10 * tensors[at + 4 * ANGLES]! +
            place.s11 * tensors[at + 4 * ANGLES + 4]!;
          const size = weights[k]! * Math.exp(place.ln) * tensor;
          expected[0]! += size * sends(m, DIPOLE, e1, e1);
          expected[1]! += size * sends(m, DIPOLE, e2, e2);
          expected[2]! += size * sends(m, DIPOLE, e1, e2);
        });
      });
      found.forEach((value, part) => {
        expectAbsolute(value, expected[part]!, 1e-14);
      });
    }
  });
  it("rays from every point cover the sphere, and their vectors are square to each other", () => {
    const covered = new Float64Array(HEIGHTS * ANGLES);
    let worst = 0;
    visitRays(sky, 1, (p) => {
      covered[p.row * ANGLES + p.column]! += p.solid;
      const angle = (gridAngle(p.column) * Math.PI) / 180;
      const sunward: Vector = [Math.sin(angle), 0, Math.cos(angle)];
      const [e1, e2]: [Vector, Vector] = [
        [p.x1, p.y1, p.z1],
        [p.x2, p.y2, 0],
      ];
      const sight = cross(e1, e2);
      const off = [
        dot(e1, e1) - 1,
        dot(e2, e2) - 1,
        dot(e1, e2),
        Math.abs(sight[2]) - Math.abs(p.view),
      ];
      off.push(dot(e1, sunward) - p.sun1, dot(e2, sunward) - p.sun2, sunward[2] - p.sun);
      off.push(dot(sight, sunward) - p.between);
      worst = Math.max(worst, ...off.map(Math.abs));
    });
    expect(worst).toBeLessThan(1e-14);
    for (const solid of covered) expectRelative(solid, 4 * Math.PI, 1e-13);
  });
});

describe("all orders together", () => {
  it("prefer no azimuth under a sun overhead, at any height", () => {
    const { tensors } = higherOrders(sky, DIPOLE, ALBEDO);
    for (let row = 0; row < HEIGHTS; row++) {
      const [xx, yy, zz, xz] = tensors.subarray(COMPONENTS * row * ANGLES) as unknown as Matrix;
      expectRelative(xx!, yy!, 1e-12);
      expectAbsolute(xz!, 0, 1e-12);
      expect(zz).toBeGreaterThan(0);
    }
  });
});

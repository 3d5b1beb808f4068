import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  illuminateSky,
  prepareSky,
  rayleighScatteringMatrix,
  skyFluxes,
  skyStokes,
  type PreparedSky,
  type SkyInput,
} from "../../src/index.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRefusal, expectRelative } from "../_tolerance.js";
import { directions, doublingMode, type Slab } from "./_doubling.js";

const zenithOf = (cosine: number): number => (Math.acos(cosine) * 180) / Math.PI;
const molecules = (rayleighDepth: number, rest: Partial<SkyInput> = {}): PreparedSky =>
  prepareSky({
    layers: [{ rayleighDepth, absorptionDepth: 0 }],
    depolarisation: 0,
    groundAlbedo: 0,
    ...rest,
  });

describe("published values", () => {
  it("meets Natraj, Li & Yung 2009: depth 0.5, sun cosine 0.2, view cosine 0.02", () => {
    // Astrophys. J. 691, 1909 (from memory, eight digits)
    const lit = illuminateSky(molecules(0.5, { streams: 64 }), zenithOf(0.2));
    const view = { viewZenithDeg: zenithOf(0.02), relativeAzimuthDeg: 0, at: "top" } as const;
    const [i, q] = skyStokes(lit, view);
    expectAbsolute(i, 0.44129802, 5e-9); // half of the last printed digit
    expectAbsolute(Math.abs(q), 0.01753141, 5e-9);
    const usual = skyStokes(illuminateSky(molecules(0.5), zenithOf(0.2)), view);
    expectAbsolute(usual[0], 0.44129802, 1e-6); // the error stated for 32 streams
    expectAbsolute(Math.abs(usual[1]), 0.01753141, 1e-6);
  });

  it("has the spherical albedos computed elsewhere for unpolarising molecules", () => {
    // Independent computation, six digits: half of the last one
    expectAbsolute(molecules(0.5).sphericalAlbedo, 0.296034, 5e-7);
    expectAbsolute(molecules(1).sphericalAlbedo, 0.446904, 5e-7);
  });
});

describe("independent fixtures", () => {
  const cosines = [0.02, 0.2, 0.55, 1];
  const layers = [
    { rayleighDepth: 0.02, absorptionDepth: 0.05 },
    { rayleighDepth: 0.3, absorptionDepth: 0 },
    { rayleighDepth: 0.1, absorptionDepth: 0.2 },
  ];
  it("is what doubling and adding of 3 x 3 blocks gives, at every azimuth, up and down", () => {
    const [depolarisation, groundAlbedo] = [0.0279, 0.25];
    const dirs = directions(8, cosines);
    const at = (k: number): number => 8 + k;
    const orders = ([0, 1, 2] as const).map((order) => {
      const { layer, add, ground } = doublingMode(order, dirs, depolarisation);
      const slabs = layers.map(({ rayleighDepth: s, absorptionDepth: a }) =>
        layer(s + a, s / (s + a)),
      );
      const air = add(add(slabs[0]!, slabs[1]!), slabs[2]!);
      return { whole: add(air, ground(groundAlbedo)), air, floor: ground(groundAlbedo), add };
    });
    const sky = prepareSky({ layers, depolarisation, groundAlbedo, streams: 16 });
    // light on the ground: in the adding scheme it is what enters a last slab that only lets through
    const through = orders.map(({ air, floor }, order) => downward(air, floor, dirs, order));
    for (const [k0, m0] of cosines.entries()) {
      const lit = illuminateSky(sky, zenithOf(m0));
      for (const [k, m] of cosines.entries()) {
        for (const az of [0, 50, 135, 180, 290]) {
          const series = (pick: (order: number) => Float64Array[]): number[] =>
            [0, 1, 2].map((row) =>
              [0, 1, 2].reduce((s, order) => {
                const phase = (order * az * Math.PI) / 180;
                const f = row === 2 ? Math.sin(phase) : Math.cos(phase);
                return s + m0 * f * pick(order)[3 * at(k) + row]![3 * at(k0)]!;
              }, 0),
            );
          const up = skyStokes(lit, {
            viewZenithDeg: zenithOf(m),
            relativeAzimuthDeg: az,
            at: "top",
          });
          const down = skyStokes(lit, {
            viewZenithDeg: zenithOf(m),
            relativeAzimuthDeg: az,
            at: "ground",
          });
          const expectUp = series((order) => orders[order]!.whole.r);
          const expectDown = series((order) => through[order]!);
          for (let row = 0; row < 3; row++) {
            // the same nodes, so only the start of the doubling, a slab of depth 1e-10, stands between them
            expectAbsolute(up[row]!, expectUp[row]!, 1e-9);
            expectAbsolute(down[row]!, expectDown[row]!, 1e-9);
          }
        }
      }
    }
  });

  it("with 32 streams is within 3e-7 of doubling and adding on 20 nodes, which knows nothing of the streams here", () => {
    const nodes = 20;
    const dirs = directions(nodes, cosines);
    const slabs = ([0, 1, 2] as const).map((order) =>
      doublingMode(order, dirs, 0.0279).layer(0.5, 1),
    );
    const sky = molecules(0.5, { depolarisation: 0.0279 });
    for (const [k0, m0] of cosines.entries()) {
      const lit = illuminateSky(sky, zenithOf(m0));
      for (const [k, m] of cosines.entries()) {
        for (const az of [0, 70, 180]) {
          for (const at of ["ground", "top"] as const) {
            const view = { viewZenithDeg: zenithOf(m), relativeAzimuthDeg: az, at };
            skyStokes(lit, view).forEach((value, row) => {
              const sum = slabs.reduce((s, { r, t }, order) => {
                const phase = (order * az * Math.PI) / 180;
                const f = row === 2 ? Math.sin(phase) : Math.cos(phase);
                const slab = at === "top" ? r : t;
                return s + m0 * f * slab[3 * (nodes + k) + row]![3 * (nodes + k0)]!;
              }, 0);
              expectAbsolute(value, sum, 3e-7); // 20 nodes are 5e-8 from the limit
            });
          }
        }
      }
    }
  });

  it("tends to single scattering in thin air, with signs", () => {
    // one scattering written with the angle between the beams and turns of the planes (Hansen & Travis 1974, section 2)
    const depth = 1e-5;
    for (const [sun, zenith, az, at] of [
      [50, 40, 70, "ground"],
      [50, 40, 70, "top"],
      [20, 75, 200, "ground"],
      [70, 10, 310, "top"],
    ] as const) {
      const sky = molecules(depth, { depolarisation: 0.0279 });
      const got = skyStokes(illuminateSky(sky, sun), {
        viewZenithDeg: zenith,
        relativeAzimuthDeg: az,
        at,
      });
      const expected = singleScattering(depth, sun, zenith, az, at === "top");
      // second order is about the depth itself (times 2 for slanted sun)
      for (let k = 0; k < 3; k++) expectAbsolute(got[k]!, expected[k]!, 4 * depth * depth);
    }
  });
});

/** Diffuse light that reaches the ground: air over a reflecting floor, by counting the bounces between them. */
function downward(
  air: Slab,
  floor: Slab,
  dirs: { mu: number[]; w: number[] },
  order: number,
): Float64Array[] {
  if (order > 0) return air.t;
  const n = air.t.length;
  const flux = (column: (i: number) => number): number =>
    2 * dirs.mu.reduce((s, m, i) => s + dirs.w[i]! * m * column(3 * i), 0);
  const albedo = floor.r[0]![0]!;
  // answer to an even glow of radiance 1 from below
  const glow = Array.from(
    { length: n },
    (_, i) => 2 * dirs.mu.reduce((s, m, j) => s + air.rs[i]![3 * j]! * dirs.w[j]! * m, 0),
  );
  const spherical = flux((i) => glow[i]!);
  return air.t.map((row, i) =>
    row.map((t, j) => {
      const falling = air.straight[j]! + flux((k) => air.t[k]![j]!);
      return t + (glow[i]! * albedo * falling) / (1 - albedo * spherical);
    }),
  );
}

function singleScattering(
  depth: number,
  sunDeg: number,
  zenithDeg: number,
  azDeg: number,
  up: boolean,
): number[] {
  const [sun, zenith, az] = [sunDeg, zenithDeg, azDeg].map((x) => (x * Math.PI) / 180) as [
    number,
    number,
    number,
  ];
  const c = up ? Math.cos(zenith) : -Math.cos(zenith);
  const s = Math.sin(zenith);
  const seen = [s * Math.cos(az), s * Math.sin(az), c] as const;
  const beam = [Math.sin(sun), 0, -Math.cos(sun)] as const;
  const dot = seen.reduce((t, x, k) => t + x * beam[k]!, 0);
  const { f11, f12 } = rayleighScatteringMatrix((Math.acos(dot) * 180) / Math.PI, 0.0279);
  // the vibration is square to both beams: its angle from the vertical plane gives the turn of Q into Q and U
  const cross = [
    seen[1] * beam[2] - seen[2] * beam[1],
    seen[2] * beam[0] - seen[0] * beam[2],
    seen[0] * beam[1] - seen[1] * beam[0],
  ];
  const theta = [c * Math.cos(az), c * Math.sin(az), -s];
  const phi = [-Math.sin(az), Math.cos(az), 0];
  const along = cross.reduce((t, x, k) => t + x * theta[k]!, 0);
  const across = cross.reduce((t, x, k) => t + x * phi[k]!, 0);
  const angle = 2 * Math.atan2(across, along);
  const [m, m0] = [Math.cos(zenith), Math.cos(sun)];
  const path = up
    ? (m0 / (m + m0)) * -Math.expm1(-depth * (1 / m + 1 / m0))
    : (m0 / (m0 - m)) * (Math.exp(-depth / m0) - Math.exp(-depth / m));
  return [f11, -f12 * Math.cos(angle), -f12 * Math.sin(angle)].map((f) => (f * path) / 4);
}

const layerStack = fc.array(
  fc.record({ rayleighDepth: between(0, 0.6), absorptionDepth: between(0, 0.4) }),
  { minLength: 1, maxLength: 4 },
);

describe("properties", () => {
  it("keeps energy without absorption", () => {
    fc.assert(
      fc.property(
        fc.array(between(0.001, 1), { minLength: 1, maxLength: 4 }),
        between(0, 89),
        between(0, 1),
        between(0, 0.5),
        (depths, sun, groundAlbedo, depolarisation) => {
          const layers = depths.map((rayleighDepth) => ({ rayleighDepth, absorptionDepth: 0 }));
          const lit = illuminateSky(prepareSky({ layers, depolarisation, groundAlbedo }), sun);
          const { direct, diffuseDown, up } = skyFluxes(lit);
          const net = direct.map((d, b) => d + diffuseDown[b]! - up[b]!);
          for (const value of net) expectAbsolute(value, net[0]!, 1e-10);
          const last = depths.length;
          expectAbsolute(up[last]!, groundAlbedo * (direct[last]! + diffuseDown[last]!), 1e-10);
          expectAbsolute(diffuseDown[0]!, 0, 0);
        },
      ),
      { numRuns: 60 },
    );
  });

  it.each([
    [[1000], 1e-10],
    [[5, 0.1, 300], 1e-10],
    [[1e4], 1e-9],
    [[1e4, 1e4], 1e-9],
  ])("keeps energy in layers of depth %j to %d", (depths, error) => {
    const layers = depths.map((rayleighDepth) => ({ rayleighDepth, absorptionDepth: 0 }));
    for (const groundAlbedo of [0, 0.5, 1]) {
      const sky = prepareSky({ layers, depolarisation: 0.0279, groundAlbedo });
      for (const sun of [0, 60, 89]) {
        const { direct, diffuseDown, up } = skyFluxes(illuminateSky(sky, sun));
        const net = direct.map((d, b) => d + diffuseDown[b]! - up[b]!);
        for (const value of net) expectAbsolute(value, net[0]!, error);
      }
    }
  });

  it("is reciprocal: sun and eye change places", () => {
    fc.assert(
      fc.property(
        layerStack,
        between(0, 88),
        between(0, 88),
        between(0, 360),
        (layers, a, b, az) => {
          const sky = prepareSky({ layers, depolarisation: 0.0279, groundAlbedo: 0.3 });
          const [ca, cb] = [a, b].map((x) => Math.cos((x * Math.PI) / 180)) as [number, number];
          const one = skyStokes(illuminateSky(sky, a), {
            viewZenithDeg: b,
            relativeAzimuthDeg: az,
            at: "top",
          })[0];
          const other = skyStokes(illuminateSky(sky, b), {
            viewZenithDeg: a,
            relativeAzimuthDeg: az,
            at: "top",
          })[0];
          expectAbsolute(one * cb, other * ca, 1e-10);
        },
      ),
      { numRuns: 40 },
    );
  });

  it("does not care how a layer is cut, or about layers of no depth", () => {
    fc.assert(
      fc.property(layerStack, between(0, 88), between(0, 88), (layers, sun, view) => {
        const cut = layers.flatMap(({ rayleighDepth: s, absorptionDepth: a }) => [
          { rayleighDepth: 0.3 * s, absorptionDepth: 0.3 * a },
          { rayleighDepth: 0, absorptionDepth: 0 },
          { rayleighDepth: 0.7 * s, absorptionDepth: 0.7 * a },
        ]);
        const rest = { depolarisation: 0.0279, groundAlbedo: 0.2 };
        const one = illuminateSky(prepareSky({ layers, ...rest }), sun);
        const other = illuminateSky(prepareSky({ layers: cut, ...rest }), sun);
        for (const at of ["ground", "top"] as const) {
          const direction = { viewZenithDeg: view, relativeAzimuthDeg: 33, at };
          const [x, y] = [skyStokes(one, direction), skyStokes(other, direction)];
          for (let k = 0; k < 3; k++) expectAbsolute(y[k]!, x[k]!, 1e-10);
        }
        const fluxes = skyFluxes(other);
        expect(fluxes.up.length).toBe(cut.length + 1);
        for (let l = 0; l < layers.length; l++) {
          expectAbsolute(fluxes.up[3 * l]!, skyFluxes(one).up[l]!, 1e-10);
          expectAbsolute(fluxes.diffuseDown[3 * l + 1]!, fluxes.diffuseDown[3 * l + 2]!, 0);
        }
      }),
      { numRuns: 25 },
    );
  });

  it("sums over the dome to its own diffuse flux", () => {
    const lit = illuminateSky(molecules(0.4, { groundAlbedo: 0.3, depolarisation: 0.0279 }), 55);
    const { mu, w } = directions(40, []);
    let flux = 0;
    for (const [i, m] of mu.entries()) {
      for (let k = 0; k < 8; k++) {
        const direction = {
          viewZenithDeg: zenithOf(m),
          relativeAzimuthDeg: 45 * k,
          at: "ground",
        } as const;
        flux += ((2 * Math.PI) / 8) * w[i]! * m * skyStokes(lit, direction)[0];
      }
    }
    expectAbsolute(flux, skyFluxes(lit).diffuseDown[1]!, 1e-7); // quadrature of the 32 streams
  });

  it("keeps Q and U within I, and I positive", () => {
    fc.assert(
      fc.property(
        layerStack,
        between(0, 89),
        between(0, 89),
        between(0, 360),
        (layers, sun, view, az) => {
          fc.pre(layers.some(({ rayleighDepth }) => rayleighDepth > 1e-6));
          const lit = illuminateSky(
            prepareSky({ layers, depolarisation: 0, groundAlbedo: 0.1 }),
            sun,
          );
          const [i, q, u] = skyStokes(lit, {
            viewZenithDeg: view,
            relativeAzimuthDeg: az,
            at: "ground",
          });
          expect(i).toBeGreaterThan(0);
          expect(Math.hypot(q, u)).toBeLessThanOrEqual(i);
        },
      ),
      { numRuns: 40 },
    );
  });
});

describe("convergence with streams", () => {
  const values = (streams: number): number[] => {
    const all: number[] = [];
    for (const depth of [0.02, 0.1, 0.5, 1]) {
      for (const groundAlbedo of [0, 0.8]) {
        const sky = molecules(depth, { depolarisation: 0.0279, groundAlbedo, streams });
        for (const m0 of [0.02, 0.06, 0.2, 0.6, 1]) {
          const lit = illuminateSky(sky, zenithOf(m0));
          for (const m of [0.02, 0.06, 0.2, 0.6, 1]) {
            for (const az of [0, 70, 180]) {
              for (const at of ["ground", "top"] as const) {
                all.push(
                  ...skyStokes(lit, { viewZenithDeg: zenithOf(m), relativeAzimuthDeg: az, at }),
                );
              }
            }
          }
        }
      }
    }
    return all;
  };
  const limit = values(64);
  it.each([
    [16, 1e-4],
    [24, 5e-6],
    [32, 3e-7],
    [40, 5e-8],
    [48, 3e-9],
  ])("%d streams stay within %d of 64", (streams, error) => {
    const some = values(streams);
    const worst = some.reduce((most, x, k) => Math.max(most, Math.abs(x - limit[k]!)), 0);
    expect(worst).toBeLessThanOrEqual(error);
    expect(worst).toBeGreaterThan(error / 200); // the table would be idle if far too generous
  });
});

describe("edges", () => {
  it.each([
    ["without absorption", 0.5, 0],
    ["with much", 0.05, 0.45], // even the first eigenvalue is one a sun can meet
  ])(
    "does not lose digits where the sun or the eye meets an eigenvalue, %s",
    (_, rayleighDepth, absorptionDepth) => {
      const layers = [{ rayleighDepth, absorptionDepth }];
      const sky = prepareSky({ layers, depolarisation: 0, groundAlbedo: 0.3 });
      for (const { layers } of sky.stacks) {
        for (const square of layers[0]!.squares) {
          if (square < 1 || square > 2500) continue;
          const zenith = zenithOf(1 / Math.sqrt(square));
          for (const off of [0, 1e-9, 1e-5, 3e-4]) {
            const at = (sun: number, viewZenithDeg: number, level: "ground" | "top"): number =>
              skyStokes(illuminateSky(sky, sun), {
                viewZenithDeg,
                relativeAzimuthDeg: 40,
                at: level,
              })[0];
            const mean = (f: (z: number) => number): number =>
              0.5 * (f(zenith - 2e-3) + f(zenith + 2e-3));
            // the field is smooth in both angles: the mean of two near neighbours is off by their curvature and by `off`
            const tolerance = 1e-7 + 0.02 * off;
            for (const level of ["ground", "top"] as const) {
              expectAbsolute(
                at(zenith + off, 30, level),
                mean((z) => at(z, 30, level)),
                tolerance,
              );
              expectAbsolute(
                at(30, zenith + off, level),
                mean((z) => at(30, z, level)),
                tolerance,
              );
            }
            const [m, m30] = [zenith + off, 30].map((z) => Math.cos((z * Math.PI) / 180));
            expectAbsolute(
              at(zenith + off, 30, "top") * m30!,
              at(30, zenith + off, "top") * m!,
              1e-10,
            );
          }
        }
      }
    },
  );

  it("holds with no scattering, no depth at all, deep air and nearly no absorption", () => {
    const dark = illuminateSky(
      prepareSky({
        layers: [{ rayleighDepth: 0, absorptionDepth: 0.3 }],
        depolarisation: 0,
        groundAlbedo: 0.5,
      }),
      40,
    );
    const up = { viewZenithDeg: 60, relativeAzimuthDeg: 0, at: "top" } as const;
    expect(skyStokes(dark, { ...up, at: "ground" })).toEqual([0, 0, 0]);
    const m0 = Math.cos((40 * Math.PI) / 180);
    expectAbsolute(skyStokes(dark, up)[0], 0.5 * m0 * Math.exp(-0.3 / m0) * Math.exp(-0.6), 1e-14);
    const none = illuminateSky(
      prepareSky({
        layers: [{ rayleighDepth: 0, absorptionDepth: 0 }],
        depolarisation: 0,
        groundAlbedo: 0.5,
      }),
      40,
    );
    expectAbsolute(skyStokes(none, up)[0], 0.5 * m0, 1e-15);
    expectAbsolute(skyFluxes(none).up[0]!, 0.5 * Math.PI * m0, 1e-14);
    const deep = illuminateSky(molecules(1e4), 20);
    expectAbsolute(skyFluxes(deep).up[0]!, Math.PI * Math.cos((20 * Math.PI) / 180), 1e-3); // nearly all comes back
    const clear = skyStokes(illuminateSky(molecules(0.5), 50), up)[0];
    for (const absorptionDepth of [1e-16, 1e-12, 1e-9, 1e-6]) {
      const hazed = prepareSky({
        layers: [{ rayleighDepth: 0.5, absorptionDepth }],
        depolarisation: 0,
        groundAlbedo: 0,
      });
      expectAbsolute(
        skyStokes(illuminateSky(hazed, 50), up)[0],
        clear,
        3 * absorptionDepth + 1e-11,
      );
    }
    for (const rayleighDepth of [1e-14, 1e-11, 1e-9, 1e-6]) {
      const faint = prepareSky({
        layers: [{ rayleighDepth, absorptionDepth: 0.3 }],
        depolarisation: 0,
        groundAlbedo: 0.5,
      });
      const [bright] = skyStokes(illuminateSky(faint, 40), up);
      expectAbsolute(bright, skyStokes(dark, up)[0], 4 * rayleighDepth + 1e-13);
    }
  });

  it("refuses what cannot be", () => {
    const good = {
      layers: [{ rayleighDepth: 0.1, absorptionDepth: 0 }],
      depolarisation: 0,
      groundAlbedo: 0,
    };
    const refused = (
      change: object,
      kind: typeof RangeError | typeof TypeError,
      ...parts: string[]
    ): void =>
      expectRefusal(
        () => prepareSky({ ...good, ...change } as never),
        kind,
        "prepareSky",
        ...parts,
      );
    refused({ layers: 3 }, TypeError, "layers");
    refused({ layers: [] }, RangeError, "at least one");
    refused(
      { layers: [{ rayleighDepth: -0.1, absorptionDepth: 0 }] },
      RangeError,
      "layers[0].rayleighDepth",
    );
    refused({ layers: [{ rayleighDepth: 0.1 }] }, TypeError, "layers[0].absorptionDepth");
    refused({ layers: [{ rayleighDepth: 0.1, absorptionDepth: Number.NaN }] }, RangeError, "NaN");
    refused({ depolarisation: 0.5001 }, RangeError, "depolarisation", "0.5001");
    refused({ layers: [{ rayleighDepth: 10_001, absorptionDepth: 0 }] }, RangeError, "10000");
    refused({ layers: [{ rayleighDepth: 0, absorptionDepth: 10_001 }] }, RangeError, "10001");
    expect(prepareSky({ ...good, depolarisation: 0.5 }).boundaryDepths[1]).toBe(0.1);
    refused({ groundAlbedo: 25 }, RangeError, "groundAlbedo", "percent");
    refused({ streams: 17 }, RangeError, "streams", "even");
    refused({ streams: 14 }, RangeError, "streams");
    refused({ streams: 66 }, RangeError, "streams");
    refused({ streams: "32" }, TypeError, "streams");
    expectRefusal(() => prepareSky(undefined as never), TypeError, "prepareSky");
    const sky = prepareSky(good);
    expectRefusal(() => illuminateSky(good as never, 30), TypeError, "prepareSky");
    expectRefusal(() => illuminateSky(sky, 90), RangeError, "sunZenithDeg", "under 90");
    expectRefusal(() => illuminateSky(sky, -1), RangeError, "sunZenithDeg");
    const lit = illuminateSky(sky, 30);
    const view = { viewZenithDeg: 10, relativeAzimuthDeg: 0, at: "ground" } as const;
    expectRefusal(() => skyStokes(sky as never, view), TypeError, "illuminateSky");
    expectRefusal(
      () => skyStokes(lit, { ...view, viewZenithDeg: 90 }),
      RangeError,
      "viewZenithDeg",
    );
    expectRefusal(
      () => skyStokes(lit, { ...view, relativeAzimuthDeg: Number.NaN }),
      RangeError,
      "relativeAzimuthDeg",
    );
    expectRefusal(
      () => skyStokes(lit, { ...view, at: "bottom" } as never),
      TypeError,
      "ground",
      "top",
    );
    expectRefusal(() => skyFluxes(sky as never), TypeError, "illuminateSky");
    expectRelative(
      skyStokes(illuminateSky(sky, 89.999), { ...view, viewZenithDeg: 89.999 })[0] > 0 ? 1 : 0,
      1,
      0,
    );
  });
});

import { describe, expect, it } from "vitest";
import { illuminateSky, prepareSky, skyStokes } from "../../src/index.js";
import { randomSource } from "./_random.js";

/**
 * Photons followed one by one, each a pair of electric vectors in space (two incoherent waves): a dipole radiates the part of
 * the vector square to the new direction. No Stokes matrices, no azimuth modes, no quadrature.
 */
type V = [number, number, number];
const dot = (a: V, b: V): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const square = (e: V, n: V): V => {
  const along = dot(e, n);
  return [e[0] - along * n[0], e[1] - along * n[1], e[2] - along * n[2]];
};
const scaled = (e: V, f: number): V => [e[0] * f, e[1] * f, e[2] * f];
/** Any two unit vectors square to n and each other. */
const frame = (n: V): [V, V] => {
  const s = Math.hypot(n[0], n[1]);
  if (s < 1e-9)
    return [
      [1, 0, 0],
      [0, 1, 0],
    ];
  const theta: V = [(n[2] * n[0]) / s, (n[2] * n[1]) / s, -s];
  return [theta, [-n[1] / s, n[0] / s, 0]];
};

interface Eye {
  zenith: number;
  azimuth: number;
  at: "ground" | "top";
}

function photons(
  count: number,
  random: () => number,
  air: { scattering: number; absorption: number; depolarisation: number; albedo: number },
  sunDeg: number,
  eyes: readonly Eye[],
): number[][] {
  const depth = air.scattering + air.absorption;
  const omega = air.scattering / depth;
  const dipole = (1 - air.depolarisation) / (1 + air.depolarisation / 2);
  const sun = (sunDeg * Math.PI) / 180;
  const rays = eyes.map(({ zenith, azimuth, at }) => {
    const [z, a] = [(zenith * Math.PI) / 180, (azimuth * Math.PI) / 180];
    const c = at === "top" ? Math.cos(z) : -Math.cos(z);
    const n: V = [Math.sin(z) * Math.cos(a), Math.sin(z) * Math.sin(a), c];
    return { n, frame: frame(n), mu: Math.cos(z), at };
  });
  const sums = eyes.map(() => [0, 0, 0]);
  for (let p = 0; p < count; p++) {
    let n: V = [Math.sin(sun), 0, -Math.cos(sun)];
    // flux π per area square to the beam: π cos(sun) per horizontal area
    let fields = frame(n).map((e) => scaled(e, Math.sqrt((Math.PI * Math.cos(sun)) / 2)));
    let tau = 0; // from the top
    for (let order = 0; order < 400; order++) {
      tau += -Math.log(random()) * -n[2];
      if (tau < 0) break;
      const power = fields.reduce((s, e) => s + dot(e, e), 0);
      if (tau >= depth) {
        if (random() >= air.albedo) break;
        tau = depth;
        for (const [k, ray] of rays.entries()) {
          if (ray.at === "top") sums[k]![0]! += (power / Math.PI) * Math.exp(-depth / ray.mu);
        }
        const c = Math.sqrt(random());
        const a = 2 * Math.PI * random();
        n = [Math.sqrt(1 - c * c) * Math.cos(a), Math.sqrt(1 - c * c) * Math.sin(a), c];
        fields = frame(n).map((e) => scaled(e, Math.sqrt(power / 2)));
        continue;
      }
      if (random() >= omega) break;
      const even = random() >= dipole;
      for (const [
        k,
        {
          n: to,
          frame: [theta, phi],
          mu,
          at,
        },
      ] of rays.entries()) {
        const f = Math.exp(-(at === "top" ? tau : depth - tau) / mu) / (4 * Math.PI * mu);
        const sum = sums[k]!;
        if (even) {
          sum[0]! += f * power;
          continue;
        }
        for (const e of fields) {
          const [x, y] = [dot(square(e, to), theta), dot(square(e, to), phi)];
          sum[0]! += 1.5 * f * (x * x + y * y);
          sum[1]! += 1.5 * f * (x * x - y * y);
          sum[2]! += 3 * f * x * y;
        }
      }
      const c = 2 * random() - 1;
      const a = 2 * Math.PI * random();
      const s = Math.sqrt(1 - c * c);
      n = [s * Math.cos(a), s * Math.sin(a), c];
      fields = even
        ? frame(n).map((e) => scaled(e, Math.sqrt(power / 2)))
        : fields.map((e) => scaled(square(e, n), Math.sqrt(1.5)));
    }
  }
  return sums.map((sum) => sum.map((x) => x / count));
}

describe("a Monte Carlo of electric vectors", () => {
  const eyes: Eye[] = [
    { zenith: 20, azimuth: 60, at: "ground" },
    { zenith: 75, azimuth: 250, at: "ground" },
    { zenith: 60, azimuth: 0, at: "ground" },
    { zenith: 30, azimuth: 120, at: "top" },
    { zenith: 70, azimuth: 300, at: "top" },
  ];
  it.each([
    [1, { scattering: 0.5, absorption: 0, depolarisation: 0, albedo: 0 }, 60],
    [2, { scattering: 0.8, absorption: 0.3, depolarisation: 0.0279, albedo: 0.8 }, 35],
    [3, { scattering: 0.25, absorption: 0, depolarisation: 0.4, albedo: 0.25 }, 75],
  ])("agrees within 4 standard errors (case %d)", (seed, air, sun) => {
    const batches = 20;
    const random = randomSource(seed);
    const means = Array.from({ length: batches }, () => photons(4000, random, air, sun, eyes));
    const sky = prepareSky({
      layers: [{ rayleighDepth: air.scattering, absorptionDepth: air.absorption }],
      depolarisation: air.depolarisation,
      groundAlbedo: air.albedo,
    });
    const lit = illuminateSky(sky, sun);
    for (const [k, { zenith, azimuth, at }] of eyes.entries()) {
      const exact = skyStokes(lit, { viewZenithDeg: zenith, relativeAzimuthDeg: azimuth, at });
      for (let s = 0; s < 3; s++) {
        const draws = means.map((batch) => batch[k]![s]!);
        const mean = draws.reduce((a, b) => a + b, 0) / batches;
        const variance = draws.reduce((a, b) => a + (b - mean) ** 2, 0) / (batches * (batches - 1));
        const error = Math.sqrt(variance);
        const off = Math.abs(exact[s]! - mean);
        if (s < 2 || Math.abs(exact[s]!) > 1e-12) expect(error).toBeLessThan(0.02 * exact[0]); // sharp enough to tell
        expect(
          off,
          `eye ${k}, ${"IQU"[s]}: ${exact[s]} against ${mean} ± ${error}`,
        ).toBeLessThanOrEqual(4 * error + 1e-15);
      }
    }
  });
});

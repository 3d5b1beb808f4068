import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { PNG } from "pngjs";
import { expect, it } from "vitest";
import { azimuthsOf, layDome, placeOf } from "../../examples/sky/dome.js";
import { domeStokes } from "../../examples/sky/domeStokes.js";
import { opticsOf, type Site } from "../../examples/sky/opticsOf.js";
import { paintColour } from "../../examples/sky/paintDome.js";
import { savePicture } from "../../examples/sky/picture.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

const site: Site = { altitudeM: 300, latitudeDeg: 45, ozoneDu: 330, groundAlbedo: 0.15 };

it("layers add up to the whole of the air and of the ozone", () => {
  const { layers, rayleighDepth, ozoneDepth } = opticsOf(600, site);
  expectRelative(
    layers.reduce((s, l) => s + l.rayleighDepth, 0),
    rayleighDepth,
    1e-12,
  );
  expectRelative(
    layers.reduce((s, l) => s + l.absorptionDepth, 0),
    ozoneDepth,
    1e-12,
  );
  for (const layer of layers) expect(layer.absorptionDepth).toBeGreaterThan(0);
});

it("the dome has north up and east on the left, and the sun where it belongs", () => {
  const dome = layDome(60, 6);
  const [eastX, eastY] = placeOf(dome, 90, 90);
  expectAbsolute(eastX, 6, 1e-9);
  expectAbsolute(eastY, 30, 1e-9);
  expectAbsolute(placeOf(dome, 90, 0)[1], 6, 1e-9);
  const sun = { zenithDeg: 50, bearingDeg: 120 };
  const stokes = new Float64Array(3 * dome.dots.length);
  domeStokes(700, dome, { ...site, groundAlbedo: 0 }, sun, stokes);
  // red light is scattered once, nearly: of the dots 50° from the vertical the one on the sun's side is the brightest
  const ring = [...dome.dots.keys()].filter((k) => Math.abs(dome.zenithsDeg[k]! - 50) < 2);
  const best = ring.reduce((a, b) => (stokes[3 * b]! > stokes[3 * a]! ? b : a));
  expect(Math.abs(Math.cos((azimuthsOf(dome, 120)[best]! * Math.PI) / 180))).toBeGreaterThan(0.95);
  expect(Math.cos(((dome.bearingsDeg[best]! - 120) * Math.PI) / 180)).toBeGreaterThan(0.95);
});

it("a picture comes back from its file dot by dot", () => {
  const dome = layDome(48, 8);
  const xyz = new Float64Array(3 * dome.dots.length).map((_, k) => [950, 1000, 1089][k % 3]!);
  const picture = paintColour(dome, xyz, 2000, { zenithDeg: 30, bearingDeg: 180 });
  const folder = mkdtempSync(join(tmpdir(), "sky-"));
  try {
    savePicture(picture, join(folder, "a", "sky.png"));
    const back = PNG.sync.read(readFileSync(join(folder, "a", "sky.png")));
    expect([back.width, back.height]).toEqual([picture.width, picture.height]);
    expect(Buffer.compare(back.data, Buffer.from(picture.bytes))).toBe(0);
    // half of white's luminance: encoded 0.735 of 255
    const dot = 4 * (10 * back.width + 24 + 6);
    expectAbsolute(back.data[dot]!, 0.735 * 255, 3);
  } finally {
    rmSync(folder, { recursive: true });
  }
});

/**
 * Pictures of a clear sky: its colour and its polarisation, as PNG, and what it gives in numbers.
 * `npx tsx examples/sky.ts` after `npm run build`; `npx tsx examples/sky.ts 20` for a sun 20° high.
 * Never look at the sun through an instrument, nor at all without a filter made for it.
 */
import { fileURLToPath } from "node:url";
import {
  chromaticity,
  cie1931Observer,
  illuminateSky,
  neutralPoints,
  prepareSky,
  spectraToXyz,
  wavelengthGrid,
} from "airlight";
import { layDome } from "./sky/dome.js";
import { domeStokes, type Sun } from "./sky/domeStokes.js";
import { opticsOf, type Site } from "./sky/opticsOf.js";
import { paintColour, paintPolarisation } from "./sky/paintDome.js";
import { savePicture } from "./sky/picture.js";
import { printGround } from "./sky/printGround.js";
import { progress } from "./sky/progress.js";
import { temperatureWords } from "./sky/temperatureWords.js";

const SITE: Site = { altitudeM: 0, latitudeDeg: 45, ozoneDu: 330, groundAlbedo: 0.15 };
/** Wavelength of the polarisation picture, nm. */
const POLARISATION_NM = 450;

const height = Number(process.argv[2] ?? 35);
if (!(height >= 10 && height <= 90)) {
  console.error(
    "The sun's height must be 10 to 90 degrees: lower suns need the round Earth, see examples/twilight.ts.",
  );
  process.exit(1);
}
const sun: Sun = { zenithDeg: 90 - height, bearingDeg: 140 };
const out = (name: string): string => fileURLToPath(new URL(`out/${name}`, import.meta.url));

const dome = layDome(640, 36);
const count = dome.dots.length;
const grid = wavelengthGrid(380, 780, 10);
const spectra = new Float64Array(count * grid.length);
const stokes = new Float64Array(3 * count);
for (const [w, wavelengthNm] of grid.entries()) {
  domeStokes(wavelengthNm, dome, SITE, sun, stokes);
  for (let k = 0; k < count; k++) spectra[k * grid.length + w] = stokes[3 * k]!;
  progress(w + 1, grid.length, "wavelengths");
}
const xyz = spectraToXyz(spectra, grid, cie1931Observer);
const luminances = Array.from({ length: count }, (_, k) => xyz[3 * k + 1]!);
const brightest = luminances.reduce((most, y) => Math.max(most, y), 0);
// what is as bright as white keeps its colour only if nothing is brighter
const white = Math.ceil(brightest / 1000) * 1000;
savePicture(paintColour(dome, xyz, white, sun), out("sky-colour.png"));

domeStokes(POLARISATION_NM, dome, SITE, sun, stokes);
const { layers, depolarisation } = opticsOf(POLARISATION_NM, SITE);
const lit = illuminateSky(
  prepareSky({ layers, depolarisation, groundAlbedo: SITE.groundAlbedo }),
  sun.zenithDeg,
);
savePicture(
  paintPolarisation(dome, stokes, neutralPoints(lit), sun, POLARISATION_NM),
  out("sky-polarisation.png"),
);

const zenith = dome.zenithsDeg.indexOf(
  dome.zenithsDeg.reduce((least, z) => Math.min(least, z), 90),
);
const overhead: [number, number, number] = [
  xyz[3 * zenith]!,
  xyz[3 * zenith + 1]!,
  xyz[3 * zenith + 2]!,
];
const [x, y] = chromaticity(overhead);
console.log(
  `Zenith: ${overhead[1].toFixed(0)} cd/m², x ${x.toFixed(4)}, y ${y.toFixed(4)}, ${temperatureWords(overhead)}`,
);
console.log(`Brightest: ${brightest.toFixed(0)} cd/m²; white of the picture: ${white} cd/m²`);
printGround(SITE, sun.zenithDeg);
for (const [name, point] of Object.entries(neutralPoints(lit))) {
  console.log(
    `${name}: ${point === undefined ? "below the horizon" : `${point.distanceDeg.toFixed(2)}° from ${name === "arago" ? "the point opposite the sun" : "the sun"}`}`,
  );
}
console.log("Written: examples/out/sky-colour.png, examples/out/sky-polarisation.png");

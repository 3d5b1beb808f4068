/**
 * The colour overhead from a high sun to the end of civil twilight, with the ozone layer and without it.
 * `npx tsx examples/twilight.ts` after `npm run build`; the wavelengths are spread over the machine's cores.
 */
import { fileURLToPath } from "node:url";
import { chromaticity, cie1931Observer, spectraToXyz, wavelengthGrid } from "airlight";
import type { Site } from "./sky/opticsOf.js";
import { overCores } from "./sky/overCores.js";
import { paintStrips } from "./sky/paintStrip.js";
import { savePicture } from "./sky/picture.js";
import type { ZenithTask } from "./sky/zenithWorker.js";

const SITE: Site = { altitudeM: 0, latitudeDeg: 45, ozoneDu: 330, groundAlbedo: 0.15 };
const COLUMNS = 520;
const grid = wavelengthGrid(380, 780, 20);

/** Sun heights from 60° to -6°, drawn out towards the horizon. */
const heights = Array.from({ length: COLUMNS }, (_, k) => {
  const t = 1 - k / (COLUMNS - 1);
  return -6 + 18 * t + 48 * t * t * t;
});
const suns = heights.map((height) => 90 - height);

const sites = [SITE, { ...SITE, ozoneDu: 0 }];
const tasks = sites.flatMap((site) =>
  Array.from(grid, (wavelengthNm): ZenithTask => ({ wavelengthNm, site, sunZenithsDeg: suns })),
);
const worker = new URL("sky/zenithWorker.ts", import.meta.url);
const radiances = await overCores<ZenithTask, number[]>(worker, tasks, "wavelengths");

const strips = ["With ozone", "Without ozone"].map((title, s) => {
  const spectra = new Float64Array(COLUMNS * grid.length);
  for (let w = 0; w < grid.length; w++) {
    for (let k = 0; k < COLUMNS; k++)
      spectra[k * grid.length + w] = radiances[s * grid.length + w]![k]!;
  }
  const xyz = spectraToXyz(spectra, grid, cie1931Observer);
  const colours = heights.map((_, k): [number, number, number] => [
    xyz[3 * k]!,
    xyz[3 * k + 1]!,
    xyz[3 * k + 2]!,
  ]);
  return { title, colours };
});
const path = fileURLToPath(new URL("out/twilight-zenith.png", import.meta.url));
savePicture(paintStrips(strips, heights), path);

console.log("sun height   with ozone: cd/m²      x       y     without: cd/m²      x       y");
for (const mark of [60, 30, 10, 5, 2, 0, -2, -4, -6]) {
  const k = heights.findIndex((height) => height <= mark + 1e-9);
  const cells = strips.map(({ colours }) => {
    const [x, y] = chromaticity(colours[k]!);
    return `${colours[k]![1].toPrecision(4).padStart(20)} ${x.toFixed(4)}  ${y.toFixed(4)}`;
  });
  console.log(`${`${mark}°`.padStart(10)} ${cells.join(" ")}`);
}
console.log("Written: examples/out/twilight-zenith.png");

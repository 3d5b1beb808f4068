/** The page: hands the wavelengths to workers, adds up the light, paints. */
import {
  cie1931Observer5nm,
  encodeSrgb,
  fitToDisplay,
  spectraToXyz,
  wavelengthGrid,
  xyzToLinearSrgb,
} from "../../dist/index.js";

const grid = wavelengthGrid(380, 780, 20);
const canvas = document.querySelector("#sky");
const slider = document.querySelector("#height");
const size = canvas.width;

/** Dots of the disc, their angles from the vertical and from the sun's plane. */
const dots = [];
const viewZenithsDeg = [];
const relativeAzimuthsDeg = [];
for (let row = 0; row < size; row++) {
  for (let column = 0; column < size; column++) {
    const [x, y] = [column + 0.5 - size / 2, row + 0.5 - size / 2];
    const zenith = (180 * Math.sqrt(x * x + y * y)) / size;
    if (zenith > 89.5) continue;
    dots.push(row * size + column);
    viewZenithsDeg.push(zenith);
    relativeAzimuthsDeg.push((Math.atan2(x, y) * 180) / Math.PI);
  }
}
const directions = { viewZenithsDeg, relativeAzimuthsDeg, at: "ground" };

const count = Math.max(1, Math.min(navigator.hardwareConcurrency ?? 2, 8));
const workers = Array.from({ length: count }, () => {
  const worker = new Worker(new URL("skyWorker.js", import.meta.url), { type: "module" });
  worker.postMessage({ directions });
  return worker;
});

/** Radiances of all dots at all wavelengths, dot by dot. */
function radiances(sunZenithDeg) {
  const spectra = new Float64Array(dots.length * grid.length);
  const jobs = workers.map(
    (worker, k) =>
      new Promise((resolve) => {
        const mine = [...grid.keys()].filter((w) => w % count === k);
        let left = mine.length;
        if (left === 0) resolve();
        worker.onmessage = ({ data: { w, values } }) => {
          for (let i = 0; i < values.length; i++) spectra[i * grid.length + w] = values[i];
          if (--left === 0) resolve();
        };
        for (const w of mine) worker.postMessage({ w, wavelengthNm: grid[w], sunZenithDeg });
      }),
  );
  return Promise.all(jobs).then(() => spectra);
}

let busy = false;
let wanted = Number(slider.value);
async function paint() {
  if (busy) return;
  busy = true;
  while (true) {
    const height = wanted;
    const start = performance.now();
    const xyz = spectraToXyz(await radiances(90 - height), grid, cie1931Observer5nm);
    const white = xyz.reduce((most, value, k) => (k % 3 === 1 ? Math.max(most, value) : most), 0);
    const context = canvas.getContext("2d");
    const image = context.createImageData(size, size);
    dots.forEach((dot, k) => {
      const linear = xyzToLinearSrgb([
        xyz[3 * k] / white,
        xyz[3 * k + 1] / white,
        xyz[3 * k + 2] / white,
      ]);
      const colour = encodeSrgb(fitToDisplay(linear));
      for (let c = 0; c < 3; c++) image.data[4 * dot + c] = 255 * colour[c];
      image.data[4 * dot + 3] = 255;
    });
    context.putImageData(image, 0, 0);
    const told = `White stands for ${white.toFixed(0)} cd/m²; ${grid.length} wavelengths by ${dots.length} directions on ${count} workers in ${(performance.now() - start).toFixed(0)} ms.`;
    document.querySelector("#told").textContent = told;
    if (wanted === height) break;
  }
  busy = false;
}
slider.addEventListener("input", () => {
  wanted = Number(slider.value);
  document.querySelector("#shown").textContent = slider.value;
  paint();
});
paint();

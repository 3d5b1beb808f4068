/** The polarised sky: preparing, a sun more, a direction more, a dome; beside loops of the same size that scatter once. */
import {
  illuminateSky,
  prepareSky,
  prepareTwilight,
  skyStokes,
  skyStokesMap,
  twilightStokes,
} from "../../dist/index.js";

const DEGREES = Math.PI / 180;
/** Calls `work` with another number each time. */
function turning(work) {
  let call = 0;
  return () => work(call++ % 997);
}

const sky = (i, absorptionDepth, streams) =>
  prepareSky({
    layers: [{ rayleighDepth: 0.1 + i * 4e-4, absorptionDepth }],
    depolarisation: 0.0279,
    groundAlbedo: 0,
    streams,
  });

/** I of light scattered once in one layer, without polarisation: the formula, nothing checked. */
function once(depth, cosSun, cosView, cosAngle) {
  const path =
    Math.abs(cosSun - cosView) < 1e-9
      ? (depth / cosView) * Math.exp(-depth / cosView)
      : ((Math.exp(-depth / cosSun) - Math.exp(-depth / cosView)) * cosSun) / (cosSun - cosView);
  return 0.1875 * (1 + cosAngle * cosAngle) * path;
}

/** A dome of directions, 256 by 256 dots. */
const SIDE = 256;
const zeniths = [];
const azimuths = [];
for (let row = 0; row < SIDE; row++) {
  for (let column = 0; column < SIDE; column++) {
    const [x, y] = [column + 0.5 - SIDE / 2, row + 0.5 - SIDE / 2];
    const zenith = (Math.sqrt(x * x + y * y) / (SIDE / 2)) * 90;
    if (zenith >= 90) continue;
    zeniths.push(zenith);
    azimuths.push(Math.atan2(x, y) / DEGREES);
  }
}
const directions = {
  viewZenithsDeg: Float64Array.from(zeniths),
  relativeAzimuthsDeg: Float64Array.from(azimuths),
  at: "ground",
};
const map = new Float64Array(3 * zeniths.length);
const ready = sky(300, 0);
const lit = illuminateSky(ready, 50);
const twilight = prepareTwilight({
  rayleighDepth: 0.22,
  ozoneDepth: 0.001,
  depolarisation: 0.0279,
  groundAlbedo: 0.1,
  altitudeM: 0,
  orders: "single",
});

/** The dome by the formula for one scattering: cosines, two exponentials and a quotient a dot. */
function domeOnce(i) {
  const depth = 0.2 + i * 1e-5;
  const [cosSun, sinSun] = [Math.cos(50 * DEGREES), Math.sin(50 * DEGREES)];
  for (let k = 0; k < zeniths.length; k++) {
    const cosView = Math.cos(zeniths[k] * DEGREES);
    const sinView = Math.sqrt(1 - cosView * cosView);
    const cosAngle = cosSun * cosView + sinSun * sinView * Math.cos(azimuths[k] * DEGREES);
    map[3 * k] = once(depth, cosSun, cosView, cosAngle);
  }
  return 1;
}
function dome(i) {
  skyStokesMap(illuminateSky(ready, 50 + i * 1e-3), directions, map);
  return 1;
}
/** Molecular depths of 32 wavelengths from 400 to 700 nm, inverse fourth power: sizes for the clock, not physics. */
const depths = Array.from({ length: 32 }, (_, k) => 0.36 * (400 / (400 + k * 9.7)) ** 4);
/** Prepares and lights every wavelength, then fills the dome with each. */
function domeInColour(i) {
  for (const rayleighDepth of depths) {
    const prepared = prepareSky({
      layers: [{ rayleighDepth, absorptionDepth: 0.01 }],
      depolarisation: 0.0279,
      groundAlbedo: 0.2,
    });
    skyStokesMap(illuminateSky(prepared, 50 + i * 1e-3), directions, map);
  }
  return 1;
}
function domeInColourOnce(i) {
  for (let k = 0; k < depths.length; k++) domeOnce(i + k);
  return 1;
}
const view = (i) => ({ viewZenithDeg: i * 0.09, relativeAzimuthDeg: i, at: "ground" });
/** A thousand values of the formula for one scattering: the yardstick of single calls. */
function thousandOnce(i) {
  let sum = 0;
  for (let k = 0; k < 1000; k++) sum += once(0.2 + i * 1e-5, 0.5, 0.2 + k * 7e-4, k * 1e-3);
  return sum > 0 ? 1 : 0;
}
const beside = "1000 values scattered once";

export const skyCases = [
  {
    title: "prepareSky and a sun, 16 streams, no absorption",
    beside,
    count: 1,
    ours: turning((i) => (illuminateSky(sky(i, 0, 16), 50) ? 1 : 0)),
    naive: turning(thousandOnce),
  },
  {
    title: "prepareSky and a sun, 32 streams, no absorption",
    beside,
    count: 1,
    ours: turning((i) => (illuminateSky(sky(i, 0, 32), 50) ? 1 : 0)),
    naive: turning(thousandOnce),
  },
  {
    title: "prepareSky and a sun, 32 streams, absorption",
    beside,
    count: 1,
    ours: turning((i) => (illuminateSky(sky(i, 0.05, 32), 50) ? 1 : 0)),
    naive: turning(thousandOnce),
  },
  {
    title: "illuminateSky, one sun more, 32 streams",
    beside,
    count: 1,
    ours: turning((i) => (illuminateSky(ready, i * 0.08) ? 1 : 0)),
    naive: turning(thousandOnce),
  },
  {
    title: "skyStokes, one direction more, 32 streams",
    beside,
    count: 1,
    ours: turning((i) => (skyStokes(lit, view(i)) ? 1 : 0)),
    naive: turning(thousandOnce),
  },
  {
    title: "skyStokesMap, a dome of 256 by 256",
    beside: "the dome scattered once",
    count: 1,
    ours: turning(dome),
    naive: turning(domeOnce),
  },
  {
    title: "a dome of 256 by 256 at 32 wavelengths",
    beside: "the 32 domes scattered once",
    count: 1,
    ours: turning(domeInColour),
    naive: turning(domeInColourOnce),
  },
  {
    title: "twilightStokes, scattered once",
    beside,
    count: 1,
    ours: turning((i) =>
      twilightStokes(twilight, {
        sunZenithDeg: 85 + i * 0.01,
        viewZenithDeg: 60,
        relativeAzimuthDeg: i,
      })
        ? 1
        : 0,
    ),
    naive: turning(thousandOnce),
  },
];

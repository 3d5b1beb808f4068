/** Worker of examples/twilight.ts: the zenith's radiance at one wavelength for a list of suns. */
import { parentPort } from "node:worker_threads";
import { prepareTwilight, solarIrradiance, twilightStokes } from "airlight";
import { opticsOf, type Site } from "./opticsOf.js";

/** What the worker is handed. */
export interface ZenithTask {
  readonly wavelengthNm: number;
  readonly site: Site;
  readonly sunZenithsDeg: readonly number[];
}

parentPort?.on("message", ({ wavelengthNm, site, sunZenithsDeg }: ZenithTask) => {
  const { rayleighDepth, ozoneDepth, depolarisation } = opticsOf(wavelengthNm, site);
  const { groundAlbedo, altitudeM } = site;
  const air = { rayleighDepth, ozoneDepth, depolarisation, groundAlbedo, altitudeM };
  const twilight = prepareTwilight({ ...air, orders: "all" });
  const scale = solarIrradiance(wavelengthNm) / Math.PI;
  const radiances = sunZenithsDeg.map((sunZenithDeg) => {
    const zenith = { sunZenithDeg, viewZenithDeg: 0, relativeAzimuthDeg: 0 };
    return scale * twilightStokes(twilight, zenith)[0];
  });
  parentPort?.postMessage(radiances);
});

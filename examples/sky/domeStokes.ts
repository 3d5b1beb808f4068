/** Stokes parameters of a dome at some wavelengths. */
import { illuminateSky, prepareSky, skyStokesMap, solarIrradiance } from "airlight";
import { azimuthsOf, type Dome } from "./dome.js";
import { opticsOf, type Site } from "./opticsOf.js";

/** The sun: angle from the vertical and bearing, degrees. */
export interface Sun {
  readonly zenithDeg: number;
  readonly bearingDeg: number;
}

/** Radiances I, Q, U in W m⁻² sr⁻¹ nm⁻¹ of every dot of the dome, written to `out` for one wavelength. */
export function domeStokes(
  wavelengthNm: number,
  dome: Dome,
  site: Site,
  sun: Sun,
  out: Float64Array,
): void {
  const { layers, depolarisation } = opticsOf(wavelengthNm, site);
  const sky = prepareSky({ layers, depolarisation, groundAlbedo: site.groundAlbedo });
  const lit = illuminateSky(sky, sun.zenithDeg);
  const directions = {
    viewZenithsDeg: dome.zenithsDeg,
    relativeAzimuthsDeg: azimuthsOf(dome, sun.bearingDeg),
    at: "ground",
  } as const;
  skyStokesMap(lit, directions, out);
  const scale = solarIrradiance(wavelengthNm) / Math.PI;
  for (let k = 0; k < out.length; k++) out[k]! *= scale;
}

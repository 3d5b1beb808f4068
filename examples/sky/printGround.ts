/** Light on level ground under a clear sky: direct, diffuse and global. */
import {
  chromaticity,
  cie1931Observer,
  illuminateSky,
  prepareSky,
  type Spectrum,
  skyFluxes,
  solarIrradiance,
  spectrumToXyz,
  wavelengthGrid,
} from "airlight";
import { opticsOf, type Site } from "./opticsOf.js";
import { temperatureWords } from "./temperatureWords.js";

/** Spectra of the light on level ground, W m⁻² nm⁻¹. */
export interface GroundLight {
  readonly direct: Spectrum;
  readonly diffuse: Spectrum;
  readonly global: Spectrum;
}

/** Works the three spectra out, at 1 au. */
export function groundLight(site: Site, sunZenithDeg: number): GroundLight {
  const wavelengthsNm = wavelengthGrid(380, 780, 5);
  const direct = new Float64Array(wavelengthsNm.length);
  const diffuse = direct.slice();
  for (const [w, wavelengthNm] of wavelengthsNm.entries()) {
    const { layers, depolarisation } = opticsOf(wavelengthNm, site);
    const sky = prepareSky({ layers, depolarisation, groundAlbedo: site.groundAlbedo });
    const fluxes = skyFluxes(illuminateSky(sky, sunZenithDeg));
    const scale = solarIrradiance(wavelengthNm) / Math.PI;
    direct[w] = scale * fluxes.direct.at(-1)!;
    diffuse[w] = scale * fluxes.diffuseDown.at(-1)!;
  }
  const global = direct.map((sun, w) => sun + diffuse[w]!);
  const spectrum = (values: Float64Array): Spectrum => ({ wavelengthsNm, values });
  return { direct: spectrum(direct), diffuse: spectrum(diffuse), global: spectrum(global) };
}

/** Prints illuminance, colour and colour temperature of the three. */
export function printGround(site: Site, sunZenithDeg: number): void {
  for (const [name, spectrum] of Object.entries(groundLight(site, sunZenithDeg))) {
    const xyz = spectrumToXyz(spectrum, cie1931Observer);
    const [x, y] = chromaticity(xyz);
    const klx = (xyz[1] / 1000).toFixed(2);
    console.log(
      `On the ground, ${name}: ${klx} klx, x ${x.toFixed(4)}, y ${y.toFixed(4)}, ${temperatureWords(xyz)}`,
    );
  }
}

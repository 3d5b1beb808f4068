/** The sky the station would have without haze: light on level ground, direct and scattered, and the colour overhead. */
import {
  airColumn,
  chromaticity,
  cie1931Observer,
  depolarisation,
  encodeSrgb,
  fitToDisplay,
  illuminateSky,
  nitrogenDioxideOpticalDepth,
  ozoneOpticalDepth,
  type PreparedSky,
  prepareSky,
  rayleighOpticalDepth,
  type Spectrum,
  skyFluxes,
  skyRadiance,
  solarIrradiance,
  spectrumToXyz,
  srgbHex,
  wavelengthGrid,
  type Xyz,
  xyzToLinearSrgb,
} from "airlight";
import type { StationResult } from "./analyseStation.js";
import type { Table } from "./table.js";

/** True heights of the sun shown, degrees; lower ones need the round Earth. */
const HEIGHTS_DEG: readonly number[] = [60, 30, 15];
/** Albedo of the ground, assumed: grass and fields (common practice). */
const GROUND_ALBEDO = 0.15;
/** Share of the air that lies above most of the ozone. */
const AIR_ABOVE = 0.1;

/** The clear sky under one sun. */
export interface ClearSky {
  readonly trueHeightDeg: number;
  /** On level ground, W m⁻² nm⁻¹: the sunbeam, the scattered light, both. */
  readonly direct: Spectrum;
  readonly diffuse: Spectrum;
  readonly global: Spectrum;
  /** X, Y, Z of the zenith, Y in cd m⁻². */
  readonly zenith: Xyz;
}

/** The clear sky at the heights shown. */
export function clearSkies({ station, air }: StationResult): ClearSky[] {
  const { altitudeM, latitudeDeg, co2Ppm, ozoneDu, ozoneTemperatureK, nitrogenDioxideDu } = station;
  const wavelengthsNm = wavelengthGrid(380, 780, 5);
  const column = airColumn({ pressurePa: air.pressurePa, altitudeM, latitudeDeg, co2Ppm });
  const skies = Array.from(wavelengthsNm, (nm): PreparedSky => {
    const rayleigh = rayleighOpticalDepth(nm, column);
    // nitrogen dioxide's table ends at 660 nm; beyond, it takes next to nothing
    const nitrogen = nm > 660 ? 0 : nitrogenDioxideOpticalDepth(nm, nitrogenDioxideDu, 220);
    const gases = ozoneOpticalDepth(nm, ozoneDu, ozoneTemperatureK) + nitrogen;
    const layers = [
      { rayleighDepth: AIR_ABOVE * rayleigh, absorptionDepth: gases },
      { rayleighDepth: (1 - AIR_ABOVE) * rayleigh, absorptionDepth: 0 },
    ];
    return prepareSky({
      layers,
      depolarisation: depolarisation(nm, co2Ppm),
      groundAlbedo: GROUND_ALBEDO,
    });
  });
  const sunlight = wavelengthsNm.map((nm) => solarIrradiance(nm) / air.distanceAu ** 2);
  return HEIGHTS_DEG.map((height) => viewSky(height, wavelengthsNm, skies, sunlight));
}

function viewSky(
  trueHeightDeg: number,
  wavelengthsNm: Float64Array,
  skies: readonly PreparedSky[],
  sunlight: Float64Array,
): ClearSky {
  const lit = skies.map((sky) => illuminateSky(sky, 90 - trueHeightDeg));
  const fluxes = lit.map((sky) => skyFluxes(sky));
  const spectrum = (value: (w: number) => number): Spectrum => ({
    wavelengthsNm,
    values: wavelengthsNm.map((_, w) => value(w)),
  });
  const direct = (w: number): number => (fluxes[w]!.direct.at(-1)! * sunlight[w]!) / Math.PI;
  const diffuse = (w: number): number => (fluxes[w]!.diffuseDown.at(-1)! * sunlight[w]!) / Math.PI;
  const overhead = { viewZenithDeg: 0, relativeAzimuthDeg: 0, at: "ground" } as const;
  const radiance = (w: number): number => skyRadiance(lit[w]!, overhead, sunlight[w]!);
  return {
    trueHeightDeg,
    direct: spectrum(direct),
    diffuse: spectrum(diffuse),
    global: spectrum((w) => direct(w) + diffuse(w)),
    zenith: spectrumToXyz(spectrum(radiance), cie1931Observer),
  };
}

/** The clear sky in figures. */
export function skyTable(result: StationResult): Table {
  return {
    title: "Light on level ground under the same air without haze, and the sky overhead",
    columns: [
      ["true height", "degrees"],
      ["direct", "lx"],
      ["diffuse", "lx"],
      ["global", "lx"],
      ["global x", ""],
      ["global y", ""],
      ["zenith", "cd/m²"],
      ["zenith x", ""],
      ["zenith y", ""],
      ["display", "sRGB"],
    ],
    rows: clearSkies(result).map(({ trueHeightDeg, direct, diffuse, global, zenith }) => {
      const lux = (spectrum: Spectrum): string =>
        Number(spectrumToXyz(spectrum, cie1931Observer)[1].toPrecision(3)).toFixed(0);
      const [x, y] = chromaticity(spectrumToXyz(global, cie1931Observer));
      const [skyX, skyY] = chromaticity(zenith);
      return [
        trueHeightDeg.toFixed(0),
        lux(direct),
        lux(diffuse),
        lux(global),
        x.toFixed(4),
        y.toFixed(4),
        Number(zenith[1].toPrecision(3)).toFixed(0),
        skyX.toFixed(4),
        skyY.toFixed(4),
        displayColour(zenith),
      ];
    }),
  };
}

/** Chromaticity kept, at a third of white's luminance. */
function displayColour([x, y, z]: Xyz): string {
  const scale = 0.3 / y;
  return srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([scale * x, scale * y, scale * z]))));
}

/** The clear sky along the arc from the horizon behind you through the zenith to the horizon under the sun. */
import {
  airColumn,
  cie1931Observer5nm,
  depolarisation,
  illuminateSky,
  ozoneOpticalDepth,
  type PreparedSky,
  prepareSky,
  rayleighOpticalDepth,
  skyStokesMap,
  solarIrradiance,
  spectrumToXyz,
  standardAtmosphere,
  wavelengthGrid,
  type Xyz,
} from "airlight";
import type { State } from "./compute.js";

/** Angles along the arc from the vertical, degrees; below 0 behind you. */
export const ARC_DEG: readonly number[] = [
  -86, -80, -70, -60, -45, -30, -15, 0, 15, 30, 45, 60, 70, 80, 86,
];
/** The least height of the sun for which a flat sky still means something, degrees. */
export const LEAST_HEIGHT_DEG = 2;
/** The ground's reflectance, taken the same for all light. */
export const GROUND_ALBEDO = 0.15;

/** Step in wavelength, nm: the sky's luminance is within 1 % and its chromaticity within 0.003 of those by 5 nm from 380 to 780 nm. */
export const SKY_STEP_NM = 25;

const WAVELENGTHS_NM = /* @__PURE__ */ wavelengthGrid(400, 700, SKY_STEP_NM);
const DIRECTIONS = {
  viewZenithsDeg: /* @__PURE__ */ ARC_DEG.map(Math.abs),
  relativeAzimuthsDeg: /* @__PURE__ */ ARC_DEG.map((angle) => (angle < 0 ? 180 : 0)),
  at: "ground",
} as const;

/** The sky at each wavelength before the sun is placed. */
export function prepareArc({ altitudeM, ozoneDu, co2Ppm }: State): PreparedSky[] {
  const { pressurePa } = standardAtmosphere(altitudeM);
  const column = airColumn({ pressurePa, altitudeM, latitudeDeg: 45, co2Ppm });
  return Array.from(WAVELENGTHS_NM, (nm) => {
    const air = rayleighOpticalDepth(nm, column);
    const ozone = ozoneOpticalDepth(nm, ozoneDu, 228);
    const layers = [
      { rayleighDepth: 0.1 * air, absorptionDepth: ozone },
      { rayleighDepth: 0.9 * air, absorptionDepth: 0 },
    ];
    const ground = { groundAlbedo: GROUND_ALBEDO, streams: 16 };
    return prepareSky({ layers, depolarisation: depolarisation(nm, co2Ppm), ...ground });
  });
}

/** Tristimulus values along the arc, Y in cd/m²; undefined for a sun too low for a flat sky. */
export function skyArc(skies: readonly PreparedSky[], heightDeg: number): Xyz[] | undefined {
  if (heightDeg < LEAST_HEIGHT_DEG) return undefined;
  const maps = skies.map((sky, i) => {
    const map = skyStokesMap(illuminateSky(sky, 90 - heightDeg), DIRECTIONS);
    const scale = solarIrradiance(WAVELENGTHS_NM[i]!) / Math.PI;
    return map.map((value) => value * scale);
  });
  return ARC_DEG.map((_, k) => {
    const values = Float64Array.from(maps, (map) => map[3 * k]!);
    return spectrumToXyz({ wavelengthsNm: WAVELENGTHS_NM, values }, cie1931Observer5nm);
  });
}

/** Forward again: what the measured air lets through at other heights of the sun, and what colour the sun then has. */
import {
  airColumn,
  type Beam,
  type BeamMasses,
  beamIrradiance,
  chromaticity,
  cie1931Observer,
  type ColourTemperature,
  clearBeam,
  correlatedColourTemperature,
  encodeSrgb,
  fitToDisplay,
  type PreparedPath,
  refractionOnTruePath,
  type Spectrum,
  spectrumToXyz,
  srgbHex,
  tabulate,
  wavelengthGrid,
  type Xyz,
  xyzToLinearSrgb,
} from "airlight";
import { mean, median } from "./lines.js";
import { precipitableWaterCm } from "./precipitableWaterCm.js";
import type { Station } from "./readStation.js";
import type { AerosolPoint } from "./retrieveAerosol.js";
import { type Constituent, stationPath } from "./stationPaths.js";

/** True heights of the sun's centre above the horizon, degrees. */
export const SUN_HEIGHTS_DEG: readonly number[] = [60, 30, 15, 8, 4, 2];

/** The air of the measured day, as one state. */
export interface TypicalAir {
  readonly pressurePa: number;
  readonly temperatureK: number;
  /** Medians over the readings without cloud. */
  readonly turbidity: number;
  readonly exponent: number;
  /** Standard uncertainties of the depth at 500 nm and of the exponent: medians too, since the largest errors last all day. */
  readonly depthUncertainty: number;
  readonly exponentUncertainty: number;
  /** Estimated from the weather at the ground. */
  readonly waterCm: number;
  readonly distanceAu: number;
  /** The refracted ray through the mean weather of those readings. */
  readonly path: PreparedPath<Constituent>;
}

/** Direct sunlight at one height of the sun. */
export interface SunView {
  readonly trueHeightDeg: number;
  readonly apparentHeightDeg: number;
  /** Air mass of each constituent. */
  readonly masses: BeamMasses;
  /** On a plane facing the sun, W m⁻² nm⁻¹, 300 to 1100 nm. */
  readonly spectrum: Spectrum;
  /** On a plane facing the sun. */
  readonly illuminanceLx: number;
  readonly chromaticity: readonly [number, number];
  /** Undefined for a sun too red to have one. */
  readonly colourTemperature: ColourTemperature | undefined;
  /** Colour at the greatest brightness the display can show it with. */
  readonly displayColour: string;
}

/** The day as one state of the air, `k` the channel nearest 500 nm; undefined without a reading free of cloud that has a power law. */
export function typicalAir(
  points: readonly AerosolPoint[],
  k: number,
  station: Station,
): TypicalAir | undefined {
  const clear = points.filter(({ cloudy, powerLaw }) => !cloudy && powerLaw !== undefined);
  if (clear.length === 0) return undefined;
  const over = (pick: (point: AerosolPoint) => number): number[] => clear.map(pick);
  const weather = {
    pressurePa: mean(over(({ reading }) => reading.pressurePa)),
    temperatureK: mean(over(({ reading }) => reading.temperatureK)),
    relativeHumidity: mean(over(({ reading }) => reading.relativeHumidity)),
  };
  return {
    pressurePa: weather.pressurePa,
    temperatureK: weather.temperatureK,
    turbidity: median(over(({ powerLaw }) => powerLaw!.turbidity)),
    exponent: median(over(({ powerLaw }) => powerLaw!.exponent)),
    depthUncertainty: median(over(({ budgets }) => budgets[k]!.standardUncertainty)),
    exponentUncertainty: median(over((point) => point.powerLawUncertainty!.exponent)),
    waterCm: median(over(({ reading }) => precipitableWaterCm(reading))),
    distanceAu: mean(over(({ reading }) => reading.distanceAu)),
    path: stationPath(weather, station),
  };
}

/** Direct sunlight with the sun's centre at `trueHeightDeg`. */
export function viewSun(trueHeightDeg: number, air: TypicalAir, station: Station): SunView {
  const trueZenithDeg = 90 - trueHeightDeg;
  const beam = beamAt(trueZenithDeg, air, station);
  const irradiance = (wavelengthNm: number): number =>
    beamIrradiance(wavelengthNm, beam, air.distanceAu);
  const spectrum = tabulate(irradiance, wavelengthGrid(300, 1100, 1));
  const xyz = spectrumToXyz(spectrum, cie1931Observer);
  const [x, y] = chromaticity(xyz);
  return {
    trueHeightDeg,
    apparentHeightDeg: trueHeightDeg + refractionOnTruePath(trueZenithDeg, air.path),
    masses: beam.masses,
    spectrum,
    illuminanceLx: xyz[1],
    chromaticity: [x, y],
    colourTemperature: colourTemperatureOf(xyz),
    displayColour: displayColour(xyz),
  };
}

function beamAt(trueZenithDeg: number, air: TypicalAir, station: Station): Beam {
  const { altitudeM, latitudeDeg, co2Ppm } = station;
  const { ozoneDu, ozoneTemperatureK, ozoneHeightM, nitrogenDioxideDu } = station;
  const { pressurePa, waterCm, turbidity, exponent, path } = air;
  return clearBeam({
    column: airColumn({ pressurePa, altitudeM, latitudeDeg, co2Ppm }),
    trueZenithDeg,
    ozoneDu,
    ozoneTemperatureK,
    ozoneHeightM,
    nitrogenDioxideDu,
    waterCm,
    aerosol: { opticalDepth: turbidity, referenceNm: 1000, exponent },
    path,
  });
}

/** Chromaticity kept, brightness as great as the display allows. */
function displayColour([x, y, z]: Xyz): string {
  return srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([x / y, 1, z / y]))));
}

/** The library refuses a colour that has no colour temperature; here that is an answer. */
function colourTemperatureOf(xyz: Xyz): ColourTemperature | undefined {
  try {
    return correlatedColourTemperature(xyz);
  } catch (error) {
    if (error instanceof RangeError) return undefined;
    throw error;
  }
}

/** The way of light to the station: the refracted ray through the weather of the readings. */
import {
  earthCurvatureRadius,
  exponentialLayer,
  gaussianLayer,
  type PreparedPath,
  preparePath,
  prepareWeatherPaths,
  standardProfile,
  type WeatherPaths,
} from "airlight";
import type { Station } from "./readStation.js";

/** What lies along the way besides air; nitrogen dioxide is put where ozone is. */
export type Constituent = "ozone" | "water" | "aerosol";

/** Air at the station. */
export interface Weather {
  readonly pressurePa: number;
  readonly temperatureK: number;
  readonly relativeHumidity: number;
}

/** Light that is refracted as the middle of the visible, nm. */
const WAVELENGTH_NM = 550;
/** Direction of the low sun, degrees from north: its air masses are the great ones. */
const LOW_SUN_AZIMUTH_DEG = 90;
/** Thickness of the ozone layer (standard deviation) and scale height of water and haze, m: common practice. */
const OZONE_DEVIATION_M = 5000;
const NEAR_GROUND_M = 2000;

/** A day without change still needs a range. */
const LEAST_PA = 1;
const LEAST_K = 0.01;

function pathInput({ pressurePa, temperatureK, relativeHumidity }: Weather, station: Station) {
  const { altitudeM, latitudeDeg, co2Ppm, ozoneHeightM } = station;
  const state = { pressurePa, temperatureK, relativeHumidity, altitudeM, co2Ppm };
  const nearGround = exponentialLayer({ scaleHeightM: NEAR_GROUND_M });
  return {
    profile: standardProfile(state),
    altitudeM,
    wavelengthNm: WAVELENGTH_NM,
    earthRadiusM: earthCurvatureRadius(latitudeDeg, LOW_SUN_AZIMUTH_DEG),
    constituents: {
      ozone: gaussianLayer({ heightM: ozoneHeightM, standardDeviationM: OZONE_DEVIATION_M }),
      water: nearGround,
      aerosol: nearGround,
    },
  };
}

/** The path in one weather. */
export function stationPath(weather: Weather, station: Station): PreparedPath<Constituent> {
  return preparePath(pathInput(weather, station));
}

/** Paths for all the weather of a day, for `pathInWeather`; the vapour is that of the middle reading. */
export function dayPaths(day: readonly Weather[], station: Station): WeatherPaths<Constituent> {
  const range = (values: readonly number[], least: number): [number, number] => {
    return [Math.min(...values) - least, Math.max(...values) + least];
  };
  return prepareWeatherPaths({
    ...pathInput(day[day.length >> 1]!, station),
    pressureRangePa: range(
      day.map(({ pressurePa }) => pressurePa),
      LEAST_PA,
    ),
    temperatureRangeK: range(
      day.map(({ temperatureK }) => temperatureK),
      LEAST_K,
    ),
  });
}

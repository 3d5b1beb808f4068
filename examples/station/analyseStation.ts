/** The whole job on numbers: station folder in, results out; nothing is written. */
import { type Calibration, calibrate } from "./calibrate.js";
import { channelOptics } from "./channelOptics.js";
import { blaming, inputError } from "./inputError.js";
import {
  SUN_HEIGHTS_DEG,
  type SunView,
  type TypicalAir,
  typicalAir,
  viewSun,
} from "./lookForward.js";
import { nearestTo500 } from "./nearestTo500.js";
import { type PlacedReading, placeReadings } from "./placeReadings.js";
import { readReadings } from "./readReadings.js";
import { readStation, type Station } from "./readStation.js";
import { type AerosolPoint, retrieveAerosol } from "./retrieveAerosol.js";
import { type ViewUncertainty, viewUncertainty } from "./viewUncertainty.js";

/** Everything the report tells. */
export interface StationResult {
  readonly station: Station;
  readonly calibrationDay: readonly PlacedReading[];
  readonly calibrations: readonly Calibration[];
  /** The measured day, reading by reading. */
  readonly aerosol: readonly AerosolPoint[];
  readonly air: TypicalAir;
  /** The sun at SUN_HEIGHTS_DEG. */
  readonly views: readonly SunView[];
  /** What is known of them, in the same order. */
  readonly viewUncertainties: readonly ViewUncertainty[];
  /** The sun at many heights, for the strip of colours, from the highest of SUN_HEIGHTS_DEG to the lowest. */
  readonly strip: readonly SunView[];
}

const STRIP_STEPS = 96;

/** Runs the job on a station folder. */
export function analyseStation(folder: string): StationResult {
  const station = readStation(folder);
  const load = (file: string): PlacedReading[] => {
    const names = station.channels.map(({ name }) => name);
    return placeReadings(readReadings(folder, file, names), file, station);
  };
  const calibrationDay = load(station.calibrationFile);
  const measuredDay = load(station.measurementFile); // before any work: all input errors come first
  const channels = station.channels.map((channel) => channelOptics(channel, station));
  const calibrations = calibrate(channels, calibrationDay, station.calibrationFile);
  const measured = { file: station.measurementFile };
  const aerosol = blaming(measured, () =>
    retrieveAerosol(calibrations, measuredDay, station.latitudeDeg),
  );
  const air = typicalAir(aerosol, nearestTo500(calibrations), station);
  if (air === undefined) {
    const what = "no reading is free of cloud with an aerosol depth above 0 in every channel";
    throw inputError(measured, what);
  }
  const view = (height: number): SunView => blaming(measured, () => viewSun(height, air, station));
  const views = SUN_HEIGHTS_DEG.map(view);
  return {
    station,
    calibrationDay,
    calibrations,
    aerosol,
    air,
    views,
    viewUncertainties: blaming(measured, () =>
      views.map((seen) => viewUncertainty(seen, air, station)),
    ),
    strip: stripHeights().map(view),
  };
}

/** Heights at equal ratios, for an axis of logarithms. */
function stripHeights(): number[] {
  const [high, low] = [SUN_HEIGHTS_DEG[0]!, SUN_HEIGHTS_DEG.at(-1)!];
  return Array.from(
    { length: STRIP_STEPS },
    (_, i) => high * (low / high) ** ((i + 0.5) / STRIP_STEPS),
  );
}

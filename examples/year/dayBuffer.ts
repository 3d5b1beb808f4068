/** One day of readings in typed arrays that are used again for every day. */
import { type ArchiveReadings, type ArchiveResult, aerosolOpticalDepths } from "airlight";
import { archiveChannels, CENTRES_NM, SETTINGS } from "./channels.js";
import { massesAt } from "./masses.js";

const MOST = 1440;
const WIDTH = CENTRES_NM.length;

/** What a day comes to. */
export interface DaySummary {
  readonly day: number;
  readonly readings: number;
  readonly clear: number;
  /** Mean optical depth at 500 nm of the clear readings, NaN without any. */
  readonly depth: number;
  /** Mean standard uncertainty of them: most of it lasts all day, so it does not shrink with their number. */
  readonly standardUncertainty: number;
}

/** Takes rows one by one; `full` gives the day's summary and empties it. */
export interface DayBuffer {
  readonly add: (row: readonly number[]) => void;
  readonly full: (day: number) => DaySummary;
}

/** A buffer for one day. */
export function dayBuffer(): DayBuffer {
  const list = (): Float64Array => new Float64Array(MOST);
  const all: ArchiveReadings = {
    timesMinutes: list(),
    signals: new Float64Array(MOST * WIDTH),
    sunDistancesAu: list(),
    pressuresPa: list(),
    ozoneDu: list(),
    airMasses: list(),
    ozoneAirMasses: list(),
    aerosolAirMasses: list(),
  };
  const out: ArchiveResult = {
    opticalDepths: new Float64Array(MOST * WIDTH),
    standardUncertainties: new Float64Array(MOST * WIDTH),
    screening: new Uint8Array(MOST),
  };
  const channels = archiveChannels();
  let count = 0;
  return {
    add: ([minute, zenith, distance, pressure, ozone, ...signals]) => {
      const masses = massesAt(zenith!);
      all.timesMinutes[count] = minute!;
      all.sunDistancesAu[count] = distance!;
      all.pressuresPa[count] = pressure!;
      all.ozoneDu[count] = ozone!;
      [all.airMasses[count], all.ozoneAirMasses[count], all.aerosolAirMasses[count]] = masses;
      all.signals.set(signals, count * WIDTH);
      count += 1;
    },
    full: (day) => {
      const part = <List extends Float64Array | Uint8Array>(values: List): List =>
        values.subarray(0, values.length === MOST ? count : count * WIDTH) as List;
      const readings = mapValues(all, part);
      const result = aerosolOpticalDepths(readings, channels, SETTINGS, {
        opticalDepths: part(out.opticalDepths),
        standardUncertainties: part(out.standardUncertainties),
        screening: part(out.screening),
      });
      const summary = summarise(day, result);
      count = 0;
      return summary;
    },
  };
}

function mapValues(
  readings: ArchiveReadings,
  change: (values: Float64Array) => Float64Array,
): ArchiveReadings {
  const entries = Object.entries(readings).map(([key, values]) => [key, change(values)]);
  return Object.fromEntries(entries) as unknown as ArchiveReadings;
}

function summarise(
  day: number,
  { opticalDepths, standardUncertainties, screening }: ArchiveResult,
): DaySummary {
  let [clear, depth, uncertainty] = [0, 0, 0];
  screening.forEach((code, i) => {
    if (code !== 0) return;
    clear += 1;
    depth += opticalDepths[i * WIDTH + SETTINGS.screeningChannel]!;
    uncertainty += standardUncertainties[i * WIDTH + SETTINGS.screeningChannel]!;
  });
  return {
    day,
    readings: screening.length,
    clear,
    depth: depth / clear,
    standardUncertainty: uncertainty / clear,
  };
}

/** Reading station.json: place, gases, channels, days. */
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import {
  choiceField,
  listField,
  numberField,
  recordField,
  textField,
  type UnknownRecord,
} from "./checkField.js";
import { inputError } from "./inputError.js";

const FILE = "station.json";

/** One channel of the instrument: a Gaussian passband on the vacuum scale. */
export interface Channel {
  /** Column of its readings. */
  readonly name: string;
  /** Centre, nm in vacuum. */
  readonly centreNm: number;
  /** Full width at half maximum, nm. */
  readonly fullWidthHalfMaximumNm: number;
}

/** The station as its file describes it, checked. */
export interface Station {
  readonly station: string;
  readonly about: string;
  readonly signalUnit: string;
  readonly latitudeDeg: number;
  /** East positive. */
  readonly longitudeDeg: number;
  readonly altitudeM: number;
  readonly co2Ppm: number;
  readonly ozoneDu: number;
  readonly ozoneTemperatureK: number;
  readonly ozoneHeightM: number;
  readonly nitrogenDioxideDu: number;
  readonly channels: readonly Channel[];
  /** File of the morning that gives the calibration. */
  readonly calibrationFile: string;
  /** File of the day that is measured. */
  readonly measurementFile: string;
}

/** Reads and checks `folder`/station.json. */
export function readStation(folder: string): Station {
  const raw = parse(folder);
  const number = (field: string, low: number, high: number, unit: string): number =>
    numberField(raw[field], low, high, unit, field);
  choiceField(raw.wavelengthScale, ["vacuum"], "wavelengthScale");
  return {
    station: textField(raw.station, "station"),
    about: raw.about === undefined ? "" : textField(raw.about, "about"),
    signalUnit: textField(raw.signalUnit, "signalUnit"),
    latitudeDeg: number("latitudeDeg", -90, 90, "degrees north"),
    longitudeDeg: number("longitudeDeg", -180, 180, "degrees east"),
    altitudeM: number("altitudeM", -450, 6000, "m"),
    co2Ppm: number("co2Ppm", 0, 2000, "µmol/mol"),
    ozoneDu: number("ozoneDu", 0, 700, "Dobson units"),
    ozoneTemperatureK: number("ozoneTemperatureK", 200, 298, "K"),
    ozoneHeightM: number("ozoneHeightM", 10_000, 40_000, "m"),
    nitrogenDioxideDu: number("nitrogenDioxideDu", 0, 5, "Dobson units"),
    channels: readChannels(raw),
    ...readDays(raw, folder),
  };
}

function parse(folder: string): UnknownRecord {
  const path = join(folder, FILE);
  if (!existsSync(path))
    throw inputError({ file: path }, "no such file; a station folder needs one");
  const text = readFileSync(path, "utf8");
  if (text.trim() === "") throw inputError({ file: FILE }, "the file is empty");
  try {
    return recordField(JSON.parse(text), "the whole file");
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    throw inputError({ file: FILE }, `not JSON: ${error.message}`);
  }
}

function readChannels(raw: UnknownRecord): Channel[] {
  const channels = listField(raw.channels, 3, "channels").map((item, i) => {
    const field = `channels[${i}]`;
    choiceField(item.shape, ["Gaussian"], `${field}.shape`);
    const width = `${field}.fullWidthHalfMaximumNm`;
    return {
      name: textField(item.name, `${field}.name`),
      centreNm: numberField(item.centreNm, 320, 1000, "nm", `${field}.centreNm`),
      fullWidthHalfMaximumNm: numberField(item.fullWidthHalfMaximumNm, 0.5, 30, "nm", width),
    };
  });
  channels.forEach(({ name, centreNm }, i) => {
    const field = `channels[${i}]`;
    const before = channels.slice(0, i);
    if (before.some((other) => other.name === name)) {
      throw inputError({ file: FILE, field: `${field}.name` }, `"${name}" stands twice`);
    }
    if (before.some((other) => other.centreNm === centreNm)) {
      throw inputError({ file: FILE, field: `${field}.centreNm` }, `${centreNm} nm stands twice`);
    }
  });
  return channels.sort((a, b) => a.centreNm - b.centreNm);
}

function readDays(
  raw: UnknownRecord,
  folder: string,
): { calibrationFile: string; measurementFile: string } {
  const days = listField(raw.days, 2, "days").map((item, i) => {
    const file = textField(item.file, `days[${i}].file`);
    const role = choiceField(item.role, ["calibration", "measurement"], `days[${i}].role`);
    if (/[\\/]/.test(file) || !existsSync(join(folder, file))) {
      const what = `no file "${file}" in the station's folder`;
      throw inputError({ file: FILE, field: `days[${i}].file` }, what);
    }
    return { file, role };
  });
  const only = (role: string): string => {
    const found = days.filter((day) => day.role === role);
    if (found.length === 1) return found[0]!.file;
    throw inputError(
      { file: FILE, field: "days" },
      `needs exactly one day with role "${role}", got ${found.length}`,
    );
  };
  return { calibrationFile: only("calibration"), measurementFile: only("measurement") };
}

/** The checks of `aerosolOpticalDepths`. */
import { checkList, checkNumber, checkRecord, refuse } from "../_check.js";
import type {
  ArchiveChannel,
  ArchiveReadings,
  ArchiveResult,
  ArchiveSettings,
} from "./_archive.js";
import { checkPositive, checkUncertainty } from "./_checkPositive.js";

const NAME = "aerosolOpticalDepths";

/** Throws unless lengths fit and settings are in range; single readings are not looked at. */
export function checkArchive(
  readings: ArchiveReadings,
  channels: readonly ArchiveChannel[],
  settings: ArchiveSettings,
  out: ArchiveResult | undefined,
): void {
  checkRecord(readings, "readings", NAME);
  checkList(channels, 1, "channels", NAME);
  checkRecord(settings, "settings", NAME);
  checkList(readings.timesMinutes, 0, "readings.timesMinutes", NAME);
  const count = readings.timesMinutes.length;
  const { timesMinutes, signals, ...others } = readings;
  checkLength(signals, count * channels.length, "readings.signals");
  const names = "sunDistancesAu pressuresPa ozoneDu airMasses ozoneAirMasses aerosolAirMasses";
  for (const name of names.split(" ")) {
    checkLength(others[name as keyof typeof others], count, `readings.${name}`);
  }
  channels.forEach(checkChannel);
  checkSettings(settings, channels.length);
  if (out === undefined) return;
  checkRecord(out, "out", NAME);
  checkLength(out.opticalDepths, count * channels.length, "out.opticalDepths");
  checkLength(out.standardUncertainties, count * channels.length, "out.standardUncertainties");
  if (!(out.screening instanceof Uint8Array && out.screening.length === count)) {
    refuse(out.screening, `a Uint8Array of ${count}`, "", "out.screening", NAME);
  }
}

function checkSettings(settings: ArchiveSettings, channels: number): void {
  checkNumber(
    settings.pressureRelativeUncertainty,
    0,
    1,
    "fraction",
    "pressureRelativeUncertainty",
    NAME,
  );
  checkUncertainty(settings.ozoneStandardUncertaintyDu, "ozoneStandardUncertaintyDu", NAME);
  checkUncertainty(settings.zenithStandardUncertaintyDeg, "zenithStandardUncertaintyDeg", NAME);
  checkNumber(settings.windowMinutes, 0.1, 120, "minutes", "windowMinutes", NAME);
  checkNumber(settings.screeningChannel, 0, channels - 1, "", "screeningChannel", NAME);
  if (Number.isInteger(settings.screeningChannel)) return;
  throw new RangeError(
    `${NAME}: screeningChannel must be a whole number, got ${settings.screeningChannel}`,
  );
}

function checkChannel(channel: ArchiveChannel, c: number): void {
  checkRecord(channel, `channels[${c}]`, NAME);
  checkPositive(channel.constant, `channels[${c}].constant`, NAME);
  const fields = ["constantRelativeUncertainty", "signalRelativeUncertainty"] as const;
  for (const field of fields)
    checkNumber(channel[field], 0, 1, "fraction", `channels[${c}].${field}`, NAME);
  checkUncertainty(channel.rayleighDepthPerPa, `channels[${c}].rayleighDepthPerPa`, NAME);
  checkUncertainty(channel.ozoneDepthPerDu, `channels[${c}].ozoneDepthPerDu`, NAME);
  checkNumber(channel.otherDepth, -100, 100, "", `channels[${c}].otherDepth`, NAME);
}

function checkLength(list: unknown, wanted: number, argument: string): void {
  checkList(list, 0, argument, NAME);
  if (list.length === wanted) return;
  throw new RangeError(`${NAME}: ${argument} must be of ${wanted} values, got ${list.length}`);
}

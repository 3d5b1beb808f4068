/** Aerosol optical depths of an archive of readings, with uncertainties and cloud screening, in one call. */
import { log, sqrt } from "../_numeric.js";
import { type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";
import {
  type ArchiveChannel,
  type ArchiveReadings,
  type ArchiveResult,
  type ArchiveSettings,
  emptyResult,
} from "./_archive.js";
import { checkArchive } from "./_checkArchive.js";
import { screenDays } from "./_screenDays.js";

/**
 * Aerosol optical depths, standard uncertainties and cloud screening of many readings in several channels.
 *
 * Model: as `aerosolOpticalDepth` for each reading and channel, then `cloudScreening` on one channel day by day (a new day
 * begins after a gap of more than three hours). The slope of every air mass with the zenith angle is taken as m √(m² - 1) per radian, a flat
 * atmosphere's; it is used for the uncertainty alone.
 * Validity: as `aerosolOpticalDepth`. A NaN or a signal that is not above 0 gives NaN at that place, and code 1 of the
 * screening if it is in the screened channel.
 * Accuracy: depths 1e-12 against `aerosolOpticalDepth` reading by reading, uncertainties 1e-10 with the same slopes. To air
 * mass 6 the flat slope is within 6 % of a spherical one's, 12 % for ozone's shell at 22 km, which a zenith angle known to 0.02° hardly
 * shows. Some 0.1 µs a value (measured on Node 20).
 * Source: as `aerosolOpticalDepth` and `cloudScreening`.
 *
 * @param readings - typed arrays, one value per reading; `signals` reading by reading, channels innermost
 * @param channels - calibration and optical depths of each channel
 * @param settings - uncertainties common to all channels, and the screening
 * @param out - arrays to fill, of the right lengths; made if left out
 * @returns optical depths and standard uncertainties, laid out as the signals, and the screening codes
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths differ or a setting is out of range
 * @example
 * import { aerosolOpticalDepths } from "airlight";
 * const readings = {
 *   timesMinutes: Float64Array.of(0, 1, 2), signals: Float64Array.of(1.5, 1.5, 1.5), sunDistancesAu: Float64Array.of(1, 1, 1),
 *   pressuresPa: Float64Array.of(80000, 80000, 80000), ozoneDu: Float64Array.of(300, 300, 300),
 *   airMasses: Float64Array.of(2, 2, 2), ozoneAirMasses: Float64Array.of(2, 2, 2), aerosolAirMasses: Float64Array.of(2, 2, 2),
 * };
 * const green = {
 *   constant: 2, constantRelativeUncertainty: 0.005, signalRelativeUncertainty: 0.001, rayleighDepthPerPa: 1.4e-6,
 *   ozoneDepthPerDu: 3.2e-5, otherDepth: 0,
 * };
 * const year = aerosolOpticalDepths(readings, [green], {
 *   pressureRelativeUncertainty: 0.001, ozoneStandardUncertaintyDu: 10, zenithStandardUncertaintyDeg: 0.005,
 *   screeningChannel: 0, windowMinutes: 4,
 * });
 * year.opticalDepths[0]; // => 0.02224
 * year.standardUncertainties[0]; // => 0.00257
 */
export function aerosolOpticalDepths(
  readings: ArchiveReadings,
  channels: readonly ArchiveChannel[],
  settings: ArchiveSettings,
  out?: ArchiveResult,
): ArchiveResult {
  checkArchive(readings, channels, settings, out);
  const count = readings.timesMinutes.length;
  const result = out ?? emptyResult(count, channels.length);
  for (let c = 0; c < channels.length; c++) {
    fillChannel(readings, channels[c]!, settings, c, channels.length, result);
  }
  screenDays(readings.timesMinutes, channels.length, settings, result);
  return result;
}

/** All readings of one channel. */
function fillChannel(
  readings: ArchiveReadings,
  channel: ArchiveChannel,
  settings: ArchiveSettings,
  c: number,
  stride: number,
  { opticalDepths, standardUncertainties }: ArchiveResult,
): void {
  const { signals, sunDistancesAu, pressuresPa, ozoneDu } = readings;
  const { airMasses, ozoneAirMasses, aerosolAirMasses } = readings;
  const { constantRelativeUncertainty: uc, signalRelativeUncertainty: us } = channel;
  const measured = uc * uc + us * us;
  const logConstant = log(channel.constant);
  const uo = settings.ozoneStandardUncertaintyDu * channel.ozoneDepthPerDu;
  const up = settings.pressureRelativeUncertainty;
  const uz = settings.zenithStandardUncertaintyDeg * RADIANS_PER_DEGREE;
  for (let i = 0; i < airMasses.length; i++) {
    const air = airMasses[i]!;
    const ozone = ozoneAirMasses[i]!;
    const aerosol = aerosolAirMasses[i]!;
    const distance = sunDistancesAu[i]!;
    const rayleigh = channel.rayleighDepthPerPa * pressuresPa[i]!;
    const high = channel.ozoneDepthPerDu * ozoneDu[i]! + channel.otherDepth;
    const signal = signals[i * stride + c]!;
    const slant = signal > 0 ? logConstant - log(signal * distance * distance) : Number.NaN;
    const depth = (slant - rayleigh * air - high * ozone) / aerosol;
    const pressure = up * rayleigh * air;
    const column = uo * ozone;
    const turn =
      uz * (rayleigh * steepness(air) + high * steepness(ozone) + depth * steepness(aerosol));
    const variance = measured + pressure * pressure + column * column + turn * turn;
    opticalDepths[i * stride + c] = depth;
    standardUncertainties[i * stride + c] = sqrt(variance) / aerosol;
  }
}

/** Change of a flat atmosphere's air mass per radian of zenith angle. */
function steepness(airMass: Dimensionless): number {
  return airMass * sqrt(Math.max(0, airMass * airMass - 1));
}

/** The invented instrument and station of the year. */
import {
  airColumn,
  type ArchiveChannel,
  type ArchiveSettings,
  nitrogenDioxideOpticalDepth,
  ozoneOpticalDepth,
  rayleighOpticalDepth,
} from "airlight";

/** Place of the station. */
export const STATION = { latitudeDeg: 28.3, altitudeM: 2370, co2Ppm: 425 } as const;
/** Weather that refracts the sun, the same all year. */
export const TYPICAL_AIR = { pressurePa: 77_000, temperatureK: 283 } as const;
/** Centres of the channels, nm, and their constants. */
export const CENTRES_NM: readonly number[] = [368, 412, 500, 675, 778, 862];
export const CONSTANTS: readonly number[] = [0.71, 1.18, 2.05, 1.72, 1.58, 1.36];

/** Channels as the library wants them. */
export function archiveChannels(): ArchiveChannel[] {
  const column = airColumn({ ...STATION, pressurePa: TYPICAL_AIR.pressurePa });
  return CENTRES_NM.map((nm, c) => ({
    constant: CONSTANTS[c]!,
    constantRelativeUncertainty: 0.004,
    signalRelativeUncertainty: 0.001,
    rayleighDepthPerPa: rayleighOpticalDepth(nm, column) / TYPICAL_AIR.pressurePa,
    ozoneDepthPerDu: ozoneOpticalDepth(nm, 1, 225),
    otherDepth: nm > 660 ? 0 : nitrogenDioxideOpticalDepth(nm, 0.1, 225),
  }));
}

/** Uncertainties common to all channels; 500 nm is screened. */
export const SETTINGS: ArchiveSettings = {
  pressureRelativeUncertainty: 0.001,
  ozoneStandardUncertaintyDu: 12,
  zenithStandardUncertaintyDeg: 0.01,
  screeningChannel: 2,
  windowMinutes: 4,
};

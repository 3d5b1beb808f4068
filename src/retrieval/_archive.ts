/** What `aerosolOpticalDepths` takes and gives. */
/** Readings, one value per reading in each array but `signals`. */
export interface ArchiveReadings {
  /** Times, minutes on any scale, rising. */
  readonly timesMinutes: Float64Array;
  /** Signals, reading by reading, channels innermost: reading × channels + channel. */
  readonly signals: Float64Array;
  /** Distances of the sun, au. */
  readonly sunDistancesAu: Float64Array;
  /** Pressures at the station, Pa. */
  readonly pressuresPa: Float64Array;
  /** Ozone columns, DU. */
  readonly ozoneDu: Float64Array;
  /** Air masses of the air. */
  readonly airMasses: Float64Array;
  /** Air masses of ozone (and of `otherDepth`). */
  readonly ozoneAirMasses: Float64Array;
  /** Air masses of the aerosol. */
  readonly aerosolAirMasses: Float64Array;
}

/** One channel. */
export interface ArchiveChannel {
  /** Signal outside the air at 1 au, above 0. */
  readonly constant: number;
  /** Its relative standard uncertainty. */
  readonly constantRelativeUncertainty: number;
  /** Relative standard uncertainty of a reading. */
  readonly signalRelativeUncertainty: number;
  /** Rayleigh optical depth over the pressure, per Pa. */
  readonly rayleighDepthPerPa: number;
  /** Optical depth of one Dobson unit of ozone. */
  readonly ozoneDepthPerDu: number;
  /** Optical depth of other gases high above (nitrogen dioxide). */
  readonly otherDepth: number;
}

/** What is common to all channels. */
export interface ArchiveSettings {
  /** Relative standard uncertainty of the pressure. */
  readonly pressureRelativeUncertainty: number;
  /** Standard uncertainty of the ozone column, DU. */
  readonly ozoneStandardUncertaintyDu: number;
  /** Standard uncertainty of the zenith angle, degrees. */
  readonly zenithStandardUncertaintyDeg: number;
  /** Place of the channel that is screened (500 nm or near it), from 0. */
  readonly screeningChannel: number;
  /** Time within which readings belong together, 0.1 to 120 minutes. */
  readonly windowMinutes: number;
}

/** Arrays that `aerosolOpticalDepths` fills. */
export interface ArchiveResult {
  /** Aerosol optical depths, laid out as the signals. */
  readonly opticalDepths: Float64Array;
  /** Their standard uncertainties, laid out as the signals. */
  readonly standardUncertainties: Float64Array;
  /** Codes of `cloudScreening`, one per reading. */
  readonly screening: Uint8Array;
}

/** New arrays for `count` readings. */
export function emptyResult(count: number, channels: number): ArchiveResult {
  return {
    opticalDepths: new Float64Array(count * channels),
    standardUncertainties: new Float64Array(count * channels),
    screening: new Uint8Array(count),
  };
}

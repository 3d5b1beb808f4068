/** Uncertainty of the sun's zenith angle from clock and position. */
import { checkNumber, checkRecord } from "../_check.js";
import { cos, sin, sqrt } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";

const NAME = "zenithStandardUncertainty";
/** Degrees the sky turns in one second of mean solar time. */
const DEGREES_PER_SECOND = 360 / 86400;

/** Where the sun stands and how well time and place are known. */
export interface SightUncertainty {
  /** Latitude of the site, -90 to 90°. */
  readonly latitudeDeg: Degrees;
  /** Azimuth of the sun from north through east, 0 to 360°. */
  readonly sunAzimuthDeg: Degrees;
  /** Standard uncertainty of the time, 0 to 86 400 s. */
  readonly timeStandardUncertaintyS: number;
  /** Standard uncertainty of the latitude, 0 to 10 degrees. */
  readonly latitudeStandardUncertaintyDeg: Degrees;
  /** Standard uncertainty of the longitude, 0 to 10 degrees. */
  readonly longitudeStandardUncertaintyDeg: Degrees;
}

/**
 * Standard uncertainty of the sun's zenith angle from the uncertainties of time, latitude and longitude.
 *
 * Model: the zenith angle changes by cos latitude × sin azimuth per degree of hour angle or longitude, and by cos azimuth
 * per degree of latitude; the three are independent.
 * Validity: any place and azimuth; angles far below 1°.
 * Accuracy: 1e-6 relative against differences of the zenith angle of spherical trigonometry.
 * Source: spherical trigonometry.
 *
 * @param sight - latitude, sun's azimuth, standard uncertainties of time (s), latitude and longitude (degrees)
 * @returns standard uncertainty, degrees
 * @throws TypeError if a value is not a number; RangeError if it is out of range
 * @example
 * import { zenithStandardUncertainty } from "airlight";
 * zenithStandardUncertainty({
 *   latitudeDeg: 40, sunAzimuthDeg: 90, timeStandardUncertaintyS: 2,
 *   latitudeStandardUncertaintyDeg: 0.001, longitudeStandardUncertaintyDeg: 0.001,
 * }); // => 0.00643
 */
export function zenithStandardUncertainty(sight: SightUncertainty): Degrees {
  checkRecord(sight, "sight", NAME);
  const { latitudeDeg, sunAzimuthDeg, timeStandardUncertaintyS } = sight;
  const { latitudeStandardUncertaintyDeg, longitudeStandardUncertaintyDeg } = sight;
  checkNumber(latitudeDeg, -90, 90, "degrees", "latitudeDeg", NAME);
  checkNumber(sunAzimuthDeg, 0, 360, "degrees", "sunAzimuthDeg", NAME);
  checkNumber(timeStandardUncertaintyS, 0, 86400, "s", "timeStandardUncertaintyS", NAME);
  const [latitude, longitude] = [
    "latitudeStandardUncertaintyDeg",
    "longitudeStandardUncertaintyDeg",
  ];
  checkNumber(latitudeStandardUncertaintyDeg, 0, 10, "degrees", latitude!, NAME);
  checkNumber(longitudeStandardUncertaintyDeg, 0, 10, "degrees", longitude!, NAME);
  const azimuth = sunAzimuthDeg * RADIANS_PER_DEGREE;
  const east = cos(latitudeDeg * RADIANS_PER_DEGREE) * sin(azimuth);
  const turned = east * timeStandardUncertaintyS * DEGREES_PER_SECOND;
  const moved = east * longitudeStandardUncertaintyDeg;
  const tilted = cos(azimuth) * latitudeStandardUncertaintyDeg;
  return sqrt(turned * turned + moved * moved + tilted * tilted);
}

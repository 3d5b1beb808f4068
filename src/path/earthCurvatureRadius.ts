/** Radius of the sphere that fits the Earth along a line of sight. */
import { checkNumber } from "../_check.js";
import { cos, sin, sqrt } from "../_numeric.js";
import { type Degrees, type Metres, RADIANS_PER_DEGREE } from "../units.js";

/** Semi-major axis, m, and squared eccentricity of the WGS 84 ellipsoid (defining constants a and 1/f; the latter f (2 - f), derived). */
const SEMI_MAJOR_AXIS_M = 6378137;
const SQUARED_ECCENTRICITY = 0.006694379990141317;

/**
 * Radius of curvature of the Earth at sea level along a direction: what `earthRadiusM` of a ray should be.
 *
 * Model: Euler's formula on the WGS 84 ellipsoid, 1/R = cos² A / M + sin² A / N, with the meridian's radius M and the prime
 * vertical's N.
 * Validity: every latitude and azimuth, enforced -90 to 90 and -360 to 360 degrees.
 * Accuracy: 1e-12 relative against curvature taken from points on the ellipsoid; the geoid itself departs further.
 * Source: Euler's theorem of normal sections; WGS 84 defining constants.
 *
 * @param latitudeDeg - geodetic latitude, -90 to 90 degrees
 * @param azimuthDeg - direction of the line of sight from north, degrees, -360 to 360 (its sense does not matter)
 * @returns the radius, m, 6 335 439 to 6 399 594
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { earthCurvatureRadius } from "airlight";
 * earthCurvatureRadius(45, 270); // => 6388838
 */
export function earthCurvatureRadius(latitudeDeg: Degrees, azimuthDeg: Degrees): Metres {
  checkNumber(latitudeDeg, -90, 90, "degrees", "latitudeDeg", "earthCurvatureRadius");
  checkNumber(azimuthDeg, -360, 360, "degrees", "azimuthDeg", "earthCurvatureRadius");
  const sinLatitude = sin(latitudeDeg * RADIANS_PER_DEGREE);
  const flattening = 1 - SQUARED_ECCENTRICITY * sinLatitude * sinLatitude;
  const primeVertical = SEMI_MAJOR_AXIS_M / sqrt(flattening);
  const meridian = (primeVertical * (1 - SQUARED_ECCENTRICITY)) / flattening;
  const northward = cos(azimuthDeg * RADIANS_PER_DEGREE);
  const north2 = northward * northward;
  return 1 / (north2 / meridian + (1 - north2) / primeVertical);
}

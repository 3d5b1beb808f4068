/** Stokes parameters of a lit sky in many directions at once. */
import { checkList, checkPrepared, checkRecord } from "../_check.js";
import { cos, sin } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { AMPLITUDES, amplitudesToStokes, sightAmplitudes } from "./_amplitudes.js";
import { checkAzimuth, checkLevel } from "./_checkDirection.js";
import { checkZenith } from "./_checkZenith.js";
import type { LitSky } from "./illuminateSky.js";
import type { SkyLevel } from "./skyStokes.js";

/** Lines of sight, direction i at index i of both lists. */
export interface SkyDirections {
  /** Angles of the lines of sight from the vertical, 0 to under 90 degrees; NaN for a direction to leave out. */
  readonly viewZenithsDeg: ArrayLike<Degrees>;
  /** Azimuths between seen light and sunbeam, degrees, as for `skyStokes`. */
  readonly relativeAzimuthsDeg: ArrayLike<Degrees>;
  /** Where the light is met. */
  readonly at: SkyLevel;
}

/**
 * Stokes parameters in many directions: the kernel behind pictures of the sky.
 *
 * Model: as `skyStokes`. The integrals along a line of sight do not depend on azimuth, so they are done once for each
 * different zenith angle in the list; pixels of a round picture that lie symmetric to its centre share them.
 * Validity: as `prepareSky`. A NaN in either list gives NaN at that place.
 * Accuracy: equal to `skyStokes` within 1e-14.
 * Source: as `skyStokes`.
 *
 * @param lit - a lit sky from `illuminateSky`
 * @param directions - `viewZenithsDeg` and `relativeAzimuthsDeg` of equal length; `at` "ground" or "top"
 * @param out - filled and returned if given: at least three values a direction
 * @returns I, Q, U of direction i at 3 i, 3 i + 1, 3 i + 2, for a sunbeam of flux π
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths do not match or an angle is out of range
 * @example
 * import { illuminateSky, prepareSky, skyStokesMap } from "airlight";
 * const layers = [{ rayleighDepth: 0.2, absorptionDepth: 0.01 }];
 * const lit = illuminateSky(prepareSky({ layers, depolarisation: 0.0279, groundAlbedo: 0.1 }), 40);
 * const map = skyStokesMap(lit, { viewZenithsDeg: [0, 45], relativeAzimuthsDeg: [0, 90], at: "ground" });
 * map[3]; // => 0.0768084
 */
export function skyStokesMap(
  lit: LitSky,
  directions: SkyDirections,
  out?: Float64Array,
): Float64Array {
  checkPrepared(lit?.groundRadiance, "illuminateSky", "lit", "skyStokesMap");
  const count = checkDirections(directions);
  const { viewZenithsDeg, relativeAzimuthsDeg, at } = directions;
  const map = out ?? new Float64Array(3 * count);
  checkList(map, 3 * count, "out", "skyStokesMap");
  const upward = at === "top";
  const known = new Map<number, number>();
  const amplitudes = new Float64Array(AMPLITUDES * count);
  for (let i = 0; i < count; i++) {
    const zenith = viewZenithsDeg[i]!;
    const azimuth = relativeAzimuthsDeg[i]! * RADIANS_PER_DEGREE;
    const cosine = cos(zenith * RADIANS_PER_DEGREE);
    let at = known.get(zenith);
    if (at === undefined) {
      at = AMPLITUDES * known.size;
      known.set(zenith, at);
      sightAmplitudes(lit, cosine, upward, amplitudes, at);
    }
    const travel = upward ? cosine : -cosine;
    amplitudesToStokes(amplitudes, at, travel, cos(azimuth), sin(azimuth), map, 3 * i);
  }
  return map;
}

/** Throws unless every direction is a line of sight or NaN; the number of directions. */
function checkDirections(directions: SkyDirections): number {
  const name = "skyStokesMap";
  checkRecord(directions, "directions", name);
  const { viewZenithsDeg, relativeAzimuthsDeg, at } = directions;
  checkList(viewZenithsDeg, 0, "viewZenithsDeg", name);
  checkList(relativeAzimuthsDeg, 0, "relativeAzimuthsDeg", name);
  checkLevel(at, name);
  const count = viewZenithsDeg.length;
  if (relativeAzimuthsDeg.length !== count) {
    throw new RangeError(
      `${name}: relativeAzimuthsDeg must be as long as viewZenithsDeg, got ${relativeAzimuthsDeg.length} and ${count}`,
    );
  }
  for (let i = 0; i < count; i++) {
    const zenith = viewZenithsDeg[i]!;
    const azimuth = relativeAzimuthsDeg[i]!;
    if (!(zenith >= 0 && zenith < 90) && !Number.isNaN(zenith))
      checkZenith(zenith, `viewZenithsDeg[${i}]`, name);
    if (!(Math.abs(azimuth) <= 3600) && !Number.isNaN(azimuth))
      checkAzimuth(azimuth, `relativeAzimuthsDeg[${i}]`, name);
  }
  return count;
}

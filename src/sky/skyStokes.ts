/** Stokes parameters of the scattered light of a lit sky in one direction. */
import { checkPrepared } from "../_check.js";
import { cos, sin } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { AMPLITUDES, amplitudesToStokes, sightAmplitudes } from "./_amplitudes.js";
import { checkDirection } from "./_checkDirection.js";
import type { LitSky } from "./illuminateSky.js";

/** Where light is met that crosses the sky: on the ground looking up, or above the air, leaving upward. */
export type SkyLevel = "ground" | "top";

/** A line of sight. */
export interface SkyDirection {
  /** Angle of the line of sight from the vertical, 0 to under 90 degrees. */
  readonly viewZenithDeg: Degrees;
  /**
   * Azimuth between the directions in which the seen light and the sunbeam travel, counter-clockwise as seen from
   * above, degrees: at the ground 0 is the sky on the sun's side, 180 the sky opposite.
   */
  readonly relativeAzimuthDeg: Degrees;
  /** Where the light is met. */
  readonly at: SkyLevel;
}

/** Stokes parameters I, Q, U of light: `[I, Q, U]`, all in the unit of radiance. */
export type Stokes = [number, number, number];

/**
 * Stokes parameters of the light the sky scatters towards one direction, all orders of scattering; the sunbeam itself is
 * left out.
 *
 * Model: the source function of the solved layers, integrated along the line of sight in closed form (no interpolation
 * between directions). Q is positive for a vibration in the vertical plane through the line of sight; U is positive for a
 * vibration turned from that plane counter-clockwise by up to 90°, as seen by someone whom the light meets:
 *
 * ```text
 *    .      |
 *      .    |        Q > 0: a vibration along |      U > 0: one along the dots
 *        .  |        Q < 0: one along --             U < 0: one square to them
 *    ------ o ------
 *           |  .     o: light that comes towards the observer
 *           |    .
 *           |      .
 * ```
 *
 * Validity: as `prepareSky`.
 * Accuracy: 1e-6 absolute in I, Q, U for flux π and 32 streams (see `prepareSky`); reciprocity to 1e-10; 5e-9 against the
 * one value of Natraj, Li & Yung 2009 we remember (64 streams).
 * Source: Chandrasekhar 1950, Radiative Transfer, chapter X; Natraj, Li & Yung 2009, Astrophys. J. 691, 1909 (tables).
 *
 * @param lit - a lit sky from `illuminateSky`
 * @param direction - `viewZenithDeg` 0 to under 90 degrees; `relativeAzimuthDeg`, -3600 to 3600; `at` "ground" or "top"
 * @returns `[I, Q, U]` for a sunbeam of flux π through a unit area square to it (times irradiance / π for a radiance)
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is out of range
 * @example
 * import { illuminateSky, prepareSky, skyStokes } from "airlight";
 * const layers = [{ rayleighDepth: 0.5, absorptionDepth: 0 }];
 * const sky = prepareSky({ layers, depolarisation: 0, groundAlbedo: 0 });
 * const lit = illuminateSky(sky, 60);
 * skyStokes(lit, { viewZenithDeg: 30, relativeAzimuthDeg: 180, at: "ground" })[1]; // => -0.066559
 */
export function skyStokes(lit: LitSky, direction: SkyDirection): Stokes {
  checkPrepared(lit?.groundRadiance, "illuminateSky", "lit", "skyStokes");
  checkDirection(direction, "skyStokes");
  const cosine = cos(direction.viewZenithDeg * RADIANS_PER_DEGREE);
  const azimuth = direction.relativeAzimuthDeg * RADIANS_PER_DEGREE;
  const upward = direction.at === "top";
  const amplitudes = new Float64Array(AMPLITUDES);
  sightAmplitudes(lit, cosine, upward, amplitudes, 0);
  const stokes: Stokes = [0, 0, 0];
  const travel = upward ? cosine : -cosine;
  amplitudesToStokes(amplitudes, 0, travel, cos(azimuth), sin(azimuth), stokes, 0);
  return stokes;
}

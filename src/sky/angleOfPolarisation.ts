/** The plane in which light vibrates. */
import { refuse } from "../_check.js";
import { atan2 } from "../_numeric.js";
import { DEGREES_PER_RADIAN, type Degrees } from "../units.js";
import { checkStokes } from "./_checkStokes.js";
import type { Stokes } from "./skyStokes.js";

/**
 * Angle of the plane of vibration from the vertical plane through the line of sight, counter-clockwise as seen by someone
 * whom the light meets.
 *
 * Model: half the angle of (Q, U); 0 is a vibration in the vertical plane, 90 a horizontal one (drawn at `skyStokes`).
 * Validity: any light that is polarised at all.
 * Accuracy: 1e-13 degrees (4e-14 seen).
 * Source: Hansen & Travis 1974, Space Sci. Rev. 16, 527, section 1.
 *
 * @param stokes - `[I, Q, U]` as of `skyStokes`, any unit
 * @returns above -90 to 90 degrees
 * @throws TypeError if `stokes` is not three numbers; RangeError if I is not above 0 or Q and U are both 0 (unpolarised
 *   light has no angle)
 * @example
 * import { angleOfPolarisation } from "airlight";
 * angleOfPolarisation([1, 0, 0.5]); // => 45
 */
export function angleOfPolarisation(stokes: Readonly<Stokes>): Degrees {
  checkStokes(stokes, "angleOfPolarisation");
  const [, q, u] = stokes;
  if (q === 0 && u === 0) {
    refuse(
      0,
      "polarised light, Q or U other than 0",
      "unpolarised light has no angle",
      "stokes",
      "angleOfPolarisation",
    );
  }
  const angle = 0.5 * atan2(u, q) * DEGREES_PER_RADIAN;
  return angle === -90 ? 90 : angle;
}

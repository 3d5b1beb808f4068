/** How much of light is linearly polarised. */
import { checkStokes } from "./_checkStokes.js";
import type { Fraction } from "../units.js";
import type { Stokes } from "./skyStokes.js";

/**
 * Degree of linear polarisation, sqrt(Q² + U²) / I.
 *
 * Model: the ratio itself.
 * Validity: I above 0.
 * Accuracy: 1e-15 relative.
 * Source: Stokes 1852; Hansen & Travis 1974, Space Sci. Rev. 16, 527, section 1.
 *
 * @param stokes - `[I, Q, U]` as of `skyStokes`, any unit
 * @returns 0 (unpolarised) to 1 (fully polarised)
 * @throws TypeError if `stokes` is not three numbers; RangeError if I is not above 0 or a value is not finite
 * @example
 * import { degreeOfPolarisation } from "airlight";
 * degreeOfPolarisation([5, -3, 0]); // => 0.6
 */
export function degreeOfPolarisation(stokes: Readonly<Stokes>): Fraction {
  checkStokes(stokes, "degreeOfPolarisation");
  const [i, q, u] = stokes;
  return Math.sqrt(q * q + u * u) / i;
}

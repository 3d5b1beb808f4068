/** How scattering by molecules changes the Stokes parameters of light. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { type Degrees, type Dimensionless, RADIANS_PER_DEGREE } from "../units.js";

/** Elements of a scattering matrix of randomly turned molecules; those not named are zero. */
export interface ScatteringMatrix {
  /** From I to I: the phase function, mean 1 over the sphere. */
  readonly f11: Dimensionless;
  /** From I to Q and from Q to I. */
  readonly f12: Dimensionless;
  /** From Q to Q. */
  readonly f22: Dimensionless;
  /** From U to U. */
  readonly f33: Dimensionless;
}

/**
 * Scattering matrix of molecules for I, Q, U, with depolarisation.
 *
 * Model: share Δ = (1 - ρ) / (1 + ρ / 2) of a small dipole's matrix, the rest scattered evenly and unpolarised. Q is
 * positive for a vibration in the plane of scattering, both before and after.
 * Validity: scattering angle 0 to 180°, depolarisation factor 0 to 0.5, enforced.
 * Accuracy: 1e-15 against `rayleighPhase` and `rayleighPolarisation`, which come from another form of the formula.
 * Source: Hansen & Travis 1974, Space Sci. Rev. 16, 527, equations 2.15 and 2.16.
 *
 * @param scatteringAngleDeg - angle between the light's old and new direction, 0 to 180°
 * @param depolarisation - depolarisation factor for natural light, 0 to 0.5
 * @returns `f11`, `f12`, `f22`, `f33`, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { rayleighScatteringMatrix } from "airlight";
 * rayleighScatteringMatrix(90, 0).f12; // => -0.75
 */
export function rayleighScatteringMatrix(
  scatteringAngleDeg: Degrees,
  depolarisation: Dimensionless,
): ScatteringMatrix {
  const name = "rayleighScatteringMatrix";
  checkNumber(scatteringAngleDeg, 0, 180, "degrees", "scatteringAngleDeg", name);
  checkNumber(depolarisation, 0, 0.5, "", "depolarisation", name);
  const dipole = (1 - depolarisation) / (1 + 0.5 * depolarisation);
  const cosine = cos(scatteringAngleDeg * RADIANS_PER_DEGREE);
  const square = cosine * cosine;
  return {
    f11: 0.75 * dipole * (1 + square) + 1 - dipole,
    f12: -0.75 * dipole * (1 - square),
    f22: 0.75 * dipole * (1 + square),
    f33: 1.5 * dipole * cosine,
  };
}

/** Rayleigh phase function with depolarisation. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { RADIANS_PER_DEGREE, type Degrees, type Dimensionless } from "../units.js";

/**
 * Phase function of molecular scattering of natural light, mean 1 over the sphere.
 *
 * Model: 3 / (4 (1 + 2 γ)) ((1 + 3 γ) + (1 - γ) cos²Θ), γ = ρ / (2 - ρ).
 * Validity: scattering angle 0 to 180°, depolarisation factor 0 to 0.5 (6/7 is the physical limit), enforced.
 * Accuracy: 1e-13 (mean over the sphere by Gauss sums; 1.5 at 0°, 0.75 at 90° for ρ = 0).
 * Source: Chandrasekhar 1960, Radiative Transfer, section 18; in this form Bucholtz 1995, Appl. Opt. 34, 2765, equation 12.
 *
 * @param scatteringAngleDeg - angle between the light's old and new direction, 0 to 180°
 * @param depolarisation - depolarisation factor for natural light, 0 to 0.5
 * @returns phase function, without unit
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { rayleighPhase } from "airlight";
 * rayleighPhase(90, 0.0279); // => 0.7603
 */
export function rayleighPhase(
  scatteringAngleDeg: Degrees,
  depolarisation: Dimensionless,
): Dimensionless {
  checkNumber(scatteringAngleDeg, 0, 180, "degrees", "scatteringAngleDeg", "rayleighPhase");
  checkNumber(depolarisation, 0, 0.5, "", "depolarisation", "rayleighPhase");
  const gamma = depolarisation / (2 - depolarisation);
  const cosine = cos(scatteringAngleDeg * RADIANS_PER_DEGREE);
  return (0.75 * (1 + 3 * gamma + (1 - gamma) * cosine * cosine)) / (1 + 2 * gamma);
}

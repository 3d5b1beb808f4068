/** Degree of polarisation of light scattered once by air. */
import { checkNumber } from "../_check.js";
import { cos } from "../_numeric.js";
import { RADIANS_PER_DEGREE, type Degrees, type Dimensionless, type Fraction } from "../units.js";

/**
 * Degree of linear polarisation of natural light scattered once by molecules; the vibration is square to the scattering plane.
 *
 * Model: (1 - γ) sin²Θ / ((1 + 3 γ) + (1 - γ) cos²Θ), γ = ρ / (2 - ρ).
 * Validity: scattering angle 0 to 180°, depolarisation factor 0 to 0.5, enforced; single scattering only (the real sky is
 * less polarised).
 * Accuracy: 1e-13 (1 at 90° for ρ = 0; (1 - ρ) / (1 + ρ) at 90° otherwise).
 * Source: Chandrasekhar 1960, Radiative Transfer, section 18.
 *
 * @param scatteringAngleDeg - angle between the light's old and new direction, 0 to 180°
 * @param depolarisation - depolarisation factor for natural light, 0 to 0.5
 * @returns degree of polarisation, 0 to 1
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { rayleighPolarisation } from "airlight";
 * rayleighPolarisation(90, 0.0279); // => 0.9457
 */
export function rayleighPolarisation(
  scatteringAngleDeg: Degrees,
  depolarisation: Dimensionless,
): Fraction {
  checkNumber(scatteringAngleDeg, 0, 180, "degrees", "scatteringAngleDeg", "rayleighPolarisation");
  checkNumber(depolarisation, 0, 0.5, "", "depolarisation", "rayleighPolarisation");
  const gamma = depolarisation / (2 - depolarisation);
  const cosine = cos(scatteringAngleDeg * RADIANS_PER_DEGREE);
  const c2 = cosine * cosine;
  return ((1 - gamma) * (1 - c2)) / (1 + 3 * gamma + (1 - gamma) * c2);
}

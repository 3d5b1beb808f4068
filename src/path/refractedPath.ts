/** The refracted ray from an observer to the end of the air, by quadrature. */
import { checkNumber } from "../_check.js";
import { DEGREES_PER_RADIAN } from "../units.js";
import type { Degrees, Dimensionless } from "../units.js";
import { checkPathInput, constituentsOf } from "./_checkPathInput.js";
import { massesOf } from "./_massesOf.js";
import { traceRay } from "./_traceRay.js";
import type { PathInput } from "./pathInput.js";

/** One ray: how far it is bent and what it meets. */
export interface RefractedPath<Key extends string = never> {
  /** True minus apparent zenith angle, degrees. */
  readonly refractionDeg: Degrees;
  /** Zenith angle of the ray outside the air as seen from the observer, degrees. */
  readonly trueZenithDeg: Degrees;
  /** Mass of air along the ray over that above the observer. */
  readonly airMass: Dimensionless;
  /** The same ratio for each constituent, under the caller's keys. */
  readonly masses: Readonly<Record<Key, Dimensionless>>;
}

/**
 * Refraction and the air mass of every constituent along the ray seen at an apparent zenith angle.
 *
 * Model: Snell's law in spherical shells, n r sin z constant, with Ciddor's moist index at every height (n - 1 from the
 * density-proportional mixing, CO2 as in the profile); integrals over a variable in which the horizontal ray is smooth,
 * 16-point Gauss-Legendre between the kinks of profile and constituents; a refractive step to 1 at the top. The angle is that
 * between the ray outside the air and at the observer. Air mass counts mass density in hydrostatic balance (pressure times
 * mean molar mass over temperature), each constituent its own density, all over the vertical column above the observer.
 * A ray that starts downward is followed to its lowest point and up again.
 * Validity: apparent zenith angle 0 up to where the ray meets the ground (90 degrees on the ground, more above it), enforced
 * with an error that says where; 300-1690 nm; layers so steep that they trap the ray are refused. Spherical shells: no
 * tilted layers, no turbulence.
 * Accuracy: 1e-9 relative in air mass and 1e-5 arcsec in refraction against the same integrals done by an adaptive
 * integration of the ray's differential equation. The air itself decides: at 90 degrees, weather near the ground changes
 * refraction by minutes of arc. The Earth's radius changes the horizon's air mass (38.11 for 6356.8 km, 38.16 for 6371 km,
 * 38.18 for 6378 km, dry standard air at 550 nm).
 * Source: Snell's law in shells (Auer & Standish 2000, Astron. J. 119, 2472, for the method of avoiding the horizon's
 * singularity by a change of variable; the variable here is our own); Ciddor 1996 for the index.
 *
 * @param apparentZenithDeg - zenith angle at which the observer sees the ray, degrees, 0 to the horizon
 * @param input - `profile`; `altitudeM` of the observer, m above sea level, from the profile's lowest height to
 *   80 000; `wavelengthNm` 300 to 1690 nm,
 *   vacuum; `earthRadiusM` of curvature at sea level, 6 300 000 to 6 420 000 m; `constituents`, a record of layers
 * @returns `refractionDeg` and `trueZenithDeg` in degrees, `airMass` and `masses` (one per key of `constituents`) without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range, if the ray meets the ground or is
 *   trapped, or if a constituent has nothing above the observer
 * @example
 * import { gaussianLayer, refractedPath, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 101325,
 *   temperatureK: 288.15,
 *   relativeHumidity: 0,
 *   altitudeM: 0,
 *   co2Ppm: 450,
 * });
 * const ozone = gaussianLayer({ heightM: 22000, standardDeviationM: 5000 });
 * const path = refractedPath(75, {
 *   profile,
 *   altitudeM: 0,
 *   wavelengthNm: 550,
 *   earthRadiusM: 6371000,
 *   constituents: { ozone },
 * });
 * path.refractionDeg * 3600; // => 210.221
 * path.airMass; // => 3.810648
 * path.masses.ozone; // => 3.703775
 */
export function refractedPath<Key extends string = never>(
  apparentZenithDeg: Degrees,
  input: PathInput<Key>,
): RefractedPath<Key> {
  const name = "refractedPath";
  const air = checkPathInput(input, name);
  checkNumber(apparentZenithDeg, 0, 120, "degrees", "apparentZenithDeg", name);
  const sums = traceRay(air, apparentZenithDeg, name);
  const ratios = massesOf(air, Object.keys(constituentsOf(input, name)), sums, name);
  const refractionDeg = sums[0]! * DEGREES_PER_RADIAN;
  return {
    refractionDeg,
    trueZenithDeg: apparentZenithDeg + refractionDeg,
    airMass: ratios.airMass,
    masses: ratios.masses as Record<Key, number>,
  };
}

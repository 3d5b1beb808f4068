/** How far the air pulls one wavelength from another. */
import type { Arcseconds, Degrees, Nanometres } from "../units.js";
import { liftOf } from "./_liftOf.js";
import type { PathInput } from "./pathInput.js";

/** Where a source stands, at which wavelength it is guided on, and the air between. */
export type DispersionInput = Omit<PathInput, "wavelengthNm" | "constituents"> & {
  /** Vacuum wavelength that the telescope is guided on, 300 to 1690 nm. */
  readonly guideWavelengthNm: Nanometres;
} & (
    | {
        /** True zenith angle of the source, degrees: its colours are compared in the picture. */
        readonly trueZenithDeg: Degrees;
        /** Left out: one angle of the two. */
        readonly apparentZenithDeg?: never;
      }
    | {
        /** Apparent zenith angle, degrees: colours that arrive there together are compared on the sky. */
        readonly apparentZenithDeg: Degrees;
        /** Left out: one angle of the two. */
        readonly trueZenithDeg?: never;
      }
  );

/**
 * Refraction at a wavelength less refraction at the guiding wavelength, arcseconds; positive where the light is lifted higher.
 *
 * Model: two rays of `refractedPath`. With `trueZenithDeg` both belong to one source, and the result is the distance of its
 * two images, which a slit or fibre must take in. With `apparentZenithDeg` both arrive from one direction, and the result is
 * the distance between the places on the sky that they come from. The second is larger: by 0.05 % at 45 degrees, 2 % at 85
 * degrees, a sixth at the horizon.
 * Validity: as `refractedPath`, both wavelengths 300-1690 nm.
 * Accuracy: 0.005 arcsec against Filippenko's printed values at sec z 1.5, 400 and 600 nm (their last digit); the rays as `refractedPath`.
 * Source: Snell's law in shells with Ciddor 1996; Filippenko 1982, Publ. Astron. Soc. Pac. 94, 715, for the use.
 *
 * @param wavelengthNm - vacuum wavelength, 300 to 1690 nm
 * @param star - `guideWavelengthNm`; exactly one of `trueZenithDeg` and `apparentZenithDeg`; `profile`, `altitudeM` and
 *   `earthRadiusM` as in `refractedPath`
 * @returns the difference, arcsec, along the vertical, towards the zenith
 * @throws TypeError if an argument is of the wrong kind, or both angles or none are given; RangeError if one is out of range
 *   or below the horizon
 * @example
 * import { differentialRefraction, standardProfile } from "airlight";
 * const profile = standardProfile({
 *   pressurePa: 79993,
 *   temperatureK: 280.15,
 *   relativeHumidity: 0.8,
 *   altitudeM: 2000,
 *   co2Ppm: 425,
 * });
 * const star = {
 *   guideWavelengthNm: 500,
 *   trueZenithDeg: 48.19,
 *   profile,
 *   altitudeM: 2000,
 *   earthRadiusM: 6371000,
 * };
 * differentialRefraction(400, star); // => 0.70845
 */
export function differentialRefraction(
  wavelengthNm: Nanometres,
  star: DispersionInput,
): Arcseconds {
  return liftOf(wavelengthNm, star, "differentialRefraction");
}

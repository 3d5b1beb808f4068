/** What a ray through a profile needs besides its angle. */
import type { AirProfile } from "../air/airProfile.js";
import type { ConstituentLayer } from "../air/constituentLayer.js";
import type { Metres, Nanometres } from "../units.js";

/** Observer, air, wavelength and Earth of a ray; the constituents' keys are the caller's own. */
export interface PathInput<Key extends string = never> {
  /** Prepared profile of moist air, from `standardProfile` or `tabulatedProfile`. */
  readonly profile: AirProfile;
  /** Height of the observer above mean sea level, m: from the profile's ground to 80 km. */
  readonly altitudeM: Metres;
  /** Vacuum wavelength, 300 to 1690 nm. */
  readonly wavelengthNm: Nanometres;
  /** Radius of the Earth's curvature at sea level, m: 6 300 000 to 6 420 000 (see `earthCurvatureRadius`). */
  readonly earthRadiusM: Metres;
  /** Layers whose masses are wanted, each under a key of its own (`{ ozone: gaussianLayer(...) }`). */
  readonly constituents?: Readonly<Record<Key, ConstituentLayer>>;
}

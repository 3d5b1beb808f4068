/** What the known constituents take from the light of a channel on a slant way. */
import type { KnownTerm } from "airlight";
import type { AirMasses } from "./airMasses.js";
import { type ChannelOptics, weightedMean } from "./channelOptics.js";

/** Aerosol as a power law of wavelength, for its small share in the band's curvature. */
export interface Turbidity {
  /** Optical depth at 1000 nm. */
  readonly turbidity: number;
  readonly exponent: number;
}

/** No aerosol at all. */
export const NO_AEROSOL: Turbidity = { turbidity: 0, exponent: 0 };

/**
 * Terms of air, ozone and nitrogen dioxide, each with the depth averaged over the band and its own air mass; and one for the
 * curvature of the band: through much air its blue side is used up first, so a band of some width lets through more than
 * its mean depth says (5 nm at 368 nm and 8 air masses: 0.3 %). Depth of that term is negative, its air mass 1.
 */
export function knownTerms(
  optics: ChannelOptics,
  masses: AirMasses,
  molecules: number,
  aerosol: Turbidity,
): KnownTerm[] {
  const { weights, airCrossSections, ozoneDepths, nitrogenDioxideDepths, meanNm } = optics;
  const terms = [
    { opticalDepth: weightedMean(airCrossSections, weights) * molecules, airMass: masses.air },
    { opticalDepth: weightedMean(ozoneDepths, weights), airMass: masses.ozone },
    { opticalDepth: weightedMean(nitrogenDioxideDepths, weights), airMass: masses.ozone },
  ];
  const aerosolAt = (nm: number): number =>
    aerosol.turbidity * (nm / 1000) ** -aerosol.exponent * masses.aerosol;
  const mean = terms.reduce(
    (sum, term) => sum + term.opticalDepth * term.airMass,
    aerosolAt(meanNm),
  );
  const transmittance = optics.wavelengthsNm.reduce((sum, nm, i) => {
    const gases = ozoneDepths[i]! + nitrogenDioxideDepths[i]!;
    const slant = airCrossSections[i]! * molecules * masses.air + gases * masses.ozone;
    return sum + weights[i]! * Math.exp(mean - slant - aerosolAt(nm));
  }, 0);
  return [...terms, { opticalDepth: -Math.log(transmittance), airMass: 1 }];
}

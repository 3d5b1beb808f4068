/** What each channel sees: its passband weighted by sunlight, and the known constituents' optical depths across it. */
import {
  gaussianPassband,
  nitrogenDioxideOpticalDepth,
  ozoneOpticalDepth,
  rayleighCrossSection,
  solarIrradiance,
} from "airlight";
import type { Channel, Station } from "./readStation.js";

/** A channel ready for use; the lists belong to the wavelengths of its passband. */
export interface ChannelOptics {
  readonly channel: Channel;
  /** Mean wavelength of the light it takes in outside the air, nm. */
  readonly meanNm: number;
  readonly wavelengthsNm: Float64Array;
  /** Passband times solar irradiance, sum 1. */
  readonly weights: Float64Array;
  /** Cross-section of one molecule of air, m². */
  readonly airCrossSections: Float64Array;
  /** Vertical optical depths of ozone. */
  readonly ozoneDepths: Float64Array;
  /** Columns behind those depths, DU. */
  readonly columns: { readonly ozoneDu: number; readonly nitrogenDioxideDu: number };
  /** Vertical optical depths of nitrogen dioxide, put at ozone's temperature as the forward calculation does. */
  readonly nitrogenDioxideDepths: Float64Array;
}

/** Prepares one channel for the gases above the station. */
export function channelOptics(channel: Channel, station: Station): ChannelOptics {
  const { co2Ppm, ozoneDu, ozoneTemperatureK, nitrogenDioxideDu } = station;
  const band = gaussianPassband(channel.centreNm, channel.fullWidthHalfMaximumNm);
  const over = (quantity: (wavelengthNm: number) => number): Float64Array =>
    band.wavelengthsNm.map(quantity);
  const light = band.values.map((value, i) => value * solarIrradiance(band.wavelengthsNm[i]!));
  const total = light.reduce((sum, value) => sum + value, 0);
  const weights = light.map((value) => value / total);
  return {
    channel,
    meanNm: weightedMean(band.wavelengthsNm, weights),
    wavelengthsNm: band.wavelengthsNm,
    weights,
    columns: { ozoneDu, nitrogenDioxideDu },
    airCrossSections: over((nm) => rayleighCrossSection(nm, co2Ppm)),
    ozoneDepths: over((nm) => ozoneOpticalDepth(nm, ozoneDu, ozoneTemperatureK)),
    nitrogenDioxideDepths: over((nm) =>
      nm > NITROGEN_DIOXIDE_LAST_NM
        ? 0
        : nitrogenDioxideOpticalDepth(nm, nitrogenDioxideDu, ozoneTemperatureK),
    ),
  };
}

/** Beyond this its absorption is too weak to be tabled; the forward calculation counts it as transparent too. */
const NITROGEN_DIOXIDE_LAST_NM = 660;

/** Mean of `values` with `weights` of sum 1. */
export function weightedMean(values: Float64Array, weights: Float64Array): number {
  return values.reduce((sum, value, i) => sum + value * weights[i]!, 0);
}

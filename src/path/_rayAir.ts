/** What a ray needs to know of the air: refractivity and densities at any height, and the heights where they have kinks. */
import { layerBreaks } from "../air/_layerDensity.js";
import { fillState, profileLayer } from "../air/_profileState.js";
import {
  type RefractivityFactors,
  refractivity,
  refractivityFactors,
} from "../air/_refractivityCore.js";
import { GEOPOTENTIAL_RADIUS_M, geopotentialHeight } from "../air/_standardLayers.js";
import type { AirLayer, AirProfile } from "../air/airProfile.js";
import type { ConstituentLayer } from "../air/constituentLayer.js";

/** Air and constituents around an observer at one wavelength. */
export interface RayAir {
  readonly profile: AirProfile;
  readonly wavelengthNm: number;
  readonly factors: RefractivityFactors;
  readonly constituents: readonly ConstituentLayer[];
  readonly earthRadiusM: number;
  readonly observerM: number;
  /** Heights, m, between which everything is smooth and changes little, rising, from the profile's lowest to its highest. */
  readonly breaksM: readonly number[];
  /** Those of them where the air or a constituent has a kink, and the lowest. */
  readonly kinksM: readonly number[];
}

export function rayAir(
  profile: AirProfile,
  constituents: readonly ConstituentLayer[],
  wavelengthNm: number,
  earthRadiusM: number,
  observerM: number,
): RayAir {
  const bases = profile.layers.map(({ baseM }) => geometricHeight(baseM));
  const tables = constituents.filter(({ shape }) => shape === "tabulated");
  return {
    profile,
    wavelengthNm,
    factors: refractivityFactors(wavelengthNm, profile.co2Ppm),
    constituents,
    earthRadiusM,
    observerM,
    breaksM: levels(profile, [...bases, ...constituents.flatMap(layerBreaks)]),
    kinksM: levels(profile, [...bases, ...tables.flatMap(layerBreaks)]),
  };
}

/** The heights inside the profile and its ends, rising, each once. */
function levels({ lowestM, highestM }: AirProfile, heightsM: readonly number[]): number[] {
  const inside = heightsM.filter((heightM) => heightM > lowestM && heightM < highestM);
  return [...new Set([lowestM, ...inside, highestM])].sort((a, b) => a - b);
}

/** The layer of the profile around a geometric height. */
export function layerAt({ profile }: RayAir, heightM: number): AirLayer {
  return profile.layers[profileLayer(profile, geopotentialHeight(heightM))]!;
}

/** n - 1 at a height in a known layer; leaves temperature, pressure and vapour in `state`. */
export function refractivityAt(
  air: RayAir,
  layer: AirLayer,
  heightM: number,
  state: Float64Array,
): number {
  fillState(air.profile, layer, heightM, state);
  return refractivity(air.factors, state[0]!, state[1]!, state[2]!);
}

function geometricHeight(geopotentialM: number): number {
  return (GEOPOTENTIAL_RADIUS_M * geopotentialM) / (GEOPOTENTIAL_RADIUS_M - geopotentialM);
}

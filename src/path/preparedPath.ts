/** The prepared path of a station state that `preparePath` makes. */
import type { Degrees, Metres, Nanometres } from "../units.js";

/** Polynomials of degree 7 over equal pieces of a variable, one table for each quantity. */
export interface PathFit {
  /** Number of pieces. */
  readonly pieces: number;
  /** Eight coefficients a piece, rising powers: of refraction (degrees), of air, then of each constituent. */
  readonly coefficients: readonly Float64Array[];
}

/** The fit of rays that start below the horizontal, between two kinks of the air or a constituent. */
export interface DippingFit extends PathFit {
  /** Apparent elevations between which it holds, degrees, 0 or less. */
  readonly topDeg: Degrees;
  /** The lower one. */
  readonly bottomDeg: Degrees;
}

/** Prepared path: refraction and every air mass of one station state; make it with `preparePath` or `pathInWeather`. */
export interface PreparedPath<Key extends string = never> {
  /** Height of the observer above mean sea level, m. */
  readonly altitudeM: Metres;
  /** Vacuum wavelength, nm. */
  readonly wavelengthNm: Nanometres;
  /** Radius of the Earth's curvature, m. */
  readonly earthRadiusM: Metres;
  /** The constituents' keys, in the order of the tables. */
  readonly keys: readonly Key[];
  /** Greatest apparent zenith angle, where the ray grazes the ground, degrees. */
  readonly horizonApparentZenithDeg: Degrees;
  /** The true zenith angle of that ray, degrees. */
  readonly horizonTrueZenithDeg: Degrees;
  /** Refraction of the level ray, degrees. */
  readonly levelRefractionDeg: Degrees;
  /** From apparent elevations of 0 to 90 degrees. */
  readonly rising: PathFit;
  /** The same rays from their true elevations. */
  readonly risingTrue: PathFit;
  /** Rays that dip, from the level ray down. */
  readonly dipping: readonly DippingFit[];
}

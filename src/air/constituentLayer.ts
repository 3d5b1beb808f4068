/** How a constituent's density lies with height: what `gaussianLayer`, `exponentialLayer` and `tabulatedLayer` make. */
import type { Metres } from "../units.js";

/** Density falling off on both sides of a height, as ozone's does. */
export interface GaussianLayer {
  /** Which shape this is. */
  readonly shape: "gaussian";
  /** Height of the peak above mean sea level, m. */
  readonly heightM: Metres;
  /** Standard deviation about it, m. */
  readonly standardDeviationM: Metres;
}

/** Density falling off upwards, as water vapour's and aerosol's do. */
export interface ExponentialLayer {
  /** Which shape this is. */
  readonly shape: "exponential";
  /** Height over which the density falls to 1/e, m. */
  readonly scaleHeightM: Metres;
}

/** Density linear between the rows of a table, none outside it. */
export interface TabulatedLayer {
  /** Which shape this is. */
  readonly shape: "tabulated";
  /** Heights above mean sea level, m, rising. */
  readonly heightsM: readonly Metres[];
  /** Density at each height, in any unit. */
  readonly densities: readonly number[];
}

/** A constituent's density with height, in a unit of its own; air masses are ratios, so the unit falls out. */
export type ConstituentLayer = GaussianLayer | ExponentialLayer | TabulatedLayer;

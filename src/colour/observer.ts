/** What a standard observer is. */
import type { Nanometres } from "../units.js";

/** Colour-matching functions at evenly spaced wavelengths: how much of X, Y and Z each wavelength adds. */
export interface Observer {
  /** Wavelength of the first row, nm. */
  readonly startNm: Nanometres;
  /** Distance of neighbouring rows, nm. */
  readonly stepNm: Nanometres;
  /** The function that gives X (reddish), without unit. */
  readonly x: Float64Array;
  /** The function that gives Y; for the 1931 observer this is the luminous efficiency of daylight vision. */
  readonly y: Float64Array;
  /** The function that gives Z (bluish), without unit. */
  readonly z: Float64Array;
}

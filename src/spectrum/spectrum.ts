/** What a sampled spectrum is. */

/** A quantity sampled at wavelengths and taken as straight lines between them; make one with `tabulate`. */
export interface Spectrum {
  /** Vacuum wavelengths, nm, strictly rising. */
  readonly wavelengthsNm: Float64Array;
  /** The quantity at each of them, in its own unit (W m⁻² nm⁻¹ for irradiance). */
  readonly values: Float64Array;
}

/**
 * The response of a channel or filter: a spectrum of relative transmission. Only its shape counts, not its height;
 * outside its wavelengths it is zero. Make one with `gaussianPassband`, or from a filter's printed curve.
 */
export type Passband = Spectrum;

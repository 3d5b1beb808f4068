/** From a spectrum measured at the ground to the one outside the air. */
import { sqrt } from "../_numeric.js";
import type { Beam } from "../beam/beam.js";
import { beamTransmittances } from "../beam/beamTransmittances.js";
import type { Spectrum } from "../spectrum/spectrum.js";
import type { Fraction, QuantityOfWavelength } from "../units.js";
import { checkRemoval } from "./_checkRemoval.js";
import type { UncertainSpectrum } from "./resampleWithCovariance.js";

const NAME = "removeAtmosphere";

/** What is known of the measurement and of the air. */
export interface RemovalOptions {
  /** Standard uncertainty of each measured value, independent of the others, in their unit. */
  readonly standardUncertainties: ArrayLike<number>;
  /**
   * Standard uncertainties of the slant optical depth as functions of wavelength in nm, signed, one per cause (aerosol, pressure,
   * ozone): each moves all wavelengths together, the causes are independent. Vertical times air mass.
   */
  readonly slantDepthUncertainties: readonly QuantityOfWavelength[];
  /** Transmittance below which nothing is divided, 1e-6 to 1. */
  readonly leastTransmittance: Fraction;
}

/** What `removeAtmosphere` returns. */
export interface OutsideSpectrum extends UncertainSpectrum {
  /** Standard uncertainty of each value; NaN where it was refused. */
  readonly standardUncertainties: Float64Array;
  /** Transmittance divided by. */
  readonly transmittances: Float64Array;
  /** Places where the transmittance was too small: value, uncertainty and covariance are NaN there. */
  readonly refused: readonly number[];
}

/**
 * A spectrum of the direct sun measured at the ground, divided by the transmittance of the beam, with its covariance.
 *
 * Model: value / transmittance; covariance = independent measured variances / transmittance², plus for each cause the product
 * of value × slant uncertainty at both wavelengths.
 * Validity: the wavelengths of `beamTransmittances`, 280 to 1690 nm; samples of the transmittance, not averages over the
 * instrument's slit: within bands of water and oxygen that is not the same thing. First order: slant uncertainties well below 1.
 * Accuracy: 1e-12 relative on a spectrum that the same beam made; standard deviations of 2000 simulated spectra within 6 %.
 * Source: law of Bouguer, Lambert and Beer; GUM 2008, equation 13.
 *
 * @param spectrum - measured at the ground, any unit, 280 to 1690 nm; a NaN gives NaN at its place
 * @param beam - prepared beam from `clearBeam` or `beamAt`
 * @param options - `standardUncertainties`, `slantDepthUncertainties`, `leastTransmittance`
 * @returns the spectrum outside the air in the same unit, with uncertainties, covariance and the places refused
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths or an uncertainty are out of range, lengths differ, or
 *   every place is refused
 * @example
 * import { airColumn, clearBeam, removeAtmosphere } from "airlight";
 * const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
 * const aerosol = { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 };
 * const ozone = { ozoneDu: 344, ozoneTemperatureK: 225, ozoneHeightM: 22000 };
 * const beam = clearBeam({ column, trueZenithDeg: 60, ...ozone, nitrogenDioxideDu: 0.1, waterCm: 1.4, aerosol });
 * const measured = { wavelengthsNm: Float64Array.of(400, 500, 600), values: Float64Array.of(0.75, 1.18, 1.24) };
 * const outside = removeAtmosphere(measured, beam, {
 *   standardUncertainties: [0.01, 0.01, 0.01], leastTransmittance: 0.01,
 *   slantDepthUncertainties: [(nm) => 0.01 * (500 / nm) * beam.masses.aerosol],
 * });
 * outside.values[1]; // => 1.8998
 * outside.standardUncertainties[1]; // => 0.0412
 */
export function removeAtmosphere(
  spectrum: Spectrum,
  beam: Beam,
  options: RemovalOptions,
): OutsideSpectrum {
  checkRemoval(spectrum, beam, options);
  const { wavelengthsNm } = spectrum;
  const transmittances = beamTransmittances(wavelengthsNm, beam);
  const clear = transmittances.map((t) => (t >= options.leastTransmittance ? t : Number.NaN));
  const refused = Array.from(clear.keys()).filter((i) => Number.isNaN(clear[i]!));
  if (refused.length === clear.length) {
    const [most, least] = [Math.max(...transmittances), options.leastTransmittance];
    throw new RangeError(
      `${NAME}: beam must let ${least} through at some wavelength, got at most ${most}`,
    );
  }
  const values = spectrum.values.map((value, i) => value / clear[i]!);
  const own = Float64Array.from(options.standardUncertainties, (u, i) => u / clear[i]!);
  const causes = options.slantDepthUncertainties.map((cause) =>
    values.map((value, i) => value * cause(wavelengthsNm[i]!)),
  );
  const covariance = covarianceOf(own, causes);
  const n = values.length;
  const standardUncertainties = values.map((_, i) => sqrt(covariance[i * n + i]!));
  return { wavelengthsNm, values, covariance, standardUncertainties, transmittances, refused };
}

function covarianceOf(own: Float64Array, causes: readonly Float64Array[]): Float64Array {
  const n = own.length;
  const covariance = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      // nothing of its own off the diagonal, but NaN where either is refused
      let sum = i === j ? own[i]! * own[i]! : 0 * own[i]! * own[j]!;
      for (const cause of causes) sum += cause[i]! * cause[j]!;
      covariance[i * n + j] = sum;
      covariance[j * n + i] = sum;
    }
  }
  return covariance;
}

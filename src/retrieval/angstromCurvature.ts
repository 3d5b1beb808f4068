/** Ångström's exponent with its curvature, errors from those of the optical depths. */
import { checkNumber } from "../_check.js";
import { exp, log, sqrt } from "../_numeric.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { checkDepths } from "./_checkDepths.js";
import { correlatedLeastSquares } from "./_correlatedLeastSquares.js";

const NAME = "angstromCurvature";

/** What `angstromCurvature` returns. */
export interface AngstromCurvature {
  /** Optical depth at the reference wavelength. */
  readonly opticalDepth: Dimensionless;
  /** Exponent at the reference wavelength: -d ln depth / d ln wavelength. */
  readonly exponent: Dimensionless;
  /** Curvature: the coefficient of (ln wavelength)², half the second derivative. */
  readonly curvature: Dimensionless;
  /** Standard uncertainty of the optical depth. */
  readonly opticalDepthStandardUncertainty: Dimensionless;
  /** Standard uncertainty of the exponent. */
  readonly exponentStandardUncertainty: Dimensionless;
  /** Standard uncertainty of the curvature. */
  readonly curvatureStandardUncertainty: Dimensionless;
  /** Covariance matrix of ln optical depth, exponent and curvature, row by row. */
  readonly covariance: Float64Array;
  /** Weighted squares of the residuals; about the wavelengths less three where the curve fits within the errors. */
  readonly chiSquare: number;
}

/**
 * Ångström's exponent and its curvature from optical depths and their covariance.
 *
 * Model: ln depth = a - exponent x + curvature x², x = ln(wavelength / reference), by generalised least squares with the
 * covariance of the depths, to first order in their logarithms. A mixture of fine and coarse particles bends; a single
 * power law (`angstromFit`) does not.
 * Validity: three or more different wavelengths; every depth at least four times its standard uncertainty, enforced: below,
 * the logarithm is neither unbiased nor normal, and an exponent would be a guess.
 * Accuracy: recovers an exact curve to 1e-9; with depths of 5 % uncertainty, partly shared between channels, the stated
 * uncertainties match the spread of 4000 simulated fits within 5 %.
 * Source: Eck et al. 1999, J. Geophys. Res. 104, 31333 (second order in ln wavelength, from memory); generalised least squares.
 *
 * @param wavelengthsNm - 200 to 4000 nm, at least three different ones
 * @param opticalDepths - as many, above 0
 * @param options - `covariance` of the depths, row by row (`opticalDepthCovariance`), and `referenceNm`, 200 to 4000 nm
 * @returns optical depth, exponent and curvature at the reference wavelength, with standard uncertainties and covariance
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths differ, a value is out of range, a depth is
 *   too small for its uncertainty, or the covariance is not positive definite
 * @example
 * import { angstromCurvature } from "airlight";
 * const u = 0.004 * 0.004;
 * const covariance = [u, 0, 0, 0, 0, u, 0, 0, 0, 0, u, 0, 0, 0, 0, u];
 * const fit = angstromCurvature([412, 500, 675, 862], [0.19, 0.15, 0.10, 0.074], { covariance, referenceNm: 500 });
 * fit.exponent; // => 1.273
 * fit.exponentStandardUncertainty; // => 0.0974
 */
export function angstromCurvature(
  wavelengthsNm: ArrayLike<Nanometres>,
  opticalDepths: ArrayLike<Dimensionless>,
  options: { readonly covariance: ArrayLike<number>; readonly referenceNm: Nanometres },
): AngstromCurvature {
  const { covariance, referenceNm } = options ?? {};
  checkNumber(referenceNm, 200, 4000, "nm", "referenceNm", NAME);
  checkDepths(wavelengthsNm, opticalDepths, covariance);
  const count = wavelengthsNm.length;
  const x = Float64Array.from(wavelengthsNm, (nm) => log(nm / referenceNm));
  const ofLogs = Float64Array.from(covariance, (value, i) => {
    return value / (opticalDepths[Math.floor(i / count)]! * opticalDepths[i % count]!);
  });
  const columns = [new Float64Array(count).fill(1), x.map((v) => -v), x.map((v) => v * v)];
  const fit = correlatedLeastSquares(columns, Float64Array.from(opticalDepths, log), ofLogs);
  if (fit === undefined) {
    throw new RangeError(
      `${NAME}: covariance must be positive definite and three wavelengths differ`,
    );
  }
  const [logDepth, exponent, curvature] = fit.unknowns as unknown as [number, number, number];
  const opticalDepth = exp(logDepth);
  return {
    opticalDepth,
    exponent,
    curvature,
    opticalDepthStandardUncertainty: opticalDepth * sqrt(fit.covariance[0]!),
    exponentStandardUncertainty: sqrt(fit.covariance[4]!),
    curvatureStandardUncertainty: sqrt(fit.covariance[8]!),
    covariance: fit.covariance,
    chiSquare: fit.chiSquare,
  };
}

/** Exponent and turbidity from optical depths at several wavelengths. */
import { checkList, checkNumber, refuse } from "../_check.js";
import { exp, log, sqrt } from "../_numeric.js";
import type { Dimensionless, Nanometres } from "../units.js";
import { type Covariance2, weightedLine } from "./_weightedLine.js";

const NAME = "angstromFit";
const TURBIDITY_NM = 1000;

/** What `angstromFit` returns. */
export interface AngstromResult {
  /** Exponent: optical depth falls as wavelength to this power. */
  readonly exponent: Dimensionless;
  /** Turbidity: the fitted optical depth at 1000 nm. */
  readonly turbidity: Dimensionless;
  /** Standard error of the exponent. */
  readonly exponentStandardError: Dimensionless;
  /** Standard error of the turbidity. */
  readonly turbidityStandardError: Dimensionless;
  /** Covariance matrix of exponent and turbidity, in that order. */
  readonly covariance: Covariance2;
}

/**
 * Ångström's exponent and turbidity from optical depths at three or more wavelengths.
 *
 * Model: optical depth = turbidity × (wavelength / 1000 nm)^-exponent, fitted by least squares to the logarithms with equal
 * weights. The errors come from the scatter about the power law, a real curvature included; with three wavelengths one
 * degree of freedom carries them.
 * Validity: wavelengths 200 to 4000 nm, not all equal; optical depths above 0 (a depth that noise made zero or negative has no
 * logarithm: leave its wavelength out). `angstromOpticalDepth` goes the other way.
 * Accuracy: recovers exponent and turbidity of an exact power law to 1e-12 where the wavelengths span a factor of 1.2; with 2 % of independent scatter on six wavelengths
 * the stated errors match the spread of 4000 simulated fits to 5 %.
 * Source: Ångström 1929, Geografiska Annaler 11, 156 (from memory).
 *
 * @param wavelengthsNm - 200 to 4000 nm, at least three
 * @param opticalDepths - as many, above 0, to 100
 * @returns exponent and turbidity (optical depth at 1000 nm), their standard errors and covariance
 * @throws TypeError if a list or a value is of the wrong kind; RangeError if there are fewer than three wavelengths, the lengths
 *   differ, a value is out of range or all wavelengths are the same
 * @example
 * import { angstromFit } from "airlight";
 * const fit = angstromFit([412, 500, 675, 862], [0.19, 0.15, 0.10, 0.074]);
 * fit.exponent; // => 1.2877
 * fit.turbidity; // => 0.060871
 */
export function angstromFit(
  wavelengthsNm: ArrayLike<Nanometres>,
  opticalDepths: ArrayLike<Dimensionless>,
): AngstromResult {
  checkList(wavelengthsNm, 3, "wavelengthsNm", NAME);
  checkList(opticalDepths, 3, "opticalDepths", NAME);
  checkValues(wavelengthsNm, opticalDepths);
  const x = Float64Array.from(wavelengthsNm, (wavelengthNm) => log(wavelengthNm / TURBIDITY_NM));
  const y = Float64Array.from(opticalDepths, log);
  const { intercept, slope, covariance } = weightedLine(x, y, new Float64Array(x.length).fill(1));
  const [[varianceLog, shared], [, varianceSlope]] = covariance;
  const turbidity = exp(intercept);
  return {
    exponent: -slope,
    turbidity,
    exponentStandardError: sqrt(varianceSlope),
    turbidityStandardError: turbidity * sqrt(varianceLog),
    covariance: [
      [varianceSlope, -turbidity * shared],
      [-turbidity * shared, turbidity * turbidity * varianceLog],
    ],
  };
}

function checkValues(wavelengthsNm: ArrayLike<number>, opticalDepths: ArrayLike<number>): void {
  if (wavelengthsNm.length !== opticalDepths.length) {
    const got = `${wavelengthsNm.length}, got ${opticalDepths.length}`;
    throw new RangeError(`${NAME}: opticalDepths must be as many as wavelengthsNm, ${got}`);
  }
  for (let i = 0; i < wavelengthsNm.length; i++) {
    checkNumber(wavelengthsNm[i], 200, 4000, "nm", `wavelengthsNm[${i}]`, NAME);
    const depth = opticalDepths[i];
    if (typeof depth === "number" && depth > 0 && depth <= 100) continue;
    refuse(depth, "above 0, to 100", "leave this wavelength out?", `opticalDepths[${i}]`, NAME);
  }
  if (Array.from(wavelengthsNm).some((wavelengthNm) => wavelengthNm !== wavelengthsNm[0])) return;
  throw new RangeError(`${NAME}: wavelengthsNm must differ, got ${wavelengthsNm[0]} nm throughout`);
}

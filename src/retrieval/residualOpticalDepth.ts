/** Optical depth left over in a reading after the known constituents. */
import { checkList, checkNumber, checkRecord } from "../_check.js";
import { log } from "../_numeric.js";
import type { Dimensionless } from "../units.js";
import { checkAirMass } from "./_checkAirMass.js";

const NAME = "residualOpticalDepth";

/** One known constituent on its own way through the air. */
export interface KnownTerm {
  /** Vertical optical depth. */
  readonly opticalDepth: Dimensionless;
  /** Air mass of this constituent, above 0, to 50. */
  readonly airMass: Dimensionless;
}

/** The way to the sun at the moment of the reading. */
export interface SlantPath {
  /** The known constituents, each with its own air mass; may be empty. */
  readonly terms: readonly KnownTerm[];
  /** Air mass of what is left, above 0, to 50. */
  readonly airMass: Dimensionless;
}

/**
 * Vertical optical depth that a reading leaves after each known constituent on its own air mass.
 *
 * Model: (ln(constant / signal) - Σ optical depth × air mass) / air mass of the rest. Noise or a wrong constant can make it
 * negative; it is returned as it is. A correction that is no constituent (curvature of a wide band) goes in as a term of
 * its own, of either sign.
 * Validity: monochromatic light, or depths averaged over the band.
 * Accuracy: 4e-16 on a case worked to 50 digits (mpmath); what matters is the constant: 1 % of it is 0.00995 of slant
 * depth.
 * Source: law of Bouguer, Lambert and Beer.
 *
 * @param signal - reading, reduced to 1 au, above 0, in the unit of `constant`
 * @param constant - signal outside the air at 1 au, above 0
 * @param path - `terms`, the known constituents, and `airMass` of the rest, above 0, to 50
 * @returns vertical optical depth of the rest
 * @throws TypeError if an argument is of the wrong kind; RangeError if a value is out of range
 * @example
 * import { residualOpticalDepth } from "airlight";
 * const terms = [{ opticalDepth: 0.14, airMass: 2.9 }, { opticalDepth: 0.01, airMass: 2.8 }];
 * residualOpticalDepth(1.1, 2.0, { terms, airMass: 3 }); // => 0.05461233
 */
export function residualOpticalDepth(
  signal: number,
  constant: number,
  path: SlantPath,
): Dimensionless {
  checkNumber(signal, Number.MIN_VALUE, Number.MAX_VALUE, "", "signal", NAME);
  checkNumber(constant, Number.MIN_VALUE, Number.MAX_VALUE, "", "constant", NAME);
  checkRecord(path, "path", NAME);
  checkList(path.terms, 0, "path.terms", NAME);
  checkAirMass(path.airMass, "path.airMass", NAME);
  let slant = log(constant / signal);
  path.terms.forEach((term, i) => {
    checkRecord(term, `path.terms[${i}]`, NAME);
    checkNumber(term.opticalDepth, -100, 100, "", `path.terms[${i}].opticalDepth`, NAME);
    checkAirMass(term.airMass, `path.terms[${i}].airMass`, NAME);
    slant -= term.opticalDepth * term.airMass;
  });
  return slant / path.airMass;
}

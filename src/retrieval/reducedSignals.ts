/** Readings as they would be at 1 au without the constituents that have an air mass of their own. */
import { checkList, checkNumber, checkRecord } from "../_check.js";
import { exp } from "../_numeric.js";
import type { AstronomicalUnits, Dimensionless } from "../units.js";

const NAME = "reducedSignals";

/** One known constituent along a morning. */
export interface KnownColumn {
  /** Vertical optical depth: one number, or one for each reading. */
  readonly opticalDepth: Dimensionless | ArrayLike<Dimensionless>;
  /** Air mass of this constituent at each reading. */
  readonly airMasses: ArrayLike<Dimensionless>;
}

/** What is taken out of the readings. */
export interface SignalReduction {
  /** Distance of the sun at each reading or one for all, au. */
  readonly sunDistanceAu: AstronomicalUnits | ArrayLike<AstronomicalUnits>;
  /** The known constituents; may be empty. */
  readonly terms: readonly KnownColumn[];
}

/**
 * Signals reduced to 1 au and freed of known constituents, each on its own air mass: what `langleyFit` wants.
 *
 * Model: signal × distance² × exp(Σ optical depth × air mass).
 * Validity: monochromatic light or depths averaged over the band. A NaN in any list gives NaN at that place.
 * Accuracy: 5e-16 relative times (1 + slant depth), against direct arithmetic, to a slant depth of 20.
 * Source: law of Bouguer, Lambert and Beer; inverse square law.
 *
 * @param signals - readings in any linear unit
 * @param reduction - `sunDistanceAu`, 0.9 to 1.1 au; `terms`, the known constituents
 * @returns the reduced signals, in the same unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if lengths differ or one distance or depth for all is out of range
 * @example
 * import { reducedSignals } from "airlight";
 * const terms = [{ opticalDepth: 0.1, airMasses: [2, 3] }];
 * reducedSignals([1, 1], { sunDistanceAu: 1, terms })[1]; // => 1.34986
 */
export function reducedSignals(
  signals: ArrayLike<number>,
  reduction: SignalReduction,
): Float64Array {
  checkList(signals, 0, "signals", NAME);
  checkRecord(reduction, "reduction", NAME);
  checkList(reduction.terms, 0, "reduction.terms", NAME);
  const distance = valueAt(reduction.sunDistanceAu, signals.length, "sunDistanceAu", 0.9, 1.1);
  const terms = reduction.terms.map((term, k) => {
    checkRecord(term, `terms[${k}]`, NAME);
    checkLength(term.airMasses, signals.length, `terms[${k}].airMasses`);
    const depth = `terms[${k}].opticalDepth`;
    const depthAt = valueAt(term.opticalDepth, signals.length, depth, -100, 100);
    return (i: number): number => depthAt(i) * term.airMasses[i]!;
  });
  return Float64Array.from(signals, (signal, i) => {
    const slant = terms.reduce((sum, term) => sum + term(i), 0);
    return signal * distance(i) * distance(i) * exp(slant);
  });
}

/** A number for all readings or one for each, as a function of the reading. */
function valueAt(
  given: number | ArrayLike<number>,
  length: number,
  argument: string,
  low: number,
  high: number,
): (i: number) => number {
  if (typeof given === "object" && given !== null) {
    checkLength(given, length, argument);
    return (i) => given[i]!;
  }
  checkNumber(given, low, high, "", argument, NAME);
  return () => given;
}

function checkLength(list: unknown, wanted: number, argument: string): void {
  checkList(list, 0, argument, NAME);
  if (list.length === wanted) return;
  throw new RangeError(
    `${NAME}: ${argument} must be as many as signals, ${wanted}, got ${list.length}`,
  );
}

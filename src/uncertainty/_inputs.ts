/** What `propagate` and `monteCarlo` take, and the checks both make of it. */
import { checkNumber, checkRecord, refuse } from "../_check.js";

/** What is known of one input: an estimate and how far it may be off. */
export interface UncertainInput {
  /** Best estimate, in the input's own unit. */
  readonly value: number;
  /** Standard uncertainty (one standard deviation), same unit, 0 for an exact input. */
  readonly standardUncertainty: number;
  /** Degrees of freedom of the standard uncertainty, at least 1; Infinity if left out. Used by `propagate` alone. */
  readonly degreesOfFreedom?: number;
  /** Shape of what is known; "normal" if left out. Used by `monteCarlo` alone. */
  readonly distribution?: "normal" | "rectangular" | "triangular" | "arcsine";
}

/** How two inputs go together. */
export interface Correlation<Name extends string = string> {
  /** Names of the two inputs. */
  readonly between: readonly [Name, Name];
  /** Correlation coefficient, -1 to 1. */
  readonly coefficient: number;
}

/** A pure function of named inputs. It must not keep or change the record it is given. */
export type Model<Name extends string> = (values: Readonly<Record<Name, number>>) => number;

/** Throws unless every input is sound; returns the names in the caller's order. */
export function checkInputs<Name extends string>(
  inputs: Readonly<Record<Name, UncertainInput>>,
  functionName: string,
): Name[] {
  checkRecord(inputs, "inputs", functionName);
  const names = Object.keys(inputs) as Name[];
  for (const name of names) {
    const input = inputs[name];
    checkRecord(input, `inputs.${name}`, functionName);
    const largest = Number.MAX_VALUE;
    checkNumber(input.value, -largest, largest, "", `inputs.${name}.value`, functionName);
    const spread = `inputs.${name}.standardUncertainty`;
    checkNumber(input.standardUncertainty, 0, largest, "", spread, functionName);
    const { degreesOfFreedom = 1 } = input;
    checkNumber(degreesOfFreedom, 1, Infinity, "", `inputs.${name}.degreesOfFreedom`, functionName);
  }
  return names;
}

/** The correlation matrix, row by row, in the order of `names`; throws on a name or coefficient that cannot be. */
export function correlationMatrix<Name extends string>(
  names: readonly Name[],
  correlations: readonly Correlation<Name>[],
  functionName: string,
): Float64Array {
  const n = names.length;
  const matrix = new Float64Array(n * n);
  for (let i = 0; i < n; i++) matrix[i * n + i] = 1;
  for (const { between, coefficient } of correlations) {
    checkNumber(coefficient, -1, 1, "", "correlations' coefficient", functionName);
    const [i, j] = [names.indexOf(between[0]), names.indexOf(between[1])];
    if (i < 0 || j < 0 || i === j) {
      refuse(between.join(", "), "the names of two different inputs", "", "between", functionName);
    }
    matrix[i * n + j] = coefficient;
    matrix[j * n + i] = coefficient;
  }
  return matrix;
}

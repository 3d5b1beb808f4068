/** The budget table that `uncertainty` and `retrieval` share: neither room needs the other for it. */
import { sqrt } from "./_numeric.js";

/** One line of a budget: what one input does to the result. */
export interface BudgetRow {
  /** Name of the input. */
  readonly input: string;
  /** Its standard uncertainty, in its own unit. */
  readonly standardUncertainty: number;
  /** Change of the result per unit of the input, in the result's unit over the input's. */
  readonly sensitivity: number;
  /** Standard uncertainty of the result due to this input alone, in the result's unit, never negative. */
  readonly contribution: number;
  /** Its part of the result's variance; 0 where the result has none. */
  readonly share: number;
}

/** A result's standard uncertainty with the table it comes from. */
export interface Budget {
  /** Combined standard uncertainty, in the result's unit. */
  readonly standardUncertainty: number;
  /** One row per input, in the caller's order. */
  readonly budget: readonly BudgetRow[];
}

/** Budget of independent inputs: contributions add as squares. */
export function independentBudget(
  parts: readonly {
    readonly input: string;
    readonly standardUncertainty: number;
    readonly sensitivity: number;
  }[],
): Budget {
  let variance = 0;
  for (const { standardUncertainty, sensitivity } of parts) {
    const contribution = standardUncertainty * sensitivity;
    variance += contribution * contribution;
  }
  const budget = parts.map((part) => {
    const contribution = Math.abs(part.standardUncertainty * part.sensitivity);
    const share = variance > 0 ? (contribution * contribution) / variance : 0;
    return { ...part, contribution, share };
  });
  return { standardUncertainty: sqrt(variance), budget };
}

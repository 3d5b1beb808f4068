/** What every result with an uncertainty carries: how it adds up. @module budget */

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

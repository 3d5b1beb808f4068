/** Propagation of distributions by Monte Carlo. */
import type { Budget } from "../budget.js";
import { checkNumber, checkRecord, refuse } from "../_check.js";
import { checkFunction } from "../_checkFunction.js";
import type { Fraction } from "../units.js";
import { prepareDraws } from "./_draws.js";
import { checkInputs, type Correlation, type Model, type UncertainInput } from "./_inputs.js";
import { blockSize, isStable } from "./_stability.js";
import { type Summary, summarise } from "./_summary.js";
import { budgetRow, joined, runTrials } from "./_trials.js";
import type { RandomSource } from "./seededRandom.js";

/** What `monteCarlo` must or may be told beyond model and inputs. */
export interface MonteCarloOptions<Name extends string> {
  /** Where the random numbers come from, for instance `seededRandom(1)`. */
  readonly random: RandomSource;
  /** Correlations of normally distributed inputs; pairs not listed are independent. */
  readonly correlations?: readonly Correlation<Name>[];
  /** Probability of the intervals, 0.5 to 0.999; 0.95 if left out. */
  readonly coverage?: Fraction;
  /** Significant digits of the standard uncertainty that must stand still, 1 to 3; 2 if left out. */
  readonly digits?: number;
  /** Trials after which to stop anyway, 50 000 to 100 000 000; 5 000 000 if left out (40 MB). */
  readonly mostTrials?: number;
}

/** Result of `monteCarlo`. */
export interface MonteCarloResult extends Budget {
  /** Mean of the trials. */
  readonly value: number;
  /** Interval with as many trials below it as above. */
  readonly interval: readonly [number, number];
  /** The shortest interval that holds as many trials. */
  readonly shortestInterval: readonly [number, number];
  /** Number of trials made, without those for the budget. */
  readonly trials: number;
  /** Whether mean, standard uncertainty and interval stood still to the wanted digits before `mostTrials`. */
  readonly stable: boolean;
}

/**
 * Value of a model, its standard uncertainty and coverage intervals by drawing the inputs at random; for models that bend.
 *
 * Model: at least five blocks of 10 000 trials (more where the coverage asks for it) until twice the standard error, over the blocks, of mean, standard uncertainty and interval ends
 * is below half a unit of the last wanted digit of the standard uncertainty. Half-widths of the distributions are √3
 * (rectangular), √6 (triangular), √2 (arcsine) standard uncertainties. The budget varies one input at a time by 10 000
 * trials, the others at their estimates: `sensitivity` is the regression slope, `share` does not add to 1 where inputs act
 * together or are correlated.
 * Validity: any finite model. Correlated inputs must be normal, enforced.
 * Accuracy: Supplement 1's examples 9.2.2 to 9.2.4, 9.3 and 9.4 within what the digits asked for leave (9.3 with two digits: 0.0005 mg
 * of 0.0754, interval ends 0.002 mg; 9.4 with three: 1 %, interval ends 4 % of the standard uncertainty). Where the
 * model is nearly straight it agrees with `propagate` within 2 %.
 * Source: JCGM 101:2008 (GUM Supplement 1), clause 7 (7.9 for the number of trials), annex B for the budget.
 *
 * @param model - pure function of a record of named numbers; it must not keep or change the record
 * @param inputs - `value`, `standardUncertainty` and `distribution` of each input
 * @param options - `random`, and `correlations`, `coverage`, `digits`, `mostTrials`
 * @returns mean, standard uncertainty, intervals, trials and budget, in the model's unit
 * @throws TypeError or RangeError if an input, an option or the matrix of correlations cannot be, or if a trial gives no
 *   finite number; errors of the model pass through
 * @example
 * import { monteCarlo, seededRandom } from "airlight";
 * const square = monteCarlo(({ x }) => x * x, { x: { value: 0, standardUncertainty: 1 } }, { random: seededRandom(1) });
 * square.value; // => 1.0
 * square.shortestInterval[1]; // => 3.82
 */
export function monteCarlo<Name extends string>(
  model: Model<Name>,
  inputs: Readonly<Record<Name, UncertainInput>>,
  options: MonteCarloOptions<Name>,
): MonteCarloResult {
  checkFunction(model, "the inputs' values", "model", "monteCarlo");
  const names = checkInputs(inputs, "monteCarlo");
  const { random, coverage, digits, mostTrials, correlations } = checkOptions(options);
  const draws = prepareDraws(names, inputs, correlations);
  const size = blockSize(coverage);
  const blocks: Float64Array[] = [];
  const summaries: Summary[] = [];
  do {
    const block = runTrials(model, (values) => draws.all(values, random), size);
    blocks.push(block);
    summaries.push(summarise(block, coverage));
  } while (!isStable(summaries, digits) && (blocks.length + 1) * size <= mostTrials);
  const { mean, standardDeviation, ...intervals } = summarise(joined(blocks), coverage);
  return {
    value: mean,
    standardUncertainty: standardDeviation,
    ...intervals,
    trials: blocks.length * size,
    stable: isStable(summaries, digits),
    budget: names.map((name) => budgetRow(model, inputs, draws, random, name, standardDeviation)),
  };
}

/** The options with their defaults, checked. */
function checkOptions<Name extends string>(
  options: MonteCarloOptions<Name>,
): Required<MonteCarloOptions<Name>> {
  checkRecord(options, "options", "monteCarlo");
  const { random, correlations = [], coverage = 0.95, digits = 2, mostTrials = 5e6 } = options;
  if (typeof random !== "function") refuse(random, "a function", "", "random", "monteCarlo");
  checkNumber(coverage, 0.5, 0.999, "fraction", "coverage", "monteCarlo");
  checkNumber(digits, 1, 3, "", "digits", "monteCarlo");
  if (!Number.isInteger(digits)) refuse(digits, "a whole number", "", "digits", "monteCarlo");
  checkNumber(mostTrials, 50_000, 1e8, "", "mostTrials", "monteCarlo");
  return { random, correlations, coverage, digits, mostTrials };
}

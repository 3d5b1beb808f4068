/** The law of propagation of uncertainty. */
import type { Budget } from "../budget.js";
import { checkRecord, refuse } from "../_check.js";
import { checkFunction } from "../_checkFunction.js";
import { sqrt } from "../_numeric.js";
import { combine, effectiveDegrees } from "./_combine.js";
import {
  checkInputs,
  type Correlation,
  correlationMatrix,
  type Model,
  type UncertainInput,
} from "./_inputs.js";
import { sensitivity } from "./_sensitivity.js";

/** What `propagate` may be told beyond model and inputs. */
export interface PropagateOptions<Name extends string> {
  /** Correlations of the inputs; pairs not listed are independent. */
  readonly correlations?: readonly Correlation<Name>[];
  /** Derivatives of the model by single inputs, where the caller has them; the others are found by differences. */
  readonly derivatives?: Partial<Readonly<Record<Name, Model<Name>>>>;
}

/** A value with its uncertainty and budget, made by `propagate`. */
export interface Propagation extends Budget {
  /** The model at the inputs' estimates. */
  readonly value: number;
  /** Effective degrees of freedom (Welch-Satterthwaite); NaN if inputs of finite degrees of freedom are correlated. */
  readonly degreesOfFreedom: number;
  /** Correlation matrix of the inputs, row by row in the budget's order. */
  readonly inputCorrelation: Float64Array;
}

/**
 * Value of a model and its combined standard uncertainty, to first order.
 *
 * Model: variance = sum over all pairs of inputs of sensitivities times covariance. Sensitivities are the caller's
 * derivatives, or central differences at steps of 0.1 and 0.05 standard uncertainties extrapolated to zero. A row's share
 * counts half of each covariance term it takes part in, so shares add to 1 and may be negative.
 * Validity: models nearly straight over two or three standard uncertainties of each input, and defined a tenth of one to
 * both sides. The buoyancy example of Supplement 1 (9.3) is not such a model: 0.0539 mg here, 0.0755 mg in truth, which
 * `monteCarlo` finds.
 * Accuracy: sensitivities 1e-8 relative against exact derivatives of smooth models, for uncertainties of 1e-6 to a tenth of the
 * value; GUM H.1 and H.2 to the printed digits, but for two that are cut there instead of rounded (16.6 for 16.68, 0.295 for 0.2956).
 * Source: GUM 2008 (JCGM 100), equations 13 and 16, 5.2; effective degrees of freedom, equation G.2b.
 *
 * @param model - pure function of a record of named numbers
 * @param inputs - `value`, `standardUncertainty` and, where finite, `degreesOfFreedom` of each input
 * @param options - `correlations` and `derivatives`
 * @returns value, combined standard uncertainty, degrees of freedom and budget, in the model's unit
 * @throws TypeError or RangeError if an input cannot be, a correlation names no input, the matrix of correlations is
 *   impossible for this model (a negative variance), or the model gives no finite number; errors of the model pass through
 * @example
 * import { propagate } from "airlight";
 * const area = propagate(({ a, b }) => a * b, { a: { value: 3, standardUncertainty: 0.1 }, b: { value: 4, standardUncertainty: 0.1 } });
 * area.standardUncertainty; // => 0.5
 * area.budget[0].share; // => 0.64
 */
export function propagate<Name extends string>(
  model: Model<Name>,
  inputs: Readonly<Record<Name, UncertainInput>>,
  options: PropagateOptions<Name> = {},
): Propagation {
  checkFunction(model, "the inputs' values", "model", "propagate");
  const names = checkInputs(inputs, "propagate");
  checkRecord(options, "options", "propagate");
  const { correlations = [], derivatives = {} as PropagateOptions<Name>["derivatives"] } = options;
  const inputCorrelation = correlationMatrix(names, correlations, "propagate");
  const values = Object.fromEntries(names.map((name) => [name, inputs[name].value]));
  const value = finite(model(values as Record<Name, number>), "the value");
  const signed = names.map((name) => {
    const u = inputs[name].standardUncertainty;
    const record = { ...values } as Record<Name, number>;
    const slope = derivatives?.[name]?.(record) ?? sensitivity(model, record, name, u);
    return { input: name, standardUncertainty: u, sensitivity: finite(slope, `slope by ${name}`) };
  });
  const { variance, budget } = combine(signed, inputCorrelation);
  const degreesOfFreedom = effectiveDegrees(
    names.map((name) => inputs[name].degreesOfFreedom ?? Infinity),
    budget,
    inputCorrelation,
  );
  return { value, standardUncertainty: sqrt(variance), degreesOfFreedom, budget, inputCorrelation };
}

function finite(value: number, what: string): number {
  if (Number.isFinite(value)) return value;
  return refuse(value, "a finite number at the inputs' estimates", "", what, "propagate");
}

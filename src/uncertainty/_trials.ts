/** Running a model many times. */
import type { BudgetRow } from "../budget.js";
import { refuse } from "../_check.js";
import { moments } from "../_moments.js";
import type { Draws } from "./_draws.js";
import type { Model, UncertainInput } from "./_inputs.js";
import type { RandomSource } from "./seededRandom.js";

/** The model's values at `count` draws; `draw` fills the record before each. */
export function runTrials<Name extends string>(
  model: Model<Name>,
  draw: (values: Record<Name, number>, trial: number) => void,
  count: number,
): Float64Array {
  const values = {} as Record<Name, number>;
  const results = new Float64Array(count);
  for (let trial = 0; trial < count; trial++) {
    draw(values, trial);
    const result = model(values);
    if (!Number.isFinite(result)) {
      refuse(result, "finite for every draw of the inputs", "", "the model's value", "monteCarlo");
    }
    results[trial] = result;
  }
  return results;
}

/** All blocks in one array. */
export function joined(blocks: readonly Float64Array[]): Float64Array {
  const size = blocks[0]!.length;
  const all = new Float64Array(blocks.length * size);
  blocks.forEach((block, i) => {
    all.set(block, i * size);
  });
  return all;
}

/** What one input does alone, the others at their estimates, from 10 000 trials (Supplement 1, annex B). */
export function budgetRow<Name extends string>(
  model: Model<Name>,
  inputs: Readonly<Record<Name, UncertainInput>>,
  draws: Draws<Name>,
  random: RandomSource,
  name: Name,
  combined: number,
): BudgetRow {
  const { value, standardUncertainty } = inputs[name];
  const steps = new Float64Array(10_000);
  const results = runTrials(
    model,
    (values, trial) => {
      for (const other in inputs) values[other] = inputs[other].value;
      values[name] = draws.one(name, random);
      steps[trial] = values[name] - value;
    },
    standardUncertainty > 0 ? steps.length : 2,
  );
  const { mean, standardDeviation: contribution } = moments(results);
  const middle = moments(steps).mean;
  let [products, squares] = [0, 0];
  for (let i = 0; i < results.length; i++) {
    const step = steps[i]! - middle;
    products += step * (results[i]! - mean);
    squares += step * step;
  }
  return {
    input: name,
    standardUncertainty,
    sensitivity: squares > 0 ? products / squares : 0,
    contribution,
    share: combined > 0 ? (contribution * contribution) / (combined * combined) : 0,
  };
}

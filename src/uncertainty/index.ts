/** From the uncertainties of inputs to the uncertainty of any result. @module uncertainty */
export type { Correlation, Model, UncertainInput } from "./_inputs.js";
export { coverageFactor } from "./coverageFactor.js";
export { type MonteCarloOptions, type MonteCarloResult, monteCarlo } from "./monteCarlo.js";
export { type PropagateOptions, type Propagation, propagate } from "./propagate.js";
export { propagatedCorrelation } from "./propagatedCorrelation.js";
export { type RandomSource, seededRandom } from "./seededRandom.js";

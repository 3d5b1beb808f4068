/** Readings back to calibration, optical depths, exponent and turbidity. @module retrieval */
export { type AngstromResult, angstromFit } from "./angstromFit.js";
export {
  type LangleyInput,
  type LangleyResult,
  langleyFit,
  type RejectedReading,
} from "./langleyFit.js";
export { type KnownTerm, residualOpticalDepth, type SlantPath } from "./residualOpticalDepth.js";
export type { Covariance2 } from "./_weightedLine.js";

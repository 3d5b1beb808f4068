/** The sum of a budget, for `uncertainty` and `retrieval` alike: neither room needs the other for it. */
import { sqrt } from "./_numeric.js";
import type { Budget } from "./budget.js";

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

/** From the fit of one passband to the record `extinctionFit` returns. */
import { sqrt } from "../_numeric.js";
import type { CleanedPlane } from "./_cleanedPlane.js";
import type { BandExtinction, Coefficient, ExtinctionTerms } from "./extinctionFit.js";

/** Coefficients with errors from the scatter of the kept observations; `places`: their indices in the caller's list. */
export function bandResult(
  band: string,
  places: readonly number[],
  weights: Float64Array,
  terms: ExtinctionTerms,
  { fit, kept, scores }: CleanedPlane,
): BandExtinction {
  const count = fit.unknowns.length;
  const perDegree = fit.chiSquare / (kept.length - count);
  const covariance = fit.covariance.map((value) => value * perDegree);
  const at = (k: number, fitted: boolean): Coefficient =>
    fitted
      ? { value: fit.unknowns[k]!, standardUncertainty: sqrt(covariance[k * count + k]!) }
      : { value: 0, standardUncertainty: 0 };
  const meanWeight = kept.reduce((sum, i) => sum + weights[i]!, 0) / kept.length;
  return {
    band,
    zeroPoint: at(0, true),
    extinction: at(1, true),
    secondOrder: at(2, terms.secondOrder),
    colourTerm: at(terms.secondOrder ? 3 : 2, terms.colourTerm),
    covariance,
    scatter: sqrt(perDegree / meanWeight),
    rejected: places.flatMap((index, i) => {
      if (kept.includes(i)) return [];
      return [
        {
          index,
          reason: `${Math.abs(scores[i]!).toFixed(1)} robust scales from the fit in ${band}`,
        },
      ];
    }),
  };
}

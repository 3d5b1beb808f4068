/** What the errors of the optical depths make of exponent and turbidity. */
import { type AerosolOpticalDepth, opticalDepthCovariance } from "airlight";
import { SHARED_LINES } from "./depthBudget.js";
import { mean } from "./lines.js";

/** Standard uncertainties of a power law. */
export interface PowerLawUncertainty {
  readonly exponent: number;
  /** Relative. */
  readonly turbidity: number;
}

/** From the covariance of the depths through the straight line of their logarithms, to first order. */
export function powerLawUncertainty(
  wavelengthsNm: readonly number[],
  depths: readonly AerosolOpticalDepth[],
): PowerLawUncertainty {
  const covariance = opticalDepthCovariance(depths, SHARED_LINES);
  const x = wavelengthsNm.map((nm) => Math.log(nm / 1000));
  const middle = mean(x);
  const spread = x.reduce((sum, value) => sum + (value - middle) ** 2, 0);
  const slope = x.map((value) => (value - middle) / spread);
  const count = depths.length;
  const through = (weights: readonly number[]): number => {
    const steps = weights.map((weight, i) => weight / depths[i]!.opticalDepth);
    const variance = steps.reduce(
      (sum, a, i) => sum + a * steps.reduce((s, b, j) => s + b * covariance[i * count + j]!, 0),
      0,
    );
    return Math.sqrt(Math.max(0, variance));
  };
  return {
    exponent: through(slope),
    turbidity: through(slope.map((weight) => 1 / count - middle * weight)),
  };
}

/** Derivative of a model by one input, by differences. */
import type { Model } from "./_inputs.js";

/**
 * Central difference with steps of a tenth and a twentieth of the standard uncertainty, extrapolated to step 0 (Richardson),
 * so that terms up to the fourth derivative cancel. The step is at least 1e-8 of the value, so that rounding stays below
 * about 1e-7 of value times derivative; an exact input gets a step of 1e-5 of its value, or 1e-6 if that is 0.
 */
export function sensitivity<Name extends string>(
  model: Model<Name>,
  values: Record<Name, number>,
  name: Name,
  standardUncertainty: number,
): number {
  const centre = values[name];
  const least = (standardUncertainty > 0 ? 1e-8 : 1e-5) * Math.abs(centre);
  const step = Math.max(0.1 * standardUncertainty, least) || 1e-6;
  const slope = (h: number): number => {
    const [above, below] = [centre + h, centre - h];
    values[name] = above;
    const high = model(values);
    values[name] = below;
    return (high - model(values)) / (above - below);
  };
  const coarse = slope(step);
  const fine = slope(0.5 * step);
  values[name] = centre;
  return fine + (fine - coarse) / 3;
}

/** Draws of the inputs for Monte Carlo. */
import { refuse } from "../_check.js";
import { choleskyRoot } from "../_choleskyRoot.js";
import { normalQuantile } from "../_normalQuantile.js";
import { cos, sqrt } from "../_numeric.js";
import { correlationMatrix, type Correlation, type UncertainInput } from "./_inputs.js";
import type { RandomSource } from "./seededRandom.js";

/** From a uniform number to a deviate of mean 0 and standard deviation 1, by the inverse of each distribution function. */
const DEVIATES: Readonly<Record<string, (u: number) => number>> = {
  normal: (u) => normalQuantile(u === 0 ? 5.551115123125783e-17 : u),
  rectangular: (u) => 1.7320508075688772 * (2 * u - 1),
  triangular: (u) => 2.449489742783178 * (u < 0.5 ? sqrt(2 * u) - 1 : 1 - sqrt(2 - 2 * u)),
  arcsine: (u) => -1.4142135623730951 * cos(Math.PI * u),
};

/** Prepared draws of all inputs. */
export interface Draws<Name extends string> {
  /** Fills `values` with a draw of every input. */
  readonly all: (values: Record<Name, number>, random: RandomSource) => void;
  /** One draw of one input alone. */
  readonly one: (name: Name, random: RandomSource) => number;
}

/** Draws of `inputs`; throws on an unknown distribution, on correlated inputs that are not normal, on an impossible matrix. */
export function prepareDraws<Name extends string>(
  names: readonly Name[],
  inputs: Readonly<Record<Name, UncertainInput>>,
  correlations: readonly Correlation<Name>[],
): Draws<Name> {
  const deviates = names.map((name) => deviateOf(name, inputs, correlations));
  const count = names.length;
  const root = choleskyRoot(correlationMatrix(names, correlations, "monteCarlo"), count);
  if (root === undefined) {
    throw new RangeError("monteCarlo: correlations must be coefficients that can hold together");
  }
  const standard = new Float64Array(count);
  const place = (i: number, deviate: number): number =>
    inputs[names[i]!].value + inputs[names[i]!].standardUncertainty * deviate;
  return {
    all: (values, random) => {
      for (let i = 0; i < count; i++) {
        standard[i] = deviates[i]!(random());
        let sum = root[i * count + i]! * standard[i]!;
        for (let j = 0; j < i; j++) sum += root[i * count + j]! * standard[j]!;
        values[names[i]!] = place(i, sum);
      }
    },
    one: (name, random) => place(names.indexOf(name), deviates[names.indexOf(name)]!(random())),
  };
}

function deviateOf<Name extends string>(
  name: Name,
  inputs: Readonly<Record<Name, UncertainInput>>,
  correlations: readonly Correlation<Name>[],
): (u: number) => number {
  const { distribution = "normal" } = inputs[name];
  const argument = `inputs.${name}.distribution`;
  const deviate = DEVIATES[distribution];
  if (deviate === undefined) {
    return refuse(
      distribution,
      `one of ${Object.keys(DEVIATES).join(", ")}`,
      "",
      argument,
      "monteCarlo",
    );
  }
  if (distribution !== "normal" && correlations.some(({ between }) => between.includes(name))) {
    refuse(distribution, "normal if it is correlated", "", argument, "monteCarlo");
  }
  return deviate;
}

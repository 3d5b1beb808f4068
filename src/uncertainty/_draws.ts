/** Draws of the inputs for Monte Carlo. */
import { refuse } from "../_check.js";
import { normalQuantile } from "../_normalQuantile.js";
import { cos, sqrt } from "../_numeric.js";
import { correlationMatrix, type Correlation, type UncertainInput } from "./_inputs.js";
import type { RandomSource } from "./seededRandom.js";

/** From a uniform number to a deviate of mean 0 and standard deviation 1, by the inverse of each distribution function. */
const DEVIATES: Readonly<Record<string, (u: number) => number>> = {
  normal: (u) => normalQuantile(u === 0 ? 2 ** -54 : u),
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
  const deviates = names.map((name) => {
    const { distribution = "normal" } = inputs[name];
    const known = Object.keys(DEVIATES).join(", ");
    if (DEVIATES[distribution]) return DEVIATES[distribution];
    return refuse(distribution, `one of ${known}`, "", `inputs.${name}.distribution`, "monteCarlo");
  });
  for (const name of correlations.flatMap(({ between }) => between)) {
    const { distribution = "normal" } = inputs[name] ?? {};
    if (distribution === "normal") continue;
    refuse(
      distribution,
      "normal if it is correlated",
      "",
      `inputs.${name}.distribution`,
      "monteCarlo",
    );
  }
  const root = choleskyRoot(correlationMatrix(names, correlations, "monteCarlo"), names.length);
  const standard = new Float64Array(names.length);
  const place = (i: number, deviate: number): number =>
    inputs[names[i]!].value + inputs[names[i]!].standardUncertainty * deviate;
  return {
    all: (values, random) => {
      for (let i = 0; i < names.length; i++) {
        standard[i] = deviates[i]!(random());
        let sum = root[i * names.length + i]! * standard[i]!;
        for (let j = 0; j < i; j++) sum += root[i * names.length + j]! * standard[j]!;
        values[names[i]!] = place(i, sum);
      }
    },
    one: (name, random) => place(names.indexOf(name), deviates[names.indexOf(name)]!(random())),
  };
}

/** Lower triangular root of a correlation matrix; inputs that follow wholly from earlier ones get a zero column. */
function choleskyRoot(matrix: Float64Array, n: number): Float64Array {
  const root = new Float64Array(n * n);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j]!;
      for (let k = 0; k < j; k++) sum -= root[i * n + k]! * root[j * n + k]!;
      const pivot = root[j * n + j]!;
      if (i === j && sum < -1e-9) {
        refuse(sum, "coefficients that can hold together", "", "correlations", "monteCarlo");
      }
      root[i * n + j] = i === j ? sqrt(Math.max(0, sum)) : pivot > 1e-7 ? sum / pivot : 0;
    }
  }
  return root;
}

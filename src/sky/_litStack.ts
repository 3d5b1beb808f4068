/** One azimuth mode lit by the sun, in the form lines of sight are integrated from. */
import { plus } from "./_matrix.js";
import { exp } from "../_numeric.js";
import type { LayerModes } from "./_layerModes.js";
import { addBeam, type BeamSource, sunSource } from "./_sunBeam.js";
import { type Amplitudes, darkSources, type Stack, type StackField } from "./_stack.js";
import { solveStack } from "./_solveStack.js";
import type { Zeros } from "./_zeros.js";

/** Source of one layer: its eigenmodes' amplitudes, albedo included, and what follows the beam. */
export interface LitLayer extends Amplitudes {
  readonly beams: readonly BeamSource[];
}

/** A lit azimuth mode. */
export interface LitStack {
  readonly stack: Stack;
  readonly layers: readonly LitLayer[];
  /** The field at the boundaries. */
  readonly field: StackField;
}

/** Lights a stack, over a black ground, with a sunbeam of flux π carried by `secants`, each with an equal share. */
export function litStack(
  zeros: Zeros,
  stack: Stack,
  secants: readonly number[],
  cosine: number,
): LitStack {
  const sources = darkSources(zeros, stack);
  const share = 1 / secants.length;
  const beams = stack.layers.map((): BeamSource[] => []);
  const [first, second] = sunSource(stack, cosine);
  for (const secant of secants) {
    let depth = 0;
    for (const [l, layer] of stack.layers.entries()) {
      const left = share * layer.albedo * exp(-secant * depth);
      beams[l]!.push({ secant, first: first * left, second: second * left });
      depth += layer.depth;
      addBeam(layer, sources[l]!, beams[l]!.at(-1)!);
    }
  }
  const field = solveStack(zeros, stack, sources, zeros(stack.kernel.size));
  const layers = stack.layers.map((layer, l) =>
    litLayer(zeros, layer, field.amplitudes[l]!, beams[l]!),
  );
  return { stack, layers, field };
}

/** Sorts a solved layer by form: what the particular solution adds goes to the beams and is taken from the eigenmodes. */
function litLayer(
  zeros: Zeros,
  layer: LayerModes,
  solved: Amplitudes,
  beams: readonly BeamSource[],
): LitLayer {
  const { albedo } = layer;
  const even = plus(zeros, zeros(solved.even.length), albedo, solved.even);
  const odd = plus(zeros, zeros(solved.odd.length), albedo, solved.odd);
  const all = beams.map((beam): BeamSource => {
    const { secant } = beam;
    const left = exp(-secant * layer.depth);
    let { first, second } = beam;
    for (let m = 0; m < even.length; m++) {
      const drive = layer.first[m]! * beam.first + layer.second[m]! * beam.second;
      const part = (2 * albedo * drive) / (layer.squares[m]! - secant * secant);
      first += layer.first[m]! * part;
      second += layer.second[m]! * part;
      even[m]! -= 0.5 * part * (1 + left);
      odd[m]! -= 0.5 * part * (1 - left);
    }
    return { secant, first, second };
  });
  return { even, odd, beams: all };
}

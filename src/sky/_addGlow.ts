/** The light of the ground in a lit azimuth mode. */
import type { LitStack } from "./_litStack.js";
import { plus } from "./_matrix.js";
import type { StackField } from "./_stack.js";
import type { Zeros } from "./_zeros.js";

/** The same mode with the light of a ground of radiance `radiance` added. */
export function addGlow(zeros: Zeros, lit: LitStack, glow: StackField, radiance: number): LitStack {
  if (radiance === 0) return lit;
  const layers = lit.layers.map((layer, l) => {
    const scale = radiance * lit.stack.layers[l]!.albedo;
    const { even, odd } = glow.amplitudes[l]!;
    return {
      even: plus(zeros, layer.even, scale, even),
      odd: plus(zeros, layer.odd, scale, odd),
      beams: layer.beams,
    };
  });
  return { ...lit, layers };
}

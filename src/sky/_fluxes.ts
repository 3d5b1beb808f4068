/** Fluxes of a solved mode 0 at every boundary of its stack. */
import { evenGlow, fieldFlux } from "./_ground.js";
import type { Stack, StackField } from "./_stack.js";
import { bottomField, topField } from "./_stackEnds.js";
import type { Zeros } from "./_zeros.js";

/** Diffuse fluxes at the boundaries, from the top down. */
export interface DiffuseFluxes {
  readonly down: Float64Array;
  readonly up: Float64Array;
}

/** Diffuse fluxes of `field`, in units of its sources. */
export function diffuseFluxes(zeros: Zeros, stack: Stack, field: StackField): DiffuseFluxes {
  const count = stack.layers.length;
  const { secants } = stack.kernel;
  const glow = evenGlow(zeros, stack.kernel);
  const down = zeros(count + 1);
  const up = zeros(count + 1);
  for (let b = 1; b < count; b++) down[b] = fieldFlux(field.down[b]!, glow, secants);
  for (let b = 1; b <= count; b++) up[b] = fieldFlux(field.up[b - 1]!, glow, secants);
  if (count === 0) {
    up[0] = fieldFlux(field.up[0]!, glow, secants);
  } else {
    up[0] = fieldFlux(topField(zeros, stack, field), glow, secants);
    down[count] = fieldFlux(bottomField(zeros, stack, field), glow, secants);
  }
  return { down, up };
}

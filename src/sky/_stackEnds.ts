/** Fields at the two ends of a solved stack. */
import type { Stack, StackField } from "./_stack.js";
import { plus } from "./_matrix.js";
import { leaving } from "./_sweep.js";

/** Field that leaves the top of the stack. */
export function topField(stack: Stack, field: StackField): Float64Array {
  return leaving(stack.layers[0]!, field.amplitudes[0]!, 1, stack.kernel.secants);
}

/** Diffuse field that reaches the bottom of the stack. */
export function bottomField(stack: Stack, field: StackField): Float64Array {
  const last = stack.layers.length - 1;
  const total = leaving(stack.layers[last]!, field.amplitudes[last]!, -1, stack.kernel.secants);
  return plus(total, -1, field.up[last]!);
}

/** Fields at the two ends of a solved stack. */
import type { Stack, StackField } from "./_stack.js";
import { plus } from "./_matrix.js";
import { leaving } from "./_sweep.js";
import type { Zeros } from "./_zeros.js";

/** Field that leaves the top of the stack. */
export function topField(zeros: Zeros, stack: Stack, field: StackField): Float64Array {
  return leaving(zeros, stack.layers[0]!, field.amplitudes[0]!, 1, stack.kernel.secants);
}

/** Diffuse field that reaches the bottom of the stack. */
export function bottomField(zeros: Zeros, stack: Stack, field: StackField): Float64Array {
  const last = stack.layers.length - 1;
  const total = leaving(
    zeros,
    stack.layers[last]!,
    field.amplitudes[last]!,
    -1,
    stack.kernel.secants,
  );
  return plus(zeros, total, -1, field.up[last]!);
}

/** Lines of sight: the source of each layer integrated along them. */
import { exp } from "../_numeric.js";
import { passedOn } from "./_beam.js";
import type { LayerModes } from "./_layerModes.js";
import type { LitLayer, LitStack } from "./_litStack.js";

/** What one azimuth mode sends along a line of sight of secant `view`: its two components, written to `out`. */
export function sightComponents(
  lit: LitStack,
  view: number,
  upward: boolean,
  out: Float64Array,
): void {
  const { layers } = lit.stack;
  const count = layers.length;
  let first = 0;
  let second = 0;
  // from the far side to the near side, what has been gathered fades in each layer
  for (let step = 0; step < count; step++) {
    const l = upward ? count - 1 - step : step;
    const left = exp(-view * layers[l]!.depth);
    layerComponents(layers[l]!, lit.layers[l]!, view, left, upward, out);
    first = first * left + out[0]!;
    second = second * left + out[1]!;
  }
  out[0] = first;
  out[1] = second;
}

function layerComponents(
  layer: LayerModes,
  lit: LitLayer,
  view: number,
  left: number,
  upward: boolean,
  out: Float64Array,
): void {
  const { squares, even, odd } = layer;
  const square = view * view;
  const more = 1 + left;
  const less = 1 - left;
  const side = upward ? 1 : -1;
  let first = 0;
  let second = 0;
  for (let m = 0; m < squares.length; m++) {
    const part =
      (lit.even[m]! * (view * less - even[m]! * more) +
        side * lit.odd[m]! * (view * more - odd[m]! * less)) /
      (square - squares[m]!);
    first += layer.first[m]! * part;
    second += layer.second[m]! * part;
  }
  for (const beam of lit.beams) {
    const path = upward
      ? (1 - left * exp(-beam.secant * layer.depth)) / (beam.secant + view)
      : passedOn(view, beam.secant, layer.depth);
    first += beam.first * path;
    second += beam.second * path;
  }
  out[0] = view * first;
  out[1] = view * second;
}

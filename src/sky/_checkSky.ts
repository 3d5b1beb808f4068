/** Guards of `prepareSky`. */
import { checkNumber, checkRecord, refuse } from "../_check.js";
import type { SkyInput, SkyLayer } from "./prepareSky.js";

/** Largest depolarisation accepted, as everywhere in the library (6/7 is the physical limit). */
const MOST_DEPOLARISED = 0.5;
/** Deepest layer accepted. */
const DEEPEST = 1e4;

/** Throws unless `input` can be a sky. */
export function checkSky(input: SkyInput): void {
  const name = "prepareSky";
  checkRecord(input, "input", name);
  const { layers, depolarisation, groundAlbedo, streams } = input;
  if (!Array.isArray(layers)) {
    throw new TypeError(`${name}: layers must be an array of records, from the top down`);
  }
  if (layers.length === 0) throw new RangeError(`${name}: layers must hold at least one layer`);
  for (const [l, layer] of (layers as readonly SkyLayer[]).entries()) {
    checkRecord(layer, `layers[${l}]`, name);
    checkNumber(layer.rayleighDepth, 0, DEEPEST, "", `layers[${l}].rayleighDepth`, name);
    checkNumber(layer.absorptionDepth, 0, DEEPEST, "", `layers[${l}].absorptionDepth`, name);
  }
  checkNumber(depolarisation, 0, MOST_DEPOLARISED, "fraction", "depolarisation", name);
  checkNumber(groundAlbedo, 0, 1, "fraction", "groundAlbedo", name);
  if (streams === undefined) return;
  const even = typeof streams !== "number" || (Number.isInteger(streams) && streams % 2 === 0);
  if (!even) refuse(streams, "an even whole number, 16 to 64", "", "streams", name);
  checkNumber(streams, 16, 64, "", "streams", name);
}

/** The checks of what a ray needs; gives the air around the observer ready for tracing. */
import { checkNumber, checkPrepared, checkRecord } from "../_check.js";
import type { ConstituentLayer } from "../air/constituentLayer.js";
import { type RayAir, rayAir } from "./_rayAir.js";
import type { PathInput } from "./pathInput.js";

/** Highest observer, m: above it the air is too thin to speak of. */
const HIGHEST_OBSERVER_M = 80_000;

export function checkPathInput<Key extends string>(
  input: PathInput<Key>,
  functionName: string,
): RayAir {
  checkRecord(input, "input", functionName);
  const { profile, altitudeM, wavelengthNm, earthRadiusM } = input;
  const maker = "standardProfile or tabulatedProfile";
  checkPrepared(profile?.waterPerK, maker, "profile", functionName);
  const { lowestM } = profile;
  checkNumber(altitudeM, lowestM, HIGHEST_OBSERVER_M, "m", "altitudeM", functionName);
  checkNumber(wavelengthNm, 300, 1690, "nm", "wavelengthNm", functionName);
  checkNumber(earthRadiusM, 6_300_000, 6_420_000, "m", "earthRadiusM", functionName);
  const layers = Object.entries(constituentsOf(input, functionName));
  for (const [key, layer] of layers) checkLayer(layer, `constituents.${key}`, functionName);
  const shapes = layers.map(([, layer]) => layer as ConstituentLayer);
  return rayAir(profile, shapes, wavelengthNm, earthRadiusM, altitudeM);
}

/** The caller's keys, in the order of the masses. */
export function constituentsOf<Key extends string>(
  { constituents }: PathInput<Key>,
  functionName: string,
): Readonly<Record<string, unknown>> {
  if (constituents === undefined) return {};
  checkRecord(constituents, "constituents", functionName);
  return constituents;
}

function checkLayer(layer: unknown, argument: string, functionName: string): void {
  checkRecord(layer, argument, functionName);
  const shape = (layer as Partial<ConstituentLayer>).shape;
  if (shape === "gaussian" || shape === "exponential" || shape === "tabulated") return;
  const makers = "gaussianLayer, exponentialLayer or tabulatedLayer";
  throw new TypeError(`${functionName}: ${argument} must be made by ${makers}`);
}

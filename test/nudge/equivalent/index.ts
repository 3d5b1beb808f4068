/** All explanations. */
import { ABSORPTION } from "./absorption.js";
import { AIR } from "./air.js";
import { BEAM } from "./beam.js";
import { COLOUR } from "./colour.js";
import { COLUMN } from "./column.js";
import { PATH } from "./path.js";
import { RETRIEVAL } from "./retrieval.js";
import { SCATTERING } from "./scattering.js";
import { SKY } from "./sky.js";
import { SPECTRUM } from "./spectrum.js";
import { UNCERTAINTY } from "./uncertainty.js";
import type { Equivalent } from "./_equivalent.js";

export type { Equivalent };
export const EQUIVALENT: readonly Equivalent[] = [
  ...SPECTRUM,
  ...AIR,
  ...SCATTERING,
  ...ABSORPTION,
  ...COLUMN,
  ...PATH,
  ...BEAM,
  ...SKY,
  ...COLOUR,
  ...RETRIEVAL,
  ...UNCERTAINTY,
];

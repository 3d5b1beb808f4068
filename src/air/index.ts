/** Moist air at a point, the standard atmosphere, gravity. @module air */
export { type AirAtHeight, airAtHeight } from "./airAtHeight.js";
export type { AirLayer, AirProfile } from "./airProfile.js";
export type {
  ConstituentLayer,
  ExponentialLayer,
  GaussianLayer,
  TabulatedLayer,
} from "./constituentLayer.js";
export { exponentialLayer } from "./exponentialLayer.js";
export { gaussianLayer } from "./gaussianLayer.js";
export { moistAir, type MoistAir, type MoistAirInput } from "./moistAir.js";
export { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";
export { standardAtmosphere, type StandardState } from "./standardAtmosphere.js";
export { type StandardProfileInput, standardProfile } from "./standardProfile.js";
export { tabulatedLayer } from "./tabulatedLayer.js";
export { type ProfileRow, tabulatedProfile } from "./tabulatedProfile.js";

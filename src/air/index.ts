/** Moist air at a point, the standard atmosphere, gravity. @module air */
export { type AirAtHeight, airAtHeight } from "./airAtHeight.js";
export { airDensity } from "./airDensity.js";
export { airNumberDensity } from "./airNumberDensity.js";
export type { AirLayer, AirProfile } from "./airProfile.js";
export { airToVacuumWavelength } from "./airToVacuumWavelength.js";
export type {
  ConstituentLayer,
  ExponentialLayer,
  GaussianLayer,
  TabulatedLayer,
} from "./constituentLayer.js";
export { exponentialLayer } from "./exponentialLayer.js";
export { gaussianLayer } from "./gaussianLayer.js";
export { gravity } from "./gravity.js";
export { groupIndexCiddor } from "./groupIndexCiddor.js";
export { type MoistAir, type MoistAirInput, moistAir } from "./moistAir.js";
export { refractiveIndexBirchDowns } from "./refractiveIndexBirchDowns.js";
export { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";
export { refractiveIndexEdlen } from "./refractiveIndexEdlen.js";
export { refractiveIndexPeckReeder } from "./refractiveIndexPeckReeder.js";
export { type StandardState, standardAtmosphere } from "./standardAtmosphere.js";
export { type StandardProfileInput, standardProfile } from "./standardProfile.js";
export { tabulatedLayer } from "./tabulatedLayer.js";
export { type ProfileRow, tabulatedProfile } from "./tabulatedProfile.js";
export { vacuumToAirWavelength } from "./vacuumToAirWavelength.js";

/** Moist air at a point, the standard atmosphere, gravity. @module air */
export { airDensity } from "./airDensity.js";
export { airNumberDensity } from "./airNumberDensity.js";
export { airToVacuumWavelength } from "./airToVacuumWavelength.js";
export { gravity } from "./gravity.js";
export { groupIndexCiddor } from "./groupIndexCiddor.js";
export { type MoistAir, type MoistAirInput, moistAir } from "./moistAir.js";
export { refractiveIndexBirchDowns } from "./refractiveIndexBirchDowns.js";
export { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";
export { refractiveIndexEdlen } from "./refractiveIndexEdlen.js";
export { refractiveIndexPeckReeder } from "./refractiveIndexPeckReeder.js";
export { type StandardState, standardAtmosphere } from "./standardAtmosphere.js";
export { vacuumToAirWavelength } from "./vacuumToAirWavelength.js";

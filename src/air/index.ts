/** Moist air at a point, the standard atmosphere, gravity. @module air */
export { moistAir, type MoistAir, type MoistAirInput } from "./moistAir.js";
export { refractiveIndexCiddor } from "./refractiveIndexCiddor.js";
export { standardAtmosphere, type StandardState } from "./standardAtmosphere.js";

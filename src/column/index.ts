/** What stands above a site: molecules per square metre, optical depths of each constituent. @module column */
export { type AirColumn, type AirColumnInput, airColumn } from "./airColumn.js";
export { airColumnBodhaine } from "./airColumnBodhaine.js";
export { type AngstromAerosol, angstromOpticalDepth } from "./angstromOpticalDepth.js";
export { nitrogenDioxideOpticalDepth } from "./nitrogenDioxideOpticalDepth.js";
export { ozoneOpticalDepth } from "./ozoneOpticalDepth.js";
export { rayleighOpticalDepth } from "./rayleighOpticalDepth.js";

/** Every public name of Airlight. @module airlight */
export * from "./units.js";
export * from "./constants.js";
export * from "./budget.js";
export * from "./spectrum/index.js";
export * from "./air/index.js";
export * from "./scattering/index.js";
export * from "./absorption/index.js";
export * from "./column/index.js";
export * from "./path/index.js";
export * from "./beam/index.js";
export * from "./sky/index.js";
export * from "./colour/index.js";
export * from "./retrieval/index.js";
export * from "./uncertainty/index.js";

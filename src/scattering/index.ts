/** One molecule: cross-section, King factor, phase function. @module scattering */
export { depolarisation } from "./depolarisation.js";
export { kingFactor } from "./kingFactor.js";
export { rayleighCrossSection } from "./rayleighCrossSection.js";
export { rayleighPhase } from "./rayleighPhase.js";
export { rayleighPhaseMode } from "./rayleighPhaseMode.js";
export { rayleighPolarisation } from "./rayleighPolarisation.js";
export { rayleighScatteringCoefficient } from "./rayleighScatteringCoefficient.js";
export { rayleighScatteringMatrix, type ScatteringMatrix } from "./rayleighScatteringMatrix.js";

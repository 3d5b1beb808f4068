/** The way through the air: refraction and the air mass of each constituent. @module path */
export { airMassKastenWater } from "./airMassKastenWater.js";
export { airMassKastenYoung } from "./airMassKastenYoung.js";
export { airMassShell, type Shell } from "./airMassShell.js";
export { airMassYoung } from "./airMassYoung.js";
export { apparentZenith } from "./apparentZenith.js";
export type { SurfaceAir } from "./_checkSurface.js";
export { type DispersionInput, differentialRefraction } from "./differentialRefraction.js";
export { dispersionOffset } from "./dispersionOffset.js";
export { earthCurvatureRadius } from "./earthCurvatureRadius.js";
export type { PathInput } from "./pathInput.js";
export { type RefractedPath, refractedPath } from "./refractedPath.js";
export { refractionBennett } from "./refractionBennett.js";
export { refractionSaemundsson } from "./refractionSaemundsson.js";

/** The way through the air: refraction and the air mass of each constituent. @module path */
export type { SurfaceAir } from "./_checkSurface.js";
export { airMassKastenWater } from "./airMassKastenWater.js";
export { airMassKastenYoung } from "./airMassKastenYoung.js";
export { airMassShell, type Shell } from "./airMassShell.js";
export { airMassYoung } from "./airMassYoung.js";
export { refractionBennett } from "./refractionBennett.js";
export { refractionSaemundsson } from "./refractionSaemundsson.js";

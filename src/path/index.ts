/** The way through the air: refraction and the air mass of each constituent. @module path */
export { airMassesOnPath } from "./airMassesOnPath.js";
export { airMassesOnTruePath } from "./airMassesOnTruePath.js";
export { airMassHardie } from "./airMassHardie.js";
export { airMassKasten } from "./airMassKasten.js";
export { airMassKastenWater } from "./airMassKastenWater.js";
export { airMassKastenYoung } from "./airMassKastenYoung.js";
export { airMassOnPath } from "./airMassOnPath.js";
export { airMassOnTruePath } from "./airMassOnTruePath.js";
export { airMassPickering } from "./airMassPickering.js";
export { airMassRozenberg } from "./airMassRozenberg.js";
export { airMassShell, type Shell } from "./airMassShell.js";
export { airMassYoung } from "./airMassYoung.js";
export { airMassYoungIrvine } from "./airMassYoungIrvine.js";
export { apparentZenith } from "./apparentZenith.js";
export type { SurfaceAir } from "./_checkSurface.js";
export { constituentMassesOnPath } from "./constituentMassesOnPath.js";
export { constituentMassesOnTruePath } from "./constituentMassesOnTruePath.js";
export { constituentMassOnPath } from "./constituentMassOnPath.js";
export { constituentMassOnTruePath } from "./constituentMassOnTruePath.js";
export { type DispersionInput, differentialRefraction } from "./differentialRefraction.js";
export { dispersionOffset } from "./dispersionOffset.js";
export { earthCurvatureRadius } from "./earthCurvatureRadius.js";
export type { PathInput } from "./pathInput.js";
export { pathInWeather } from "./pathInWeather.js";
export type { DippingFit, PathFit, PreparedPath } from "./preparedPath.js";
export { preparePath } from "./preparePath.js";
export {
  prepareWeatherPaths,
  type WeatherPathInput,
  type WeatherPaths,
} from "./prepareWeatherPaths.js";
export { type RefractedPath, refractedPath } from "./refractedPath.js";
export { refractionBennett } from "./refractionBennett.js";
export { refractionOnPath } from "./refractionOnPath.js";
export { refractionOnTruePath } from "./refractionOnTruePath.js";
export { refractionSaemundsson } from "./refractionSaemundsson.js";
export { refractionsOnPath } from "./refractionsOnPath.js";
export { refractionsOnTruePath } from "./refractionsOnTruePath.js";

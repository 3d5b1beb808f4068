export { apparentZenith } from "./apparentZenith.js";
export { earthCurvatureRadius } from "./earthCurvatureRadius.js";
export type { PathInput } from "./pathInput.js";
export { type RefractedPath, refractedPath } from "./refractedPath.js";

/** From spectra to tristimulus values, chromaticity, colour temperature and display colour. @module colour */
export { chromaticity } from "./chromaticity.js";
export { cie1931Observer } from "./cie1931Observer.js";
export { cie1931Observer5nm } from "./cie1931Observer5nm.js";
export { cie1964Observer } from "./cie1964Observer.js";
export {
  type ColourTemperature,
  correlatedColourTemperature,
} from "./correlatedColourTemperature.js";
export { daylightIlluminant } from "./daylightIlluminant.js";
export { decodeSrgb } from "./decodeSrgb.js";
export { encodeSrgb } from "./encodeSrgb.js";
export { fitToDisplay } from "./fitToDisplay.js";
export { linearSrgbToXyz } from "./linearSrgbToXyz.js";
export type { Observer } from "./observer.js";
export { spectraToXyz } from "./spectraToXyz.js";
export { spectrumToXyz } from "./spectrumToXyz.js";
export { srgbHex } from "./srgbHex.js";
export type { Chromaticity, Rgb, Xyz } from "./triples.js";
export { xyzToLinearSrgb } from "./xyzToLinearSrgb.js";

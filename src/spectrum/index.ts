/** Grids, sampled spectra, integrals, passbands, Planck's law, sunlight outside the air. @module spectrum */
export { bandMean } from "./bandMean.js";
export { gaussianPassband } from "./gaussianPassband.js";
export { integrateSpectrum } from "./integrateSpectrum.js";
export { planckRadiance } from "./planckRadiance.js";
export { resampleSpectrum } from "./resampleSpectrum.js";
export { solarIrradiance } from "./solarIrradiance.js";
export type { Passband, Spectrum } from "./spectrum.js";
export { tabulate } from "./tabulate.js";
export { wavelengthGrid } from "./wavelengthGrid.js";

/** Scattered light of the clear sky: radiance, polarisation, fluxes, neutral points, twilight. @module sky */
export { angleOfPolarisation } from "./angleOfPolarisation.js";
export { degreeOfPolarisation } from "./degreeOfPolarisation.js";
export { illuminateSky, type LitSky } from "./illuminateSky.js";
export { neutralPoints, type NeutralPoint, type NeutralPoints } from "./neutralPoints.js";
export { prepareSky, type PreparedSky, type SkyInput, type SkyLayer } from "./prepareSky.js";
export { prepareTwilight, type PreparedTwilight, type TwilightInput } from "./prepareTwilight.js";
export { skyFluxes, type SkyFluxes } from "./skyFluxes.js";
export { skyRadiance } from "./skyRadiance.js";
export { skyStokes, type SkyDirection, type SkyLevel, type Stokes } from "./skyStokes.js";
export { skyStokesMap, type SkyDirections } from "./skyStokesMap.js";
export { twilightStokes, type TwilightDirection } from "./twilightStokes.js";

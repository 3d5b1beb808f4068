/** Direct light at the ground: transmittance, irradiance. @module beam */
export type { BandRows } from "./_bandRows.js";
export type { BeamKernel } from "./_beamKernel.js";
export type { Beam, BeamMasses, BeamState } from "./beam.js";
export { beamAt } from "./beamAt.js";
export { beamIrradiance } from "./beamIrradiance.js";
export { type BeamOpticalDepths, beamOpticalDepths } from "./beamOpticalDepths.js";
export { type BeamTable, beamTable } from "./beamTable.js";
export { beamTransmittance } from "./beamTransmittance.js";
export { beamTransmittances } from "./beamTransmittances.js";
export { type ClearBeamInput, clearBeam } from "./clearBeam.js";

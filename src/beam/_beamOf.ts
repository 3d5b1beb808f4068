/** Puts a beam together from its state and its air masses. */
import { STANDARD_ATMOSPHERE } from "../constants.js";
import type { Beam, BeamMasses, BeamState } from "./beam.js";

export function beamOf(state: BeamState, trueZenithDeg: number, masses: BeamMasses): Beam {
  return {
    state,
    trueZenithDeg,
    masses,
    slantWaterCm: state.waterCm * masses.water,
    pressureAirMass: (masses.air * state.column.pressurePa) / STANDARD_ATMOSPHERE,
  };
}

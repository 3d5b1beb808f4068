/** The one place where each constituent gets its air mass. */
import { standardState } from "../air/_standardLayers.js";
import { airMassKastenWater } from "../path/airMassKastenWater.js";
import { airMassShell } from "../path/airMassShell.js";
import { airMassYoung } from "../path/airMassYoung.js";
import { refractionSaemundsson } from "../path/refractionSaemundsson.js";
import { massesOnPath } from "./_massesOnPath.js";
import type { BeamMasses, BeamState } from "./beam.js";

/** Air masses at a true zenith angle: from the state's path, or at 0 to 90° from the closed formulas. */
export function massesAt(state: BeamState, trueZenithDeg: number): BeamMasses {
  if (state.path) return massesOnPath(state.path, trueZenithDeg);
  const { pressurePa, altitudeM } = state.column;
  const { temperatureK } = standardState(altitudeM);
  const apparentZenithDeg =
    trueZenithDeg - refractionSaemundsson(trueZenithDeg, { pressurePa, temperatureK });
  const shell = airMassShell(trueZenithDeg, { shellHeightM: state.ozoneHeightM, altitudeM });
  const nearGround = airMassKastenWater(apparentZenithDeg);
  return {
    air: airMassYoung(trueZenithDeg),
    ozone: shell,
    nitrogenDioxide: shell,
    water: nearGround,
    aerosol: nearGround,
  };
}

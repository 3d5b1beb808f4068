/** The way of sunlight through each constituent. */
import { airMassKastenWater, airMassShell, airMassYoung, refractionSaemundsson } from "airlight";
import type { Reading } from "./readReadings.js";
import type { Station } from "./readStation.js";

/** Air mass of each constituent on one way to the sun. */
export interface AirMasses {
  /** Of air: molecular scattering. */
  readonly air: number;
  /** Of ozone, and of nitrogen dioxide, which is put in the same layer. */
  readonly ozone: number;
  /** Of aerosol, which lies near the ground. */
  readonly aerosol: number;
}

/** Air masses at a true zenith angle; aerosol's goes with the apparent angle, refracted by the weather of the reading. */
export function airMasses(trueZenithDeg: number, reading: Reading, station: Station): AirMasses {
  const { ozoneHeightM, altitudeM } = station;
  const apparentZenithDeg = trueZenithDeg - refractionSaemundsson(trueZenithDeg, reading);
  return {
    air: airMassYoung(trueZenithDeg),
    ozone: airMassShell(trueZenithDeg, { shellHeightM: ozoneHeightM, altitudeM }),
    aerosol: airMassKastenWater(apparentZenithDeg),
  };
}

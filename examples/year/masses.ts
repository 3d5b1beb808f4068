/** Air masses of one reading. */
import {
  airMassKastenWater,
  airMassKastenYoung,
  airMassShell,
  refractionSaemundsson,
} from "airlight";
import { STATION, TYPICAL_AIR } from "./channels.js";

/** Of air, ozone and aerosol. */
export function massesAt(trueZenithDeg: number): readonly [number, number, number] {
  const apparentDeg = trueZenithDeg - refractionSaemundsson(trueZenithDeg, TYPICAL_AIR);
  return [
    airMassKastenYoung(apparentDeg),
    airMassShell(trueZenithDeg, { shellHeightM: 22_000, altitudeM: STATION.altitudeM }),
    airMassKastenWater(apparentDeg),
  ];
}

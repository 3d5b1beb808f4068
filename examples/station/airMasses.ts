/** The way of sunlight through each constituent. */
import { airMassOnTruePath, constituentMassOnTruePath, type PreparedPath } from "airlight";
import type { Constituent } from "./stationPaths.js";

/** Air mass of each constituent on one way to the sun. */
export interface AirMasses {
  /** Of air: molecular scattering. */
  readonly air: number;
  /** Of ozone, and of nitrogen dioxide, which is put in the same layer. */
  readonly ozone: number;
  /** Of aerosol, which lies near the ground. */
  readonly aerosol: number;
}

/** Air masses at a true zenith angle, on the ray refracted by the weather that the path was prepared for. */
export function airMasses(trueZenithDeg: number, path: PreparedPath<Constituent>): AirMasses {
  return {
    air: airMassOnTruePath(trueZenithDeg, path),
    ozone: constituentMassOnTruePath(trueZenithDeg, path, "ozone"),
    aerosol: constituentMassOnTruePath(trueZenithDeg, path, "aerosol"),
  };
}

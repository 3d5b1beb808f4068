/** Air masses of a beam from a prepared path. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { AirColumn } from "../column/airColumn.js";
import { massAtTrue } from "../path/_atElevation.js";
import type { PreparedPath } from "../path/preparedPath.js";
import type { BeamMasses } from "./beam.js";

/** A path must be seen from where the column stands, to this many metres. */
const ALTITUDE_TOLERANCE_M = 1;

/** Throws unless the path was prepared at the column's altitude with the constituents that a beam needs. */
export function checkBeamPath(
  path: PreparedPath<string>,
  { altitudeM }: AirColumn,
  functionName: string,
): void {
  const maker = "preparePath or pathInWeather";
  checkPrepared(path?.levelRefractionDeg, maker, "path", functionName);
  const missing = ["ozone", "water", "aerosol"].filter((key) => !path.keys.includes(key));
  if (missing.length > 0) {
    throw new TypeError(
      `${functionName}: path must hold constituents ozone, water and aerosol, ${missing.join(", ")} missing`,
    );
  }
  if (Math.abs(path.altitudeM - altitudeM) <= ALTITUDE_TOLERANCE_M) return;
  throw new RangeError(
    `${functionName}: path must be prepared at the column's altitude, ${altitudeM} m, got ${path.altitudeM} m`,
  );
}

/** The zenith angle checked against what the closed formulas or the path reach. */
export function checkBeamZenith(
  trueZenithDeg: number,
  path: PreparedPath<string> | undefined,
  functionName: string,
): void {
  const most = path ? path.horizonTrueZenithDeg : 90;
  checkNumber(trueZenithDeg, 0, most, "degrees", "trueZenithDeg", functionName);
}

export function massesOnPath(path: PreparedPath<string>, trueZenithDeg: number): BeamMasses {
  const elevation = 90 - trueZenithDeg;
  const mass = (key: string): number => massAtTrue(path, elevation, path.keys.indexOf(key) + 2);
  const ozone = mass("ozone");
  return {
    air: massAtTrue(path, elevation, 1),
    ozone,
    nitrogenDioxide: path.keys.includes("nitrogenDioxide") ? mass("nitrogenDioxide") : ozone,
    water: mass("water"),
    aerosol: mass("aerosol"),
  };
}

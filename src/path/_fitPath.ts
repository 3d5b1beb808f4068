/** Fits a path in all its angles. */
import { DEGREES_PER_RADIAN } from "../units.js";
import { fitDipping, fitRising } from "./_fitAngles.js";
import { fitRisingTrue } from "./_fitTrueAngles.js";
import { checkedColumns } from "./_massesOf.js";
import type { RayAir } from "./_rayAir.js";
import { apparentHorizonDeg, traceRay } from "./_traceRay.js";
import type { PreparedPath } from "./preparedPath.js";

/** The prepared path of air ready for tracing, on the same pieces as another if one is given. */
export function fitPath<Key extends string>(
  air: RayAir,
  keys: readonly Key[],
  name: string,
  like?: PreparedPath<Key>,
): PreparedPath<Key> {
  const columns = checkedColumns(air, keys, name);
  const refraction = (zenithDeg: number): number =>
    traceRay(air, zenithDeg, name)[0]! * DEGREES_PER_RADIAN;
  const horizonApparentZenithDeg = apparentHorizonDeg(air);
  const rising = fitRising(air, columns, name, like?.rising);
  const apparent = {
    altitudeM: air.observerM,
    wavelengthNm: air.wavelengthNm,
    earthRadiusM: air.earthRadiusM,
    keys,
    horizonApparentZenithDeg,
    horizonTrueZenithDeg: horizonApparentZenithDeg + refraction(horizonApparentZenithDeg),
    levelRefractionDeg: refraction(90),
    rising,
    risingTrue: rising,
    dipping: fitDipping(air, columns, name, like?.dipping),
  };
  return { ...apparent, risingTrue: fitRisingTrue(apparent, like?.risingTrue) };
}

/** The fits of a path over apparent angles: rays that rise and rays that dip. */
import { DEGREES_PER_RADIAN } from "../units.js";
import { RISING_TOLERANCE, resolution, scaled } from "./_fitResolution.js";
import { fitPieces } from "./_fitPieces.js";
import { grazingDips } from "./_lowestPoint.js";
import { dippingElevation } from "./_dippingPlace.js";
import { nearSine, risingElevation, risingReach } from "./_risingPlace.js";
import type { RayAir } from "./_rayAir.js";
import { traceRay } from "./_traceRay.js";
import type { DippingFit, PathFit } from "./preparedPath.js";

/** Error allowed in refraction, degrees, of rays that dip: 4e-6 arcsec. */
const DIPPING_TOLERANCE = 1e-9;

/** What a ray at an apparent elevation collects, over `columns`; refraction in degrees first. */
function rayAt(
  air: RayAir,
  columns: Float64Array,
  elevationDeg: number,
  name: string,
): Float64Array {
  const sums = traceRay(air, 90 - elevationDeg, name);
  sums[0]! *= DEGREES_PER_RADIAN;
  for (let q = 1; q < sums.length; q++) sums[q]! /= columns[q]!;
  return sums;
}

export function fitRising(
  air: RayAir,
  columns: Float64Array,
  name: string,
  like?: PathFit,
): PathFit {
  const [fewest, tolerance] = resolution(like, 8, RISING_TOLERANCE);
  return fitPieces(columns.length, fewest, tolerance, (place, pieces) => {
    const elevation = risingElevation(place, 90, pieces);
    const values = rayAt(air, columns, elevation, name);
    return scaled(values, risingReach(elevation, 90, 1 / 8100), nearSine(90 - elevation, 90));
  });
}

export function fitDipping(
  air: RayAir,
  columns: Float64Array,
  name: string,
  like?: readonly PathFit[],
): DippingFit[] {
  const dips = grazingDips(air);
  return dips.slice(1).map((bottomDeg, i) => {
    const topDeg = dips[i]!;
    const [fewest, tolerance] = resolution(like?.[i], 16, DIPPING_TOLERANCE);
    const fit = fitPieces(columns.length, fewest, tolerance, (place, pieces) =>
      rayAt(air, columns, dippingElevation(place, topDeg, bottomDeg, pieces), name),
    );
    return { topDeg, bottomDeg, ...fit };
  });
}

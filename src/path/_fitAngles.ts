/** The three fits of a path: rays that rise, by apparent and by true angle, and rays that dip. */
import { DEGREES_PER_RADIAN } from "../units.js";
import { apparentElevation, massAt, refractionAt } from "./_atElevation.js";
import { fitPieces } from "./_fitPieces.js";
import { grazingDips } from "./_lowestPoint.js";
import { dippingElevation, nearSine, risingElevation, risingReach } from "./_pathVariable.js";
import type { RayAir } from "./_rayAir.js";
import { traceRay } from "./_traceRay.js";
import type { DippingFit, PathFit, PreparedPath } from "./preparedPath.js";

/** Error allowed in refraction times reach over sine, degrees: 5e-6 arcsec at the horizon, less above. */
const RISING_TOLERANCE = 1e-10;
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

/** Pieces and tolerance to begin with: those of another fit exactly, or as many as it takes. */
function resolution(
  like: PathFit | undefined,
  fewest: number,
  tolerance: number,
): [number, number] {
  return like ? [like.pieces, Number.POSITIVE_INFINITY] : [fewest, tolerance];
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

/** The rising rays again over their true elevations, from the fit over apparent ones. */
export function fitRisingTrue(path: PreparedPath<string>, like?: PathFit): PathFit {
  const [fewest, tolerance] = resolution(like, path.rising.pieces, RISING_TOLERANCE);
  const span = 90 + path.levelRefractionDeg;
  const quantities = path.rising.coefficients.length;
  return fitPieces(quantities, fewest, tolerance, (place, pieces) => {
    const above = risingElevation(place, span, pieces);
    const elevation = Math.max(0, apparentElevation(path, above - path.levelRefractionDeg));
    const values = new Float64Array(quantities);
    values[0] = refractionAt(path, elevation);
    for (let q = 1; q < quantities; q++) values[q] = massAt(path, elevation, q);
    return scaled(
      values,
      risingReach(above, span, 1 / (span * span)),
      nearSine(span - above, span),
    );
  });
}

function scaled(values: Float64Array, reach: number, sine: number): Float64Array {
  values[0]! /= sine;
  for (let q = 0; q < values.length; q++) values[q]! *= reach;
  return values;
}

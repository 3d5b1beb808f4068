/** Evaluation of a prepared path, unguarded. */
import { atPiece } from "./_pieces.js";
import { dippingPlace } from "./_dippingPlace.js";
import { nearSine, risingPlace, risingReach } from "./_risingPlace.js";
import { rootBetween } from "./_rootBetween.js";
import type { PreparedPath } from "./preparedPath.js";

/** Refraction in degrees at an apparent elevation, not below the horizon's. */
export function refractionAt(path: PreparedPath<string>, elevationDeg: number): number {
  if (elevationDeg < 0) return dippingValue(path, elevationDeg, 0);
  return nearSine(90 - elevationDeg, 90) * risingValue(path, elevationDeg, 0);
}

/** Mass at an apparent elevation: 1 air, 2 and on the constituents. */
export function massAt(path: PreparedPath<string>, elevationDeg: number, quantity: number): number {
  return elevationDeg < 0
    ? dippingValue(path, elevationDeg, quantity)
    : risingValue(path, elevationDeg, quantity);
}

function risingValue({ rising }: PreparedPath<string>, elevationDeg: number, q: number): number {
  const inverse = 1 / risingReach(elevationDeg, 90, 1 / 8100);
  const place = risingPlace(inverse, rising.pieces);
  return atPiece(rising.coefficients[q]!, rising.pieces, place) * inverse;
}

function dippingValue({ dipping }: PreparedPath<string>, elevationDeg: number, q: number): number {
  let i = 0;
  while (i < dipping.length - 1 && elevationDeg < dipping[i]!.bottomDeg) i++;
  const { topDeg, bottomDeg, pieces, coefficients } = dipping[i]!;
  return atPiece(coefficients[q]!, pieces, dippingPlace(elevationDeg, topDeg, bottomDeg, pieces));
}

/** Refraction in degrees at a true elevation. */
export function refractionAtTrue(path: PreparedPath<string>, elevationDeg: number): number {
  const above = elevationDeg + path.levelRefractionDeg;
  if (above < 0) return apparentElevation(path, elevationDeg) - elevationDeg;
  const span = 90 + path.levelRefractionDeg;
  return nearSine(90 - elevationDeg, span) * risingTrueValue(path, above, 0);
}

/** Mass at a true elevation. */
export function massAtTrue(
  path: PreparedPath<string>,
  elevationDeg: number,
  quantity: number,
): number {
  const above = elevationDeg + path.levelRefractionDeg;
  return above < 0
    ? massAt(path, apparentElevation(path, elevationDeg), quantity)
    : risingTrueValue(path, above, quantity);
}

/** `aboveDeg` counts from the true elevation of the level ray. */
function risingTrueValue(path: PreparedPath<string>, aboveDeg: number, q: number): number {
  const { pieces, coefficients } = path.risingTrue;
  const span = 90 + path.levelRefractionDeg;
  const inverse = 1 / risingReach(aboveDeg, span, 1 / (span * span));
  return atPiece(coefficients[q]!, pieces, risingPlace(inverse, pieces)) * inverse;
}

/** Apparent elevation of a true one, from the fit of apparent ones: exact but slow. */
export function apparentElevation(path: PreparedPath<string>, trueElevationDeg: number): number {
  const lowest = 90 - path.horizonApparentZenithDeg;
  const excess = (elevation: number): number =>
    elevation - refractionAt(path, elevation) - trueElevationDeg;
  const low = excess(lowest);
  if (low >= 0) return lowest;
  const high = Math.min(90, trueElevationDeg + 10);
  return rootBetween(excess, lowest, low, high, excess(high), 1e-13);
}

/** Bulk evaluation of a prepared path over typed arrays. */
import { checkNumber } from "../_check.js";
import { massAt, massAtTrue, refractionAt, refractionAtTrue } from "./_atElevation.js";
import { atPiece } from "./_pieces.js";
import { risingPlace, risingReach } from "./_pathVariable.js";
import type { PathFit, PreparedPath } from "./preparedPath.js";

/** Fills `out` with a quantity at apparent zenith angles; NaN stays NaN, an angle out of range throws and names its place. */
export function fillApparent(
  path: PreparedPath<string>,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  out: Float64Array,
  functionName: string,
): Float64Array {
  const most = path.horizonApparentZenithDeg;
  if (quantity > 0 && fillRising(path.rising, zenithsDeg, quantity, 0, out)) return out;
  for (let i = 0; i < zenithsDeg.length; i++) {
    const zenith = zenithsDeg[i]!;
    if (quantity > 0 && zenith >= 0 && zenith <= 90) continue;
    if (Number.isNaN(zenith)) {
      out[i] = zenith;
      continue;
    }
    checkNumber(zenith, 0, most, "degrees", `apparentZenithsDeg[${i}]`, functionName);
    out[i] = quantity === 0 ? refractionAt(path, 90 - zenith) : massAt(path, 90 - zenith, quantity);
  }
  return out;
}

/** The same at true zenith angles. */
export function fillTrue(
  path: PreparedPath<string>,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  out: Float64Array,
  functionName: string,
): Float64Array {
  const most = path.horizonTrueZenithDeg;
  const level = path.levelRefractionDeg;
  if (quantity > 0 && fillRising(path.risingTrue, zenithsDeg, quantity, level, out)) return out;
  for (let i = 0; i < zenithsDeg.length; i++) {
    const zenith = zenithsDeg[i]!;
    if (quantity > 0 && zenith >= 0 && zenith <= 90 + level) continue;
    if (Number.isNaN(zenith)) {
      out[i] = zenith;
      continue;
    }
    checkNumber(zenith, 0, most, "degrees", `trueZenithsDeg[${i}]`, functionName);
    out[i] =
      quantity === 0
        ? refractionAtTrue(path, 90 - zenith)
        : massAtTrue(path, 90 - zenith, quantity);
  }
  return out;
}

/** The hot loop: masses of the rays that rise. True if that is all of them. */
function fillRising(
  { pieces, coefficients }: PathFit,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  levelDeg: number,
  out: Float64Array,
): boolean {
  const table = coefficients[quantity]!;
  const span = 90 + levelDeg;
  const perSquare = 1 / (span * span);
  let all = true;
  for (let i = 0; i < zenithsDeg.length; i++) {
    const above = span - zenithsDeg[i]!;
    if (above >= 0 && above <= span) {
      const inverse = 1 / risingReach(above, span, perSquare);
      out[i] = atPiece(table, pieces, risingPlace(inverse, pieces)) * inverse;
    } else all = false;
  }
  return all;
}

/** Bulk evaluation of a prepared path over typed arrays. */
import { checkNumber } from "../_check.js";
import { massAt, massAtTrue, refractionAt, refractionAtTrue } from "./_atElevation.js";
import { fillRising } from "./_risingPlace.js";
import type { PreparedPath } from "./preparedPath.js";

/** Fills `out` with a quantity at apparent zenith angles; NaN stays NaN, an angle out of range throws and names its place. */
export function fillApparent(
  path: PreparedPath<string>,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  out: Float64Array,
  name: string,
): Float64Array {
  if (quantity > 0 && fillRising(path.rising, zenithsDeg, quantity, 0, out)) return out;
  const most = path.horizonApparentZenithDeg;
  return fillEach(zenithsDeg, most, out, "apparentZenithsDeg", name, (elevation) =>
    quantity === 0 ? refractionAt(path, elevation) : massAt(path, elevation, quantity),
  );
}

/** The same at true zenith angles. */
export function fillTrue(
  path: PreparedPath<string>,
  zenithsDeg: ArrayLike<number>,
  quantity: number,
  out: Float64Array,
  name: string,
): Float64Array {
  const level = path.levelRefractionDeg;
  if (quantity > 0 && fillRising(path.risingTrue, zenithsDeg, quantity, level, out)) return out;
  const most = path.horizonTrueZenithDeg;
  return fillEach(zenithsDeg, most, out, "trueZenithsDeg", name, (elevation) =>
    quantity === 0 ? refractionAtTrue(path, elevation) : massAtTrue(path, elevation, quantity),
  );
}

function fillEach(
  zenithsDeg: ArrayLike<number>,
  most: number,
  out: Float64Array,
  argument: string,
  name: string,
  valueAt: (elevationDeg: number) => number,
): Float64Array {
  for (let i = 0; i < zenithsDeg.length; i++) {
    const zenith = zenithsDeg[i]!;
    if (!Number.isNaN(zenith)) checkNumber(zenith, 0, most, "degrees", `${argument}[${i}]`, name);
    out[i] = Number.isNaN(zenith) ? zenith : valueAt(90 - zenith);
  }
  return out;
}

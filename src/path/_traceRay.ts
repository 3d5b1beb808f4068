/** A whole ray: from the observer, down to its lowest point if it dips, and up to the end of the air. */
import { refuse } from "../_check.js";
import { atan2, cos, sin, sqrt } from "../_numeric.js";
import { RADIANS_PER_DEGREE } from "../units.js";
import { grazingDips, lowestPoint } from "./_lowestPoint.js";
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";
import { sumAlong } from "./_sumAlong.js";
import { sumLevel } from "./_sumLevel.js";

/** Cosine of the smallest dip whose lowest point (0.4 mm down) is worth finding; nearer, the ray is a parabola. */
const LEAST_DIP = 1e-5;

/** Greatest apparent zenith angle, degrees, that passes the ground. */
export function apparentHorizonDeg(air: RayAir): number {
  return 90 - grazingDips(air).at(-1)!;
}

/**
 * Refraction in radians at [0], and what the ray collects of air at [1] and of each constituent from [2] on, in the units of
 * `verticalColumns`.
 */
export function traceRay(air: RayAir, apparentZenithDeg: number, name: string): Float64Array {
  const elevation = (90 - apparentZenithDeg) * RADIANS_PER_DEGREE;
  const cosine = sin(elevation);
  const sine = cos(elevation);
  const { observerM, earthRadiusM, profile } = air;
  const sums = new Float64Array(2 + air.constituents.length);
  if (cosine < 0) {
    const dip = sumDip(air, cosine, sine, apparentZenithDeg, name);
    for (let i = 0; i < sums.length; i++) sums[i] = 2 * dip[i]!;
  }
  if (!sumAlong(air, observerM, Math.abs(cosine), sine, profile.highestM, sums)) {
    refuseTrapped(apparentZenithDeg, name);
  }
  const here = refractivityAt(air, layerAt(air, observerM), observerM, new Float64Array(3));
  const invariant = (1 + here) * (earthRadiusM + observerM) * sine;
  const top = earthRadiusM + profile.highestM;
  const outside = atan2(invariant, sqrt((top - invariant) * (top + invariant)));
  sums[0]! += outside - apparentZenithDeg * RADIANS_PER_DEGREE;
  return sums;
}

/** What stands above the observer, of air at [1] and of each constituent from [2] on. */
export function verticalColumns(air: RayAir): Float64Array {
  const columns = new Float64Array(2 + air.constituents.length);
  sumAlong(air, air.observerM, 1, 0, air.profile.highestM, columns);
  return columns;
}

/** Twice the way from the lowest point to the observer, whom the ray passes again at the mirrored angle. */
function sumDip(
  air: RayAir,
  cosine: number,
  sine: number,
  zenithDeg: number,
  name: string,
): Float64Array {
  const dip = new Float64Array(2 + air.constituents.length);
  const lowestM = lowestPoint(air, (cosine * cosine) / (1 + sine));
  if (lowestM === undefined) {
    const range = `0 to ${apparentHorizonDeg(air)} degrees (beyond that the ray meets the ground at ${air.profile.lowestM} m)`;
    refuse(zenithDeg, range, "", "apparentZenithDeg", name);
  }
  if (-cosine < LEAST_DIP) sumLevel(air, air.observerM, -cosine, dip);
  else if (!sumAlong(air, lowestM, 0, 1, air.observerM, dip)) refuseTrapped(zenithDeg, name);
  return dip;
}

function refuseTrapped(apparentZenithDeg: number, name: string): never {
  const range =
    "less near 90 degrees (the air above is so layered that this ray is bent back down)";
  refuse(apparentZenithDeg, range, "", "apparentZenithDeg", name);
}

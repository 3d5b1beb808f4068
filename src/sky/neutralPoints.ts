/** The points of the sky where its light is not polarised. */
import { checkPrepared } from "../_check.js";
import type { Degrees } from "../units.js";
import { fallThroughZero } from "./_fallThroughZero.js";
import type { LitSky } from "./illuminateSky.js";
import { skyStokes } from "./skyStokes.js";

/** A neutral point, in the vertical plane of the sun. */
export interface NeutralPoint {
  /** Angle from the vertical, degrees. */
  readonly viewZenithDeg: Degrees;
  /** 0 on the sun's side of the zenith, 180 on the other. */
  readonly relativeAzimuthDeg: 0 | 180;
  /** Angle from the sun, or for Arago's point from the point opposite the sun, degrees. */
  readonly distanceDeg: Degrees;
}

/** The neutral points a sky has above its horizon; undefined for those it has not. */
export interface NeutralPoints {
  /** Babinet's, above the sun. */
  readonly babinet: NeutralPoint | undefined;
  /** Brewster's, below the sun. */
  readonly brewster: NeutralPoint | undefined;
  /** Arago's, above the point opposite the sun. */
  readonly arago: NeutralPoint | undefined;
}

/** Lowest sight looked along, degrees from the vertical. */
const LOWEST = 89.9;

/**
 * Neutral points of Babinet, Brewster and Arago: where the sky seen from the ground is unpolarised.
 *
 * Model: zeros of Q along the sun's vertical plane (U vanishes there), bracketed in steps of half a degree. Around the sun
 * and around the point opposite multiple scattering leaves a vibration in the vertical plane, elsewhere it is square to it.
 * Validity: as `prepareSky`; sights down to 89.9° from the vertical. With the sun at the zenith the points meet in it and
 * none is reported.
 * Accuracy: the degree of polarisation at a point found is below 1e-9. Points seen in nature lie elsewhere as haze goes: what
 * is computed here is the clear sky's.
 * Source: the definition; Chandrasekhar & Elbert 1954, Trans. Am. Phil. Soc. 44, 643 (points as zeros of the computed Q).
 *
 * @param lit - a lit sky from `illuminateSky`
 * @returns the three points, each undefined where it is below the horizon or missing
 * @throws TypeError if `lit` is not a lit sky
 * @example
 * import { illuminateSky, neutralPoints, prepareSky } from "airlight";
 * const layers = [{ rayleighDepth: 0.2, absorptionDepth: 0 }];
 * const lit = illuminateSky(prepareSky({ layers, depolarisation: 0.0279, groundAlbedo: 0.1 }), 80);
 * neutralPoints(lit).arago?.distanceDeg; // => 22.9235
 */
export function neutralPoints(lit: LitSky): NeutralPoints {
  checkPrepared(lit?.groundRadiance, "illuminateSky", "lit", "neutralPoints");
  const sun = lit.sunZenithDeg;
  const q = (signedZenith: Degrees): number =>
    skyStokes(lit, {
      viewZenithDeg: Math.abs(signedZenith),
      relativeAzimuthDeg: azimuthOf(signedZenith),
      at: "ground",
    })[1];
  const point = (signedZenith: number | undefined, from: Degrees): NeutralPoint | undefined =>
    signedZenith === undefined
      ? undefined
      : {
          viewZenithDeg: Math.abs(signedZenith),
          relativeAzimuthDeg: azimuthOf(signedZenith),
          distanceDeg: Math.abs(signedZenith - from),
        };
  return {
    babinet: point(fallThroughZero(q, sun, -LOWEST), sun),
    brewster: point(fallThroughZero(q, sun, LOWEST), sun),
    arago: point(fallThroughZero(q, -LOWEST, sun), sun - 180),
  };
}

/** Azimuth from the sun's of a place on the sun's vertical circle, whose zenith angle is below 0 on the other side. */
function azimuthOf(signedZenith: Degrees): 0 | 180 {
  if (signedZenith < 0) return 180;
  return 0;
}

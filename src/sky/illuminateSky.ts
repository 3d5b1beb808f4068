/** A prepared sky lit by the sun. */
import { checkPrepared } from "../_check.js";
import { cos, exp } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { addGlow } from "./_addGlow.js";
import { safeSecants } from "./_beam.js";
import { checkZenith } from "./_checkZenith.js";
import { diffuseFluxes } from "./_fluxes.js";
import { type LitStack, litStack } from "./_litStack.js";
import type { PreparedSky } from "./prepareSky.js";
import { zerosFromBlocks } from "./_zeros.js";

/** Sky lit by a sunbeam of flux π through a unit area square to it; make it with `illuminateSky`. */
export interface LitSky {
  /** The sky that is lit. */
  readonly sky: PreparedSky;
  /** Angle of the sun from the vertical, degrees. */
  readonly sunZenithDeg: Degrees;
  /** Radiance of the ground, the same in all directions. */
  readonly groundRadiance: number;
  /** Flux of the sunbeam through a horizontal area at each boundary. */
  readonly directFluxes: Float64Array;
  /** Flux of scattered light downward at each boundary. */
  readonly diffuseFluxes: Float64Array;
  /** Flux upward at each boundary. */
  readonly upwardFluxes: Float64Array;
  /** The solution of the three azimuth modes. @internal */
  readonly modes: readonly [LitStack, LitStack, LitStack];
}

/**
 * A prepared sky under one sun.
 *
 * Model: the sunbeam as a source in every layer (a particular solution that vanishes at the layer's faces), joined over a
 * black ground; the light of the ground added after, counting every bounce between ground and air.
 * Validity: as `prepareSky`. Where the sun's secant comes within 2e-6 of an eigenvalue, two suns to either side of it
 * stand for it.
 * Accuracy: as `prepareSky`.
 * Source: Chandrasekhar 1950, Radiative Transfer, chapters IX and X.
 *
 * @param sky - a prepared sky from `prepareSky`
 * @param sunZenithDeg - angle of the sun from the vertical, 0 to under 90 degrees
 * @returns the lit sky, for `skyStokes`, `skyStokesMap`, `skyFluxes`, `skyRadiance` and `neutralPoints`
 * @throws TypeError if an argument is of the wrong kind; RangeError if the angle is out of range
 * @example
 * import { illuminateSky, prepareSky } from "airlight";
 * const layers = [{ rayleighDepth: 0.5, absorptionDepth: 0 }];
 * const lit = illuminateSky(prepareSky({ layers, depolarisation: 0, groundAlbedo: 0.8 }), 30);
 * lit.groundRadiance; // => 0.702276
 */
export function illuminateSky(sky: PreparedSky, sunZenithDeg: Degrees): LitSky {
  checkPrepared(sky?.sphericalAlbedo, "prepareSky", "sky", "illuminateSky");
  checkZenith(sunZenithDeg, "sunZenithDeg", "illuminateSky");
  const cosine = cos(sunZenithDeg * RADIANS_PER_DEGREE);
  const beams = safeSecants(sky.stacks, 1 / cosine);
  const [mean, first, second] = sky.stacks;
  const zeros = zerosFromBlocks();
  const lit = litStack(zeros, mean, beams, cosine);
  const fluxes = diffuseFluxes(zeros, mean, lit.field);
  const depths = sky.boundaryDepths;
  const directFluxes = depths.map((depth) => Math.PI * cosine * exp(-depth / cosine));
  const onGround = directFluxes[depths.length - 1]! + fluxes.down[mean.layers.length]!;
  const { groundAlbedo, sphericalAlbedo } = sky;
  const groundRadiance =
    (groundAlbedo * onGround) / (Math.PI * (1 - groundAlbedo * sphericalAlbedo));
  const pick = (own: Float64Array, glow: Float64Array): Float64Array =>
    depths.map((_, b) => {
      const at = sky.solvedBoundaries[b]!;
      return own[at]! + groundRadiance * glow[at]!;
    });
  return {
    sky,
    sunZenithDeg,
    groundRadiance,
    directFluxes,
    diffuseFluxes: pick(fluxes.down, sky.glowFluxes.down),
    upwardFluxes: pick(fluxes.up, sky.glowFluxes.up),
    modes: [
      addGlow(zeros, lit, sky.glow, groundRadiance),
      litStack(zeros, first, beams, cosine),
      litStack(zeros, second, beams, cosine),
    ],
  };
}

/** A clear sky before the sun is placed: everything that depends on the air and the ground alone. */
import type { Dimensionless, Fraction } from "../units.js";
import { checkSky } from "./_checkSky.js";
import { type DiffuseFluxes, diffuseFluxes } from "./_fluxes.js";
import { evenGlow } from "./_ground.js";
import { dipoleShare, type ModeKernel, meanKernel, wavyKernel } from "./_kernel.js";
import { halfRangeNodes } from "./_nodes.js";
import { darkSources, prepareStack, type Stack, type StackField } from "./_stack.js";
import { solveStack } from "./_solveStack.js";
import { solvable } from "./_solvable.js";
import { zerosFromBlocks } from "./_zeros.js";

/** One homogeneous layer of the sky at one wavelength. */
export interface SkyLayer {
  /** Optical depth of Rayleigh scattering. */
  readonly rayleighDepth: Dimensionless;
  /** Optical depth of absorption (ozone, nitrogen dioxide). */
  readonly absorptionDepth: Dimensionless;
}

/** What `prepareSky` takes: the air at one wavelength and the ground under it. */
export interface SkyInput {
  /** Layers from the top down. */
  readonly layers: readonly SkyLayer[];
  /** Depolarisation of natural light scattered at a right angle, 0 to 0.5. */
  readonly depolarisation: Fraction;
  /** Albedo of the ground, which reflects without polarisation and equally in all directions. */
  readonly groundAlbedo: Fraction;
  /** Directions the field is carried in, both hemispheres together: even, 16 to 64; 32 if left out. */
  readonly streams?: number;
}

/** Sky at one wavelength, prepared for any sun; make it with `prepareSky`. */
export interface PreparedSky {
  /** Optical depth from the top to every boundary. */
  readonly boundaryDepths: Float64Array;
  /** Albedo of the ground. */
  readonly groundAlbedo: Fraction;
  /** Share of light the air sends back down of what the ground sends up evenly. */
  readonly sphericalAlbedo: Fraction;
  /** For each boundary its number when layers without depth are left out. @internal */
  readonly solvedBoundaries: readonly number[];
  /** The three azimuth modes. @internal */
  readonly stacks: readonly [Stack, Stack, Stack];
  /** The field of a ground of radiance 1 under a dark sky. @internal */
  readonly glow: StackField;
  /** The fluxes of that field. @internal */
  readonly glowFluxes: DiffuseFluxes;
}

const DEFAULT_STREAMS = 32;

/**
 * Sky at one wavelength, solved for every sun at once: scattering of all orders with polarisation, by layers of air over
 * a ground that reflects evenly.
 *
 * Model: the vector equation of transfer for I, Q, U between plane parallel layers; Rayleigh scattering with
 * depolarisation in three azimuth modes, of rank 2, 1 and 1, at Gaussian cosines crowded towards the horizon; each layer
 * by the eigenmodes of one symmetric matrix per azimuth mode, which a secular equation gives; layers joined by adding;
 * absorption of any strength, none included.
 * Validity: optical depths 0 to 10 000 a layer; the flat layers hold while sun and sight are above about 10°
 * (compare `twilightStokes`). A layer that scatters less than 1e-10 of what it takes out counts as not scattering.
 * Accuracy: with 32 streams Stokes parameters within 1e-6 of the limit of many streams, for depths 0.02 to 1 and
 * cosines of sun and sight 0.02 to 1 (flux of the sunbeam π); 16 streams 1e-4, 24 streams 5e-6, 32 streams 3e-7, 48 streams 3e-9. Energy is
 * kept to 1e-10 to depths of 1000, 1e-9 at 10 000.
 * Source: Chandrasekhar 1950, Radiative Transfer, chapters I and X; Hansen & Travis 1974, Space Sci. Rev. 16, 527
 * (scattering matrix with depolarisation); Gu & Eisenstat 1994, SIAM J. Matrix Anal. Appl. 15, 1266 (eigenmodes).
 *
 * @param input - `layers` from the top down, each with `rayleighDepth` and `absorptionDepth`, 0 to 10 000;
 *   `depolarisation` of natural light, 0 to 0.5; `groundAlbedo` 0 to 1; `streams`, even, 16 to 64, 32 if left out
 * @returns the prepared sky
 * @throws TypeError if a value is of the wrong kind; RangeError if it is outside its range
 * @example
 * import { prepareSky } from "airlight";
 * const sky = prepareSky({
 *   layers: [{ rayleighDepth: 0.5, absorptionDepth: 0 }],
 *   depolarisation: 0,
 *   groundAlbedo: 0.25,
 * });
 * sky.sphericalAlbedo; // => 0.296034
 */
export function prepareSky(input: SkyInput): PreparedSky {
  checkSky(input);
  const { layers, depolarisation, groundAlbedo, streams = DEFAULT_STREAMS } = input;
  const { depths, albedos, solvedBoundaries, boundaryDepths } = solvable(layers);
  const zeros = zerosFromBlocks();
  const nodes = halfRangeNodes(streams / 2);
  const dipole = dipoleShare(depolarisation);
  const stackOf = (kernel: ModeKernel): Stack => prepareStack(zeros, kernel, depths, albedos);
  const mean = stackOf(meanKernel(zeros, nodes, dipole));
  const glow = solveStack(zeros, mean, darkSources(zeros, mean), evenGlow(zeros, mean.kernel));
  const glowFluxes = diffuseFluxes(zeros, mean, glow);
  return {
    boundaryDepths,
    groundAlbedo,
    sphericalAlbedo: glowFluxes.down[depths.length]! / Math.PI,
    solvedBoundaries,
    stacks: [
      mean,
      stackOf(wavyKernel(zeros, 1, nodes, dipole)),
      stackOf(wavyKernel(zeros, 2, nodes, dipole)),
    ],
    glow,
    glowFluxes,
  };
}

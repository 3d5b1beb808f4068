/** Fluxes of a lit sky at the boundaries of its layers. */
import { checkPrepared } from "../_check.js";
import type { LitSky } from "./illuminateSky.js";

/** Fluxes through a horizontal unit area at each boundary, from the top down, for a sunbeam of flux π square to itself. */
export interface SkyFluxes {
  /** The sunbeam, downward. */
  readonly direct: Float64Array;
  /** Scattered light, downward. */
  readonly diffuseDown: Float64Array;
  /** All light upward; at the last boundary what the ground reflects. */
  readonly up: Float64Array;
}

/**
 * Direct, diffuse and upward flux at every boundary of a lit sky.
 *
 * Model: the solved field of azimuth mode 0 summed over its nodes.
 * Validity: as `prepareSky`.
 * Accuracy: without absorption the net flux is the same at every boundary to 1e-10 (depths to 1000; 1e-9 at 10 000); the diffuse flux at the ground is the
 * integral of `skyStokes` over the dome to 1e-7.
 * Source: Chandrasekhar 1950, Radiative Transfer, chapter I.
 *
 * @param lit - a lit sky from `illuminateSky`
 * @returns `direct`, `diffuseDown` and `up`, one value a boundary (layers + 1, from the top down), for a sunbeam of flux
 *   π; times irradiance / π for W m⁻² nm⁻¹; global is direct plus diffuse
 * @throws TypeError if `lit` is not a lit sky
 * @example
 * import { illuminateSky, prepareSky, skyFluxes } from "airlight";
 * const layers = [{ rayleighDepth: 0.5, absorptionDepth: 0 }];
 * const lit = illuminateSky(prepareSky({ layers, depolarisation: 0, groundAlbedo: 0 }), 60);
 * const { direct, diffuseDown } = skyFluxes(lit);
 * diffuseDown[1] / (direct[1] + diffuseDown[1]); // => 0.447082
 */
export function skyFluxes(lit: LitSky): SkyFluxes {
  checkPrepared(lit?.groundRadiance, "illuminateSky", "lit", "skyFluxes");
  return {
    direct: lit.directFluxes.slice(),
    diffuseDown: lit.diffuseFluxes.slice(),
    up: lit.upwardFluxes.slice(),
  };
}

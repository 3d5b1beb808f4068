/** Radiance of the clear sky in one direction. */
import { checkNumber, checkPrepared } from "../_check.js";
import type { SpectralIrradiance, SpectralRadiance } from "../units.js";
import { checkDirection } from "./_checkDirection.js";
import type { LitSky } from "./illuminateSky.js";
import { type SkyDirection, skyStokes } from "./skyStokes.js";

/**
 * Spectral radiance of the scattered light of the sky.
 *
 * Model: I of `skyStokes` times the sun's irradiance over π.
 * Validity: as `prepareSky`.
 * Accuracy: 1e-6 / π of the sun's irradiance per steradian (see `skyStokes`), besides the error of the irradiance given.
 * Source: as `skyStokes`.
 *
 * @param lit - a lit sky from `illuminateSky`
 * @param direction - line of sight, as for `skyStokes`
 * @param irradiance - sunlight above the air on a plane facing the sun, at least 0 W m⁻² nm⁻¹ (`solarIrradiance`, over
 *   the square of the distance in au)
 * @returns radiance, W m⁻² sr⁻¹ nm⁻¹
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle or the irradiance is out of range
 * @example
 * import { illuminateSky, prepareSky, skyRadiance, solarIrradiance } from "airlight";
 * const layers = [{ rayleighDepth: 0.3604, absorptionDepth: 0 }];
 * const lit = illuminateSky(prepareSky({ layers, depolarisation: 0.0279, groundAlbedo: 0.1 }), 45);
 * skyRadiance(lit, { viewZenithDeg: 0, relativeAzimuthDeg: 0, at: "ground" }, solarIrradiance(400)); // => 0.0505315
 */
export function skyRadiance(
  lit: LitSky,
  direction: SkyDirection,
  irradiance: SpectralIrradiance,
): SpectralRadiance {
  checkPrepared(lit?.groundRadiance, "illuminateSky", "lit", "skyRadiance");
  checkDirection(direction, "skyRadiance");
  checkNumber(irradiance, 0, 1e6, "W m⁻² nm⁻¹", "irradiance", "skyRadiance");
  return (skyStokes(lit, direction)[0] * irradiance) / Math.PI;
}

/** The clear sky in spherical shells at one wavelength, for low suns and twilight. */
import type { Dimensionless, Fraction, Metres } from "../units.js";
import { checkTwilight } from "./_checkTwilight.js";
import { type HigherOrders, higherOrders } from "./_higherOrders.js";
import { dipoleShare } from "./_kernel.js";
import { gaussNodes, type Nodes } from "./_nodes.js";
import type { ShellSky } from "./_rays.js";
import { shellAir } from "./_shellAir.js";
import { slantTable } from "./_slantDepth.js";

/** What `prepareTwilight` takes: the air above a site at one wavelength, and the ground. */
export interface TwilightInput {
  /** Optical depth of Rayleigh scattering, from the site up; spread over height as the standard atmosphere's air. */
  readonly rayleighDepth: Dimensionless;
  /** Optical depth of ozone; spread over a layer about 20 km above sea level. */
  readonly ozoneDepth: Dimensionless;
  /** Depolarisation of natural light scattered at a right angle, 0 to 0.5. */
  readonly depolarisation: Fraction;
  /** Albedo of the ground, which reflects without polarisation and equally in all directions. */
  readonly groundAlbedo: Fraction;
  /** Height of the site (and of all ground around it) above sea level, m. */
  readonly altitudeM: Metres;
  /** "single": light scattered once, ready in a moment; "all": all orders, for every sun at once, in about a second. */
  readonly orders: "single" | "all";
}

/** Air in shells at one wavelength, prepared for any sun; make it with `prepareTwilight`. */
export interface PreparedTwilight extends TwilightInput {
  /** Share of scattering that keeps the pattern of a small dipole. */
  readonly dipole: Fraction;
  /** Profiles and optical depths of rays. @internal */
  readonly shells: ShellSky;
  /** Points of the integral along a line of sight. @internal */
  readonly nodes: Nodes;
  /** The light of higher orders; undefined for single scattering. @internal */
  readonly higher: HigherOrders | undefined;
}

/** Points on each stretch of a line of sight (there are up to eight). */
const SIGHT_POINTS = 10;

/**
 * The clear sky around a round Earth at one wavelength: for suns low over the horizon or below it.
 *
 * Model: spherical shells, straight rays; molecules as in the US Standard Atmosphere 1976 (above 86 km falling on
 * exponentially), ozone with the column above height h in proportion to 1 / (1 + exp((h - 20 km) / 5 km)), both scaled to
 * the depths given; polarised Rayleigh scattering. Orders above the first: the tensor of the field is carried on a grid of
 * 16 heights and 38 sun angles, sunlight scattered once is gathered at each point, and successive orders are added until
 * one brings less than 1e-5; ground light is counted in all of them.
 * Validity: Rayleigh depth 1e-6 to 5, ozone depth 0 to 20. Refraction is left out: rays are straight.
 * Accuracy: single scattering 1e-4 against a brute-force sum; all orders against a Monte Carlo in shells: see `twilightStokes`.
 * Source: equations of transfer; US Standard Atmosphere 1976; Lacis & Hansen 1974, J. Atmos. Sci. 31, 118 (ozone layer, from
 * memory).
 *
 * @param input - `rayleighDepth` 1e-6 to 5; `ozoneDepth` 0 to 20; `depolarisation` 0 to 0.5; `groundAlbedo` 0 to 1;
 *   `altitudeM` -500 to 6000 m; `orders` "single" or "all"
 * @returns the prepared air, for `twilightStokes`
 * @throws TypeError if a value is of the wrong kind; RangeError if it is outside its range
 * @example
 * import { prepareTwilight, twilightStokes } from "airlight";
 * const air = { rayleighDepth: 0.22, ozoneDepth: 0.001, depolarisation: 0.0279, groundAlbedo: 0.1, altitudeM: 0 };
 * const twilight = prepareTwilight({ ...air, orders: "single" });
 * const zenith = { viewZenithDeg: 0, relativeAzimuthDeg: 0 };
 * const sunset = twilightStokes(twilight, { ...zenith, sunZenithDeg: 90 })[0];
 * sunset / twilightStokes(twilight, { ...zenith, sunZenithDeg: 95 })[0]; // => 74.5
 */
export function prepareTwilight(input: TwilightInput): PreparedTwilight {
  checkTwilight(input);
  const { rayleighDepth, ozoneDepth, depolarisation, groundAlbedo, altitudeM, orders } = input;
  const air = shellAir(rayleighDepth, ozoneDepth, altitudeM);
  const shells = { air, table: slantTable(air) };
  const dipole = dipoleShare(depolarisation);
  return {
    rayleighDepth,
    ozoneDepth,
    depolarisation,
    groundAlbedo,
    altitudeM,
    orders,
    dipole,
    shells,
    nodes: gaussNodes(SIGHT_POINTS),
    higher: orders === "all" ? higherOrders(shells, dipole, groundAlbedo) : undefined,
  };
}

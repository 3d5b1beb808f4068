/** The clear sky in spherical shells at one wavelength, for low suns and twilight. */
import type { Dimensionless, Fraction, Metres } from "../units.js";
import { checkNumber, checkRecord, refuse } from "../_check.js";
import { type HigherOrders, higherOrders } from "./_higherOrders.js";
import { dipoleShare } from "./_kernel.js";
import type { ShellSky } from "./_rays.js";
import { shellAir } from "./_shellAir.js";
import { slantTable } from "./_slantDepth.js";

export interface TwilightInput {
  readonly rayleighDepth: Dimensionless;
  readonly ozoneDepth: Dimensionless;
  readonly depolarisation: Fraction;
  readonly groundAlbedo: Fraction;
  readonly altitudeM: Metres;
  readonly orders: "single" | "all";
}

export interface PreparedTwilight extends TwilightInput {
  readonly dipole: Fraction;
  readonly shells: ShellSky;
  readonly higher: HigherOrders | undefined;
}

export function prepareTwilight(input: TwilightInput): PreparedTwilight {
  const name = "prepareTwilight";
  checkRecord(input, "input", name);
  const { rayleighDepth, ozoneDepth, depolarisation, groundAlbedo, altitudeM, orders } = input;
  const air = shellAir(rayleighDepth, ozoneDepth, altitudeM);
  const shells = { air, table: slantTable(air) };
  const dipole = dipoleShare(depolarisation);
  const higher = orders === "all" ? higherOrders(shells, dipole, groundAlbedo) : undefined;
  return { rayleighDepth, ozoneDepth, depolarisation, groundAlbedo, altitudeM, orders, dipole, shells, higher };
}

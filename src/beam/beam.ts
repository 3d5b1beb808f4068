/** What a beam is made of: the air above the site and the air mass of each constituent. */
import type { AirColumn } from "../column/airColumn.js";
import type { AngstromAerosol } from "../column/angstromOpticalDepth.js";
import type { PreparedPath } from "../path/preparedPath.js";
import type {
  Centimetres,
  Degrees,
  Dimensionless,
  DobsonUnits,
  Kelvins,
  Metres,
} from "../units.js";

/** Relative air mass of each constituent along the beam: slant amount over vertical amount. */
export interface BeamMasses {
  /** Molecules of air; mixed gases use it too, times pressure over 101 325 Pa. */
  readonly air: Dimensionless;
  /** Ozone. */
  readonly ozone: Dimensionless;
  /** Nitrogen dioxide. */
  readonly nitrogenDioxide: Dimensionless;
  /** Water vapour. */
  readonly water: Dimensionless;
  /** Aerosol. */
  readonly aerosol: Dimensionless;
}

/** What stands above a site, whatever the sun's height. */
export interface BeamState {
  /** Air above the site, from `airColumn`; carries pressure, altitude and CO2. */
  readonly column: AirColumn;
  /** Ozone, Dobson units. */
  readonly ozoneDu: DobsonUnits;
  /** Temperature of the ozone, taken for nitrogen dioxide too, K. */
  readonly ozoneTemperatureK: Kelvins;
  /** Height of the ozone layer above sea level, m; nitrogen dioxide is put there too. */
  readonly ozoneHeightM: Metres;
  /** Nitrogen dioxide, Dobson units. */
  readonly nitrogenDioxideDu: DobsonUnits;
  /** Water vapour in the vertical column as depth of liquid, cm. */
  readonly waterCm: Centimetres;
  /** Aerosol by Ångström's law. */
  readonly aerosol: AngstromAerosol;
  /**
   * Prepared path with constituents `ozone`, `water`, `aerosol` and, if it differs from ozone, `nitrogenDioxide`: the air
   * masses come from it instead of the closed formulas, and the ozone's height from its layer.
   */
  readonly path?: PreparedPath<string>;
}

/** Prepared beam; make it with `clearBeam` or `beamAt`. */
export interface Beam {
  /** What stands above the site; the same record in all beams that `beamAt` makes from this one. */
  readonly state: BeamState;
  /** True zenith angle of the sun, degrees. */
  readonly trueZenithDeg: Degrees;
  /** Air mass of each constituent. */
  readonly masses: BeamMasses;
  /** Water vapour along the beam as depth of liquid, cm. */
  readonly slantWaterCm: Centimetres;
  /** Air mass of air times pressure over 101 325 Pa. */
  readonly pressureAirMass: Dimensionless;
}

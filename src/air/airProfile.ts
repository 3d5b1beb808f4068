/** The prepared profile of moist air with height that `standardProfile` and `tabulatedProfile` make. */
import type { Kelvins, Metres, Pascals, PartsPerMillion } from "../units.js";

/** One layer of a profile: temperature linear in geopotential height, pressure hydrostatic. */
export interface AirLayer {
  /** Geopotential height of the layer's base, m. */
  readonly baseM: Metres;
  /** Temperature at the base, K (molecular-scale temperature above 80 km). */
  readonly baseK: Kelvins;
  /** Gradient of temperature, K per m of geopotential height. */
  readonly gradient: number;
  /** Pressure at the base, Pa, without the vapour's part in the balance. */
  readonly basePa: Pascals;
  /** Weight of the air over its gas constant, K per m: pressure falls as exp(-this dH / T). */
  readonly hydrostaticKPerM: number;
  /** Mole fraction of water vapour at the base (tables only; 0 where the vapour is exponential). */
  readonly baseWater: number;
  /** Its gradient per m of geopotential height. */
  readonly waterGradient: number;
}

/** Prepared profile of moist air from the ground to 86 km; make it with `standardProfile` or `tabulatedProfile`. */
export interface AirProfile {
  /** Lowest height of the profile above mean sea level, m: the ground that a ray can meet. */
  readonly lowestM: Metres;
  /** Where the air ends, m above mean sea level. */
  readonly highestM: Metres;
  /** Carbon dioxide, µmol/mol, the same at every height. */
  readonly co2Ppm: PartsPerMillion;
  /** The layers, from the lowest up; the first also serves below its base, the last above. */
  readonly layers: readonly AirLayer[];
  /** Geopotential height where the exponential vapour is given (the station), m. */
  readonly waterOriginM: Metres;
  /** Mole fraction of vapour over temperature there, K-1 (0 in a table). */
  readonly waterPerK: number;
  /** Scale height of mole fraction over temperature, m of geopotential height. */
  readonly waterScaleM: Metres;
}

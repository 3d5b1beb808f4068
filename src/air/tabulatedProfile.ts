/** A profile of moist air from a caller's table, such as a radiosonde's ascent. */
import { checkNumber, checkRecord } from "../_check.js";
import { log, log1p } from "../_numeric.js";
import type { Fraction, Kelvins, Metres, PartsPerMillion, Pascals } from "../units.js";
import { checkProfileRows } from "./_checkProfileRows.js";
import { enhancementFactor } from "./_enhancementFactor.js";
import { raisedStandard } from "./_raisedStandard.js";
import { saturationVapourPressure } from "./_saturationVapourPressure.js";
import {
  geopotentialHeight,
  standardLayer,
  standardMolecularTemperature,
} from "./_standardLayers.js";
import type { AirLayer, AirProfile } from "./airProfile.js";

/** CO2 of Ciddor's standard air, µmol/mol. */
const STANDARD_AIR_CO2_PPM = 450;

/** One row of a sounding. */
export interface ProfileRow {
  /** Geometric height above mean sea level, m. */
  readonly heightM: Metres;
  /** Temperature, K. */
  readonly temperatureK: Kelvins;
  /** Pressure, Pa. */
  readonly pressurePa: Pascals;
  /** Relative humidity over liquid water, 0 to 1. */
  readonly relativeHumidity: Fraction;
}

/**
 * Profile of moist air from a table of height, temperature, pressure and humidity, continued to 86 km.
 *
 * Model: between rows temperature and the mole fraction of vapour are linear in geopotential height and ln(pressure) is
 * linear in ln(temperature), which is hydrostatic balance with the weight that joins the two rows. Above the last row the
 * standard atmosphere's shape goes on from its temperature and pressure, dry. The first row is the ground.
 * Validity: heights rise from -1000 to at most 85 000 m, no two rows further apart than 5 km; pressures fall, the first 10 to
 * 140 kPa; temperature 150 to 380 K; humidity 0 to 1; and heights, pressures and temperatures balance within 10 % over
 * every 500 m. All enforced: a table with a hole, in feet or hPa is refused.
 * Accuracy: passes through its rows (1e-12 relative); with the rows of `standardAtmosphere` every 1000 m it gives that
 * atmosphere's pressure between them to 1e-5.
 * Source: hydrostatic balance; US Standard Atmosphere 1976 above the table.
 *
 * @param rows - at least two rows `{ heightM, temperatureK, pressurePa, relativeHumidity }` in m above mean sea level, K,
 *   Pa, 0 to 1 (over water), from the ground up
 * @param composition - `co2Ppm` 0 to 2000 µmol/mol; left out, the 450 of Ciddor's standard air
 * @returns the prepared profile
 * @throws TypeError if a row or value is of the wrong kind; RangeError if a value is out of range (NaN too), or rows are
 *   out of order, too far apart, or out of balance; the message names the row
 * @example
 * import { airAtHeight, tabulatedProfile } from "airlight";
 * const profile = tabulatedProfile([
 *   { heightM: 113, temperatureK: 279.2, pressurePa: 100400, relativeHumidity: 0.93 },
 *   { heightM: 480, temperatureK: 283.4, pressurePa: 95990, relativeHumidity: 0.55 },
 *   { heightM: 1520, temperatureK: 276.9, pressurePa: 84600, relativeHumidity: 0.5 },
 *   { heightM: 3010, temperatureK: 268.1, pressurePa: 70200, relativeHumidity: 0.3 },
 * ]);
 * airAtHeight(300, profile).temperatureK; // => 281.34
 */
export function tabulatedProfile(
  rows: readonly ProfileRow[],
  composition: { readonly co2Ppm?: PartsPerMillion } = {},
): AirProfile {
  checkProfileRows(rows);
  checkRecord(composition, "composition", "tabulatedProfile");
  const co2Ppm = composition.co2Ppm ?? STANDARD_AIR_CO2_PPM;
  checkNumber(co2Ppm, 0, 2000, "ppm", "composition.co2Ppm", "tabulatedProfile");
  const layers = rows.slice(1).map((row, i) => layerBetween(rows[i]!, row));
  return {
    lowestM: rows[0]!.heightM,
    highestM: 86_000,
    co2Ppm,
    layers: [...layers, ...standardAbove(rows.at(-1)!)],
    waterOriginM: 0,
    waterPerK: 0,
    waterScaleM: 1,
  };
}

/** The layer that joins two rows: its weight is what their pressures say. */
function layerBetween(lower: ProfileRow, upper: ProfileRow): AirLayer {
  const baseM = geopotentialHeight(lower.heightM);
  const climb = geopotentialHeight(upper.heightM) - baseM;
  const rise = upper.temperatureK - lower.temperatureK;
  const meanK = rise === 0 ? lower.temperatureK : rise / log1p(rise / lower.temperatureK);
  const baseWater = waterMoleFraction(lower);
  return {
    baseM,
    baseK: lower.temperatureK,
    gradient: rise / climb,
    basePa: lower.pressurePa,
    hydrostaticKPerM: (log(lower.pressurePa / upper.pressurePa) * meanK) / climb,
    baseWater,
    waterGradient: (waterMoleFraction(upper) - baseWater) / climb,
  };
}

function waterMoleFraction({ pressurePa, temperatureK, relativeHumidity }: ProfileRow): number {
  const factor = enhancementFactor(pressurePa, temperatureK);
  return (relativeHumidity * factor * saturationVapourPressure(temperatureK)) / pressurePa;
}

/** The standard's layers from the last row up. */
function standardAbove({ heightM, temperatureK, pressurePa }: ProfileRow): AirLayer[] {
  const baseM = geopotentialHeight(heightM);
  const offsetK = temperatureK - standardMolecularTemperature(heightM);
  const layers = raisedStandard(baseM, pressurePa, offsetK);
  const [first, ...above] = layers.slice(standardLayer(baseM)) as [AirLayer, ...AirLayer[]];
  return [{ ...first, baseM, baseK: temperatureK, basePa: pressurePa }, ...above];
}

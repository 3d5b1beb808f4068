/** Readings with the sun's place and the air masses that belong to them. */
import { airColumn, pathInWeather } from "airlight";
import { type AirMasses, airMasses } from "./airMasses.js";
import { blaming, inputError } from "./inputError.js";
import type { Reading } from "./readReadings.js";
import type { Station } from "./readStation.js";
import { dayPaths } from "./stationPaths.js";
import { sunAt } from "./sunAt.js";

/** A reading and the way its light came. */
export interface PlacedReading extends Reading {
  readonly trueZenithDeg: number;
  readonly distanceAu: number;
  readonly masses: AirMasses;
  /** Molecules of air above one square metre, from the pressure of this reading. */
  readonly molecules: number;
}

/** Places the readings of one file; a reading with the sun below the horizon is refused. */
export function placeReadings(
  readings: readonly Reading[],
  file: string,
  station: Station,
): PlacedReading[] {
  const { altitudeM, latitudeDeg, co2Ppm } = station;
  const placed = readings.map((reading) => {
    const place = { file, row: reading.row };
    const { trueZenithDeg, distanceAu } = sunAt(reading.time, station);
    if (trueZenithDeg > 89.5) {
      const height = (90 - trueZenithDeg).toFixed(1);
      const what = `the sun stood at ${height}° then: is the time UTC, and is the station's longitude positive to the east?`;
      throw inputError({ ...place, column: "time_utc" }, what);
    }
    const { pressurePa } = reading;
    const molecules = blaming(
      { ...place, column: "pressure_pa" },
      () => airColumn({ pressurePa, altitudeM, latitudeDeg, co2Ppm }).moleculesPerM2,
    );
    return { ...reading, trueZenithDeg, distanceAu, molecules };
  });
  const paths = blaming({ file }, () => dayPaths(readings, station));
  return placed.map((reading) => {
    const path = pathInWeather(reading, paths);
    return { ...reading, masses: airMasses(reading.trueZenithDeg, path) };
  });
}

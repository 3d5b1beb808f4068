/** Where the sun stands: from an ephemeris, without refraction. */
import { Body, Equator, Horizon, Observer } from "astronomy-engine";

/** The sun as seen from the station at a moment. */
export interface SunPlace {
  /** True (geometric, not refracted) zenith angle of its centre from the station itself, degrees. */
  readonly trueZenithDeg: number;
  /** Its distance, astronomical units. */
  readonly distanceAu: number;
}

/** Place of the sun at `time` over a station; the ephemeris library's own refraction stays off. */
export function sunAt(
  time: Date,
  place: {
    readonly latitudeDeg: number;
    readonly longitudeDeg: number;
    readonly altitudeM: number;
  },
): SunPlace {
  const observer = new Observer(place.latitudeDeg, place.longitudeDeg, place.altitudeM);
  const sun = Equator(Body.Sun, time, observer, true, true); // of date, with aberration: as seen now
  const { altitude } = Horizon(time, observer, sun.ra, sun.dec); // no refraction asked for: none given
  return { trueZenithDeg: 90 - altitude, distanceAu: sun.dist };
}

/** The whole sky on a disc: straight up in the middle, the horizon at the rim, north at the top, east on the left, as one sees it lying on one's back. */

/** Places on the disc. */
export interface Dome {
  /** Width and height of the square around the disc, dots. */
  readonly size: number;
  /** Radius of the horizon, dots. */
  readonly radius: number;
  /** Dots above the horizon: their numbers in the square, row by row. */
  readonly dots: Int32Array;
  /** Angle of each from the vertical, degrees. */
  readonly zenithsDeg: Float64Array;
  /** Compass bearing of each, clockwise from north, degrees. */
  readonly bearingsDeg: Float64Array;
}

/** Lowest sight shown, degrees from the vertical: flat layers have no horizon. */
const LOWEST_DEG = 89.5;
const DEGREES = 180 / Math.PI;

/** Lays out a dome of `size` dots with `margin` dots around it. */
export function layDome(size: number, margin: number): Dome {
  const radius = size / 2 - margin;
  const dots: number[] = [];
  const zeniths: number[] = [];
  const bearings: number[] = [];
  for (let row = 0; row < size; row++) {
    for (let column = 0; column < size; column++) {
      const [x, y] = [column + 0.5 - size / 2, row + 0.5 - size / 2];
      const zenith = (90 * Math.sqrt(x * x + y * y)) / radius;
      if (zenith > 90) continue;
      dots.push(row * size + column);
      zeniths.push(Math.min(zenith, LOWEST_DEG));
      bearings.push(Math.atan2(-x, -y) * DEGREES);
    }
  }
  return {
    size,
    radius,
    dots: Int32Array.from(dots),
    zenithsDeg: Float64Array.from(zeniths),
    bearingsDeg: Float64Array.from(bearings),
  };
}

/** Where a direction lies on the square. */
export function placeOf(dome: Dome, zenithDeg: number, bearingDeg: number): [number, number] {
  const r = (dome.radius * zenithDeg) / 90;
  const turn = bearingDeg / DEGREES;
  return [dome.size / 2 - r * Math.sin(turn), dome.size / 2 - r * Math.cos(turn)];
}

/** Azimuths for `skyStokesMap`: light from a bearing under a sun at another. */
export function azimuthsOf(dome: Dome, sunBearingDeg: number): Float64Array {
  return dome.bearingsDeg.map((bearing) => sunBearingDeg - bearing);
}

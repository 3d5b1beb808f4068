/** The temperature of the black body that a light looks most like. */
import type { Kelvins } from "../units.js";
import { checkTriple } from "./_checkTriple.js";
import { type LocusPoint, planckianLocus } from "./_planckianLocus.js";
import type { Xyz } from "./triples.js";

/** What `correlatedColourTemperature` gives. */
export interface ColourTemperature {
  /** Correlated colour temperature, K. */
  readonly temperatureK: Kelvins;
  /** Distance from the black bodies in the CIE 1960 diagram: positive above them (greenish), negative below (pinkish). */
  readonly duv: number;
}

/**
 * Correlated colour temperature, and the distance from the black bodies.
 *
 * Model: the nearest point of the Planckian locus in the CIE 1960 u, v diagram, found with Newton's method on Planck's law
 * itself, summed with the 1931 observer at 1 nm.
 * Validity: 1000-50 000 K and up to 0.05 from the locus, enforced (CIE 15 gives colour temperature no meaning further off):
 * many deep blue skies and very red suns have none.
 * Accuracy: 0.01 K and 1e-7 of duv on and off the locus over the whole range (tested against lights made from Planck's
 * law). Second radiation constant 0.01438776877 m K; the CIE's older 0.014388 gives 0.1 K more at 6500 K.
 * Source: CIE 15 (definition); Planck's law.
 *
 * @param xyz - [X, Y, Z] of the 1931 observer, in any common unit
 * @returns temperature, K, and duv, without unit
 * @throws TypeError if `xyz` is not three numbers; RangeError if they are no colour, or have no colour temperature within
 *   the range
 * @example
 * import { correlatedColourTemperature } from "airlight";
 * const d65 = correlatedColourTemperature([0.95047, 1, 1.08883]);
 * d65.temperatureK; // => 6502.62
 * d65.duv; // => 0.0032056
 */
export function correlatedColourTemperature(xyz: Readonly<Xyz>): ColourTemperature {
  checkTriple(xyz, "xyz", "correlatedColourTemperature");
  const [x, y, z] = xyz;
  const d = x + 15 * y + 3 * z;
  if (!(x >= 0 && y > 0 && z >= 0 && d < Number.POSITIVE_INFINITY)) {
    throw new RangeError(
      `correlatedColourTemperature: xyz must be a colour (X and Z 0 or more, Y above 0), got ${x}, ${y}, ${z}`,
    );
  }
  const [u, v] = [(4 * x) / d, (6 * y) / d];
  const { temperatureK, duv } = nearest(u, v);
  // a hundredth of a kelvin is the accuracy stated: an end of the range must not be lost to rounding
  if (temperatureK >= 999.99 && temperatureK <= 50_000.01 && Math.abs(duv) <= 0.05) {
    return { temperatureK, duv };
  }
  throw new RangeError(
    `correlatedColourTemperature: xyz must lie within 0.05 of a black body of 1000 to 50000 K in u, v, got chromaticity ${x / (x + y + z)}, ${y / (x + y + z)}`,
  );
}

/** Signed distance across the locus: positive on the side of greater v. */
function distance(point: LocusPoint, u: number, v: number): number {
  const { u1, v1 } = point;
  return ((v - point.v) * u1 - (u - point.u) * v1) / Math.sqrt(u1 * u1 + v1 * v1);
}

/** The nearest point of the locus, by Newton's method in mired from a rough start. */
function nearest(u: number, v: number): ColourTemperature {
  let mired = roughMired(u, v);
  for (let step = 0; ; step++) {
    const p = planckianLocus(mired);
    const along = (p.u - u) * p.u1 + (p.v - v) * p.v1;
    const speed = p.u1 * p.u1 + p.v1 * p.v1;
    const bend = (p.u - u) * p.u2 + (p.v - v) * p.v2;
    const change = -along / Math.max(speed + bend, speed / 4); // never uphill, however far off the light is
    mired = Math.min(Math.max(mired + change, 10), 1200);
    // the error left is of the order of the square of the last change
    if (Math.abs(change) < 1e-6 * mired || step === 30) {
      return { temperatureK: 1e6 / mired, duv: distance(p, u, v) };
    }
  }
}

/** Nearest of a few temperatures on Krystek's rational curve (1985, Color Res. Appl. 10, 38; from memory): only a start. */
function roughMired(u: number, v: number): number {
  let [best, least] = [0, Number.POSITIVE_INFINITY];
  for (let t = 900; t < 60_000; t *= 1.15) {
    const du =
      u -
      (0.860117757 + t * (1.54118254e-4 + t * 1.28641212e-7)) /
        (1 + t * (8.42420235e-4 + t * 7.08145163e-7));
    const dv =
      v -
      (0.317398726 + t * (4.22806245e-5 + t * 4.20481691e-8)) /
        (1 + t * (-2.89741816e-5 + t * 1.61456053e-7));
    const square = du * du + dv * dv;
    if (square < least) [best, least] = [1e6 / t, square];
  }
  return best;
}

/** Stokes parameters of the sky seen from the ground at low sun and in twilight. */
import { cos, sin } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { higherAlong, type Sight } from "./_higherSight.js";
import type { PreparedTwilight } from "./prepareTwilight.js";
import { onceScattered } from "./_singleSight.js";
import type { Stokes } from "./skyStokes.js";

export interface TwilightDirection {
  readonly sunZenithDeg: Degrees;
  readonly viewZenithDeg: Degrees;
  readonly relativeAzimuthDeg: Degrees;
}

export function twilightStokes(twilight: PreparedTwilight, direction: TwilightDirection): Stokes {
  const { dipole, shells, higher } = twilight;
  const sight = sightOf(direction);
  const once = 0.375 * onceScattered(shells, sight.sun, sight.view, sight.between);
  const even = (1 - dipole) / 3;
  let a = once * (0.5 * dipole * (1 - sight.theta * sight.theta) + even);
  let b = once * (0.5 * dipole * (1 - sight.phi * sight.phi) + even);
  let g = -once * 0.5 * dipole * sight.theta * sight.phi;
  if (higher !== undefined) {
    const [more, moreAcross, moreBoth] = higherAlong(shells, higher, dipole, sight);
    a += more;
    b += moreAcross;
    g += moreBoth;
  }
  return [a + b, a - b, 2 * g];
}

/** Cosines of a direction; the seen light travels at azimuth 0 from the sunbeam when it comes from the sun's side. */
function sightOf(direction: TwilightDirection): Sight {
  const zenith = direction.viewZenithDeg * RADIANS_PER_DEGREE;
  const sunZenith = direction.sunZenithDeg * RADIANS_PER_DEGREE;
  const azimuth = direction.relativeAzimuthDeg * RADIANS_PER_DEGREE;
  const [view, side] = [cos(zenith), sin(zenith)];
  const [sun, sunSide] = [cos(sunZenith), sin(sunZenith)];
  // the sun lies at (-sunSide, 0, sun); the seen light goes (side cos, side sin, -view)
  return {
    sun,
    view,
    between: side * sunSide * cos(azimuth) + view * sun,
    theta: view * cos(azimuth) * sunSide - side * sun,
    phi: sin(azimuth) * sunSide,
  };
}

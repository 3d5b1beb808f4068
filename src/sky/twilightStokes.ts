/** Stokes parameters of the sky seen from the ground at low sun and in twilight. */
import { checkPrepared } from "../_check.js";
import { cos, sin } from "../_numeric.js";
import { type Degrees, RADIANS_PER_DEGREE } from "../units.js";
import { checkTwilightDirection } from "./_checkTwilight.js";
import { higherAlong, type Sight } from "./_higherSight.js";
import type { PreparedTwilight } from "./prepareTwilight.js";
import { onceScattered } from "./_singleSight.js";
import type { Stokes } from "./skyStokes.js";

/** A sun and a line of sight from the ground. */
export interface TwilightDirection {
  /** True angle of the sun from the vertical, 0 to 96 degrees. */
  readonly sunZenithDeg: Degrees;
  /** Angle of the line of sight from the vertical, 0 to 90 degrees. */
  readonly viewZenithDeg: Degrees;
  /** Azimuth between seen light and sunbeam, degrees, as for `skyStokes`: 0 is the sky on the sun's side. */
  readonly relativeAzimuthDeg: Degrees;
}

/**
 * Stokes parameters of the sky seen from the ground, around a round Earth: before and after sunset.
 *
 * Model: sunlight scattered once, integrated along the line of sight from where it leaves the Earth's shadow; plus, if
 * prepared for all orders, what air lit by all other light sends. Which solution to use: `skyStokes` (flat layers) while
 * the sun and the sight are more than 10° above the horizon, this one below. For suns to 70° from the vertical the two
 * agree within 1 % at sights of 10° and within 2 % at 60°; at sights of 80° the flat layers are 1.5 to 5 % too bright.
 * Validity: suns 0 to 96° from the vertical, sights down to the horizon. Straight rays: within a degree of the horizon
 * the sun's refraction (half a degree) matters more than anything stated here; pass the true, not the apparent, zenith
 * angle of the sun.
 * Accuracy: single scattering 1e-4 to 96° against a brute-force sum. All orders: within 0.5 % of I to 93°, 1.3 % to 96°
 * against a seeded Monte Carlo of field vectors in shells (13 directions at 450 nm over a ground of albedo 0.1, suns
 * between the grid's angles among them; standard errors 0.1 to 0.8 %). Over ground of albedo 0.8 under a high sun 0.8 to
 * 1.5 % below the flat layers.
 * Source: as `prepareTwilight`.
 *
 * @param twilight - prepared air from `prepareTwilight`
 * @param direction - `sunZenithDeg` 0 to 96 degrees; `viewZenithDeg` 0 to 90 degrees; `relativeAzimuthDeg`, -3600 to 3600
 * @returns `[I, Q, U]` for a sunbeam of flux π through a unit area square to it, signs as `skyStokes`
 * @throws TypeError if an argument is of the wrong kind; RangeError if an angle is out of range
 * @example
 * import { prepareTwilight, twilightStokes } from "airlight";
 * const air = { rayleighDepth: 0.1, ozoneDepth: 0.03, depolarisation: 0.0279, groundAlbedo: 0.1, altitudeM: 0 };
 * const twilight = prepareTwilight({ ...air, orders: "single" });
 * twilightStokes(twilight, { sunZenithDeg: 94, viewZenithDeg: 0, relativeAzimuthDeg: 0 })[1]; // => -8.355e-5
 */
export function twilightStokes(twilight: PreparedTwilight, direction: TwilightDirection): Stokes {
  checkPrepared(twilight?.dipole, "prepareTwilight", "twilight", "twilightStokes");
  checkTwilightDirection(direction);
  const { dipole, shells, higher, nodes } = twilight;
  const sight = sightOf(direction);
  const once = 0.375 * onceScattered(shells, sight.sun, sight.view, sight.between, nodes);
  const even = (1 - dipole) / 3;
  let a = once * (0.5 * dipole * (1 - sight.theta * sight.theta) + even);
  let b = once * (0.5 * dipole * (1 - sight.phi * sight.phi) + even);
  let g = -once * 0.5 * dipole * sight.theta * sight.phi;
  if (higher !== undefined) {
    const [more, moreAcross, moreBoth] = higherAlong(shells, higher, dipole, sight, nodes);
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

/** The layers of the US Standard Atmosphere 1976 below 86 km, and the state at a height, unguarded (for use along a ray too). */
import { exp, pow } from "../_numeric.js";

/** Radius that turns geometric into geopotential height, m (USSA 1976, section 1.2.4). */
export const GEOPOTENTIAL_RADIUS_M = 6356766;
/** g0 M0 / R* = 9.80665 * 28.9644 / 8314.32, K per m of geopotential height. */
export const HYDROSTATIC_K_PER_M = 0.03416319473631036;
/** Molar mass of air at sea level, kg/mol, and gas constant, J/(mol K), of that standard. */
const MOLAR_MASS = 0.0289644;
const GAS_CONSTANT = 8.31432;
/** Avogadro constant of that standard, 1/mol. */
const AVOGADRO = 6.022169e23;

/** Geopotential height of each layer's base, m (table 4). */
export const BASE_M: readonly number[] = [0, 11_000, 20_000, 32_000, 47_000, 51_000, 71_000];
/** Molecular-scale temperature at the base, K. */
export const BASE_K: readonly number[] = [288.15, 216.65, 216.65, 228.65, 270.65, 270.65, 214.65];
/** Gradient of molecular-scale temperature, K per m. */
export const GRADIENT: readonly number[] = [-0.0065, 0, 0.001, 0.0028, 0, -0.0028, -0.002];

/** Ratio of molar mass to its sea-level value every 500 m of geometric height from 80 to 86 km (table 8, from memory). */
const MASS_RATIO: readonly number[] = [
  1, 0.999996, 0.999989, 0.999971, 0.999941, 0.999909, 0.99987, 0.999829, 0.999786, 0.999741,
  0.999694, 0.999641, 0.999579,
];

/** Pressure after a climb of `climbM` geopotential metres from a point of `baseK` and `basePa`, with a constant gradient. */
export function pressureAfterClimb(
  basePa: number,
  baseK: number,
  gradient: number,
  climbM: number,
): number {
  return gradient === 0
    ? basePa * exp((-HYDROSTATIC_K_PER_M * climbM) / baseK)
    : basePa * pow(baseK / (baseK + gradient * climbM), HYDROSTATIC_K_PER_M / gradient);
}

/** Geopotential height of a geometric height, both m. */
export function geopotentialHeight(altitudeM: number): number {
  return (GEOPOTENTIAL_RADIUS_M * altitudeM) / (GEOPOTENTIAL_RADIUS_M + altitudeM);
}

/** Index of the layer that holds a geopotential height (the lowest one also below sea level). */
export function standardLayer(geopotentialM: number): number {
  let layer = 0;
  while (layer < 6 && geopotentialM >= BASE_M[layer + 1]!) layer++;
  return layer;
}

/** Molecular-scale temperature, K, of the standard at a geometric height. */
export function standardMolecularTemperature(altitudeM: number): number {
  const h = geopotentialHeight(altitudeM);
  const layer = standardLayer(h);
  return BASE_K[layer]! + GRADIENT[layer]! * (h - BASE_M[layer]!);
}

/** Kinetic over molecular-scale temperature: 1 below 80 km, linear between the rows of table 8 above. */
export function molarMassRatio(altitudeM: number): number {
  if (altitudeM <= 80_000) return 1;
  const place = Math.min((altitudeM - 80_000) / 500, 12);
  const row = Math.min(Math.floor(place), 11);
  return MASS_RATIO[row]! + (place - row) * (MASS_RATIO[row + 1]! - MASS_RATIO[row]!);
}

/** The standard state at a geometric height from -5 to 86 km, not checked. */
export function standardState(altitudeM: number): {
  temperatureK: number;
  pressurePa: number;
  densityKgM3: number;
  numberDensityM3: number;
} {
  const h = geopotentialHeight(altitudeM);
  const last = standardLayer(h);
  let pressurePa = 101325;
  for (let i = 0; i < last; i++) {
    pressurePa = pressureAfterClimb(
      pressurePa,
      BASE_K[i]!,
      GRADIENT[i]!,
      BASE_M[i + 1]! - BASE_M[i]!,
    );
  }
  pressurePa = pressureAfterClimb(pressurePa, BASE_K[last]!, GRADIENT[last]!, h - BASE_M[last]!);
  const molecularK = BASE_K[last]! + GRADIENT[last]! * (h - BASE_M[last]!);
  const temperatureK = molecularK * molarMassRatio(altitudeM);
  return {
    temperatureK,
    pressurePa,
    densityKgM3: (pressurePa * MOLAR_MASS) / (GAS_CONSTANT * molecularK),
    numberDensityM3: (pressurePa * AVOGADRO) / (GAS_CONSTANT * temperatureK),
  };
}

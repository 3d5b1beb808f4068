/** Gravity averaged by mass over the standard atmosphere above a site. */
import { normalGravity } from "../air/_gravity.js";
import { standardState } from "../air/_standardLayers.js";

/** Top of the standard atmosphere, m; leaving out the 4e-6 of the mass above it changes the mean by 1e-7. */
const TOP_M = 86_000;
/** Slices between the site and the top, each with three Gauss-Legendre nodes: 1e-7 of the mean (the profile has kinks). */
const SLICES = 43;
const NODE = 0.7745966692414834; // sqrt(3/5), half-widths from the middle
const WEIGHT_SIDE = 5;
const WEIGHT_MIDDLE = 8;

/** Mass-weighted mean of g, m s⁻², above a height at a latitude. */
export function meanGravity(latitudeDeg: number, altitudeM: number): number {
  const half = (TOP_M - altitudeM) / (2 * SLICES);
  let mass = 0;
  let weight = 0;
  const add = (heightM: number, share: number): void => {
    const part = share * standardState(heightM).densityKgM3;
    mass += part;
    weight += part * normalGravity(latitudeDeg, heightM);
  };
  for (let i = 0; i < SLICES; i++) {
    const middle = altitudeM + (2 * i + 1) * half;
    add(middle - NODE * half, WEIGHT_SIDE);
    add(middle, WEIGHT_MIDDLE);
    add(middle + NODE * half, WEIGHT_SIDE);
  }
  return weight / mass;
}

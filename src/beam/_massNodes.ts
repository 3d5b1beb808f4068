/**
 * Air masses at which a beam table keeps the depth of saturating bands, and the parabola through three of them.
 * The depth goes as mass when weak and as mass^0.55 when strong, so it is interpolated in mass^0.55.
 */
import { exp, log } from "../_numeric.js";

/** Nodes are e^((k - 2) / 8), k = 0 to 38: 0.78 to 90. */
export const NODES = 39;
const STEP = 0.125;
const BEFORE_ONE = 2;
/** Node k over the first of three neighbours, to the power of 0.55: e^(0.55 k / 8). */
const EXPONENT = 0.55;
const SECOND = 1.0711683835756507;
const THIRD = 1.1474017059720723;
/** Masses with a node on either side, e^-0.125 to e^4.375 rounded inwards. */
const LEAST = 0.89;
const MOST = 79;

/** Air mass of node k. */
export function nodeMass(k: number): number {
  return exp(STEP * (k - BEFORE_ONE));
}

/** True if `mass` lies between the nodes, so that `nodeWeights` may be asked. */
export function withinNodes(mass: number): boolean {
  return mass >= LEAST && mass <= MOST;
}

/** First of three neighbouring nodes and the weight of each. */
export type NodeWeights = readonly [number, number, number, number];

/** The node nearest to `mass` with its two neighbours, and their Lagrange weights. */
export function nodeWeights(mass: number): NodeWeights {
  const place = log(mass) / STEP + BEFORE_ONE;
  const first = Math.round(place) - 1;
  const v = exp(EXPONENT * STEP * (place - first));
  return [
    first,
    ((v - SECOND) * (v - THIRD)) / ((1 - SECOND) * (1 - THIRD)),
    ((v - 1) * (v - THIRD)) / ((SECOND - 1) * (SECOND - THIRD)),
    ((v - 1) * (v - SECOND)) / ((THIRD - 1) * (THIRD - SECOND)),
  ];
}

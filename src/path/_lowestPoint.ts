/** Where a ray that starts downward turns, and how steeply it may start without meeting the ground. */
import { asin, sqrt } from "../_numeric.js";
import { DEGREES_PER_RADIAN } from "../units.js";
import { layerAt, type RayAir, refractivityAt } from "./_rayAir.js";
import { rootBetween } from "./_rootBetween.js";

/**
 * Height at which a ray turns that has lost the share `deficit` = 1 - sin z of n r at the observer; undefined if it meets
 * the ground first.
 */
export function lowestPoint(air: RayAir, deficit: number): number | undefined {
  const aim = raysProduct(air);
  const target = -deficit * aim.atObserver;
  let highM = air.observerM;
  let high = -target;
  for (const lowM of stepsDown(air)) {
    const middleM = (lowM + highM) / 2;
    const excess = (heightM: number): number => aim.above(heightM, middleM) - target;
    // the ground itself counts as passed: within a tenth of a micrometre
    const low = excess(lowM) - 1e-7;
    if (low <= 0) return rootBetween(excess, lowM, low, highM, high, 1e-13);
    highM = lowM;
    high = low;
  }
  return undefined;
}

/**
 * Elevations, degrees, 0 and falling, at which a ray just grazes each kink of the air below the observer; the last grazes the
 * ground, or what hides it.
 */
export function grazingDips(air: RayAir): number[] {
  const aim = raysProduct(air);
  const dips = [0];
  let least = 0;
  let highM = air.observerM;
  for (const lowM of stepsDown(air)) {
    const excess = aim.above(lowM, (lowM + highM) / 2);
    highM = lowM;
    if (excess >= least) continue;
    least = excess;
    const deficit = -least / aim.atObserver;
    dips.push(-asin(sqrt(deficit * (2 - deficit))) * DEGREES_PER_RADIAN);
  }
  return dips;
}

/** n r, as its excess over that at the observer, in metres. */
interface RaysProduct {
  readonly atObserver: number;
  readonly above: (heightM: number, inLayerAroundM: number) => number;
}

function raysProduct(air: RayAir): RaysProduct {
  const state = new Float64Array(3);
  const { observerM } = air;
  const radius = air.earthRadiusM + observerM;
  const here = refractivityAt(air, layerAt(air, observerM), observerM, state);
  const above = (heightM: number, inLayerAroundM: number): number => {
    const there = refractivityAt(air, layerAt(air, inLayerAroundM), heightM, state);
    return (1 + there) * (heightM - observerM) + radius * (there - here);
  };
  return { atObserver: (1 + here) * radius, above };
}

function stepsDown({ kinksM, observerM }: RayAir): number[] {
  return kinksM.filter((heightM) => heightM < observerM).reverse();
}

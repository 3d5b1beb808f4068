/** Density of a constituent at a height, unguarded, and the heights that a quadrature must not step over. */
import { exp } from "../_numeric.js";
import type { ConstituentLayer, TabulatedLayer } from "./constituentLayer.js";

export function layerDensity(layer: ConstituentLayer, heightM: number): number {
  if (layer.shape === "exponential") return exp(-heightM / layer.scaleHeightM);
  if (layer.shape === "tabulated") return tableDensity(layer, heightM);
  const deviations = (heightM - layer.heightM) / layer.standardDeviationM;
  return exp(-0.5 * deviations * deviations);
}

/** Heights between which the density is smooth and changes by no more than a few scale heights, rising. */
export function layerBreaks(layer: ConstituentLayer): number[] {
  if (layer.shape === "tabulated") return [...layer.heightsM];
  if (layer.shape === "exponential") {
    return [8, 20, 44].map((times) => times * layer.scaleHeightM);
  }
  return [-7, -3.5, 0, 3.5, 7].map((d) => layer.heightM + d * layer.standardDeviationM);
}

function tableDensity({ heightsM, densities }: TabulatedLayer, heightM: number): number {
  const last = heightsM.length - 1;
  if (heightM < heightsM[0]! || heightM > heightsM[last]!) return 0;
  let low = 0;
  let high = last;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (heightM >= heightsM[middle]!) low = middle;
    else high = middle;
  }
  const share = (heightM - heightsM[low]!) / (heightsM[high]! - heightsM[low]!);
  return densities[low]! + share * (densities[high]! - densities[low]!);
}

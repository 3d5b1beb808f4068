/** Saturation vapour pressure over liquid water, Pa: exp(A T² + B T + C + D / T) (Giacomo 1982; kept by CIPM-2007 and Ciddor 1996). */
import { exp } from "../_numeric.js";

const A = 1.2378847e-5; // K-2
const B = -1.9121316e-2; // K-1
const C = 33.93711047;
const D = -6.3431645e3; // K

export function saturationVapourPressure(temperatureK: number): number {
  return exp(A * temperatureK * temperatureK + B * temperatureK + C + D / temperatureK);
}

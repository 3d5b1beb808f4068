/** The customary channel for turbidity. */
import type { Calibration } from "./calibrate.js";

/** Place in the list of channels of the one nearest 500 nm. */
export function nearestTo500(calibrations: readonly Calibration[]): number {
  const gaps = calibrations.map(({ optics }) => Math.abs(optics.channel.centreNm - 500));
  return gaps.indexOf(Math.min(...gaps));
}

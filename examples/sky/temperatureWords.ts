/** Colour temperature in words. */
import { correlatedColourTemperature } from "airlight";

/** Kelvins, or that the colour lies beyond the scale: a clear sky overhead is bluer than any black body. */
export function temperatureWords(xyz: readonly [number, number, number]): string {
  try {
    return `${correlatedColourTemperature(xyz).temperatureK.toFixed(0)} K`;
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return "no colour temperature";
  }
}

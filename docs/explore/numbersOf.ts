/** The numbers of a view as text. */
import type { View } from "./compute.js";

/** Three significant digits at least, thousands apart. */
function digits(value: number): string {
  if (value >= 1000) return Math.round(value).toLocaleString("en").replaceAll(",", " ");
  return value >= 0.001 || value === 0 ? value.toPrecision(3) : value.toExponential(2);
}

/** Pairs of name and value. */
export function numbersOf(view: View): [name: string, value: string][] {
  const { depths, colourTemperatureK } = view;
  return [
    ["Air mass", view.airMass.toFixed(3)],
    ["Ozone mass", view.ozoneMass.toFixed(3)],
    ["Direct illuminance, facing the sun", `${digits(view.illuminanceLx)} lx`],
    ["Direct illuminance, level ground", `${digits(view.levelLx)} lx`],
    [
      "Luminance of the sky overhead",
      view.zenithLuminance === undefined ? "not computed" : `${digits(view.zenithLuminance)} cd/m²`,
    ],
    ["Direct irradiance, 300 to 1100 nm", `${digits(view.irradiance)} W/m²`],
    [
      "Colour temperature",
      colourTemperatureK === undefined ? "none" : `${digits(colourTemperatureK)} K`,
    ],
    ["Slant depth of air, 550 nm", depths.air.toFixed(4)],
    ["Slant depth of ozone, 550 nm", depths.ozone.toFixed(4)],
    ["Slant depth of haze, 550 nm", depths.aerosol.toFixed(4)],
    ["Pressure at the site", `${(view.pressurePa / 100).toFixed(1)} hPa`],
    ["(n − 1) × 10⁶ at the site, 550 nm", view.refractivity.toFixed(3)],
  ];
}

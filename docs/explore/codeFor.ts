/** The code that produces the state shown on the explore page, for copying. */
import type { State, View } from "./compute.js";

/** A module that works out what the page shows; its comments hold the values shown. */
export function codeFor(state: State, view: View): string {
  const { heightDeg, altitudeM, ozoneDu, haze, co2Ppm } = state;
  return `import {
  airColumn, beamIrradiance, cie1931Observer5nm, clearBeam, encodeSrgb, fitToDisplay, spectrumToXyz,
  srgbHex, standardAtmosphere, tabulate, wavelengthGrid, xyzToLinearSrgb,
} from "airlight";

const altitudeM = ${altitudeM};
const { pressurePa } = standardAtmosphere(altitudeM);
const beam = clearBeam({
  column: airColumn({ pressurePa, altitudeM, latitudeDeg: 45, co2Ppm: ${co2Ppm} }),
  trueZenithDeg: 90 - ${heightDeg},
  ozoneDu: ${ozoneDu}, ozoneTemperatureK: 228, ozoneHeightM: 22000, nitrogenDioxideDu: 0.1, waterCm: 1.4,
  aerosol: { opticalDepth: ${haze}, referenceNm: 500, exponent: 1.3 },
});
beam.masses.air; // => ${view.airMass.toPrecision(5)}

const ground = tabulate((nm) => beamIrradiance(nm, beam, 1), wavelengthGrid(300, 1100, 2));
const [X, Y, Z] = spectrumToXyz(ground, cie1931Observer5nm);
Y; // => ${view.illuminanceLx.toPrecision(5)}
srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([X / Y, 1, Z / Y])))); // => "${view.sunColour}"
`;
}

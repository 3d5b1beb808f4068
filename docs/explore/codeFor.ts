/** The code that produces the state shown on the explore page, for copying. */
import type { State, View } from "./compute.js";
import { GROUND_ALBEDO, SKY_STEP_NM } from "./skyArc.js";

/** The lines about the sky overhead. */
function skyCode({ heightDeg, ozoneDu, co2Ppm }: State, view: View): string {
  if (view.zenithLuminance === undefined) return "";
  return `
const overhead = tabulate((nm) => {
  const air = rayleighOpticalDepth(nm, column);
  const layers = [
    { rayleighDepth: 0.1 * air, absorptionDepth: ozoneOpticalDepth(nm, ${ozoneDu}, 228) },
    { rayleighDepth: 0.9 * air, absorptionDepth: 0 },
  ];
  const sky = prepareSky({ layers, depolarisation: depolarisation(nm, ${co2Ppm}), groundAlbedo: ${GROUND_ALBEDO}, streams: 16 });
  const up = { viewZenithDeg: 0, relativeAzimuthDeg: 0, at: "ground" };
  return skyRadiance(illuminateSky(sky, 90 - ${heightDeg}), up, solarIrradiance(nm));
}, wavelengthGrid(400, 700, ${SKY_STEP_NM}));
const [zenithX, zenithY, zenithZ] = spectrumToXyz(overhead, cie1931Observer5nm);
zenithY; // => ${view.zenithLuminance.toPrecision(5)}
srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([zenithX / zenithY, 1, zenithZ / zenithY])))); // => "${view.zenithColour}"
`;
}

/** Five digits. */
function digits(value: number): string {
  return value === 0 ? "0" : value.toPrecision(5);
}

/** The line about the colour temperature, if there is one. */
function temperatureCode({ colourTemperatureK }: View): string {
  if (colourTemperatureK === undefined) return "";
  return `\ncorrelatedColourTemperature([X, Y, Z]).temperatureK; // => ${colourTemperatureK.toPrecision(5)}`;
}

/** A module that works out what the page shows; its comments hold the values shown. */
export function codeFor(state: State, view: View): string {
  const { heightDeg, altitudeM, ozoneDu, haze, co2Ppm } = state;
  const { air, ozone, aerosol } = view.depths;
  return `import {
  airColumn, beamIrradiance, beamOpticalDepths, cie1931Observer5nm, clearBeam, correlatedColourTemperature,
  depolarisation, encodeSrgb, fitToDisplay, illuminateSky, integrateSpectrum, moistAir, ozoneOpticalDepth,
  prepareSky, rayleighOpticalDepth, refractiveIndexCiddor, skyRadiance, solarIrradiance, spectrumToXyz, srgbHex,
  standardAtmosphere, tabulate, wavelengthGrid, xyzToLinearSrgb,
} from "airlight";

const altitudeM = ${altitudeM};
const { pressurePa, temperatureK } = standardAtmosphere(altitudeM);
pressurePa; // => ${view.pressurePa.toPrecision(6)}
const here = moistAir({ pressurePa, temperatureK, relativeHumidity: 0, co2Ppm: ${co2Ppm} });
1e6 * (refractiveIndexCiddor(550, here) - 1); // => ${view.refractivity.toPrecision(6)}

const column = airColumn({ pressurePa, altitudeM, latitudeDeg: 45, co2Ppm: ${co2Ppm} });
const beam = clearBeam({
  column,
  trueZenithDeg: 90 - ${heightDeg},
  ozoneDu: ${ozoneDu}, ozoneTemperatureK: 228, ozoneHeightM: 22000, nitrogenDioxideDu: 0.1, waterCm: 1.4,
  aerosol: { opticalDepth: ${haze}, referenceNm: 500, exponent: 1.3 },
});
beam.masses.air; // => ${view.airMass.toPrecision(5)}
beam.masses.ozone; // => ${view.ozoneMass.toPrecision(5)}
const depths = beamOpticalDepths(550, beam);
[depths.air, depths.ozone, depths.aerosol]; // => [${[air, ozone, aerosol].map(digits).join(", ")}]

const ground = tabulate((nm) => beamIrradiance(nm, beam, 1), wavelengthGrid(300, 1100, 2));
const [X, Y, Z] = spectrumToXyz(ground, cie1931Observer5nm);
Y; // => ${digits(view.illuminanceLx)}
Y * Math.sin((${heightDeg} * Math.PI) / 180); // => ${digits(view.levelLx)}
integrateSpectrum(ground, 300, 1100); // => ${view.irradiance.toPrecision(5)}${temperatureCode(view)}
srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([X / Y, 1, Z / Y])))); // => "${view.sunColour}"
${skyCode(state, view)}`;
}

/** Vertical optical depth of each constituent that obeys Bouguer's law; no guards. */
import { angstromOf } from "../column/_angstrom.js";
import { nitrogenDioxideDepthOf, ozoneDepthOf } from "../column/_gasDepth.js";
import { crossSectionOf } from "../scattering/_bodhaine.js";
import type { BeamState } from "./beam.js";

export function airDepth(wavelengthNm: number, state: BeamState): number {
  return crossSectionOf(wavelengthNm, state.column.co2Ppm) * state.column.moleculesPerM2;
}

/** 0 beyond 1098 nm, where the table ends. */
export function ozoneDepth(wavelengthNm: number, state: BeamState): number {
  return ozoneDepthOf(wavelengthNm, state.ozoneDu, state.ozoneTemperatureK);
}

/** 0 beyond 660 nm, where the table ends. */
export function nitrogenDioxideDepth(wavelengthNm: number, state: BeamState): number {
  return nitrogenDioxideDepthOf(wavelengthNm, state.nitrogenDioxideDu, state.ozoneTemperatureK);
}

export function aerosolDepth(wavelengthNm: number, state: BeamState): number {
  return angstromOf(wavelengthNm, state.aerosol);
}

/** Optical depths along the beam; no guards. */
import {
  mixedGasCoefficientOf,
  mixedGasDepthOf,
  waterCoefficientOf,
  waterDepthOf,
} from "../absorption/_bandDepth.js";
import { aerosolDepth, airDepth, nitrogenDioxideDepth, ozoneDepth } from "./_verticalDepths.js";
import type { BeamOpticalDepths } from "./beamOpticalDepths.js";
import type { Beam } from "./beam.js";

export function slantDepths(wavelengthNm: number, beam: Beam): BeamOpticalDepths {
  const { state, masses } = beam;
  return {
    air: masses.air * airDepth(wavelengthNm, state),
    ozone: masses.ozone * ozoneDepth(wavelengthNm, state),
    nitrogenDioxide: masses.nitrogenDioxide * nitrogenDioxideDepth(wavelengthNm, state),
    aerosol: masses.aerosol * aerosolDepth(wavelengthNm, state),
    water: waterDepthOf(waterCoefficientOf(wavelengthNm) * beam.slantWaterCm),
    mixedGases: mixedGasDepthOf(mixedGasCoefficientOf(wavelengthNm) * beam.pressureAirMass),
  };
}

/** Their sum. */
export function slantDepth(wavelengthNm: number, beam: Beam): number {
  const d = slantDepths(wavelengthNm, beam);
  return d.air + d.ozone + d.nitrogenDioxide + d.aerosol + d.water + d.mixedGases;
}

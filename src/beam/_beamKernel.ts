/** The arrays behind `beamTable`, and the sum of depths over them. */
import {
  mixedGasCoefficientOf,
  mixedGasDepthOf,
  waterCoefficientOf,
  waterDepthOf,
} from "../absorption/_bandDepth.js";
import { STANDARD_ATMOSPHERE } from "../constants.js";
import { attenuate, attenuationPowers, UNITS_PER_DEPTH } from "./_attenuate.js";
import { addBand, type BandRows, bandRows } from "./_bandRows.js";
import { aerosolDepth, airDepth, nitrogenDioxideDepth, ozoneDepth } from "./_verticalDepths.js";
import type { BeamMasses, BeamState } from "./beam.js";

/** What the kernel reads; its layout is no promise. */
export interface BeamKernel {
  /** Vertical depths, a row each of air, aerosol, ozone with nitrogen dioxide, and nitrogen dioxide alone, one after the other. */
  readonly vertical: Float64Array;
  /** Slant depths of water vapour at fixed air masses. */
  readonly water: BandRows;
  /** Slant depths of mixed gases at fixed air masses. */
  readonly mixedGases: BandRows;
  /** Powers of two for the exponential. */
  readonly powers: Float64Array;
}

export function beamKernel(wavelengthsNm: Float64Array, state: BeamState): BeamKernel {
  const count = wavelengthsNm.length;
  const vertical = new Float64Array(4 * count);
  const airAmount = state.column.pressurePa / STANDARD_ATMOSPHERE;
  wavelengthsNm.forEach((nm, i) => {
    const nitrogenDioxide = UNITS_PER_DEPTH * nitrogenDioxideDepth(nm, state);
    vertical[i] = UNITS_PER_DEPTH * airDepth(nm, state);
    vertical[count + i] = UNITS_PER_DEPTH * aerosolDepth(nm, state);
    vertical[2 * count + i] = UNITS_PER_DEPTH * ozoneDepth(nm, state) + nitrogenDioxide;
    vertical[3 * count + i] = nitrogenDioxide;
  });
  const water = wavelengthsNm.map((nm) => waterCoefficientOf(nm) * state.waterCm);
  const mixed = wavelengthsNm.map((nm) => mixedGasCoefficientOf(nm) * airAmount);
  return {
    vertical,
    water: bandRows(water, waterDepthOf),
    mixedGases: bandRows(mixed, mixedGasDepthOf),
    powers: attenuationPowers(),
  };
}

/** Fills the first `count` of `out` with transmittances; all masses must lie within the nodes. */
export function runKernel(
  kernel: BeamKernel,
  count: number,
  masses: BeamMasses,
  out: Float64Array,
): void {
  const { air, aerosol, ozone, nitrogenDioxide, water } = masses;
  sumRows(kernel.vertical, air, aerosol, ozone, count, out);
  const apart = nitrogenDioxide - ozone;
  if (apart !== 0) addRow(kernel.vertical.subarray(3 * count), apart, count, out);
  addBand(kernel.water, water, out);
  addBand(kernel.mixedGases, air, out);
  attenuate(out, count, kernel.powers);
}

function sumRows(
  rows: Float64Array,
  air: number,
  aerosol: number,
  ozone: number,
  count: number,
  out: Float64Array,
): void {
  const second = 2 * count;
  for (let i = 0; i < count; i++) {
    out[i] = air * rows[i]! + aerosol * rows[count + i]! + ozone * rows[second + i]!;
  }
}

function addRow(row: Float64Array, weight: number, count: number, out: Float64Array): void {
  for (let i = 0; i < count; i++) out[i] = out[i]! + weight * row[i]!;
}

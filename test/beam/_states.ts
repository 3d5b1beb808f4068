/** Beams the tests share. */
import fc from "fast-check";
import {
  type AirColumn,
  airColumn,
  type Beam,
  type BeamState,
  clearBeam,
} from "../../src/index.js";
import { between } from "../_generators.js";

export const seaLevel: AirColumn = airColumn({
  pressurePa: 101325,
  altitudeM: 0,
  latitudeDeg: 45,
  co2Ppm: 425,
});

/** Clear air at sea level. */
export const clearAir: BeamState = {
  column: seaLevel,
  ozoneDu: 344,
  ozoneTemperatureK: 225,
  ozoneHeightM: 22_000,
  nitrogenDioxideDu: 0.1,
  waterCm: 1.4,
  aerosol: { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 },
};

export const beamAtZenith = (trueZenithDeg: number, change: Partial<BeamState> = {}): Beam =>
  clearBeam({ ...clearAir, ...change, trueZenithDeg });

/** Air from a clean summit to a hazy city. */
export const states: fc.Arbitrary<BeamState> = fc
  .record({
    pressurePa: between(60_000, 104_000),
    altitudeM: between(0, 4000),
    ozoneDu: between(100, 600),
    ozoneTemperatureK: between(200, 298),
    ozoneHeightM: between(15_000, 35_000),
    nitrogenDioxideDu: between(0, 3),
    waterCm: between(0, 6),
    opticalDepth: between(0, 1),
    exponent: between(-0.2, 2),
  })
  .map(({ pressurePa, altitudeM, opticalDepth, exponent, ...rest }) => ({
    ...rest,
    column: airColumn({ pressurePa, altitudeM, latitudeDeg: 40, co2Ppm: 425 }),
    aerosol: { opticalDepth, referenceNm: 550, exponent },
  }));

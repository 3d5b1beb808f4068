/** Transmittances of the direct beam: 801 wavelengths by 1000 suns. */
import {
  airColumn,
  beamAt,
  beamTable,
  beamTransmittance,
  beamTransmittances,
  clearBeam,
  wavelengthGrid,
} from "../../dist/index.js";

const SUNS = 1000;
const PART = 100;
const wavelengths = wavelengthGrid(300, 1100, 1);
const COUNT = wavelengths.length;
const column = airColumn({ pressurePa: 101325, altitudeM: 0, latitudeDeg: 45, co2Ppm: 425 });
const noon = clearBeam({
  column,
  trueZenithDeg: 30,
  ozoneDu: 344,
  ozoneTemperatureK: 225,
  ozoneHeightM: 22000,
  nitrogenDioxideDu: 0.1,
  waterCm: 1.4,
  aerosol: { opticalDepth: 0.084, referenceNm: 500, exponent: 1.3 },
});
const table = beamTable(wavelengths, noon);
const suns = Array.from({ length: SUNS }, (_, i) => beamAt(noon, (i * 85) / SUNS));
const out = new Float64Array(COUNT);
/** The exponents, one row per sun, for the loops that only take exponentials. */
const exponents = new Float64Array(COUNT * SUNS);
suns.forEach((sun, k) => {
  beamTransmittances(table, sun, out);
  for (let i = 0; i < COUNT; i++) exponents[k * COUNT + i] = Math.log(out[i]);
});

/**
 * Calls `work(from)` with the first of a hundred suns, another hundred at each call: long samples would measure what else
 * the machine is doing.
 */
function turning(work) {
  let call = 0;
  return () => {
    work((call++ % (SUNS / PART)) * PART);
    return out[0] > 0 ? PART : 0;
  };
}

function byTable(from) {
  for (let k = from; k < from + PART; k++) beamTransmittances(table, suns[k], out);
}

/** Nothing but the exponential, as many times. */
function bareExp(from) {
  for (let k = from; k < from + PART; k++) {
    const row = k * COUNT;
    for (let i = 0; i < COUNT; i++) out[i] = Math.exp(exponents[row + i]);
  }
}

function oneByOne(from) {
  for (let k = from; k < from + PART; k++)
    for (let i = 0; i < COUNT; i++) out[i] = beamTransmittance(wavelengths[i], suns[k]);
}

export const beam = [
  {
    title: "beamTransmittances by table, 801 by 1000 suns",
    beside: "a bare Math.exp loop",
    count: COUNT * PART,
    ours: turning(byTable),
    naive: turning(bareExp),
    target: 1,
  },
  {
    title: "beamTransmittances by table, 801 by 1000 suns",
    beside: "a call per wavelength",
    count: COUNT * PART,
    ours: turning(byTable),
    naive: turning(oneByOne),
  },
];

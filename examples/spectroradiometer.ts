/**
 * A spectroradiometer's table of the direct sun back to sunlight outside the air, with uncertainties: `npm run spectrum`,
 * or with a CSV of your own of the same columns as its argument (then change SITE and AIR to what is true of it).
 */
import { readFileSync } from "node:fs";
import { relative } from "node:path";
import { fileURLToPath } from "node:url";
import {
  airColumn,
  angstromOpticalDepth,
  clearBeam,
  coverageFactor,
  ozoneOpticalDepth,
  type QuantityOfWavelength,
  rayleighOpticalDepth,
  removeAtmosphere,
  resampleWithCovariance,
  solarIrradiance,
} from "airlight";
import Papa from "papaparse";
import { tableAsText } from "./station/table.js";

const COLUMN = airColumn({ pressurePa: 95_200, altitudeM: 520, latitudeDeg: 47, co2Ppm: 425 });
const SUN_DISTANCE_AU = 1.0093;
const AIR = {
  column: COLUMN,
  trueZenithDeg: 58.3,
  ozoneDu: 325,
  ozoneTemperatureK: 225,
  ozoneHeightM: 22_000,
  nitrogenDioxideDu: 0.12,
  waterCm: 1.1,
  aerosol: { opticalDepth: 0.125, referenceNm: 500, exponent: 1.3 },
};
/** Standard uncertainties of what the air is taken to be, and of the instrument's scale. */
const UNCERTAINTY = { aerosolDepth: 0.005, ozoneDu: 8, rayleigh: 0.0015, scale: 0.012 };
const LEAST_TRANSMITTANCE = 0.02;

const file = process.argv[2] ?? fileURLToPath(new URL("spectrum/ground.csv", import.meta.url));
const { data } = Papa.parse<Record<string, string>>(readFileSync(file, "utf8"), {
  header: true,
  skipEmptyLines: true,
});
const column = (name: string): Float64Array => Float64Array.from(data, (row) => Number(row[name]));
const measured = {
  wavelengthsNm: column("wavelength_nm"),
  values: column("irradiance_w_m2_nm").map((value) => value * SUN_DISTANCE_AU * SUN_DISTANCE_AU),
};

const beam = clearBeam(AIR);
const { masses } = beam;
const causes: Record<string, QuantityOfWavelength> = {
  aerosol: (nm) =>
    angstromOpticalDepth(nm, { ...AIR.aerosol, opticalDepth: UNCERTAINTY.aerosolDepth }) *
    masses.aerosol,
  Rayleigh: (nm) => UNCERTAINTY.rayleigh * rayleighOpticalDepth(nm, COLUMN) * masses.air,
  ozone: (nm) =>
    nm > 1090
      ? 0
      : ozoneOpticalDepth(nm, UNCERTAINTY.ozoneDu, AIR.ozoneTemperatureK) * masses.ozone,
  scale: () => UNCERTAINTY.scale,
};
const outside = removeAtmosphere(measured, beam, {
  standardUncertainties: column("standard_uncertainty"),
  slantDepthUncertainties: Object.values(causes),
  leastTransmittance: LEAST_TRANSMITTANCE,
});

const wanted = [310, 325, 350, 375, 400, 450, 500, 550, 600, 650, 700, 750, 800, 870, 1000, 1050];
const some = resampleWithCovariance(outside, wanted);
const k = coverageFactor(0.95, Number.POSITIVE_INFINITY);
console.log(
  `${relative(".", file)}: ${data.length} wavelengths, sun ${AIR.trueZenithDeg}° from the zenith\n`,
);
console.log(
  `${tableAsText({
    title: "Sunlight outside the air at 1 au, W m⁻² nm⁻¹ (± half width of a 95 % interval)",
    columns: [
      ["wavelength", "nm"],
      ["found", ""],
      ["± 95 %", ""],
      ["± 95 %", "%"],
      ...Object.keys(causes).map((name) => [name, "± %"] as const),
      ["table", "solarIrradiance"],
      ["off", "%"],
    ],
    rows: wanted.map((nm, i) => {
      const value = some.values[i]!;
      const wide = k * Math.sqrt(some.covariance[i * wanted.length + i]!);
      const table = solarIrradiance(nm);
      const parts = Object.values(causes).map((cause) =>
        (100 * k * Math.abs(cause(nm))).toFixed(2),
      );
      return [
        String(nm),
        value.toFixed(4),
        wide.toFixed(4),
        ((100 * wide) / value).toFixed(2),
        ...parts,
        table.toFixed(4),
        ((value / table - 1) * 100).toFixed(2),
      ];
    }),
  })}\n`,
);
const refused = outside.refused.map((i) => measured.wavelengthsNm[i]!);
console.log(
  `Not divided, less than ${LEAST_TRANSMITTANCE} of the light came through: ${refused.join(", ") || "none"} nm`,
);
console.log(
  "Water and oxygen bands (690, 720, 760, 820, 940 nm) are sampled, not averaged over the slit: do not trust them.",
);

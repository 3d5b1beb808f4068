/** A night of stellar photometry to extinction, and to the aerosol that the clear air does not explain: `npm run starlight`. */
import { readFileSync } from "node:fs";
import {
  airColumn,
  airMassKastenYoung,
  type BandExtinction,
  coverageFactor,
  extinctionFit,
  magnitudeToOpticalDepth,
  modelExtinction,
  ozoneOpticalDepth,
  type Passband,
  type PredictedExtinction,
  planckRadiance,
  propagate,
  rayleighOpticalDepth,
  type StarObservation,
  tabulate,
  wavelengthGrid,
} from "airlight";
import Papa from "papaparse";
import { tableAsText } from "./station/table.js";

const SITE = { altitudeM: 2370, latitudeDeg: 28.3, co2Ppm: 425 };
/** What the analyst knows of the night, with standard uncertainties. */
const AIR = {
  pressurePa: { value: 76_900, standardUncertainty: 100 },
  ozoneDu: { value: 290, standardUncertainty: 15 },
};

const rowsOf = (name: string): Record<string, string>[] => {
  const text = readFileSync(new URL(`starlight/${name}`, import.meta.url), "utf8");
  return Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true }).data;
};

const observations = rowsOf("night.csv").map(
  (row): StarObservation => ({
    band: row.band!,
    magnitude: Number(row.magnitude),
    standardUncertainty: Number(row.standard_uncertainty),
    airMass: airMassKastenYoung(Number(row.apparent_zenith_deg)),
    catalogueMagnitude: Number(row.catalogue_magnitude),
    colourIndex: Number(row.colour_index),
  }),
);
const stars = rowsOf("stars.csv").map((row) => ({
  spectrum: tabulate(
    (nm) => planckRadiance(nm, Number(row.temperature_k)),
    wavelengthGrid(300, 900, 5),
  ),
  colourIndex: Number(row.colour_index),
}));
const curves = rowsOf("passbands.csv");
const passbandOf = (band: string): Passband => ({
  wavelengthsNm: Float64Array.from(curves, (row) => Number(row.wavelength_nm)),
  values: Float64Array.from(curves, (row) => Number(row[band])),
});

/** Extinction of air and ozone alone in a band. */
function clearAir(band: string, pressurePa: number, ozoneDu: number): PredictedExtinction {
  const column = airColumn({ ...SITE, pressurePa });
  return modelExtinction({
    passband: passbandOf(band),
    stars,
    airMasses: [1, 1.5, 2, 2.5],
    opticalDepth: (nm) => rayleighOpticalDepth(nm, column) + ozoneOpticalDepth(nm, ozoneDu, 225),
  });
}

/** Aerosol depth left in a band, with its budget. */
function aerosolOf({ band, extinction }: BandExtinction): ReturnType<typeof propagate> {
  const fitted = { value: extinction.value, standardUncertainty: extinction.standardUncertainty };
  return propagate(
    ({ fit, pressurePa, ozoneDu }) =>
      magnitudeToOpticalDepth(fit - clearAir(band, pressurePa, ozoneDu).extinction),
    { fit: fitted, ...AIR },
  );
}

const night = extinctionFit(observations, { secondOrder: true, colourTerm: true });
const kept = (band: BandExtinction): number =>
  observations.filter((star) => star.band === band.band).length - band.rejected.length;
const factor = (band: BandExtinction): number => coverageFactor(0.95, kept(band) - 4);
const shown = (
  { value, standardUncertainty }: { value: number; standardUncertainty: number },
  k: number,
) => `${value.toFixed(4)} ± ${(k * standardUncertainty).toFixed(4)}`;

console.log(
  "A night of starlight (invented; see examples/starlight/README.md). ± are half widths of 95 % intervals.\n",
);
console.log(
  `${tableAsText({
    title: "Fitted extinction",
    columns: [
      ["band", ""],
      ["zero point", "mag"],
      ["extinction", "mag / air mass"],
      ["second order", "mag / air mass / mag"],
      ["colour term", "mag / mag"],
      ["scatter", "mag"],
      ["kept", ""],
      ["left out", ""],
    ],
    rows: night.map((band) => {
      const k = factor(band);
      const { zeroPoint, extinction, secondOrder, colourTerm } = band;
      const terms = [zeroPoint, extinction, secondOrder, colourTerm].map((term) => shown(term, k));
      return [
        band.band,
        ...terms,
        band.scatter.toFixed(4),
        String(kept(band)),
        String(band.rejected.length),
      ];
    }),
  })}\n`,
);
console.log(
  `${tableAsText({
    title: "What clear air predicts, and the aerosol that is left",
    columns: [
      ["band", ""],
      ["extinction", "mag / air mass"],
      ["second order", "mag / air mass / mag"],
      ["aerosol depth", ""],
      ["of its variance: fit", "%"],
      ["pressure", "%"],
      ["ozone", "%"],
    ],
    rows: night.map((band) => {
      const clear = clearAir(band.band, AIR.pressurePa.value, AIR.ozoneDu.value);
      const { value, standardUncertainty, budget } = aerosolOf(band);
      const shares = budget.map(({ share }) => (share * 100).toFixed(1));
      return [
        band.band,
        clear.extinction.toFixed(4),
        clear.secondOrder.toFixed(4),
        shown({ value, standardUncertainty }, factor(band)),
        ...shares,
      ];
    }),
  })}\n`,
);
console.log("Left out");
for (const { rejected } of night) {
  for (const { index, reason } of rejected)
    console.log(`- line ${index + 2} of night.csv: ${reason}`);
}

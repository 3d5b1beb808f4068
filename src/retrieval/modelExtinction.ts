/** The extinction coefficients that a model of the air predicts for a passband. */
import { checkList, checkNumber, checkRecord } from "../_check.js";
import { checkFunction } from "../_checkFunction.js";
import { log } from "../_numeric.js";
import { checkSpectrum } from "../spectrum/_checkSpectrum.js";
import type { Passband, Spectrum } from "../spectrum/spectrum.js";
import type { Dimensionless, QuantityOfWavelength } from "../units.js";
import { bandTransmittance } from "./bandTransmittance.js";
import { checkAirMass } from "./_checkAirMass.js";
import { leastSquares } from "./_leastSquares.js";
import { opticalDepthToMagnitude } from "./opticalDepthToMagnitude.js";

const NAME = "modelExtinction";

/** A star as the model needs it. */
export interface ModelStar {
  /** Its light outside the air, any unit. */
  readonly spectrum: Spectrum;
  /** Its colour index, magnitudes, as in the observations. */
  readonly colourIndex: number;
}

/** Passband, stars and air for `modelExtinction`. */
export interface ExtinctionModel {
  /** Response of telescope, filter and detector; times wavelength where the detector counts photons. */
  readonly passband: Passband;
  /** Two or more stars of different colour, like those observed. */
  readonly stars: readonly ModelStar[];
  /** Vertical optical depth of the air at a wavelength in nm. */
  readonly opticalDepth: QuantityOfWavelength;
  /** Air masses, two or more, spread as those observed. */
  readonly airMasses: readonly Dimensionless[];
}

/** What `modelExtinction` returns, magnitudes per air mass. */
export interface PredictedExtinction {
  /** First-order extinction of a star of colour index 0. */
  readonly extinction: number;
  /** Change per magnitude of colour index. */
  readonly secondOrder: number;
}

/**
 * First- and second-order extinction that an optical depth predicts for a passband, as an extinction fit would find them.
 *
 * Model: the extinction of each star at each air mass from its own band mean, then a least-squares plane: constant, air mass,
 * colour times air mass, colour. Subtract it from the fitted extinction, and what is left is what the model does not
 * have: aerosol. All constituents share one air mass here, 2 % too much of ozone's part at air mass 3.
 * Validity: smooth passbands, colours and air masses like those of the night.
 * Accuracy: 1e-6 magnitudes on a grey air, where there is no second order; 2e-4 on blue and visual bands against a brute-force sum.
 * Source: definition of a band mean; extinction coefficients as in Hardie 1962 (from memory).
 *
 * @param model - `passband`, `stars`, `opticalDepth` and `airMasses`
 * @returns first- and second-order extinction, magnitudes per air mass
 * @throws TypeError if an argument is of the wrong kind; RangeError if stars or air masses do not differ or a value is out of range
 * @example
 * import { gaussianPassband, modelExtinction, planckRadiance, tabulate, wavelengthGrid } from "airlight";
 * const stars = [[12000, -0.1], [4500, 1.1]].map(([temperatureK, colourIndex]) => ({
 *   spectrum: tabulate((nm) => planckRadiance(nm, temperatureK), wavelengthGrid(200, 700, 5)), colourIndex,
 * }));
 * const blue = modelExtinction({
 *   passband: gaussianPassband(440, 90), stars, airMasses: [1, 1.5, 2],
 *   opticalDepth: (nm) => 0.0984 * (550 / nm) ** 4.09,
 * });
 * blue.extinction; // => 0.28752
 * blue.secondOrder; // => -0.02912
 */
export function modelExtinction(model: ExtinctionModel): PredictedExtinction {
  checkModel(model);
  const { passband, stars, opticalDepth, airMasses } = model;
  const rows = stars.flatMap(({ spectrum, colourIndex }) =>
    airMasses.map((airMass) => {
      const through = bandTransmittance(passband, spectrum, (nm) => airMass * opticalDepth(nm));
      return { airMass, colourIndex, magnitude: opticalDepthToMagnitude(-log(through)) };
    }),
  );
  const column = (of: (row: (typeof rows)[number]) => number): Float64Array =>
    Float64Array.from(rows, of);
  const fit = leastSquares(
    [
      column(({ airMass }) => airMass),
      column(({ airMass, colourIndex }) => colourIndex * airMass),
      column(() => 1),
      column(({ colourIndex }) => colourIndex),
    ],
    column(({ magnitude }) => magnitude),
    column(() => 1),
  );
  if (fit !== undefined) return { extinction: fit.unknowns[0]!, secondOrder: fit.unknowns[1]! };
  throw new RangeError(`${NAME}: stars must differ in colourIndex and airMasses from each other`);
}

function checkModel(model: ExtinctionModel): void {
  checkRecord(model, "model", NAME);
  checkSpectrum(model.passband, "passband", NAME);
  checkFunction(model.opticalDepth, "wavelength in nm", "opticalDepth", NAME);
  checkList(model.stars, 2, "stars", NAME);
  model.stars.forEach((star, i) => {
    checkRecord(star, `stars[${i}]`, NAME);
    checkNumber(star.colourIndex, -20, 20, "magnitudes", `stars[${i}].colourIndex`, NAME);
  });
  checkList(model.airMasses, 2, "airMasses", NAME);
  model.airMasses.forEach((airMass, i) => {
    checkAirMass(airMass, `airMasses[${i}]`, NAME);
  });
}

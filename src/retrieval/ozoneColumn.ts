/** Ozone column from readings of the direct sun. */
import { independentBudget } from "../_budget.js";
import type { Budget } from "../budget.js";
import { log, pow } from "../_numeric.js";
import { MOLECULES_PER_DOBSON_UNIT } from "../constants.js";
import type {
  AstronomicalUnits,
  Dimensionless,
  DobsonUnits,
  Nanometres,
  SquareMetres,
} from "../units.js";
import { checkOzone } from "./_checkOzone.js";
import { ozoneParts, solveOzone } from "./_ozoneParts.js";
import { dot } from "./_smallMatrices.js";

/** One channel's reading. */
export interface OzoneChannel {
  /** Wavelength, 200 to 4000 nm. */
  readonly wavelengthNm: Nanometres;
  /** Reading, above 0. */
  readonly signal: number;
  /** Its standard uncertainty, same unit. */
  readonly signalStandardUncertainty: number;
  /** Signal outside the air at 1 au, above 0. */
  readonly constant: number;
  /** Its standard uncertainty, same unit. Give one of the two uncertainties of each channel a value above 0. */
  readonly constantStandardUncertainty: number;
  /** Ozone cross-section averaged over the passband (see `bandTransmittance`), m² per molecule. */
  readonly crossSectionM2: SquareMetres;
  /** Slant optical depth of the air (Rayleigh) and of other known gases in this channel. */
  readonly knownSlantDepth: Dimensionless;
}

/** The way through the air, and what is taken for the aerosol. */
export interface OzonePath {
  /** Distance of the sun, 0.9 to 1.1 au. */
  readonly sunDistanceAu: AstronomicalUnits;
  /** Air mass of ozone, above 0, to 50. */
  readonly ozoneAirMass: Dimensionless;
  /** Its relative standard uncertainty (height of the layer). */
  readonly ozoneAirMassRelativeUncertainty: Dimensionless;
  /** Air mass of the aerosol, above 0, to 50. */
  readonly aerosolAirMass: Dimensionless;
  /** Powers of wavelength, -6 to 6, whose sum is the aerosol's depth: [0] for an ultraviolet pair, [0, -1, -2] for six visible channels. */
  readonly aerosolPowers: readonly number[];
  /** Relative standard uncertainty of all known slant depths together (pressure). */
  readonly knownRelativeUncertainty: Dimensionless;
  /** Relative standard uncertainty of all cross-sections together. */
  readonly crossSectionRelativeUncertainty: Dimensionless;
}

/** What `ozoneColumn` returns; the budget is in Dobson units. */
export interface OzoneColumn extends Budget {
  /** Vertical ozone column, DU. */
  readonly ozoneDu: DobsonUnits;
  /** Aerosol optical depth found at each channel's wavelength. */
  readonly aerosolOpticalDepths: Float64Array;
}

/**
 * Ozone column from direct-sun readings at two or more wavelengths, by differential absorption.
 *
 * Model: ln(constant / signal) less the known slant depths is ozone's slant depth plus the aerosol's, a sum of powers of
 * wavelength, solved by least squares with the errors of signals and constants as weights; with as many unknowns as channels
 * it is the classic pair.
 * Validity: an ultraviolet pair (305 to 325 nm) with an aerosol of equal depth in both, or visible channels across
 * the Chappuis band. The visible fit is weak: with calibrations of 0.4 % it carries 18 to 32 DU at air mass 2 if one channel
 * is near 610 nm; if none lies between 500 and 675 nm, 53 to 63 DU with two powers, 85 and more with three; less as one over the
 * air mass. Cross-sections at the centre of the band instead of means over it bias an ultraviolet pair of 2 nm width by some 5 to 13 DU. Ultraviolet light harms eyes and skin: mind the
 * usual cautions.
 * Accuracy: exact to 1e-8 DU on noise-free readings of the same model; 1 DU on a simulated ultraviolet pair of 2 nm width with
 * averaged cross-sections; the stated uncertainty matches the spread of 400 simulated pairs and fits within 10 %.
 * Source: Dobson's differential method (1931, from memory); Chappuis-band fits as King & Byrne 1976, J. Atmos. Sci. 33, 2242 (from memory).
 *
 * @param channels - readings at two or more wavelengths, more than there are aerosol powers
 * @param path - air masses, aerosol powers and common relative uncertainties
 * @returns ozone, DU, standard uncertainty and budget, DU, aerosol optical depths
 * @throws TypeError if an argument is of the wrong kind; RangeError if a value is out of range, channels are too few or cannot
 *   tell ozone from the aerosol
 * @example
 * import { ozoneColumn } from "airlight";
 * const slantMolecules = 300 * 2.68678e20 * 2;
 * const pair = [[306, 1.6e-23], [320, 2.4e-24]].map(([wavelengthNm, crossSectionM2]) => ({
 *   wavelengthNm, crossSectionM2, signal: Math.exp(-0.2 - crossSectionM2 * slantMolecules), signalStandardUncertainty: 0,
 *   constant: 1, constantStandardUncertainty: 0.002, knownSlantDepth: 0,
 * }));
 * const ozone = ozoneColumn(pair, {
 *   sunDistanceAu: 1, ozoneAirMass: 2, ozoneAirMassRelativeUncertainty: 0, aerosolAirMass: 2, aerosolPowers: [0],
 *   knownRelativeUncertainty: 0, crossSectionRelativeUncertainty: 0.01,
 * });
 * ozone.ozoneDu; // => 300.0
 * ozone.standardUncertainty; // => 3.02
 */
export function ozoneColumn(channels: readonly OzoneChannel[], path: OzonePath): OzoneColumn {
  checkOzone(channels, path, "ozoneColumn");
  const distance = path.sunDistanceAu * path.sunDistanceAu;
  const perDu = MOLECULES_PER_DOBSON_UNIT * path.ozoneAirMass;
  const powers = path.aerosolPowers.map((power) =>
    Float64Array.from(channels, ({ wavelengthNm }) => pow(wavelengthNm / 500, power)),
  );
  const columns = [
    Float64Array.from(channels, ({ crossSectionM2 }) => crossSectionM2 * perDu),
    ...powers.map((column) => column.map((value) => value * path.aerosolAirMass)),
  ];
  const slant = Float64Array.from(channels, ({ constant, signal, knownSlantDepth }) => {
    return log(constant / (signal * distance)) - knownSlantDepth;
  });
  const unknowns = solveOzone(columns, channels, slant);
  // what each channel's slant depth does to ozone: the fit of a depth of 1 in that channel alone
  const gains = channels.map((_, i) => {
    return solveOzone(
      columns,
      channels,
      Float64Array.from(channels, (_, j) => (i === j ? 1 : 0)),
    )[0]!;
  });
  const ozoneDu = unknowns[0]!;
  return {
    ozoneDu,
    aerosolOpticalDepths: Float64Array.from(channels, (_, i) =>
      dot(
        unknowns.subarray(1),
        Float64Array.from(powers, (column) => column[i]!),
      ),
    ),
    ...independentBudget(ozoneParts(channels, path, gains, ozoneDu)),
  };
}

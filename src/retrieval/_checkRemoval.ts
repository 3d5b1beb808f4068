/** The checks of `removeAtmosphere`. */
import { checkList, checkNumber, checkPrepared, checkRecord } from "../_check.js";
import { checkFunction } from "../_checkFunction.js";
import type { Beam } from "../beam/beam.js";
import { checkSpectrum } from "../spectrum/_checkSpectrum.js";
import type { Spectrum } from "../spectrum/spectrum.js";
import { checkUncertainty } from "./_checkPositive.js";
import type { RemovalOptions } from "./removeAtmosphere.js";

const NAME = "removeAtmosphere";

/** Throws unless spectrum and options are sound and of one length. */
export function checkRemoval(spectrum: Spectrum, beam: Beam, options: RemovalOptions): void {
  checkSpectrum(spectrum, "spectrum", NAME);
  checkPrepared(beam?.pressureAirMass, "clearBeam", "beam", NAME);
  checkRecord(options, "options", NAME);
  const { standardUncertainties, slantDepthUncertainties, leastTransmittance } = options;
  checkList(standardUncertainties, 0, "standardUncertainties", NAME);
  const count = spectrum.values.length;
  if (standardUncertainties.length !== count) {
    const got = standardUncertainties.length;
    throw new RangeError(
      `${NAME}: standardUncertainties must be as many as values, ${count}, got ${got}`,
    );
  }
  for (let i = 0; i < count; i++) {
    const u = standardUncertainties[i]!;
    checkUncertainty(u, `standardUncertainties[${i}]`, NAME);
  }
  checkList(slantDepthUncertainties, 0, "slantDepthUncertainties", NAME);
  slantDepthUncertainties.forEach((cause, i) => {
    checkFunction(cause, "wavelength in nm", `slantDepthUncertainties[${i}]`, NAME);
  });
  checkNumber(leastTransmittance, 1e-6, 1, "fraction", "leastTransmittance", NAME);
}

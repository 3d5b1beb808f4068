/** What a channel sees of its own light through the air. */
import { checkPositive } from "./_checkPositive.js";
import { checkFunction } from "../_checkFunction.js";
import { exp } from "../_numeric.js";
import { checkCover, checkSpectrum } from "../spectrum/_checkSpectrum.js";
import { segmentFrom, valueInSegment } from "../spectrum/_valueAt.js";
import type { Passband, Spectrum } from "../spectrum/spectrum.js";
import type { Fraction, QuantityOfWavelength } from "../units.js";

const NAME = "bandTransmittance";

/**
 * Transmittance that a channel sees: its passband and the light outside the air as weights.
 *
 * Model: ∫ S P exp(-slant depth) dλ / ∫ S P dλ by Simpson's rule between the wavelengths of passband and source. It is
 * no exponential of the air mass: the light that is left grows redder in a blue channel (Forbes effect).
 * Validity: the source must cover the passband; passbands count energy or photons as the caller's curve does.
 * Accuracy: 3e-6 relative against the integral in closed form on a Gaussian band 20 nm wide (depth changing by 0.01 per nm), 5e-6
 * with a source that slopes by 2 % per nm; it is the sampling of the curves that counts.
 * Source: definition of a band mean.
 *
 * @param passband - relative response of the channel
 * @param source - light outside the air, any unit (`tabulate(solarIrradiance, ...)`, a star, a constant)
 * @param slantDepth - slant optical depth as a function of wavelength in nm
 * @returns transmittance, 0 to 1 for a slant depth that is not negative
 * @throws TypeError if an argument is of the wrong kind; RangeError if wavelengths do not rise, the source does not cover the
 *   passband, or it has no light there
 * @example
 * import { bandTransmittance, gaussianPassband } from "airlight";
 * const flat = { wavelengthsNm: Float64Array.of(400, 600), values: Float64Array.of(1, 1) };
 * bandTransmittance(gaussianPassband(500, 20), flat, (nm) => 0.5 + 0.01 * (nm - 500)); // => 0.60872
 */
export function bandTransmittance(
  passband: Passband,
  source: Spectrum,
  slantDepth: QuantityOfWavelength,
): Fraction {
  checkSpectrum(passband, "passband", NAME);
  checkSpectrum(source, "source", NAME);
  checkFunction(slantDepth, "wavelength in nm", "slantDepth", NAME);
  const nodes = nodesOf(passband, source);
  checkCover(source, nodes[0]!, nodes[nodes.length - 1]!, "source", NAME);
  let [through, outside] = [0, 0];
  let [i, j] = [0, 0];
  const add = (nm: number, weight: number): void => {
    i = segmentFrom(passband.wavelengthsNm, nm, i);
    j = segmentFrom(source.wavelengthsNm, nm, j);
    const light =
      valueInSegment(passband.wavelengthsNm, passband.values, i, nm) *
      valueInSegment(source.wavelengthsNm, source.values, j, nm);
    outside += weight * light;
    if (light !== 0) through += weight * light * exp(-slantDepth(nm));
  };
  for (let k = 1; k < nodes.length; k++) {
    const [left, right] = [nodes[k - 1]!, nodes[k]!];
    add(left, right - left);
    add(0.5 * (left + right), 4 * (right - left));
    add(right, right - left);
  }
  checkPositive(outside, "light within the passband", NAME);
  return through / outside;
}

/** Wavelengths of both curves within the part of the passband that is not zero, rising, each once. */
function nodesOf(passband: Passband, source: Spectrum): number[] {
  const { wavelengthsNm, values } = passband;
  const lit = wavelengthsNm.filter(
    (_, k) => values[k] !== 0 || (values[k - 1] ?? 0) !== 0 || (values[k + 1] ?? 0) !== 0,
  );
  const open = lit.length ? lit : wavelengthsNm;
  const [first, last] = [open[0]!, open[open.length - 1]!];
  const all = [...open, ...source.wavelengthsNm].filter((nm) => nm >= first && nm <= last);
  return [...new Set(all)].sort((a, b) => a - b);
}

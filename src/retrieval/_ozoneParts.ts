/** The fit of `ozoneColumn` and the lines of its budget. */
import { leastSquares } from "./_leastSquares.js";
import type { OzoneChannel, OzonePath } from "./ozoneColumn.js";

/** Unknowns of the weighted fit: ozone first, then the aerosol's coefficients. */
export function solveOzone(
  columns: readonly Float64Array[],
  channels: readonly OzoneChannel[],
  data: Float64Array,
): Float64Array {
  const weights = Float64Array.from(channels, (channel) => {
    const signal = channel.signalStandardUncertainty / channel.signal;
    const constant = channel.constantStandardUncertainty / channel.constant;
    return 1 / (signal * signal + constant * constant);
  });
  const fit = leastSquares(columns, data, weights);
  if (fit !== undefined) return fit.unknowns;
  throw new RangeError(
    "ozoneColumn: channels must tell ozone from the aerosol: give other wavelengths or fewer powers",
  );
}

/** Lines of the budget; `gains`: Dobson units per slant depth in each channel. */
export function ozoneParts(
  channels: readonly OzoneChannel[],
  path: OzonePath,
  gains: readonly number[],
  ozoneDu: number,
): { input: string; standardUncertainty: number; sensitivity: number }[] {
  const known = channels.reduce((sum, channel, i) => sum + gains[i]! * channel.knownSlantDepth, 0);
  const part = (input: string, standardUncertainty: number, sensitivity: number) => ({
    input,
    standardUncertainty,
    sensitivity,
  });
  return [
    ...channels.flatMap(({ wavelengthNm, ...channel }, i) => [
      part(
        `signal ${wavelengthNm} nm`,
        channel.signalStandardUncertainty,
        -gains[i]! / channel.signal,
      ),
      part(
        `constant ${wavelengthNm} nm`,
        channel.constantStandardUncertainty,
        gains[i]! / channel.constant,
      ),
    ]),
    part("known slant depths", path.knownRelativeUncertainty, -known),
    part("ozone air mass", path.ozoneAirMassRelativeUncertainty, -ozoneDu),
    part("cross-sections", path.crossSectionRelativeUncertainty, -ozoneDu),
  ];
}

/** Comparing what two engines worked out. */

/**
 * Units in the last place that the results of two engines may differ by. Products, roots and our own exponential are the same
 * to the last bit everywhere; Math's logarithm, sine and power are not, and what is made of them by sums, exponentials of large
 * depths or differences (standard errors of a nearly perfect fit) differs by more.
 */
export const MOST_ULP = {
  airMassOnTruePath: 20,
  airMassesOnTruePath: 20,
  angstromFit: 1000,
  beamIrradiance: 10,
  beamTable: 10,
  beamTransmittance: 10,
  beamTransmittances: 50,
  constituentMassOnTruePath: 20,
  constituentMassesOnTruePath: 20,
  correlatedColourTemperature: 1000, // Duv, a small difference
  degreeOfPolarisation: 100,
  differentialRefraction: 500_000, // of two refractions; 5e-11 of them
  refractedPath: 1000,
  refractionOnPath: 10_000, // fitted: 1e-12 of the refraction
  refractionOnTruePath: 10_000,
  refractionsOnPath: 10_000,
  refractionsOnTruePath: 10_000,
  skyStokes: 100, // U where it nearly vanishes
  transferredCalibration: 500,
  twilightStokes: 10,
};
export const MOST_ULP_ELSEWHERE = 4;

/** The functions whose results differ by more than that, with the distance. */
export function tooFar(ours, theirs) {
  return Object.entries(distances(ours, theirs)).filter(
    ([name, ulp]) => !(ulp <= (MOST_ULP[name] ?? MOST_ULP_ELSEWHERE)),
  );
}

/** Distance of two numbers in units in the last place of the larger. */
export function ulpBetween(a, b) {
  if (Object.is(a, b) || a === b) return 0;
  if (!Number.isFinite(a) || !Number.isFinite(b)) return Number.POSITIVE_INFINITY;
  const size = Math.max(Math.abs(a), Math.abs(b), Number.MIN_VALUE * 2 ** 52);
  return Math.abs(a - b) / 2 ** (Math.floor(Math.log2(size)) - 52);
}

/** Largest distance by function name; Infinity where the lists do not match. */
export function distances(ours, theirs) {
  return Object.fromEntries(
    Object.entries(ours).map(([name, values]) => {
      const others = theirs[name] ?? [];
      if (others.length !== values.length || values.length === 0)
        return [name, Number.POSITIVE_INFINITY];
      return [name, Math.max(...values.map((v, i) => ulpBetween(Number(v), Number(others[i]))))];
    }),
  );
}

/** The checks of `angstromCurvature`. */
import { checkList, checkNumber, refuse } from "../_check.js";
import { sqrt } from "../_numeric.js";

const NAME = "angstromCurvature";
/** Relative standard uncertainty of an optical depth above which its logarithm has no usable error. */
const MOST_RELATIVE = 0.25;

/** Throws unless there are enough depths, each large enough for its uncertainty, and as large a covariance as they need. */
export function checkDepths(
  wavelengthsNm: ArrayLike<number>,
  opticalDepths: ArrayLike<number>,
  covariance: ArrayLike<number>,
): void {
  checkList(wavelengthsNm, 3, "wavelengthsNm", NAME);
  checkList(opticalDepths, 3, "opticalDepths", NAME);
  checkList(covariance, 9, "covariance", NAME);
  const count = wavelengthsNm.length;
  if (opticalDepths.length !== count || covariance.length !== count * count) {
    const got = `${opticalDepths.length} and ${covariance.length}`;
    throw new RangeError(
      `${NAME}: opticalDepths and covariance must be of ${count} and ${count * count} values, got ${got}`,
    );
  }
  for (let i = 0; i < count; i++) {
    checkNumber(wavelengthsNm[i], 200, 4000, "nm", `wavelengthsNm[${i}]`, NAME);
    const least = sqrt(covariance[i * count + i]!) / MOST_RELATIVE;
    const depth = opticalDepths[i]!;
    if (depth > 0 && depth >= least) continue;
    const range = `above 0 and at least four standard uncertainties, ${least}`;
    refuse(depth, range, "too little aerosol for an exponent?", `opticalDepths[${i}]`, NAME);
  }
}

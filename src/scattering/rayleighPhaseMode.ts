/** The scattering matrix between directions of the sky, as a series in azimuth that ends after three terms. */
import { checkNumber, refuse } from "../_check.js";
import type { Dimensionless } from "../units.js";

/**
 * One azimuth mode of the phase matrix of molecules for I, Q, U, referred to the vertical planes through the two directions.
 *
 * Model: with φ the azimuth from the light's old to its new direction, counter-clockwise from above, the phase matrix is
 * the sum over orders m = 0, 1, 2 of the mode's elements times cos(m φ) where row and column are both of (I, Q) or both U,
 * and times sin(m φ) elsewhere. Q is positive for a vibration in the vertical plane, U for one turned from it
 * counter-clockwise as seen by someone whom the light meets. Mean of the first element over all directions: 1.
 * Validity: cosines -1 to 1, depolarisation factor 0 to 0.5, enforced.
 * Accuracy: 1e-14 against `rayleighScatteringMatrix` turned into and out of the plane of scattering.
 * Source: Chandrasekhar 1950, Radiative Transfer, section 17 (his matrices, written for I, Q, U); Hansen & Travis 1974,
 * Space Sci. Rev. 16, 527, equation 2.16 (depolarisation).
 *
 * @param order - azimuth order m: 0, 1 or 2
 * @param cosineOut - cosine of the new direction from straight up, -1 to 1 (negative for light going down)
 * @param cosineIn - cosine of the old direction from straight up, -1 to 1
 * @param depolarisation - depolarisation factor for natural light, 0 to 0.5
 * @returns nine elements, row by row (rows: new I, Q, U; columns: old I, Q, U)
 * @throws TypeError if an argument is not a number; RangeError if it is out of range
 * @example
 * import { rayleighPhaseMode } from "airlight";
 * rayleighPhaseMode(0, 1, 1, 0)[0]; // => 1.5
 */
export function rayleighPhaseMode(
  order: 0 | 1 | 2,
  cosineOut: Dimensionless,
  cosineIn: Dimensionless,
  depolarisation: Dimensionless,
): Float64Array {
  const name = "rayleighPhaseMode";
  if (order !== 0 && order !== 1 && order !== 2) refuse(order, "0, 1 or 2", "", "order", name);
  checkNumber(cosineOut, -1, 1, "", "cosineOut", name);
  checkNumber(cosineIn, -1, 1, "", "cosineIn", name);
  checkNumber(depolarisation, 0, 0.5, "", "depolarisation", name);
  const dipole = (1 - depolarisation) / (1 + 0.5 * depolarisation);
  if (order === 0) return meanMode(cosineOut, cosineIn, dipole);
  const [i, q, u] = pattern(order, cosineOut);
  const [fromI, fromQ, fromU] = pattern(order, cosineIn);
  const scale = 1.5 * dipole;
  // biome-ignore format: a matrix, row by row
  return new Float64Array([
    scale * i * fromI, scale * i * fromQ, scale * i * fromU,
    scale * q * fromI, scale * q * fromQ, scale * q * fromU,
    -scale * u * fromI, -scale * u * fromQ, scale * u * fromU,
  ]);
}

/** How one component of a dipole's tensor looks from a direction: in I, Q and U. */
function pattern(order: 1 | 2, cosine: number): [number, number, number] {
  const square = cosine * cosine;
  if (order === 2) return [0.5 * (square - 1), 0.5 * (square + 1), cosine];
  const sine = Math.sqrt(1 - square);
  return [sine * cosine, sine * cosine, sine];
}

/** Order 0, which two components share: the horizontal and the vertical part of the tensor. */
function meanMode(cosineOut: number, cosineIn: number, dipole: number): Float64Array {
  const up = 1 - cosineOut * cosineOut;
  const from = 1 - cosineIn * cosineIn;
  const scale = 0.375 * dipole;
  const mode = new Float64Array(9);
  mode[0] = scale * ((2 - up) * (2 - from) + 2 * up * from) + 1 - dipole;
  mode[1] = scale * (2 * up * from - (2 - up) * from);
  mode[3] = scale * (2 * up * from - up * (2 - from));
  mode[4] = 3 * scale * up * from;
  return mode;
}

/** What air lit by any field sends towards a line of sight. */

/** Components of the field tensor: xx, yy, zz, xz; x horizontal towards the sun, z up. */
export const COMPONENTS = 4;

/**
 * Writes what air emits for each unit component of its field tensor, per scattering coefficient and solid angle: along a
 * vector e1 square to the sight (four values), along e2 square to both (four), between them (four). `sun1`, `sun2` are the
 * cosines of e1 and e2 from the sun, `z1` that of e1 from the vertical of the place, `sun` that of the sun; e2 is horizontal,
 * so that parts[7] and parts[10] stay as they were, 0.
 */
export function emission(
  sun1: number,
  sun2: number,
  z1: number,
  sun: number,
  dipole: number,
  parts: Float64Array,
): void {
  const sine = Math.sqrt(Math.max(1 - sun * sun, 1e-18));
  const x1 = (sun1 - sun * z1) / sine;
  const x2 = sun2 / sine;
  const scale = 0.375 / Math.PI;
  const d = scale * dipole;
  const even = (scale * (1 - dipole)) / 3;
  parts[0] = d * x1 * x1 + even;
  parts[1] = d * (1 - x1 * x1 - z1 * z1) + even;
  parts[2] = d * z1 * z1 + even;
  parts[3] = 2 * d * x1 * z1;
  parts[4] = d * x2 * x2 + even;
  parts[5] = d * (1 - x2 * x2) + even;
  parts[6] = even;
  parts[8] = d * x1 * x2;
  parts[9] = -d * x1 * x2;
  parts[11] = d * x2 * z1;
}

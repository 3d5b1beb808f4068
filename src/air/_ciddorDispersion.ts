/** Dispersion of dry air at 15 °C, 101 325 Pa, 450 ppm CO2 and of vapour at 20 °C, 1333 Pa (Ciddor 1996, equations 1 and 3). */

const K0 = 238.0185; // µm-2
const K1 = 5792105; // µm-2
const K2 = 57.362; // µm-2
const K3 = 167917; // µm-2
const CF = 1.022; // correction factor of the vapour's dispersion
const W0 = 295.235;
const W1 = 2.6422; // µm2
const W2 = -0.03238; // µm4
const W3 = 0.004028; // µm6

/** (n - 1) 1e8 of standard dry air at squared wavenumber s in µm-2. */
export function dryDispersion(s: number): number {
  return K1 / (K0 - s) + K3 / (K2 - s);
}

/** (n - 1) 1e8 of reference vapour. */
export function vapourDispersion(s: number): number {
  return CF * (W0 + s * (W1 + s * (W2 + s * W3)));
}

/** (n_group - 1) 1e8 of standard dry air: d(σ (n - 1)) / dσ, σ² = s. */
export function dryGroupDispersion(s: number): number {
  const a = K0 - s;
  const b = K2 - s;
  return (K1 * (K0 + s)) / (a * a) + (K3 * (K2 + s)) / (b * b);
}

/** (n_group - 1) 1e8 of reference vapour. */
export function vapourGroupDispersion(s: number): number {
  return CF * (W0 + s * (3 * W1 + s * (5 * W2 + s * 7 * W3)));
}

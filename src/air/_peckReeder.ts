/** Refractivity of dry air at 15 °C, 101 325 Pa, 300 ppm CO2 (Peck & Reeder 1972), unguarded; `scattering` builds on it too. */

const A = 8060.51;
const B = 2480990; // µm-2
const B_POLE = 132.274; // µm-2
const C = 17455.7; // µm-2
const C_POLE = 39.32957; // µm-2

/** n - 1 at squared wavenumber s in µm-2. */
export function peckReederRefractivity(s: number): number {
  return 1e-8 * (A + B / (B_POLE - s) + C / (C_POLE - s));
}

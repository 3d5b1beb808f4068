/** Molar mass of dry air, kg/mol, from its CO2: (15.0556 C + 28.9595) g/mol, C by volume (Bodhaine et al. 1999, equation 17). */
export function dryMolarMass(co2Ppm: number): number {
  return 1e-3 * (15.0556e-6 * co2Ppm + 28.9595);
}

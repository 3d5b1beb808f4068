/**
 * Nitrogen dioxide cross-section in bands of 5 nm, 1e-24 m2 per molecule (1e-20 cm2), base e.
 * IUPAC recommendation (after Vandaele et al. 1998) at 220 and 298 K to 495 nm; JPL Publication 19-5 (Burkholder et al.
 * 2020) at 294 K (temperature from memory) from 500 nm. Where both exist, 400-495 nm, JPL is 0.1 % lower to 3.5 % higher.
 */

/** 220 K, centres 280, 285, ... 495 nm. */
// biome-ignore format: eleven bands per row
export const NITROGEN_DIOXIDE_220K: readonly number[] = [
  5.33, 6.73, 8.79, 10.64, 12.82, 15.85, 18.7, 21.96, 24.94, 27.53, 29.82,
  33.62, 37.81, 39.11, 43.71, 47.55, 49.24, 54.18, 55.93, 58.96, 58.33, 58.97,
  62.2, 58.01, 63.2, 56.17, 60.82, 57.53, 58.43, 55.22, 52.95, 55.09, 47.33,
  47.77, 48.61, 39.68, 42.76, 40.54, 31.97, 37.95, 32.52, 23.33, 30.17, 28.63,
];

/** 298 K, centres 280, 285, ... 495 nm. */
// biome-ignore format: eleven bands per row
export const NITROGEN_DIOXIDE_298K: readonly number[] = [
  5.27, 6.82, 8.64, 10.64, 12.99, 16.04, 18.82, 21.64, 25.42, 28.79, 31.88,
  35.87, 40.2, 41.75, 46.1, 49.82, 50.77, 55.01, 56.07, 58.88, 59.24, 59.42,
  62, 59.2, 63.85, 57.68, 61.53, 58.92, 59.5, 56.7, 54.04, 55.54, 48.42,
  48.84, 48.13, 41.24, 42.97, 40.87, 33.56, 38.49, 33.44, 25.18, 30.74, 29.3,
];

/** 294 K, centres 500, 505, ... 660 nm. */
// biome-ignore format: eleven bands per row
export const NITROGEN_DIOXIDE_BEYOND: readonly number[] = [
  18.2, 24.3, 23.1, 16, 16.1, 17.9, 15.3, 10.6, 10.8, 12.7, 11,
  7.97, 6.05, 8.7, 8.48, 4.71, 4.47, 4.69, 5.39, 4.08, 3.95, 1.85,
  2.54, 3.53, 2.57, 1.96, 1.21, 1.33, 1.53, 1.92, 1.35, 0.873, 0.566,
];

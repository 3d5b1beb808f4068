/** The words for the codes of cloud screening. */

/**
 * Why a reading was left out: words for the codes that `cloudScreening` gives, by code.
 *
 * Source: the rules of `cloudScreening`.
 */
export const screeningReasons: readonly string[] = [
  "kept",
  "not a number or below -0.01",
  "varies within three readings",
  "alone between cloudy readings",
  "beyond three standard deviations of the day",
];

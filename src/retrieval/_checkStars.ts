/** The checks of `extinctionFit`. */
import { checkList, checkNumber, checkRecord, refuse } from "../_check.js";
import { checkAirMass } from "./_checkAirMass.js";
import type { StarObservation } from "./extinctionFit.js";

const NAME = "extinctionFit";
const SPARE = 3;
const LEAST_RANGE = 0.5;

/** Throws unless the observations are sound and enough for `terms` in each band; returns each band's places in the list. */
export function checkStars(
  observations: readonly StarObservation[],
  terms: number,
): ReadonlyMap<string, readonly number[]> {
  checkList(observations, 1, "observations", NAME);
  const bands = new Map<string, number[]>();
  observations.forEach((star, i) => {
    checkRecord(star, `observations[${i}]`, NAME);
    checkStar(star, `observations[${i}]`);
    bands.set(star.band, [...(bands.get(star.band) ?? []), i]);
  });
  for (const [band, places] of bands) {
    if (places.length < terms + SPARE) {
      throw new RangeError(
        `${NAME}: observations in ${band} must be at least ${terms + SPARE}, got ${places.length}`,
      );
    }
    const masses = places.map((i) => observations[i]!.airMass);
    const range = Math.max(...masses) - Math.min(...masses);
    if (range >= LEAST_RANGE) continue;
    throw new RangeError(
      `${NAME}: observations in ${band} must span at least ${LEAST_RANGE} of air mass, got ${range.toPrecision(3)}`,
    );
  }
  return bands;
}

function checkStar(star: StarObservation, at: string): void {
  if (typeof star.band !== "string") refuse(star.band, "a text", "", `${at}.band`, NAME);
  checkNumber(star.magnitude, -100, 100, "magnitudes", `${at}.magnitude`, NAME);
  const spread = `${at}.standardUncertainty`;
  checkNumber(star.standardUncertainty, Number.MIN_VALUE, 100, "magnitudes", spread, NAME);
  checkAirMass(star.airMass, `${at}.airMass`, NAME);
  checkNumber(star.catalogueMagnitude, -100, 100, "magnitudes", `${at}.catalogueMagnitude`, NAME);
  checkNumber(star.colourIndex, -20, 20, "magnitudes", `${at}.colourIndex`, NAME);
}

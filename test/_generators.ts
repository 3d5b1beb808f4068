/** fast-check generators over physical ranges: no NaN, no denormals. */
import fc from "fast-check";

/** Numbers spread evenly over [low, high]. */
export function between(low: number, high: number): fc.Arbitrary<number> {
  return fc
    .integer({ min: 0, max: 2 ** 31 - 1 })
    .map((i) => low + (high - low) * (i / (2 ** 31 - 1)));
}

/** Air as weather makes it: where Ciddor 1996 and CIPM-2007 were meant to be used, and a little beyond. */
export const airState: fc.Arbitrary<{
  pressurePa: number;
  temperatureK: number;
  relativeHumidity: number;
  co2Ppm: number;
}> = fc.record({
  pressurePa: between(50_000, 120_000),
  temperatureK: between(230, 320),
  relativeHumidity: between(0, 1),
  co2Ppm: between(0, 2000),
});

/** What a calibration refuses to work on. */
import { checkList, checkNumber, refuse } from "../_check.js";
import { checkAirMass } from "./_checkAirMass.js";

const LEAST_READINGS = 8;
const LEAST_RANGE = 1;

/** Throws unless the lists are lists of numbers of one length, every air mass is in (0, 50] and every weight above 0. */
export function checkReadings(
  airMasses: unknown,
  signals: unknown,
  weights: unknown,
  name: string,
): void {
  checkList(airMasses, 0, "airMasses", name);
  checkList(signals, 0, "signals", name);
  checkLength(signals.length, airMasses.length, "signals", name);
  for (let i = 0; i < airMasses.length; i++) {
    checkAirMass(airMasses[i], `airMasses[${i}]`, name);
    if (typeof signals[i] !== "number") refuse(signals[i], "a number", "", `signals[${i}]`, name);
  }
  if (weights === undefined) return;
  checkList(weights, 0, "weights", name);
  checkLength(weights.length, airMasses.length, "weights", name);
  for (let i = 0; i < weights.length; i++) {
    checkNumber(weights[i], Number.MIN_VALUE, Number.MAX_VALUE, "", `weights[${i}]`, name);
  }
}

/** Throws unless `kept`, places of readings out of `total`, are enough of them, and over a long enough range of air mass. */
export function checkEnough(
  kept: readonly number[],
  total: number,
  airMasses: ArrayLike<number>,
  name: string,
): void {
  if (kept.length < LEAST_READINGS) {
    const got = `got ${kept.length} of ${airMasses.length} given`;
    throw new RangeError(
      `${name}: signals needs at least ${LEAST_READINGS} usable readings, ${got}: add readings or choose a clearer morning`,
    );
  }
  if (2 * kept.length <= total) {
    const got = `got ${kept.length} of ${total}: choose a clearer morning`;
    throw new RangeError(`${name}: signals must lie on one line in more than half, ${got}`);
  }
  const masses = kept.map((i) => airMasses[i]!);
  const range = Math.max(...masses) - Math.min(...masses);
  if (range >= LEAST_RANGE) return;
  const got = `got ${range.toPrecision(3)}: take readings from a lower sun on`;
  throw new RangeError(
    `${name}: airMasses of the usable readings must span at least ${LEAST_RANGE}, ${got}`,
  );
}

function checkLength(got: number, wanted: number, argument: string, name: string): void {
  if (got === wanted) return;
  throw new RangeError(`${name}: ${argument} must be as many as airMasses, ${wanted}, got ${got}`);
}

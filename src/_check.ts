/** Guards that throw: TypeError for the wrong kind, RangeError for an impossible value, both saying what to do. */
import { refuse, show } from "./_refuse.js";

export { refuse } from "./_refuse.js";

/** Throws unless `value` is a number in [low, high]; `unit` is printed after the range ("" for none). */
export function checkNumber(
  value: unknown,
  low: number,
  high: number,
  unit: string,
  argument: string,
  functionName: string,
): asserts value is number {
  if (typeof value === "number" && value >= low && value <= high) return;
  const shown = unit === "fraction" ? ", as a fraction" : unit && ` ${unit}`;
  refuse(value, `${low} to ${high}${shown}`, slip(value, unit, low, high), argument, functionName);
}

/** Throws unless `value` is an object (a record of named inputs). */
export function checkRecord(
  value: unknown,
  argument: string,
  functionName: string,
): asserts value is object {
  if (typeof value === "object" && value !== null) return;
  throw new TypeError(
    `${functionName}: ${argument} must be a record of named values, got ${show(value)}`,
  );
}

/** Throws unless `field`, a number every record made by `maker` carries, is a number: catches raw input given for a prepared record. */
export function checkPrepared(
  field: unknown,
  maker: string,
  argument: string,
  functionName: string,
): void {
  if (typeof field === "number") return;
  throw new TypeError(`${functionName}: ${argument} must be made by ${maker}(...)`);
}

/** Throws unless `value` is an array or Float64Array of at least `least` elements (elements are not looked at). */
export function checkList(
  value: unknown,
  least: number,
  argument: string,
  functionName: string,
): asserts value is ArrayLike<number> {
  if (!Array.isArray(value) && !(value instanceof Float64Array)) {
    throw new TypeError(
      `${functionName}: ${argument} must be an array or a Float64Array, got ${show(value)}`,
    );
  }
  if (value.length >= least) return;
  throw new RangeError(
    `${functionName}: ${argument} needs at least ${least} values, got ${value.length}`,
  );
}

/** The likely slip behind a value out of range: the unit people mix up with `unit`, if converting it would fit. */
function slip(value: unknown, unit: string, low: number, high: number): string {
  const fits = (converted: number): boolean => converted >= low && converted <= high;
  if (typeof value !== "number") return "";
  if (unit === "Pa" && fits(value * 1000)) return "kPa? multiply by 1000";
  if (unit === "Pa" && fits(value * 100)) return "hPa? multiply by 100";
  if (unit === "K" && fits(value + 273.15)) return "°C? add 273.15";
  if (unit === "nm" && fits(value * 1000)) return "µm? multiply by 1000";
  if (unit === "m" && fits(value * 1000) && value < low) return "km? multiply by 1000";
  if (unit === "fraction" && value > 1 && value <= 100) return "percent? divide by 100";
  if (unit === "ppm" && value > 0 && value < low) return "fraction? multiply by 1e6";
  return "";
}

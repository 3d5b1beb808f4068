/** The elementary functions of the whole library, in one place, so that results can be made the same to the last bit in every engine. */
export { exp } from "./_exp.js";

/** Natural logarithm. */
export function log(x: number): number {
  return Math.log(x);
}
/** e^x - 1 without cancellation near 0. */
export function expm1(x: number): number {
  return Math.expm1(x);
}
/** ln(1 + x) without cancellation near 0. */
export function log1p(x: number): number {
  return Math.log1p(x);
}
/** Sine of radians. */
export function sin(x: number): number {
  return Math.sin(x);
}
/** Cosine of radians. */
export function cos(x: number): number {
  return Math.cos(x);
}
/** Tangent of radians. */
export function tan(x: number): number {
  return Math.tan(x);
}
/** Arc sine, radians. */
export function asin(x: number): number {
  return Math.asin(x);
}
/** Arc cosine, radians. */
export function acos(x: number): number {
  return Math.acos(x);
}
/** Arc tangent of y / x in the right quadrant, radians. */
export function atan2(y: number, x: number): number {
  return Math.atan2(y, x);
}
/** x to the power y, for x > 0. */
export function pow(x: number, y: number): number {
  return Math.pow(x, y);
}
/** Square root (the same bits everywhere by IEEE 754). */
export function sqrt(x: number): number {
  return Math.sqrt(x);
}
/** Cube root. */
export function cbrt(x: number): number {
  return Math.cbrt(x);
}

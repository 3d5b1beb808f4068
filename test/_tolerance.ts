/** Assertions that state their own tolerance. */
import { expect } from "vitest";

/** |actual - expected| <= tolerance |expected|. */
export function expectRelative(actual: number, expected: number, tolerance: number): void {
  const off = Math.abs(actual - expected) / Math.abs(expected);
  expect(off, `${actual} against ${expected}: relative ${off}`).toBeLessThanOrEqual(tolerance);
}

/** |actual - expected| <= tolerance, in the unit of both. */
export function expectAbsolute(actual: number, expected: number, tolerance: number): void {
  const off = Math.abs(actual - expected);
  expect(off, `${actual} against ${expected}: off by ${off}`).toBeLessThanOrEqual(tolerance);
}

/** Distance in units of the last place of `expected`. */
export function ulpsApart(actual: number, expected: number): number {
  const exponent = Math.max(-1022, Math.floor(Math.log2(Math.abs(expected))));
  return Math.abs(actual - expected) / 2 ** (exponent - 52);
}

/** `call` throws `kind` and its message names every one of `parts`. */
export function expectRefusal(
  call: () => unknown,
  kind: typeof RangeError | typeof TypeError,
  ...parts: string[]
): void {
  let caught: unknown;
  try {
    call();
  } catch (error) {
    caught = error;
  }
  expect(caught).toBeInstanceOf(kind);
  for (const part of parts) expect((caught as Error).message).toContain(part);
}

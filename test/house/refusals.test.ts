/** Bad input to every public function: an error that names the function, never an answer, NaN or the engine's own complaint. */
import { expect, it } from "vitest";
import * as airlight from "../../src/index.js";
// @ts-expect-error plain JavaScript: any engine runs it
import { resultsOf } from "../engines/_grid.mjs";

type Call = (...args: unknown[]) => unknown;
const functions = Object.entries(airlight).filter(([, value]) => typeof value === "function");

/** Arguments that work, from the first call of each function on the grid of all engines; and what functions have returned. */
const goodArguments = new Map<string, unknown[]>();
const made = new WeakSet<object>();

/** The function itself, but what it is called with is kept. */
function recording(name: string, run: Call): Call {
  return (...args) => {
    if (!goodArguments.has(name)) goodArguments.set(name, args);
    const result = run(...args);
    if (typeof result === "object" && result !== null) made.add(result);
    return result;
  };
}

const recorders = functions.map(([name, run]) => [name, recording(name, run as Call)]);
resultsOf({ ...airlight, ...Object.fromEntries(recorders) });

const UNFIT = [undefined, null, Number.NaN, Infinity, -1e300, "7", true, {}, [], () => 1];

/** What fits after all: optional arguments left out, empty lists and records, functions for functions. */
const FIT: Readonly<Record<string, readonly unknown[]>> = {
  constituents: [undefined, {}, []],
  terms: [[]],
  aerosolPowers: [[]],
  slantDepthUncertainties: [[]],
  "opticalDepthCovariance 1": [[]],
  "airMassesOnPath 0": [[]],
  "airMassesOnTruePath 0": [[]],
  "constituentMassesOnPath 0": [[]],
  "constituentMassesOnTruePath 0": [[]],
  "refractionsOnPath 0": [[]],
  "refractionsOnTruePath 0": [[]],
  "coverageFactor 1": [Infinity],
  secondOrder: [true],
  colourTerm: [true],
  // an observer of one's own: slips in its numbers are not looked for
  startNm: ["7", true],
  stepNm: ["7", true],
};

/** The record with another value under one name. */
const changed = (record: object, name: string, value: unknown): object => ({
  ...record,
  [name]: value,
});

/** Every unfit call of a function: one argument, or one value in a record of inputs, is wrong. */
function* unfitCalls(name: string, args: readonly unknown[]): Generator<[string, unknown[]]> {
  for (const [i, arg] of args.entries()) {
    const swap = (value: unknown): unknown[] => args.map((own, k) => (k === i ? value : own));
    for (const value of unfitFor(`${name} ${i}`, arg)) yield [`argument ${i}`, swap(value)];
    if (typeof arg !== "object" || arg === null || made.has(arg) || Array.isArray(arg)) continue;
    if (ArrayBuffer.isView(arg)) continue;
    if (name === "spectrumToXyz" && i === 1) continue; // kept under 1000 bytes: it looks for an observer, not into it
    for (const [key, own] of Object.entries(arg))
      for (const value of unfitFor(key, own)) yield [key, swap(changed(arg, key, value))];
  }
}

/** The values that do not fit a place now held by `own`. */
function unfitFor(place: string, own: unknown): unknown[] {
  return UNFIT.filter(
    (value) =>
      !(typeof value === "function" && typeof own === "function") &&
      !(FIT[place] ?? []).some((fit) => isLike(fit, value)),
  );
}

/** The same value, or both an empty list or record. */
function isLike(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  const both = typeof a === "object" && typeof b === "object" && a !== null && b !== null;
  return both && Array.isArray(a) === Array.isArray(b);
}

it("every function is tried", () => {
  expect([...goodArguments.keys()].sort()).toEqual(functions.map(([name]) => name).sort());
});

it.each(functions)("%s refuses what it cannot use, in its own name", (name, run) => {
  const args = goodArguments.get(name)!.slice(0, (run as Call).length || undefined);
  for (const [place, bad] of unfitCalls(name, args)) {
    let message = "nothing";
    try {
      (run as Call)(...bad);
    } catch (error) {
      message =
        error instanceof TypeError || error instanceof RangeError ? error.message : `${error}`;
    }
    expect(message, place).toMatch(new RegExp(`^${name}: `));
  }
});

import { describe, expect, it } from "vitest";
import { checkList, checkNumber, checkPrepared, checkRecord, refuse } from "../src/_check.js";
import { expectRefusal } from "./_tolerance.js";

/** The whole message of what `call` throws, with the name of its class. */
function messageOf(call: () => unknown): string {
  try {
    call();
  } catch (error) {
    return `${(error as Error).constructor.name}: ${(error as Error).message}`;
  }
  return "nothing thrown";
}
const number = (value: unknown, low: number, high: number, unit: string): string =>
  messageOf(() => checkNumber(value, low, high, unit, "x", "f"));

describe("checkNumber", () => {
  it("lets both ends and what lies between pass", () => {
    for (const value of [1, 1.5, 2]) expect(number(value, 1, 2, "m")).toBe("nothing thrown");
    expect(number(-0, 0, 1, "")).toBe("nothing thrown");
    expect(number(5e-324, 0, 1, "")).toBe("nothing thrown");
    expect(number(Number.POSITIVE_INFINITY, 0, Number.POSITIVE_INFINITY, "")).toBe(
      "nothing thrown",
    );
  });
  it("says function, argument, range with unit, value", () => {
    expect(number(3, 1, 2, "m s-1")).toBe("RangeError: f: x must be 1 to 2 m s-1, got 3");
    expect(number(0.5, 1, 2, "")).toBe("RangeError: f: x must be 1 to 2, got 0.5");
    expect(number(-2, 0, 1, "fraction")).toBe(
      "RangeError: f: x must be 0 to 1, as a fraction, got -2",
    );
    expect(number(Number.NaN, 1, 2, "m")).toBe("RangeError: f: x must be 1 to 2 m, got NaN");
    expect(number(Number.POSITIVE_INFINITY, 1, 2, "m")).toBe(
      "RangeError: f: x must be 1 to 2 m, got Infinity",
    );
  });
  it.each([
    ["3", 'TypeError: f: x must be 1 to 5 m, got the text "3"'],
    [undefined, "TypeError: f: x must be 1 to 5 m, got undefined"],
    [null, "TypeError: f: x must be 1 to 5 m, got null"],
    [true, "TypeError: f: x must be 1 to 5 m, got true"],
    [3n, "TypeError: f: x must be 1 to 5 m, got 3"],
    [[3], "TypeError: f: x must be 1 to 5 m, got an array of 1"],
    [{}, "TypeError: f: x must be 1 to 5 m, got an object"],
    [Symbol("s"), "TypeError: f: x must be 1 to 5 m, got Symbol(s)"],
  ])("refuses the kind of %s", (value, message) => {
    expect(number(value, 1, 5, "m")).toBe(message);
  });
  it.each([
    // unit, low, high, the slip, what is said; null where nothing should be
    ["Pa", 10_000, 140_000, 1013.25, "hPa? multiply by 100"],
    ["Pa", 10_000, 140_000, 101.325, "kPa? multiply by 1000"],
    ["Pa", 10_000, 140_000, 80, "kPa? multiply by 1000"],
    ["Pa", 10_000, 140_000, 2, null],
    ["Pa", 10_000, 140_000, 200_000, null],
    ["K", 180, 380, 20, "°C? add 273.15"],
    ["K", 180, 380, -40, "°C? add 273.15"],
    ["K", 180, 380, -100, null],
    ["K", 180, 380, 400, null],
    ["nm", 300, 1690, 0.55, "µm? multiply by 1000"],
    ["nm", 300, 1690, 2000, null],
    ["nm", 300, 1690, 2, null],
    ["m", 1000, 90_000, 22, "km? multiply by 1000"],
    ["m", -5000, 86_000, 90_000, null],
    ["m", 0, 100, 0.05, null],
    ["m", 1000, 90_000, 0.5, null],
    ["fraction", 0, 1, 50, "percent? divide by 100"],
    ["fraction", 0, 1, 100, "percent? divide by 100"],
    ["fraction", 0, 1, 101, null],
    ["fraction", 0, 1, -0.1, null],
    ["ppm", 100, 2000, 4.2e-4, "fraction? multiply by 1e6"],
    ["ppm", 100, 2000, 0, null],
    ["ppm", 100, 2000, 5000, null],
    ["DU", 0, 1000, 3000, null],
  ] as [string, number, number, number, string | null][])(
    "%s, %d to %d: %d",
    (unit, low, high, value, hint) => {
      const message = number(value, low, high, unit);
      if (hint) return expect(message).toContain(`(${hint})`);
      expect(message === "nothing thrown" || message.endsWith(`got ${value}`)).toBe(true);
    },
  );
  it("guesses no slip for NaN or text", () => {
    for (const unit of ["Pa", "K", "nm", "m", "fraction", "ppm"]) {
      expect(number(Number.NaN, 200, 300, unit)).toMatch(/got NaN$/);
      expect(number("20", 200, 300, unit)).toMatch(/got the text "20"$/);
    }
  });
});

describe("checkRecord", () => {
  it("takes objects and refuses the rest", () => {
    expect(() => checkRecord({}, "state", "f")).not.toThrow();
    expect(() => checkRecord(Object.create(null), "state", "f")).not.toThrow();
    const refused = (value: unknown): string => messageOf(() => checkRecord(value, "state", "f"));
    expect(refused(undefined)).toBe(
      "TypeError: f: state must be a record of named values, got undefined",
    );
    expect(refused(null)).toContain("got null");
    expect(refused(5)).toContain("got 5");
    expect(refused("air")).toContain('got the text "air"');
  });
});

describe("checkPrepared", () => {
  it("takes any number, NaN too, for only the maker writes it", () => {
    expect(() => checkPrepared(0, "moistAir", "air", "f")).not.toThrow();
    expect(() => checkPrepared(Number.NaN, "moistAir", "air", "f")).not.toThrow();
  });
  it.each([undefined, null, "1", {}])("refuses %s", (field) => {
    expect(messageOf(() => checkPrepared(field, "moistAir", "air", "f"))).toBe(
      "TypeError: f: air must be made by moistAir(...)",
    );
  });
});

describe("checkList", () => {
  it("takes arrays and Float64Arrays that are long enough, whatever is in them", () => {
    expect(() => checkList([1, 2], 2, "list", "f")).not.toThrow();
    expect(() => checkList(Float64Array.of(1, 2, 3), 2, "list", "f")).not.toThrow();
    expect(() => checkList([], 0, "list", "f")).not.toThrow();
    expect(() => checkList(["x"], 1, "list", "f")).not.toThrow();
  });
  it("refuses other kinds and short lists", () => {
    const refused = (value: unknown): string => messageOf(() => checkList(value, 2, "list", "f"));
    expect(refused([1])).toBe("RangeError: f: list needs at least 2 values, got 1");
    expect(refused(new Float64Array(0))).toBe("RangeError: f: list needs at least 2 values, got 0");
    const kind = "TypeError: f: list must be an array or a Float64Array, got ";
    expect(refused(new Float32Array(3))).toBe(`${kind}an object`);
    expect(refused({ length: 3 })).toBe(`${kind}an object`);
    expect(refused("abc")).toBe(`${kind}the text "abc"`);
    expect(refused(undefined)).toBe(`${kind}undefined`);
  });
});

describe("refuse", () => {
  it("throws RangeError for numbers and TypeError for all else, with a hint only if there is one", () => {
    expectRefusal(() => refuse(5, "odd", "", "n", "f"), RangeError, "f: n must be odd, got 5");
    expect(messageOf(() => refuse(5, "odd", "", "n", "f"))).not.toContain("(");
    expect(messageOf(() => refuse(5, "odd", "one less?", "n", "f"))).toContain("got 5 (one less?)");
    expectRefusal(() => refuse(null, "odd", "", "n", "f"), TypeError, "got null");
  });
});

import { describe, expect, it } from "vitest";
// @ts-expect-error plain JavaScript, shared with Deno
import { difference, parsePrinted } from "./_printed.mjs";

const differs = (text: string, actual: unknown): boolean =>
  difference(parsePrinted(text), actual) !== undefined;

describe("a printed value is compared to its last digit", () => {
  it.each([
    ["277.82", 277.8249],
    ["277.82 K", 277.8151],
    ["1.000268244", 1.0002682444],
    ["3.96e-31", 3.9649e-31],
    ["-3.10", -3.1049],
    ["5930", 5930.49],
    ["1_361", 1361],
    ["[0.3127, 0.329]", [0.31271, 0.3294]],
    ["[0.3127, 0.329]", new Float64Array([0.31271, 0.3294])],
    ["Float64Array(2) [1, 2]", new Float64Array([1, 2])],
    ["[1, 2, ...]", [1, 2, 3]],
    ["{ temperatureK: 6504, duv: 0.0032 }", { temperatureK: 6504.1, duv: 0.00321 }],
    ["{ a: 1, ... }", { a: 1, b: 2 }],
    ['"#ffcc00"', "#ffcc00"],
    ["true", true],
    ["NaN", Number.NaN],
    ["undefined", undefined],
    ["0.5 (a half)", 0.5],
    ["[[1], []]", [[1], []]],
  ])("%s is true of %j", (text, actual) => {
    expect(differs(text, actual)).toBe(false);
  });

  it.each([
    ["277.82", 277.8251],
    ["277.82", 277.8149],
    ["277.8200", 277.8249],
    ["3.96e-31", 3.9651e-31],
    ["3.96e-31", 0],
    ["-3.10", 3.1],
    ["1", Number.NaN],
    ["1", "1"],
    ["[0.3127, 0.329]", [0.3127]],
    ["[0.3127, 0.329]", [0.3127, 0.3296]],
    ["[1, 2, ...]", [1, 2]],
    ["{ a: 1 }", { a: 1, b: 2 }],
    ["{ a: 1, b: 2 }", { a: 1 }],
    ["{ a: 1 }", undefined],
    ['"#ffcc00"', "#ffcc01"],
    ["true", "true"],
    ["true", false],
    ["NaN", 0],
  ])("%s is not true of %j", (text, actual) => {
    expect(differs(text, actual)).toBe(true);
  });

  it.each(["", "about 3", "0.3 0.4", "[1, 2", "1.2.3", "{ a 1 }", "3 - 4"])(
    "%j cannot be read",
    (text) => {
      expect(() => parsePrinted(text)).toThrow("cannot read");
    },
  );
});

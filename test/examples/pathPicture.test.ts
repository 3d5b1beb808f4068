import { describe, expect, it } from "vitest";
import { drawErrors } from "../../examples/paths/drawErrors.js";
import { errorLines } from "../../examples/paths/errorLines.js";
import { standalone } from "../../examples/station/plotting.js";
import { textOf } from "../_source.js";

const lines = errorLines();
const numbers = /-?\d+(?:\.\d+)?/g;

describe("the picture of what published air masses are off by", () => {
  it("shows sizes known from tests of the formulas", () => {
    const at = (name: string, elevation: number): number =>
      lines.find((line) => line.name === name)!.points.find((p) => p.elevation === elevation)!
        .percent;
    expect(at("Kasten & Young 1989", 0)).toBeCloseTo(-0.625, 3);
    expect(at("Pickering 2002", 0)).toBeCloseTo(1.549, 3);
    expect(at("water: Kasten 1965", 0)).toBeCloseTo(-2.91, 2);
    expect(lines).toHaveLength(12);
  });

  it("is the one the guide shows, to two hundredths of a pixel", () => {
    const drawn = standalone(drawErrors(lines));
    const kept = textOf("examples/paths/air-mass-errors.svg");
    expect(drawn.replace(numbers, "0")).toBe(kept.replace(numbers, "0"));
    const [ours, theirs] = [drawn.match(numbers)!, kept.match(numbers)!];
    ours.forEach((value, i) => {
      expect(Math.abs(Number(value) - Number(theirs[i]))).toBeLessThanOrEqual(0.0201);
    });
  });
});

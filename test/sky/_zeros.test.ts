import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { copyOf, zerosFromBlocks } from "../../src/sky/_zeros.js";

describe("arrays cut from blocks", () => {
  it("are zero, of the length asked for, and no two share a number", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 1500 }), { maxLength: 40 }), (lengths) => {
        const zeros = zerosFromBlocks();
        const arrays = lengths.map((length, i) => {
          const made = zeros(length);
          expect(made).toHaveLength(length);
          expect(made.every((value) => value === 0)).toBe(true);
          return made.fill(i + 1);
        });
        for (const [i, made] of arrays.entries())
          expect(made.every((value) => value === i + 1)).toBe(true);
      }),
    );
  });
  it("copies are their own", () => {
    const values = Float64Array.of(1, 2, 3);
    const copy = copyOf(zerosFromBlocks(), values);
    expect(copy).toEqual(values);
    copy[1] = 7;
    expect(values[1]).toBe(2);
  });
  it("small ones come many to a block, large ones alone", () => {
    const zeros = zerosFromBlocks();
    const buffers = new Set(Array.from({ length: 64 }, () => zeros(128).buffer));
    // 64 kB in blocks of 8, 16, 32 and 64
    expect(buffers.size).toBe(4);
    expect(zeros(2000).buffer.byteLength).toBe(16_000);
  });
});

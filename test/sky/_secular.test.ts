import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { zerosFromBlocks } from "../../src/sky/_zeros.js";
import { rankOneDowndate } from "../../src/sky/_secular.js";
import { between } from "../_generators.js";
import { expectAbsolute, expectRelative } from "../_tolerance.js";

/** Largest relative residual of (diag - v vᵀ) z = λ z and departure from orthonormality. */
function faults(poles: Float64Array, vector: Float64Array): { residual: number; overlap: number } {
  const n = poles.length;
  const { values, vectors, couplings } = rankOneDowndate(zerosFromBlocks(), poles, vector);
  let [residual, overlap] = [0, 0];
  for (let a = 0; a < n; a++) {
    const z = vectors.subarray(a * n, (a + 1) * n);
    const along = z.reduce((s, x, j) => s + x * vector[j]!, 0);
    expectAbsolute(couplings[a]!, along, 1e-14 * Math.sqrt(poles[n - 1]!));
    for (let j = 0; j < n; j++) {
      const r = poles[j]! * z[j]! - vector[j]! * couplings[a]! - values[a]! * z[j]!;
      residual = Math.max(residual, Math.abs(r) / (poles[j]! + Math.abs(values[a]!)));
    }
    for (let b = 0; b < n; b++) {
      const y = vectors.subarray(b * n, (b + 1) * n);
      const sum = z.reduce((s, x, j) => s + x * y[j]!, 0);
      overlap = Math.max(overlap, Math.abs(sum - (a === b ? 1 : 0)));
    }
  }
  return { residual, overlap };
}

describe("rankOneDowndate", () => {
  it("solves a 2 x 2 by hand", () => {
    // diag(1, 3) - (1, 1)(1, 1)ᵀ = [[0, -1], [-1, 2]]: eigenvalues 1 ± sqrt 2
    const { values } = rankOneDowndate(
      zerosFromBlocks(),
      new Float64Array([1, 3]),
      new Float64Array([1, 1]),
    );
    expectRelative(values[0]!, 1 - Math.SQRT2, 1e-15);
    expectRelative(values[1]!, 1 + Math.SQRT2, 1e-15);
  });

  it("is orthogonal and exact for poles over many decades, near pairs and vectors from faint to strong", () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(between(0.05, 2), between(-1, 1), between(-9, 0)), {
          minLength: 1,
          maxLength: 20,
        }),
        between(-6, 0),
        (rows, closeness) => {
          const poles = new Float64Array(2 * rows.length);
          const vector = new Float64Array(2 * rows.length);
          let pole = 1;
          for (const [i, [step, part, faint]] of rows.entries()) {
            pole *= 10 ** step;
            poles[2 * i] = pole;
            poles[2 * i + 1] = pole * (1 + 10 ** (closeness - 1));
            const size = Math.sqrt(pole * 10 ** closeness);
            vector[2 * i] = size * 10 ** faint * (part >= 0 ? 1 : -1);
            vector[2 * i + 1] = size * (Math.abs(part) + 1e-3);
          }
          const { residual, overlap } = faults(poles, vector);
          expect(overlap).toBeLessThan(1e-14);
          expect(residual).toBeLessThan(5e-14);
        },
      ),
    );
  });
});

/** Literals of the room `beam` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const BEAM: readonly Equivalent[] = [
  {
    path: "src/beam/_massNodes.ts",
    line: "export const NODES = 39",
    literals: ["39"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/beam/_massNodes.ts",
    line: "const BEFORE_ONE = 2",
    literals: ["2"],
    why: "moves all nodes together; anywhere near they interpolate as well",
  },
  {
    path: "src/beam/_attenuate.ts",
    line: "const C4",
    literals: ["2.239395190875157e-12"],
    why: "0.1 % of this term is 1.4e-16 of the result, below rounding",
  },
  {
    path: "src/beam/_attenuate.ts",
    line: "const OCTAVES",
    literals: ["1076"],
    why: "more powers, all of them 0, that nothing asks for",
  },
  {
    path: "src/beam/_attenuate.ts",
    line: "const ROUNDER",
    literals: ["6755399441055744"],
    why: "any number of this size rounds to the nearest integer",
  },
  {
    path: "src/beam/_bandRows.ts",
    line: "amounts[first] === 0",
    literals: ["0"],
    why: "saves work: no band absorbs there",
  },
  {
    path: "src/beam/_bandRows.ts",
    line: "amounts[end - 1] === 0",
    literals: ["0"],
    why: "saves work: no band absorbs there",
  },
  {
    path: "src/beam/_bandRows.ts",
    line: "const three = ",
    literals: ["3"],
    why: "a longer view of the same rows; three are read",
  },
  {
    path: "src/beam/_beamKernel.ts",
    line: "new Float64Array(4 * count)",
    literals: ["4"],
    why: "a longer array holds the same rows",
  },
  {
    path: "src/beam/_beamKernel.ts",
    line: "if (apart !== 0)",
    literals: ["0"],
    why: "saves work: nothing would be added",
  },
];

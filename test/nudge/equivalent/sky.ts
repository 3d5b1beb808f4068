/** Literals of the room `sky` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const SKY: readonly Equivalent[] = [
  {
    path: "src/sky/_adding.ts",
    line: "const bounces = below.length > 0",
    literals: ["0"],
    why: "an empty list or one of 64 numbers and more",
  },
  {
    path: "src/sky/_adding.ts",
    line: "if (below.length === 0)",
    literals: ["0"],
    why: "an empty list or one of 64 numbers and more",
  },
  {
    path: "src/sky/_adding.ts",
    line: "if (l > 0) below",
    literals: ["0"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/sky/_amplitudes.ts",
    line: "const pair = ",
    literals: ["2"],
    why: "a longer array holds the same numbers",
  },
  {
    path: "src/sky/_beam.ts",
    line: "const ALIKE",
    literals: ["3e-6"],
    why: "near is near: the error of the step aside is its square",
  },
  {
    path: "src/sky/_beam.ts",
    line: "const STEP",
    literals: ["7e-6"],
    why: "near is near: the error of the step aside is its square",
  },
  {
    path: "src/sky/_beam.ts",
    line: "< 1e-300",
    literals: ["1e-300"],
    why: "keeps from a division of zero by zero; both forms agree long before",
  },
  {
    path: "src/sky/_beam.ts",
    line: "if (apart > 0)",
    literals: ["0"],
    why: "which of two forms of the same; the other would only overflow for great depths",
  },
  {
    path: "src/sky/_emission.ts",
    line: "const sine = ",
    literals: ["1e-18"],
    why: "keeps from a division by zero for a sun overhead, where x1 and x2 come out bounded",
  },
  {
    path: "src/sky/_fallThroughZero.ts",
    line: "const STEP_DEG",
    literals: ["0.5"],
    why: "how far apart the function is looked at: neutral points lie degrees apart",
  },
  {
    path: "src/sky/_fallThroughZero.ts",
    line: "for (let k = 1",
    literals: ["1"],
    why: "a zero in the first step is found in the second",
  },
  {
    path: "src/sky/_fallThroughZero.ts",
    line: "> 1e-9",
    literals: ["1e-9"],
    why: "where halving ends, far below what could be seen",
  },
];

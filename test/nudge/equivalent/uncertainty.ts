/** Literals of the room `uncertainty` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const UNCERTAINTY: readonly Equivalent[] = [
  {
    path: "src/uncertainty/_combine.ts",
    line: "const scale = steps.reduce",
    literals: ["0"],
    why: "room for rounding: impossible correlations miss it by far",
  },
  {
    path: "src/uncertainty/_combine.ts",
    line: "-1e-12 * scale",
    literals: ["1e-12"],
    why: "room for rounding: impossible correlations miss it by far",
  },
  {
    path: "src/uncertainty/_draws.ts",
    line: "normal: (u) =>",
    literals: ["5.551115123125783e-17"],
    why: "0.1 % of half the least step of the numbers drawn moves no result that can be told from chance",
  },
  {
    path: "src/uncertainty/_inputs.ts",
    line: "degreesOfFreedom = 1",
    literals: ["1"],
    why: "stands in for what was left out, so that the check lets it through",
  },
  {
    path: "src/uncertainty/_sensitivity.ts",
    line: "const least = ",
    literals: ["0", "1e-8", "1e-5"],
    why: "how far apart the differences are taken, not what they tend to",
  },
  {
    path: "src/uncertainty/_sensitivity.ts",
    line: "const step = ",
    literals: ["0.1", "1e-6"],
    why: "how far apart the differences are taken, not what they tend to",
  },
  {
    path: "src/uncertainty/_stability.ts",
    line: "const LEAST_BLOCKS",
    literals: ["5"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/uncertainty/_stability.ts",
    line: "if (value === 0)",
    literals: ["0"],
    why: "keeps the loop below from never ending; nothing else equals it",
  },
  {
    path: "src/uncertainty/_summary.ts",
    line: "for (let from = 0",
    literals: ["0"],
    why: "the first interval is what the others are compared with",
  },
  {
    path: "src/uncertainty/_trials.ts",
    line: "const size = blocks[0]",
    literals: ["0"],
    why: "all blocks have the same size",
  },
  {
    path: "src/uncertainty/_trials.ts",
    line: "steps.length : 2",
    literals: ["2"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/uncertainty/monteCarlo.ts",
    line: "mostTrials = 5e6",
    literals: ["5e6"],
    why: "trials come in blocks of 10 000 or more: 0.1 % is less than one",
  },
];

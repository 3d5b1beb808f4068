/** Literals of the room `retrieval` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

const COMMON = "a factor that all weights share";
const ROUND_MORE = "one more round over the same points gives the same line and the same scores";

export const RETRIEVAL: readonly Equivalent[] = [
  {
    path: "src/retrieval/_checkReading.ts",
    line: "constantDegreesOfFreedom = 1",
    literals: ["1"],
    why: "stands in for what was left out, so that the check lets it through",
  },
  {
    path: "src/retrieval/_cleanedLine.ts",
    line: "const settled = round > 1",
    literals: ["1"],
    why: ROUND_MORE,
  },
  {
    path: "src/retrieval/_cleanedPlane.ts",
    line: "const settled = round > 0",
    literals: ["0"],
    why: ROUND_MORE,
  },
  {
    path: "src/retrieval/_cleanedPlane.ts",
    line: "const ABSOLUTE_ROUNDS",
    literals: ["60"],
    why: "how near the start comes to least absolute deviations; the rounds after it end at the same points",
  },
  {
    path: "src/retrieval/_cleanedPlane.ts",
    line: "const SMALL",
    literals: ["1e-7"],
    why: "how near the start comes to least absolute deviations; the rounds after it end at the same points",
  },
  {
    path: "src/retrieval/_cleanedPlane.ts",
    line: "let round = 0; fit !== undefined && round < ABSOLUTE_ROUNDS",
    literals: ["0"],
    why: "how near the start comes to least absolute deviations; the rounds after it end at the same points",
  },
  {
    path: "src/retrieval/_ozoneParts.ts",
    line: "return 1 / (signal * signal",
    literals: ["1"],
    why: COMMON,
  },
  {
    path: "src/retrieval/_randomEffects.ts",
    line: "for (let step = 0; step < 60",
    literals: ["0", "60"],
    why: "fewer halvings already leave less than the rounding of the variances it is added to",
  },
  {
    path: "src/retrieval/_screeningRules.ts",
    line: "let [first, second] = [-1, -1]",
    literals: ["1"],
    why: "any number below 0 says that there is no reading yet",
  },
  {
    path: "src/retrieval/_screeningRules.ts",
    line: "let kept = 0",
    literals: ["0"],
    why: "a count, compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/retrieval/angstromFit.ts",
    line: "new Float64Array(x.length).fill(1)",
    literals: ["1"],
    why: COMMON,
  },
  {
    path: "src/retrieval/angstromFit.ts",
    line: "wavelengthNm !== wavelengthsNm[0]",
    literals: ["0"],
    why: "all are alike if all are like any one of them",
  },
  {
    path: "src/retrieval/angstromFit.ts",
    line: "wavelengthsNm must differ, got",
    literals: ["0"],
    why: "all are alike there",
  },
  {
    path: "src/retrieval/extinctionFit.ts",
    line: "const weights = column(",
    literals: ["1"],
    why: COMMON,
  },
  {
    path: "src/retrieval/langleyFit.ts",
    line: "weights?.[i] ?? 1",
    literals: ["1"],
    why: COMMON,
  },
  {
    path: "src/retrieval/langleyFit.ts",
    line: "const side = score < 0",
    literals: ["0"],
    why: "used for scores beyond 3 to either side",
  },
  {
    path: "src/retrieval/modelExtinction.ts",
    line: "column(() => 1)",
    literals: ["1"],
    why: "a factor that all weights share, and the unit of a constant that is not returned",
  },
  {
    path: "src/retrieval/ozoneColumn.ts",
    line: "pow(wavelengthNm / 500, power)",
    literals: ["500"],
    why: "each coefficient takes up the factor that its power of wavelength gains or loses",
  },
  {
    path: "src/retrieval/transferredCalibration.ts",
    line: "new Float64Array(used.length).fill(1)",
    literals: ["1"],
    why: COMMON,
  },
];

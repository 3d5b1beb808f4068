/** Literals of the room `colour` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const COLOUR: readonly Equivalent[] = [
  {
    path: "src/colour/encodeSrgb.ts",
    line: "return linear < 0",
    literals: ["0"],
    why: "lights this near to black were returned above",
  },
  {
    path: "src/colour/decodeSrgb.ts",
    line: "return encoded < 0",
    literals: ["0"],
    why: "lights this near to black were returned above",
  },
  {
    path: "src/colour/fitToDisplay.ts",
    line: "Math.max(0, Math.min(1, ",
    literals: ["1"],
    why: "cuts off a rounding above 1, nothing more",
  },
  {
    path: "src/colour/spectraToXyz.ts",
    line: "let [segment, first, end]",
    literals: ["0"],
    why: "the end moves with the first sample that is added",
  },
  {
    path: "src/colour/spectraToXyz.ts",
    line: "if (share === 0) return",
    literals: ["0"],
    why: "saves work: a share of zero would add zero",
  },
  {
    path: "src/colour/_checkObserver.ts",
    line: "const rows = ",
    literals: ["0"],
    why: "one row is too few as well",
  },
  {
    path: "src/colour/_checkObserver.ts",
    line: "const even = startNm > 0",
    literals: ["0"],
    why: "no observer starts at a thousandth of a nanometre, or goes by such steps",
  },
  {
    path: "src/colour/_checkObserver.ts",
    line: "rows > 1 &&",
    literals: ["1"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/colour/spectrumToXyz.ts",
    line: "let row = Math.max(0, shift)",
    literals: ["0"],
    why: "a start off the grid leads to the slower way, which gives the same",
  },
  {
    path: "src/colour/spectrumToXyz.ts",
    line: "observer?.stepNm > 0",
    literals: ["0"],
    why: "observers step by 1 or 5 nm; only a missing step is looked for",
  },
  {
    path: "src/colour/_planckianLocus.ts",
    line: "const w = 500",
    literals: ["500"],
    why: "a factor that all sums share",
  },
  {
    path: "src/colour/_planckianLocus.ts",
    line: "const p2 =",
    literals: ["1", "2"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/_planckianLocus.ts",
    line: "u2: (a2",
    literals: ["2"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "for (let step = 0",
    literals: ["0"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "const change = ",
    literals: ["4"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "mired = Math.min(",
    literals: ["10", "1200"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "1e-6 * mired",
    literals: ["1e-6"],
    why: "how fast and how far the steps go, not where they end",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "let [best, least] = ",
    literals: ["0"],
    why: "the first temperature looked at replaces it",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "for (let t = 900",
    literals: ["900", "60_000", "1.15"],
    why: "where Newton's steps start; they end at the same place",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "0.860117757 + t",
    literals: ["0.860117757", "1.54118254e-4", "1.28641212e-7"],
    why: "where Newton's steps start; they end at the same place",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "8.42420235e-4",
    literals: ["1", "8.42420235e-4", "7.08145163e-7"],
    why: "where Newton's steps start; they end at the same place",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "0.317398726 + t",
    literals: ["0.317398726", "4.22806245e-5", "4.20481691e-8"],
    why: "where Newton's steps start; they end at the same place",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "2.89741816e-5",
    literals: ["1", "2.89741816e-5", "1.61456053e-7"],
    why: "where Newton's steps start; they end at the same place",
  },
  {
    path: "src/colour/correlatedColourTemperature.ts",
    line: "[1e6 / t, square]",
    literals: ["1e6"],
    why: "where Newton's steps start; they end at the same place",
  },
];

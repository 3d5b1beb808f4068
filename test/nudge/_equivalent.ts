/** Literals whose change cannot show in any result, each with the reason. */

/** A literal, found by its file and a piece of its line. */
export interface Equivalent {
  readonly path: string;
  readonly line: string;
  readonly literal: string;
  readonly why: string;
}

export const EQUIVALENT: readonly Equivalent[] = [
  {
    path: "src/air/airToVacuumWavelength.ts",
    line: "const ROUNDS = 4",
    literal: "4",
    why: "the fixed point has converged to double precision; a fifth round changes nothing",
  },
  {
    path: "src/air/airToVacuumWavelength.ts",
    line: "for (let i = 0; i < ROUNDS",
    literal: "0",
    why: "three rounds already reach the stated accuracy; the fourth is the reserve",
  },
  {
    path: "src/air/_standardLayers.ts",
    line: "while (layer < 6",
    literal: "6",
    why: "beyond the last layer the comparison with the next base is false anyway",
  },
  {
    path: "src/air/_standardLayers.ts",
    line: "Math.min((altitudeM - 80_000) / 500, 12)",
    literal: "12",
    why: "heights end at 86 km, row 12",
  },
];

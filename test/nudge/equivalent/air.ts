/** Literals of the room `air` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const AIR: readonly Equivalent[] = [
  {
    path: "src/air/airToVacuumWavelength.ts",
    line: "const ROUNDS = 4",
    literals: ["4"],
    why: "the fixed point has converged to double precision; a fifth round changes nothing",
  },
  {
    path: "src/air/airToVacuumWavelength.ts",
    line: "for (let i = 0; i < ROUNDS",
    literals: ["0"],
    why: "three rounds already reach the stated accuracy; the fourth is the reserve",
  },
  {
    path: "src/air/_standardLayers.ts",
    line: "while (layer < 6",
    literals: ["6"],
    why: "beyond the last layer the comparison with the next base is false anyway",
  },
  {
    path: "src/air/_standardLayers.ts",
    line: "Math.min((altitudeM - 80_000) / 500, 12)",
    literals: ["12"],
    why: "heights end at 86 km, row 12",
  },
  {
    path: "src/air/airAtHeight.ts",
    line: "new Float64Array(3)",
    literals: ["3"],
    why: "a longer scratch array holds the same three numbers",
  },
  {
    path: "src/air/_shiftedProfile.ts",
    line: "new Float64Array(3)",
    literals: ["3"],
    why: "a longer scratch array holds the same three numbers",
  },
  {
    path: "src/air/tabulatedProfile.ts",
    line: "waterOriginM: 0",
    literals: ["0"],
    why: "a table has no exponential vapour: not looked at",
  },
  {
    path: "src/air/tabulatedProfile.ts",
    line: "waterScaleM: 1",
    literals: ["1"],
    why: "a table has no exponential vapour: not looked at",
  },
  {
    path: "src/air/_layerDensity.ts",
    line: "return [8, 20, 44]",
    literals: ["8", "20", "44"],
    why: "where the quadrature is cut, not what it sums: any near place gives the same integrals",
  },
  {
    path: "src/air/_layerDensity.ts",
    line: "return [-7, -3.5, 0, 3.5, 7]",
    literals: ["7", "3.5", "0"],
    why: "where the quadrature is cut, not what it sums: any near place gives the same integrals",
  },
  {
    path: "src/air/_layerDensity.ts",
    line: "while (high - low > 1)",
    literals: ["1"],
    why: "the difference of two whole numbers is 1 or at least 2",
  },
  {
    path: "src/air/_profileState.ts",
    line: "while (high - low > 1)",
    literals: ["1"],
    why: "the difference of two whole numbers is 1 or at least 2",
  },
  {
    path: "src/air/_refractivityCore.ts",
    line: "const PRESSURE_PA = 101325",
    literals: ["101325"],
    why: "any state gives the same factors",
  },
  {
    path: "src/air/_refractivityCore.ts",
    line: "const TEMPERATURE_K = 288.15",
    literals: ["288.15"],
    why: "any state gives the same factors",
  },
];

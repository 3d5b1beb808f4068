/** Literals of the room `spectrum` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const SPECTRUM: readonly Equivalent[] = [
  {
    path: "src/spectrum/solarIrradiance.ts",
    line: "const low = band > 0",
    literals: ["0"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/spectrum/solarIrradiance.ts",
    line: "const high = band < BANDS - 1",
    literals: ["1"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/spectrum/solarIrradiance.ts",
    line: "const below = widthOf(band - 1)",
    literals: ["1"],
    why: "compared with a whole number: anything between two of them does the same",
  },
  {
    path: "src/spectrum/wavelengthGrid.ts",
    line: "/ stepNm + 1e-9)",
    literals: ["1e-9"],
    why: "room for rounding: anything between the rounding and a step does the same",
  },
  {
    path: "src/spectrum/wavelengthGrid.ts",
    line: "if (steps >= 1e7)",
    literals: ["1e7"],
    why: "where a slip of the step becomes an error instead of an empty memory; the limit itself means nothing",
  },
  {
    path: "src/spectrum/gaussianPassband.ts",
    line: "for (let i = 0; i <= 2 * HALF_STEPS",
    literals: ["2"],
    why: "what is written past the end of a typed array is dropped",
  },
];

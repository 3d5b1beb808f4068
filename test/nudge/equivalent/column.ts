/** Literals of the room `column` whose change cannot show in any result. */
import type { Equivalent } from "./_equivalent.js";

export const COLUMN: readonly Equivalent[] = [
  {
    path: "src/column/_meanGravity.ts",
    line: "const TOP_M",
    literals: ["86_000"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const SLICES",
    literals: ["43"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const NODE",
    literals: ["0.7745966692414834"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const WEIGHT_SIDE",
    literals: ["5"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const WEIGHT_MIDDLE",
    literals: ["8"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const half = ",
    literals: ["2"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
  {
    path: "src/column/_meanGravity.ts",
    line: "const middle = ",
    literals: ["1"],
    why: "any near rule gives the mean within 1e-7, the accuracy stated",
  },
];

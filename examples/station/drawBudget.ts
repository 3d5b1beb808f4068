/** Picture of the budget of one reading: what each line contributes. */
import { barX, ruleX, text } from "@observablehq/plot";
import type { BudgetedReading } from "./budgetedReading.js";
import { draw, type PictureWidth } from "./plotting.js";

/** Bars of the lines' contributions to the standard uncertainty, and of all together. */
export function drawBudget({ depth }: BudgetedReading, width: PictureWidth): string {
  const lines = depth.budget
    .filter(({ standardUncertainty }) => standardUncertainty > 0)
    .map(({ input, contribution }) => ({ input, value: contribution * 1000 }));
  const whole = { input: "all together", value: depth.standardUncertainty * 1000 };
  const bars = [...lines, whole];
  return draw(width, "Budget of one optical depth", {
    height: 60 + 34 * bars.length,
    marginLeft: 130,
    marginRight: 56,
    marginBottom: 44,
    marginTop: 12,
    x: {
      domain: [0, whole.value],
      label:
        width < 500
          ? "standard uncertainty, thousandths"
          : "standard uncertainty of the optical depth, thousandths",
      labelArrow: "none",
      labelAnchor: "center",
      grid: true,
      ticks: 5,
    },
    y: { domain: bars.map(({ input }) => input), label: null, tickSize: 0 },
    marks: [
      barX(bars, {
        x: "value",
        y: "input",
        fill: "currentColor",
        fillOpacity: ({ input }: { input: string }) => (input === whole.input ? 0.8 : 0.4),
        insetTop: 3,
        insetBottom: 3,
      }),
      text(bars, {
        x: "value",
        y: "input",
        text: ({ value }: { value: number }) => value.toFixed(2),
        textAnchor: "start",
        dx: 6,
      }),
      ruleX([0]),
    ],
  });
}

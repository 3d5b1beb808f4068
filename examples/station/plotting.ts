/** What all pictures share: size, letters, colours, and the step from plot to SVG text. */
import { plot, type PlotOptions } from "@observablehq/plot";
import { parseHTML } from "linkedom";

/** A picture for wide pages, and one redrawn for a phone so that its letters stay readable. */
export type PictureWidth = 760 | 360;

/** Draws a picture as SVG text, transparent, letters and lines in the colour of the text around it. */
export function draw(width: PictureWidth, label: string, options: PlotOptions): string {
  const { document } = parseHTML("<!doctype html><html><body></body></html>");
  const drawing = plot({
    document: document as unknown as NonNullable<PlotOptions["document"]>,
    width,
    ariaLabel: label,
    ...options,
    style: {
      fontFamily: "'DejaVu Sans', Verdana, sans-serif",
      fontSize: "13px",
      overflow: "visible",
    },
  });
  return String(drawing.outerHTML)
    .replace(/<style>[\s\S]*?<\/style>/, "") // the plot's own style sheet: pages around it have theirs
    .replace(/\d+\.\d{3,}/g, (digits) => Number(digits).toFixed(2)); // a hundredth of a pixel is enough
}

/** The SVG as a file of its own: on white, in dark letters, whatever page shows it. */
export function standalone(svg: string): string {
  const paper = '<rect width="100%" height="100%" fill="#fff"/>';
  const file = svg
    .replace('style="', 'style="color:#20262e;')
    .replace(/<svg[^>]*>/, (head) => head + paper);
  const named = file.includes("xmlns=") ? file : file.replace("<svg", `<svg ${SVG_NAMESPACE}`);
  return `<?xml version="1.0" encoding="UTF-8"?>\n${named}\n`;
}

const SVG_NAMESPACE = 'xmlns="http://www.w3.org/2000/svg"';

/** Colour `index` of `count`, from violet for the first to red for the last; the report may set another for dark pages. */
export function lineColour(index: number, count: number): string {
  return `var(--line${index}, ${plainColour(index, count, 42)})`;
}

/** The same hue at a lightness of one's own, in per cent. */
export function plainColour(index: number, count: number, lightness: number): string {
  const hue = 275 - (275 * index) / Math.max(1, count - 1);
  return `hsl(${hue.toFixed(0)}, 60%, ${lightness}%)`;
}

/** Moves heights of labels apart until neighbours are at least `gap` apart; order is kept. */
export function spreadApart(values: readonly number[], gap: number): number[] {
  const order = values.map((_, i) => i).sort((a, b) => values[a]! - values[b]!);
  const moved = [...values];
  for (let round = 0; round < 100; round++) {
    for (let k = 1; k < order.length; k++) {
      const [low, high] = [order[k - 1]!, order[k]!];
      const lack = gap - (moved[high]! - moved[low]!);
      if (lack <= 1e-12) continue;
      moved[low]! -= lack / 2;
      moved[high]! += lack / 2;
    }
  }
  return moved;
}

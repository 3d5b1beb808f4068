/** The sky along the arc through zenith and sun, unrolled, with the sun on it in its colour. */
import type { State, View } from "./compute.js";
import { ARC_DEG } from "./skyArc.js";

const [WIDTH, TOP, HEIGHT] = [640, 14, 120];
const MIDDLE = TOP + HEIGHT / 2;

const x = (angleDeg: number): number => WIDTH / 2 + (angleDeg / 90) * (WIDTH / 2 - 8);

function frame(): string {
  const stops = ARC_DEG.map(
    (angle) => `<stop offset="${((x(angle) / WIDTH) * 100).toFixed(2)}%" class="sky-stop"/>`,
  );
  const marks = [-90, -45, 0, 45, 90].map((angle) => {
    const [anchor, word] = [
      { "-90": "start", "90": "end" }[angle] ?? "middle",
      { "-90": "horizon behind you", "0": "overhead", "90": "horizon" }[angle] ?? "",
    ];
    return `<line class="axis" x1="${x(angle)}" x2="${x(angle)}" y1="${TOP + HEIGHT}" y2="${TOP + HEIGHT + 6}"/><text x="${x(angle)}" y="${TOP + HEIGHT + 26}" text-anchor="${anchor}">${word}</text>`;
  });
  return `<defs><linearGradient id="sky-colours">${stops.join("")}</linearGradient></defs>
<rect class="sky" x="0" y="${TOP}" width="${WIDTH}" height="${HEIGHT}" rx="6"/>${marks.join("")}
<circle class="disc" r="20" cy="${MIDDLE}"/><text class="colour" x="0" y="${TOP + HEIGHT + 50}"></text>`;
}

/** Draws the sky as a strip from horizon to horizon and the sun at its place. */
export function drawScene(svg: SVGElement, { heightDeg }: State, view: View): void {
  const { sunColour, skyColours, zenithColour } = view;
  if (svg.querySelector(".disc") === null) svg.insertAdjacentHTML("beforeend", frame());
  const disc = svg.querySelector(".disc")!;
  disc.setAttribute("cx", x(90 - heightDeg).toFixed(1));
  disc.setAttribute("fill", sunColour);
  svg.querySelector(".sky")!.setAttribute("fill", skyColours ? "url(#sky-colours)" : "none");
  if (skyColours !== undefined)
    for (const [i, stop] of svg.querySelectorAll(".sky-stop").entries())
      stop.setAttribute("stop-color", skyColours[i]!);
  const sky = zenithColour ? `sky overhead ${zenithColour}` : "sky not computed for so low a sun";
  svg.querySelector(".colour")!.textContent = `sun ${sunColour}, ${sky}`;
  svg.querySelector("title")!.textContent =
    `The sky from the horizon behind you through the zenith to the horizon under the sun, which stands ${heightDeg} degrees high in its colour ${sunColour}; ${sky}.`;
}

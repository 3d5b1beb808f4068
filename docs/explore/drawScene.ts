/** The sun over the horizon, in its colour. */
import type { State, View } from "./compute.js";

const [CENTRE, GROUND, RADIUS] = [320, 178, 150];

/** Draws the sun at its height on an arc over the horizon. */
export function drawScene(svg: SVGElement, { heightDeg }: State, { sunColour }: View): void {
  if (svg.querySelector(".disc") === null)
    svg.insertAdjacentHTML(
      "beforeend",
      `<path class="arc" d="M${CENTRE - RADIUS * 1.9},${GROUND}A${RADIUS * 1.9},${RADIUS} 0 0 1 ${CENTRE + RADIUS * 1.9},${GROUND}"/>
<line class="horizon" x1="0" x2="640" y1="${GROUND}" y2="${GROUND}"/><circle class="disc" r="24"/>
<text x="8" y="${GROUND + 17}">horizon</text><text class="colour" x="632" y="${GROUND + 17}" text-anchor="end"></text>`,
    );
  const angle = (heightDeg * Math.PI) / 180;
  const disc = svg.querySelector(".disc")!;
  disc.setAttribute("cx", (CENTRE + 1.9 * RADIUS * Math.cos(angle)).toFixed(1));
  disc.setAttribute("cy", (GROUND - RADIUS * Math.sin(angle)).toFixed(1));
  disc.setAttribute("fill", sunColour);
  svg.querySelector(".colour")!.textContent = `light of the sun: ${sunColour}`;
  svg.querySelector("title")!.textContent =
    `The sun ${heightDeg} degrees above the horizon, drawn in its colour ${sunColour}.`;
}

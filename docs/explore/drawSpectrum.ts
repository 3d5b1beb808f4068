/** The spectrum outside the air and at the ground as an SVG. */
import type { Spectrum } from "airlight";

const [LEFT, RIGHT, TOP, BOTTOM] = [46, 612, 12, 258];
const MOST = 2.2; // W m⁻² nm⁻¹ at the top

const x = (nm: number): number => LEFT + ((nm - 300) / 800) * (RIGHT - LEFT);
const y = (value: number): number => BOTTOM - (value / MOST) * (BOTTOM - TOP);

function path({ wavelengthsNm, values }: Spectrum): string {
  let text = "";
  for (let i = 0; i < values.length; i++)
    text += `${i === 0 ? "M" : "L"}${x(wavelengthsNm[i]!).toFixed(1)},${y(values[i]!).toFixed(1)}`;
  return text;
}

function axes(): string {
  const along = [300, 400, 500, 600, 700, 800, 900, 1000, 1100].map(
    (nm) =>
      `<line class="axis" x1="${x(nm)}" x2="${x(nm)}" y1="${BOTTOM}" y2="${BOTTOM + 5}"/><text${nm % 200 === 0 ? ' class="between"' : ""} x="${x(nm)}" y="${BOTTOM + 25}" text-anchor="${nm === 1100 ? "end" : "middle"}">${nm}</text>`,
  );
  const up = [0, 0.5, 1, 1.5, 2].map(
    (value) =>
      `<line class="axis" x1="${LEFT}" x2="${RIGHT}" y1="${y(value)}" y2="${y(value)}"/><text x="${LEFT - 8}" y="${y(value) + 5}" text-anchor="end">${value}</text>`,
  );
  return `${up.join("")}${along.join("")}<text x="${RIGHT}" y="306" text-anchor="end">wavelength, nm; height: W m⁻² nm⁻¹</text>`;
}

/** Draws both spectra. The frame is drawn once, the curves at every call. */
export function drawSpectrum(svg: SVGElement, outside: Spectrum, ground: Spectrum): void {
  if (svg.querySelector(".curve-ground") === null)
    svg.insertAdjacentHTML(
      "beforeend",
      `${axes()}<path class="curve-outside" d="${path(outside)}"/><path class="curve-ground"/>`,
    );
  svg.querySelector(".curve-ground")!.setAttribute("d", path(ground));
  const top = ground.values.indexOf(ground.values.reduce((a, b) => Math.max(a, b)));
  svg.querySelector("title")!.textContent =
    `Spectrum at the ground from 300 to 1100 nm; it is strongest at ${ground.wavelengthsNm[top]} nm with ${ground.values[top]!.toFixed(3)} W m⁻² nm⁻¹.`;
}

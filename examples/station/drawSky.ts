/** Picture of the light on level ground under a clear sky: direct, diffuse, global. */
import { line, text } from "@observablehq/plot";
import type { ClearSky } from "./clearSky.js";
import { draw, lineColour, type PictureWidth } from "./plotting.js";

/** The three spectra under one sun. */
export function drawSky(sky: ClearSky, width: PictureWidth): string {
  const spectra = { global: sky.global, direct: sky.direct, diffuse: sky.diffuse };
  const curves = Object.entries(spectra).map(([label, { wavelengthsNm, values }], k) => {
    const points = Array.from(wavelengthsNm, (nm, i) => ({ nm, value: values[i]! }));
    const value = Math.max(...values);
    const nm = wavelengthsNm[values.indexOf(value)]!;
    return { points, stroke: lineColour(k, 3), peak: { nm, value, label } };
  });
  return draw(width, "Spectra of direct, diffuse and global light under a clear sky", {
    height: 320,
    marginLeft: 56,
    marginRight: 24,
    marginBottom: 44,
    marginTop: 34,
    x: {
      domain: [380, 780],
      ticks: width < 500 ? 4 : 8,
      tickFormat: String,
      label: "vacuum wavelength, nm",
      labelArrow: "none",
      labelAnchor: "center",
    },
    y: {
      zero: true,
      label: "irradiance of level ground, W m⁻² nm⁻¹",
      labelArrow: "none",
      grid: true,
    },
    marks: curves.flatMap(({ points, stroke, peak }) => [
      line(points, { x: "nm", y: "value", stroke, strokeWidth: 1.4 }),
      text([peak], {
        x: "nm",
        y: "value",
        text: "label",
        fill: stroke,
        dy: -9,
        fontWeight: "bold",
      }),
    ]),
  });
}

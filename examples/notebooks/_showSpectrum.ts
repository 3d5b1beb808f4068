/** Shows a Spectrum in a notebook as a small picture with a table; the library itself knows nothing of notebooks. */
import type { Spectrum } from "airlight";

/** Rows of the table, spread evenly. */
const ROWS = 7;
const [WIDTH, HEIGHT] = [360, 120];

/** A value that Jupyter displays: let it be the last expression of a cell. */
export function showSpectrum(spectrum: Spectrum, unit: string): object {
  const html = `<figure>${picture(spectrum)}${table(spectrum, unit)}</figure>`;
  const text = `Spectrum of ${spectrum.values.length} values, ${unit}`;
  return { [Symbol.for("Jupyter.display")]: () => ({ "text/html": html, "text/plain": text }) };
}

function picture({ wavelengthsNm, values }: Spectrum): string {
  const [first, last] = [wavelengthsNm[0]!, wavelengthsNm.at(-1)!];
  const most = values.reduce((a, b) => Math.max(a, b), 0);
  const points = Array.from(values, (value, i) => {
    const x = ((wavelengthsNm[i]! - first) / (last - first)) * WIDTH;
    return `${x.toFixed(1)},${(HEIGHT - (value / most) * HEIGHT).toFixed(1)}`;
  });
  const label = `Spectrum from ${first} to ${last} nm, largest value ${most.toPrecision(4)}`;
  return `<svg role="img" aria-label="${label}" width="${WIDTH}" height="${HEIGHT}" viewBox="0 -2 ${WIDTH} ${HEIGHT + 4}"><polyline points="${points.join(" ")}" fill="none" stroke="#c2610c" stroke-width="2"/></svg>`;
}

function table({ wavelengthsNm, values }: Spectrum, unit: string): string {
  const step = (values.length - 1) / (ROWS - 1);
  const rows = Array.from({ length: ROWS }, (_, k) => {
    const i = Math.round(k * step);
    return `<tr><td>${wavelengthsNm[i]}</td><td>${values[i]!.toPrecision(5)}</td></tr>`;
  });
  return `<table><tr><th>nm</th><th>${unit}</th></tr>${rows.join("")}</table>`;
}

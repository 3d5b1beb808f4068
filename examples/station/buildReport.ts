/** One HTML page that needs nothing else. */
import type { StationResult } from "./analyseStation.js";
import { ASSUMED_WORDS } from "./assumed.js";
import { budgetTable } from "./budgetedReading.js";
import { skyTable } from "./clearSky.js";
import type { Pictures } from "./drawPictures.js";
import { evidenceTable } from "./evidence.js";
import { nearestTo500 } from "./nearestTo500.js";
import { plainColour } from "./plotting.js";
import {
  aerosolTable,
  calibrationTable,
  clockOf,
  cloudTable,
  pathTable,
  sunTable,
} from "./resultTables.js";
import { escapeHtml, tableAsHtml } from "./table.js";
import { CAUTIONS, LIMITS, methodWords } from "./words.js";

/** The report as HTML; every picture comes wide and narrow, the page shows the one that fits. */
export function buildReport(result: StationResult, wide: Pictures, narrow: Pictures): string {
  const figure = (name: keyof Pictures, caption: string): string =>
    `<figure><div class="wide">${wide[name]}</div><div class="narrow">${narrow[name]}</div><figcaption>${escapeHtml(caption)}</figcaption></figure>`;
  const list = (items: readonly string[]): string =>
    `<ul>${items.map((item) => `<li>${escapeHtml(item)}</li>`).join("\n")}</ul>`;
  const { station, calibrations } = result;
  const title = escapeHtml(station.station);
  const about = station.about === "" ? "" : `<p class="about">${escapeHtml(station.about)}</p>`;
  const channels = calibrations.length;
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${title}: sunlight and haze</title>
<link rel="icon" href="data:,">
<style>${styleSheet(Math.max(channels, result.views.length))}</style>
</head>
<body>
<main>
<h1>${title}: sunlight and haze</h1>
${about}
<p>${escapeHtml(summaryWords(result))}</p>
<section class="caution"><h2>Cautions</h2>${list(CAUTIONS)}</section>
<h2>Calibration</h2>
${tableAsHtml(calibrationTable(result))}
${figure("calibration-lines", "Signals of the clear morning against air mass. Lines are drawn on to air mass 0, where the rings mark the constants. Crosses: readings left out (cloud).")}
${figure("calibration-residuals", "What the lines leave over, in the readings kept.")}
<h2>Haze through the day</h2>
${tableAsHtml(aerosolTable(result))}
${figure("aerosol-depth", "Optical depth of aerosol in every channel. Shaded: cloudy spells; crosses: their readings, as far as they fit in.")}
${figure("aerosol-exponent", "Exponent of the power law through the channels, without the cloudy readings. Fine particles make it large, coarse ones small.")}
${tableAsHtml(cloudTable(result))}
<h2>How well it is known</h2>
<p>${escapeHtml(ASSUMED_WORDS)}</p>
${tableAsHtml(budgetTable(result))}
${figure("budget", "What each line contributes to the standard uncertainty of that reading, and all of them together (the root of the sum of their squares).")}
<h2>The sun from high to low</h2>
${tableAsHtml(pathTable(result))}
${tableAsHtml(sunTable(result))}
${figure("sun-spectra", "Direct light on a plane facing the sun, for the median air of the day, at the true heights of the table.")}
${figure("sun-colours", "Computed colours, each as bright as a display can show it, against the sun's true height.")}
<h2>The sky without haze</h2>
${tableAsHtml(skyTable(result))}
${figure("sky-spectra", "Light on level ground with the sun 30° high, in the day's air without haze: all orders of scattering, ground albedo 0.15.")}
<h2>Evidence</h2>
${tableAsHtml(evidenceTable(result))}
<p>A bend in the residuals would show a wrong air mass or a sky that changed. A wrong constant would put a channel off the power law most at low air mass; a wrong gas would put it off by the same depth at every air mass.</p>
<h2>How it was done</h2>
<dl>${methodWords(result)
    .map(([term, words]) => `<dt>${escapeHtml(term)}</dt><dd>${escapeHtml(words)}</dd>`)
    .join("\n")}</dl>
<h2>Limits</h2>
${list(LIMITS)}
</main>
</body>
</html>
`;
}

/** The result in three sentences. */
export function summaryWords({
  aerosol,
  calibrations,
  station,
  calibrationDay,
}: StationResult): string {
  const k = nearestTo500(calibrations);
  const clear = aerosol.filter(({ cloudy }) => !cloudy);
  const depths = clear.map((point) => point.depths[k]!);
  const nm = calibrations[k]!.optics.channel.centreNm;
  const date = (time: Date): string => time.toISOString().slice(0, 10);
  const [from, to] = [clear[0]!, clear.at(-1)!];
  return `${calibrations.length} channels were calibrated on ${date(calibrationDay[0]!.time)} (${station.calibrationFile}, ${calibrationDay.length} readings). On ${date(from.reading.time)} (${station.measurementFile}, ${aerosol.length} readings, ${aerosol.length - clear.length} of them cloudy) the optical depth of aerosol at ${nm} nm lay between ${Math.min(...depths).toFixed(3)} and ${Math.max(...depths).toFixed(3)}: ${from.depths[k]!.toFixed(3)} at ${clockOf(from.reading.time)} UTC, ${to.depths[k]!.toFixed(3)} at ${clockOf(to.reading.time)} UTC.`;
}

/** Colours for light and dark pages, and a layout that holds from phone to desktop. */
function styleSheet(lines: number): string {
  const darkLines = Array.from(
    { length: lines },
    (_, k) => `--line${k}:${plainColour(k, lines, 68)};`,
  );
  return `
:root{color-scheme:light dark;--paper:#fff;--ink:#20262e;--faint:#5b6570;--edge:#d5dae0;--warn:#fdf3e3;--warnedge:#c77f1a}
@media (prefers-color-scheme:dark){:root{--paper:#161a1f;--ink:#e2e6ea;--faint:#9aa5b1;--edge:#39424c;--warn:#2c2415;--warnedge:#c98e3a;${darkLines.join("")}}}
*{box-sizing:border-box}
body{margin:0;background:var(--paper);color:var(--ink);font:16px/1.55 "DejaVu Sans",Verdana,sans-serif}
main{max-width:880px;margin:0 auto;padding:16px 24px 64px}
h1{font-size:1.6em;line-height:1.2}h2{font-size:1.2em;margin:2em 0 .5em}
.about{border-left:4px solid var(--warnedge);padding:.2em 0 .2em 1em;font-weight:bold}
.caution{background:var(--warn);border:1px solid var(--warnedge);border-radius:6px;padding:.2em 1.2em}.caution h2{margin:.6em 0 0}
ul{padding-left:1.2em}li{margin:.4em 0}dt{font-weight:bold;margin-top:.8em}dd{margin:0}
.caption{color:var(--faint);font-size:.85em;margin:1.2em 0 .4em}.table{overflow-x:auto;margin:0 0 1em}
table{border-collapse:collapse;font-size:.85em;font-variant-numeric:tabular-nums;width:100%}
th,td{text-align:right;padding:.3em .5em;border-bottom:1px solid var(--edge);white-space:nowrap}
th{font-weight:bold;vertical-align:top;white-space:normal}th small{display:block;font-weight:normal;color:var(--faint)}
.patch{display:inline-block;width:1.4em;height:1em;margin-right:.5em;vertical-align:-.12em;border:1px solid var(--edge)}
figure{margin:1.6em 0}figcaption{margin-top:.6em;color:var(--faint);font-size:.85em}
svg{display:block;max-width:100%;height:auto}
.narrow{display:none}
@media (max-width:640px){main{padding:8px 15px 48px}.wide{display:none}.narrow{display:block}}`;
}

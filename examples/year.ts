/**
 * A year of one-minute readings in six channels, streamed from CSV through screening and retrieval with memory flat:
 * `npm run year`. The year is invented and written first (some 20 MB); a file of the same columns can be named instead.
 */
import { existsSync, mkdirSync } from "node:fs";
import { relative } from "node:path";
import { fileURLToPath } from "node:url";
import { coverageFactor } from "airlight";
import { tableAsText } from "./station/table.js";
import { progressBar } from "./year/progress.js";
import { reduceYear } from "./year/reduceYear.js";
import { writeYear } from "./year/writeYear.js";

const folder = fileURLToPath(new URL("out", import.meta.url));
const file = process.argv[2] ?? `${folder}/year.csv`;
if (process.argv[2] === undefined && !existsSync(file)) {
  mkdirSync(folder, { recursive: true });
  await writeYear(file, progressBar("inventing the year"));
}
const start = performance.now();
let peak = 0;
const bar = progressBar("screening and retrieval");
const days = await reduceYear(file, (share) => {
  peak = Math.max(peak, process.memoryUsage().rss);
  bar(share);
});
const seconds = (performance.now() - start) / 1000;
const k = coverageFactor(0.95, Number.POSITIVE_INFINITY);
const months = Array.from({ length: 12 }, (_, m) =>
  days.filter(({ day }) => Math.min(11, Math.floor(day / 30.42)) === m),
);
const mean = (values: readonly number[]): number =>
  values.reduce((sum, v) => sum + v, 0) / values.length;
console.log(
  `${tableAsText({
    title: `Aerosol optical depth at 500 nm, means of the clear readings by day, then by month (${relative(".", file)})`,
    columns: [
      ["month", ""],
      ["days", ""],
      ["readings", ""],
      ["clear", "%"],
      ["depth", ""],
      ["± 95 %", ""],
    ],
    rows: months.map((month, m) => {
      const seen = month.filter(({ clear }) => clear > 0);
      const [readings, clear] = [month, seen].map((list) =>
        list.reduce((sum, day) => sum + (list === month ? day.readings : day.clear), 0),
      );
      return [
        String(m + 1),
        String(seen.length),
        String(readings),
        ((100 * clear!) / readings!).toFixed(1),
        mean(seen.map(({ depth }) => depth)).toFixed(4),
        (k * mean(seen.map(({ standardUncertainty }) => standardUncertainty))).toFixed(4),
      ];
    }),
  })}\n`,
);
const readings = days.reduce((sum, day) => sum + day.readings, 0);
console.log(
  `${readings} readings in six channels in ${seconds.toFixed(1)} s, at most ${(peak / 1e6).toFixed(0)} MB of memory in all.`,
);

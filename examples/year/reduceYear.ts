/** Streams the year's CSV through screening and retrieval, a day at a time. */
import { createReadStream, statSync } from "node:fs";
import Papa from "papaparse";
import { type DaySummary, dayBuffer } from "./dayBuffer.js";
import type { Progress } from "./progress.js";

/** Summaries of all days; no more than one day of readings is held. */
export function reduceYear(path: string, progress: Progress): Promise<DaySummary[]> {
  const { size } = statSync(path);
  const buffer = dayBuffer();
  const days: DaySummary[] = [];
  const stream = createReadStream(path, { encoding: "utf8", highWaterMark: 1 << 18 });
  let today = -1;
  const take = (row: readonly number[]): void => {
    const day = Math.floor(row[0]! / 1440);
    if (day !== today && today >= 0) days.push(buffer.full(today));
    today = day;
    buffer.add(row);
  };
  return new Promise((resolve, reject) => {
    let header = true;
    Papa.parse<string[]>(stream, {
      skipEmptyLines: true,
      chunk: ({ data }) => {
        for (const row of data) {
          if (!header) take(row.map(Number));
          header = false;
        }
        progress(stream.bytesRead / size);
      },
      complete: () => {
        if (today >= 0) days.push(buffer.full(today));
        resolve(days);
      },
      error: reject,
    });
  });
}

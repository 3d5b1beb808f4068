/** The whole job: read, work out, print, write. */
import { join, relative } from "node:path";
import { analyseStation } from "./analyseStation.js";
import { ASSUMED_WORDS } from "./assumed.js";
import { budgetTable } from "./budgetedReading.js";
import { buildReport, summaryWords } from "./buildReport.js";
import { skyTable } from "./clearSky.js";
import { drawPictures } from "./drawPictures.js";
import { evidenceTable } from "./evidence.js";
import { standalone } from "./plotting.js";
import { aerosolTable, calibrationTable, cloudTable, pathTable, sunTable } from "./resultTables.js";
import { tableAsText } from "./table.js";
import { CAUTIONS } from "./words.js";
import { writeOutput } from "./writeOutput.js";

/** Runs the job on `stationFolder`, writes into `outFolder`, gives lines to `print`. */
export function runStation(
  stationFolder: string,
  outFolder: string,
  print: (line: string) => void,
): void {
  const result = analyseStation(stationFolder);
  const wide = drawPictures(result, 760);
  const files: Record<string, string> = {
    "report.html": buildReport(result, wide, drawPictures(result, 360)),
  };
  for (const [name, svg] of Object.entries(wide)) files[`${name}.svg`] = standalone(svg);
  writeOutput(outFolder, files);
  print(result.station.station);
  if (result.station.about !== "") print(result.station.about);
  print(`\n${summaryWords(result)}\n`);
  const tables = [
    calibrationTable,
    aerosolTable,
    cloudTable,
    budgetTable,
    pathTable,
    sunTable,
    skyTable,
    evidenceTable,
  ];
  for (const table of tables) print(`${tableAsText(table(result))}\n`);
  print(`${ASSUMED_WORDS}\n`);
  print("Cautions");
  for (const caution of CAUTIONS) print(`- ${caution}`);
  print("\nWritten");
  for (const name of Object.keys(files)) print(`- ${relative(".", join(outFolder, name))}`);
}

import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { runStation } from "../../examples/station/runStation.js";
import { copyDemo, withFolder } from "./_inventedStation.js";

/** Replaces one cell; `row` as an editor numbers it, `column` from 0. */
function cell(row: number, column: number, value: string): (text: string) => string {
  return (text) => {
    const rows = text.split("\n").map((line) => line.split(","));
    rows[row - 1]![column] = value;
    return rows.map((cells) => cells.join(",")).join("\n");
  };
}

function field(change: (station: Record<string, unknown>) => void): (text: string) => string {
  return (text) => {
    const station = JSON.parse(text);
    change(station);
    return JSON.stringify(station);
  };
}

const swap = (text: string): string => {
  const rows = text.split("\n");
  [rows[3], rows[4]] = [rows[4]!, rows[3]!];
  return rows.join("\n");
};

const cutRow = (text: string): string => {
  const rows = text.split("\n");
  rows[3] = rows[3]!.slice(0, rows[3]!.lastIndexOf(","));
  return rows.join("\n");
};

const noRows = (text: string): string => text.split("\n")[0]!;
const fewRows = (text: string): string => text.split("\n").slice(0, 10).join("\n");
const [CLEAR, HAZY, STATION] = ["clear-morning.csv", "hazy-day.csv", "station.json"];

const CASES: readonly [
  what: string,
  file: string,
  change: (text: string) => string,
  ...string[],
][] = [
  [
    "missing column",
    CLEAR,
    (t) => t.replace("pressure_pa", "p"),
    `${CLEAR}, row 1, column pressure_pa: missing`,
  ],
  [
    "missing channel",
    HAZY,
    (t) => t.replace("signal_500_v", "s"),
    `${HAZY}, row 1, column signal_500_v: missing`,
  ],
  [
    "column twice",
    HAZY,
    (t) => t.replace("signal_500_v", "signal_412_v"),
    `${HAZY}, row 1, column signal_412_v: stands twice`,
  ],
  [
    "NaN",
    HAZY,
    cell(7, 6, "NaN"),
    `${HAZY}, row 7, column signal_500_v: must be a number, got "NaN"`,
  ],
  ["infinite", HAZY, cell(7, 6, "Infinity"), `${HAZY}, row 7, column signal_500_v`],
  ["empty cell", CLEAR, cell(9, 2, ""), `${CLEAR}, row 9, column temperature_k: the cell is empty`],
  [
    "hPa",
    CLEAR,
    cell(4, 1, "834.26"),
    `${CLEAR}, row 4, column pressure_pa: must be 40000 to 110000 Pa, got 834.26 (hPa? multiply by 100)`,
  ],
  ["°C", CLEAR, cell(4, 2, "11.2"), `${CLEAR}, row 4, column temperature_k`, "°C? add 273.15"],
  [
    "percent",
    HAZY,
    cell(5, 3, "38"),
    `${HAZY}, row 5, column relative_humidity`,
    "percent? divide by 100",
  ],
  ["empty file", HAZY, () => "", `${HAZY}: the file is empty`],
  ["only a heading", HAZY, noRows, `${HAZY}, row 2: no readings`],
  ["out of order", CLEAR, swap, `${CLEAR}, row 5, column time_utc`, "does not come after", "row 4"],
  [
    "same time twice",
    CLEAR,
    cell(5, 0, "2026-06-14T07:12:00Z"),
    `${CLEAR}, row 5, column time_utc`,
  ],
  [
    "local time",
    CLEAR,
    cell(5, 0, "2026-06-14 07:28"),
    `${CLEAR}, row 5, column time_utc: must be a time in UTC`,
  ],
  [
    "no such day",
    CLEAR,
    cell(2, 0, "2026-06-31T06:40:00Z"),
    `${CLEAR}, row 2, column time_utc: must be a time in UTC`,
  ],
  ["short row", HAZY, cutRow, `${HAZY}, row 4, column signal_862_v: has 9 cells, the heading 10`],
  [
    "sun below the horizon",
    STATION,
    field((s) => Object.assign(s, { longitudeDeg: -150 })),
    `${CLEAR}, row 2, column time_utc: the sun stood at -`,
    "longitude",
  ],
  ["too few readings", CLEAR, fewRows, `${CLEAR}, column signal_368_v: langleyFit:`, "at least 8"],
  ["no JSON", STATION, () => "{", `${STATION}: not JSON`],
  ["empty JSON", STATION, () => " ", `${STATION}: the file is empty`],
  [
    "missing field",
    STATION,
    field((s) => delete s.ozoneDu),
    `${STATION}, field ozoneDu: must be a number, 0 to 700 Dobson units, got nothing`,
  ],
  [
    "bad field",
    STATION,
    field((s) => Object.assign(s, { latitudeDeg: "40" })),
    `${STATION}, field latitudeDeg: must be a number`,
    '"40"',
  ],
  [
    "height in km",
    STATION,
    field((s) => Object.assign(s, { ozoneHeightM: 22 })),
    `${STATION}, field ozoneHeightM`,
    "10000 to 40000 m",
  ],
  [
    "unknown role",
    STATION,
    field((s) => Object.assign((s.days as object[])[1]!, { role: "check" })),
    `${STATION}, field days[1].role: must be "calibration" or "measurement", got "check"`,
  ],
  [
    "role twice",
    STATION,
    field((s) => Object.assign((s.days as object[])[1]!, { role: "calibration" })),
    `${STATION}, field days: needs exactly one day with role "calibration", got 2`,
  ],
  [
    "no such file",
    STATION,
    field((s) => Object.assign((s.days as object[])[0]!, { file: "x.csv" })),
    `${STATION}, field days[0].file: no file "x.csv"`,
  ],
  [
    "file elsewhere",
    STATION,
    field((s) => Object.assign((s.days as object[])[0]!, { file: "../a.csv" })),
    `${STATION}, field days[0].file`,
  ],
  [
    "square passband",
    STATION,
    field((s) => Object.assign((s.channels as object[])[2]!, { shape: "square" })),
    `${STATION}, field channels[2].shape: must be "Gaussian"`,
  ],
  [
    "wavelength in µm",
    STATION,
    field((s) => Object.assign((s.channels as object[])[2]!, { centreNm: 0.5 })),
    `${STATION}, field channels[2].centreNm`,
    "320 to 1000 nm",
  ],
  [
    "two channels",
    STATION,
    field((s) => (s.channels as object[]).splice(2)),
    `${STATION}, field channels: must be a list of at least 3`,
  ],
  [
    "channel twice",
    STATION,
    field((s) => Object.assign((s.channels as object[])[2]!, { name: "signal_368_v" })),
    `${STATION}, field channels[2].name: "signal_368_v" stands twice`,
  ],
  [
    "air wavelengths",
    STATION,
    field((s) => Object.assign(s, { wavelengthScale: "air" })),
    `${STATION}, field wavelengthScale: must be "vacuum"`,
  ],
];

describe("bad input", () => {
  it.each(CASES)(
    "%s: one line that says where, and nothing written",
    (_, file, change, ...parts) => {
      withFolder((folder) => {
        const [station, out] = [join(folder, "station"), join(folder, "out")];
        copyDemo(station, file, change);
        mkdirSync(out);
        writeFileSync(join(out, "old.txt"), "kept");
        const printed: string[] = [];
        const error = errorOf(() => runStation(station, out, (line) => printed.push(line)));
        expect(error.name).toBe("InputError");
        for (const part of parts) expect(error.message).toContain(part);
        expect(error.message).not.toContain("\n");
        expect(printed).toEqual([]);
        expect(readdirSync(folder).sort()).toEqual(["out", "station"]);
        expect(readdirSync(out)).toEqual(["old.txt"]);
      });
    },
  );

  it("a folder without station.json", () => {
    withFolder((folder) => {
      const error = errorOf(() => runStation(folder, join(folder, "out"), () => {}));
      expect(error.message).toContain("station.json: no such file");
      expect(existsSync(join(folder, "out"))).toBe(false);
    });
  });

  it("the command prints the line alone and exits with 1", () => {
    const command = fileURLToPath(new URL("../../examples/station.ts", import.meta.url));
    withFolder((folder) => {
      copyDemo(folder, CLEAR!, cell(4, 1, "834.26"));
      const run = spawnSync(process.execPath, ["--import", "tsx", command, folder], {
        encoding: "utf8",
      });
      expect(run.stdout).toBe("");
      expect(run.stderr.trim().split("\n")).toHaveLength(1);
      expect(run.stderr).toContain("row 4, column pressure_pa");
      expect(run.status).toBe(1);
    });
  });
});

describe("good input", () => {
  it("takes a byte order mark, windows line ends, further columns and a reading without sun", () => {
    withFolder((folder) => {
      const [station, out] = [join(folder, "station"), join(folder, "out")];
      const spoil = cell(9, 6, "-0.00012");
      const more = (text: string): string => text.replace(/\n/g, ",note\r\n");
      copyDemo(station, HAZY!, (text) => `\uFEFF${more(`${spoil(text)}\n`)}`);
      const printed: string[] = [];
      runStation(station, out, (line) => printed.push(line));
      const html = readFileSync(join(out, "report.html"), "utf8");
      expect(readdirSync(out).sort()).toEqual([
        "aerosol-depth.svg",
        "aerosol-exponent.svg",
        "budget.svg",
        "calibration-lines.svg",
        "calibration-residuals.svg",
        "report.html",
        "sky-spectra.svg",
        "sun-colours.svg",
        "sun-spectra.svg",
      ]);
      expect(readdirSync(folder).sort()).toEqual(["out", "station"]);
      const words = printed.join("\n");
      for (const text of [words, html]) {
        expect(text).toContain("no such island, instrument or campaign exists");
        expect(text).toContain("Never look at the sun");
        expect(text).toContain("ultraviolet");
        expect(text).toContain("Local codes");
        expect(text).not.toMatch(/NaN|undefined|Infinity/);
      }
      expect(html).not.toMatch(/(src|href)="(?!data:)/); // self-contained
      expect(html).not.toMatch(/https?:/);
      const strip = readFileSync(join(out, "sun-colours.svg"), "utf8");
      const lowest = /^\s+2 .*(#[0-9a-f]{6})$/m.exec(words)![1]!;
      expect(strip.match(/fill="#[0-9a-f]{6}"/g)!.length).toBeGreaterThan(90);
      expect(lowest).toMatch(/^#ff/); // the low sun is reddest: red is what the display runs out of first
    });
  });
});

function errorOf(work: () => unknown): Error {
  try {
    work();
  } catch (error) {
    return error as Error;
  }
  throw new Error("nothing was refused");
}

/** Station folders for the tests: copies of the demonstration with one thing spoilt, and an invented station of known truth. */
import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { airColumn, beamTransmittance, clearBeam, solarIrradiance } from "airlight";
import { sunAt } from "../../examples/station/sunAt.js";
import { normal, seeded } from "../retrieval/_mornings.js";

/** The demonstration's folder. */
export const DEMO: string = fileURLToPath(new URL("../../examples/data", import.meta.url));

/** Runs `work` with a folder that is removed afterwards. */
export function withFolder<Result>(work: (folder: string) => Result): Result {
  const folder = mkdtempSync(join(tmpdir(), "airlight-station-"));
  try {
    return work(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Copies the demonstration into `folder`, its tables cut to every eighth row, and changes one file's text. */
export function copyDemo(folder: string, file: string, change: (text: string) => string): void {
  cpSync(DEMO, folder, { recursive: true });
  for (const name of ["clear-morning.csv", "hazy-day.csv"]) {
    const rows = readFileSync(join(folder, name), "utf8").trim().split("\n");
    writeFileSync(join(folder, name), rows.filter((_, i) => i === 0 || i % 8 === 1).join("\n"));
  }
  writeFileSync(join(folder, file), change(readFileSync(join(folder, file), "utf8")));
}

/** What the invented station of `writeStation` is made of. */
export interface Truth {
  readonly constants: readonly number[];
  /** Aerosol depth at 500 nm at the start and the end of the measured day, and its exponent. */
  readonly depths: readonly [number, number];
  readonly exponent: number;
  readonly noise: number;
}

/** A reading of the measured day as it was made. */
export interface TrueReading {
  readonly depthAt500: number;
  readonly cloudDepth: number;
}

const PLACE = { latitudeDeg: 28.3, longitudeDeg: -16.5, altitudeM: 2370 };
const CENTRES_NM = [380, 440, 500, 620, 865];
const WIDTH_NM = 6;

/** Writes a station folder by running the library forwards: beam transmittances, summed over the passbands by Simpson's rule. */
export function writeStation(folder: string, truth: Truth): TrueReading[] {
  const station = {
    ...PLACE,
    station: "Test Peak (invented)",
    signalUnit: "nA",
    ...{ co2Ppm: 420, ozoneDu: 290, ozoneTemperatureK: 228, ozoneHeightM: 23000 },
    ...{ nitrogenDioxideDu: 0.1, wavelengthScale: "vacuum" },
    channels: CENTRES_NM.map((centreNm) => ({
      ...{ name: `c${centreNm}`, centreNm, fullWidthHalfMaximumNm: WIDTH_NM, shape: "Gaussian" },
    })),
    days: [
      { file: "a.csv", role: "calibration" },
      { file: "b.csv", role: "measurement" },
    ],
  };
  writeFileSync(join(folder, "station.json"), JSON.stringify(station));
  const gauss = normal(seeded(17));
  const made: TrueReading[] = [];
  const day = (date: string, count: number, measured: boolean): string => {
    const rows = Array.from({ length: count }, (_, i) => {
      const time = new Date(Date.parse(`${date}T07:10:00Z`) + i * 4 * 60_000);
      const [from, to] = measured ? truth.depths : [0.03, 0.03];
      const depthAt500 = from + ((to - from) * i) / count;
      const bump = measured ? (i - 60) / 4 : (i - 30) / 3;
      const cloudDepth = 0.7 * Math.exp(-bump * bump);
      if (measured) made.push({ depthAt500, cloudDepth });
      const pressurePa = 77_000 + 150 * Math.sin(i / 20);
      const { trueZenithDeg, distanceAu } = sunAt(time, PLACE);
      const beam = clearBeam({
        column: airColumn({ ...PLACE, pressurePa, co2Ppm: 420 }),
        trueZenithDeg,
        ...{ ozoneDu: 290, ozoneTemperatureK: 228, ozoneHeightM: 23000 },
        ...{ nitrogenDioxideDu: 0.1, waterCm: 0 },
        aerosol: { opticalDepth: depthAt500, referenceNm: 500, exponent: truth.exponent },
      });
      const cloud = Math.exp(-cloudDepth / Math.cos((trueZenithDeg * Math.PI) / 180));
      const signals = CENTRES_NM.map((centre, c) => {
        const light = overBand(centre, (nm) => solarIrradiance(nm) * beamTransmittance(nm, beam));
        const all = overBand(centre, solarIrradiance);
        const noisy = (light / all) * cloud * (1 + truth.noise * gauss());
        return ((truth.constants[c]! * noisy) / (distanceAu * distanceAu)).toFixed(6);
      });
      return [time.toISOString(), pressurePa.toFixed(0), "284.5", "0.3", ...signals].join(",");
    });
    const heading = ["time_utc", "pressure_pa", "temperature_k", "relative_humidity"];
    return [[...heading, ...CENTRES_NM.map((nm) => `c${nm}`)].join(","), ...rows].join("\n");
  };
  writeFileSync(join(folder, "a.csv"), day("2025-06-20", 90, false));
  writeFileSync(join(folder, "b.csv"), day("2025-06-21", 120, true));
  return made;
}

/** Simpson's rule over a Gaussian passband, 2 widths to either side. */
function overBand(centreNm: number, quantity: (wavelengthNm: number) => number): number {
  const step = WIDTH_NM / 20;
  let sum = 0;
  for (let i = -40; i <= 40; i++) {
    const bell = 2 ** -(((2 * i * step) / WIDTH_NM) ** 2);
    const share = Math.abs(i) === 40 ? 1 : i % 2 === 0 ? 2 : 4;
    sum += share * bell * quantity(centreNm + i * step);
  }
  return (sum * step) / 3;
}

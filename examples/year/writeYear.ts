/** Writes the invented year: one reading a minute whenever the sun stands more than 8° high. */
import { createWriteStream } from "node:fs";
import { once } from "node:events";
import { seededRandom } from "airlight";
import { archiveChannels, CENTRES_NM, CONSTANTS, STATION } from "./channels.js";
import { massesAt } from "./masses.js";
import type { Progress } from "./progress.js";

const RADIANS = Math.PI / 180;
/** Columns of the file. */
export const COLUMNS: readonly string[] = [
  ...["minute", "true_zenith_deg", "sun_distance_au", "pressure_pa", "ozone_du"],
  ...CENTRES_NM.map((nm) => `signal_${nm}_v`),
];

/** Writes `path`; a day at a time, so that memory stays flat. */
export async function writeYear(path: string, progress: Progress): Promise<void> {
  const file = createWriteStream(path);
  const random = seededRandom(2026);
  file.write(`${COLUMNS.join(",")}\n`);
  for (let day = 0; day < 365; day++) {
    if (!file.write(dayRows(day, random))) await once(file, "drain");
    progress((day + 1) / 365);
  }
  file.end();
  await once(file, "close");
}

function dayRows(day: number, random: () => number): string {
  const channels = archiveChannels();
  const declination = -23.44 * Math.cos(((day + 10) / 365.25) * 360 * RADIANS);
  const distance = 1 - 0.01671 * Math.cos(((day - 3) / 365.25) * 360 * RADIANS);
  const [ozoneDu, pressurePa] = [280 + 30 * Math.sin(day / 58), 77_000 + 400 * Math.sin(day / 9)];
  const [haze, exponent] = [0.03 * (0.4 + 3 * random() ** 6), 0.6 + random()];
  const clouds = Array.from(
    { length: Math.floor(4 * random()) },
    () => [1440 * random(), 5 + 30 * random()] as const,
  );
  const rows: string[] = [];
  for (let minute = 0; minute < 1440; minute++) {
    const zenith = zenithDeg(declination, (minute / 4 - 180) * RADIANS);
    if (zenith > 82) continue;
    const [air, ozone, aerosol] = massesAt(zenith);
    const cloud = clouds.some(([from, length]) => minute >= from && minute < from + length)
      ? 0.1 + random()
      : 0;
    const signals = channels.map((channel, c) => {
      const depth = haze * (CENTRES_NM[c]! / 500) ** -exponent + cloud;
      const high = channel.ozoneDepthPerDu * ozoneDu + channel.otherDepth;
      const slant = channel.rayleighDepthPerPa * pressurePa * air + high * ozone + depth * aerosol;
      const noise = 1 + 0.002 * (random() + random() + random() - 1.5);
      return ((CONSTANTS[c]! / distance ** 2) * Math.exp(-slant) * noise).toFixed(5);
    });
    const place = [day * 1440 + minute, zenith.toFixed(4), distance.toFixed(6)];
    rows.push([...place, pressurePa.toFixed(0), ozoneDu.toFixed(1), ...signals].join(","));
  }
  return rows.length > 0 ? `${rows.join("\n")}\n` : "";
}

function zenithDeg(declinationDeg: number, hourAngle: number): number {
  const [phi, delta] = [STATION.latitudeDeg * RADIANS, declinationDeg * RADIANS];
  const cosine =
    Math.sin(phi) * Math.sin(delta) + Math.cos(phi) * Math.cos(delta) * Math.cos(hourAngle);
  return Math.acos(cosine) / RADIANS;
}

/**
 * Seeded days of a sun-photometer station. Every formula is written here apart from src, so that what a retrieval gets back
 * was not put in by the retrieval's own code: sun from declination and hour angle, rays integrated through a layered
 * atmosphere, Rayleigh from index and King factor, ozone and nitrogen dioxide from literals of the JPL and IUPAC tables.
 */

const EARTH_M = 6_371_000;
const DEG = Math.PI / 180;

/** Random numbers by Lehmer's generator with Park & Miller's multiplier 48271; `normal` by the polar method. */
export function randomOf(seed: number): { uniform: () => number; normal: () => number } {
  let state = (seed * 7919 + 104729) % 2147483647;
  const uniform = (): number => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
  for (let i = 0; i < 10; i++) uniform();
  const normal = (): number => {
    for (;;) {
      const [a, b] = [2 * uniform() - 1, 2 * uniform() - 1];
      const s = a * a + b * b;
      if (s > 0 && s < 1) return a * Math.sqrt((-2 * Math.log(s)) / s);
    }
  };
  return { uniform, normal };
}

/** Share of the surface density at height h above the station: 6.5 K/km to 11 km above it, isothermal above. */
function density(h: number, temperatureK: number): number {
  const scale = (t: number): number => (8.314462618 * t) / (0.0289644 * 9.78);
  const top = temperatureK - 0.0065 * 11000;
  if (h <= 11000) {
    const power = 9.78 / ((8.314462618 / 0.0289644) * 0.0065) - 1;
    return ((temperatureK - 0.0065 * h) / temperatureK) ** power;
  }
  return density(11000, temperatureK) * Math.exp(-(h - 11000) / scale(top));
}

/** Air masses and true zenith angle of a ray that leaves the station at an apparent zenith angle. */
function ray(apparentDeg: number, station: Station): RayRow {
  const { altitudeM, temperatureK, pressurePa } = station;
  const refractivity = 2.79e-4 * (pressurePa / 101325) * (288.15 / temperatureK);
  const constant = (1 + refractivity) * (EARTH_M + altitudeM) * Math.sin(apparentDeg * DEG);
  const profiles = [
    (h: number) => density(h, temperatureK),
    (h: number) => Math.exp(-0.5 * ((h + altitudeM - 22000) / 4500) ** 2),
    (h: number) => Math.exp(-h / 1800),
  ];
  const slant = [0, 0, 0];
  const vertical = [0, 0, 0];
  let refraction = 0;
  let [before, lastIndex] = [0, 1 + refractivity];
  const steps = 600;
  for (let k = 1; k <= steps; k++) {
    const next = 80000 * (k / steps) ** 2;
    const [h, thickness] = [0.5 * (before + next), next - before];
    const index = 1 + refractivity * density(h, temperatureK);
    const sine = constant / (index * (EARTH_M + altitudeM + h));
    const cosine = Math.sqrt(1 - sine * sine);
    profiles.forEach((profile, i) => {
      const share = profile(h) * thickness;
      vertical[i]! += share;
      slant[i]! += share / cosine;
    });
    const nextIndex = 1 + refractivity * density(next, temperatureK);
    refraction += ((sine / cosine) * (lastIndex - nextIndex)) / index;
    [before, lastIndex] = [next, nextIndex];
  }
  const [air, ozone, aerosol] = slant.map((s, i) => s / vertical[i]!);
  return { trueDeg: apparentDeg + refraction / DEG, air: air!, ozone: ozone!, aerosol: aerosol! };
}

interface RayRow {
  trueDeg: number;
  air: number;
  ozone: number;
  aerosol: number;
}

/** Where and in what air the readings are taken. */
export interface Station {
  latitudeDeg: number;
  altitudeM: number;
  pressurePa: number;
  temperatureK: number;
}
export const SUMMIT: Station = {
  latitudeDeg: 28.3,
  altitudeM: 2370,
  pressurePa: 77_000,
  temperatureK: 283,
};

/** Masses by true zenith angle (0 to 88°), from a table of rays every half degree, cubic between them. */
export function massesAt(station: Station): (trueZenithDeg: number) => RayRow {
  const rows = Array.from({ length: 178 }, (_, i) => ray(i / 2, station));
  return (z) => {
    let i = Math.max(0, Math.min(rows.length - 4, Math.floor(z * 2) - 1));
    while (i > 0 && rows[i + 1]!.trueDeg > z) i--;
    const near = rows.slice(i, i + 4);
    const weight = (k: number): number =>
      near.reduce(
        (w, row, j) => (j === k ? w : (w * (z - row.trueDeg)) / (near[k]!.trueDeg - row.trueDeg)),
        1,
      );
    const weights = near.map((_, k) => weight(k));
    // mass times cosine is nearly straight: interpolate that
    const of = (pick: (row: RayRow) => number): number =>
      near.reduce((sum, row, k) => sum + weights[k]! * pick(row) * Math.cos(row.trueDeg * DEG), 0) /
      Math.cos(z * DEG);
    return {
      trueDeg: z,
      air: of((r) => r.air),
      ozone: of((r) => r.ozone),
      aerosol: of((r) => r.aerosol),
    };
  };
}

/** True zenith angle of the sun at a local solar hour. */
export function sunZenithDeg(dayOfYear: number, solarHour: number, latitudeDeg: number): number {
  const declination = -23.44 * Math.cos((2 * Math.PI * (dayOfYear + 10)) / 365.25) * DEG;
  const hourAngle = (solarHour - 12) * 15 * DEG;
  const phi = latitudeDeg * DEG;
  const cosine =
    Math.sin(phi) * Math.sin(declination) +
    Math.cos(phi) * Math.cos(declination) * Math.cos(hourAngle);
  return Math.acos(cosine) / DEG;
}

/** Distance of the sun, au. */
export function sunDistance(dayOfYear: number): number {
  return 1 - 0.01671 * Math.cos((2 * Math.PI * (dayOfYear - 4)) / 365.25);
}

/** Rayleigh optical depth: Peck & Reeder's index, King factor of Bates 1984, 425 ppm; gravity at 5.5 km + 0.737 altitude. */
export function rayleighDepth(nm: number, station: Station): number {
  const s = (1000 / nm) ** 2;
  const dry300 = 1e-8 * (8060.51 + 2480990 / (132.274 - s) + 17455.7 / (39.32957 - s));
  const n = 1 + dry300 * (1 + 0.54 * (425e-6 - 300e-6));
  const density15 = 2.546899e25; // m-3
  const king =
    (78.084 * (1.034 + 3.17e-4 * s) +
      20.946 * (1.096 + 1.385e-3 * s + 1.448e-4 * s * s) +
      0.934 +
      0.0425 * 1.15) /
    (78.084 + 20.946 + 0.934 + 0.0425);
  const ratio = (n * n - 1) / (n * n + 2);
  const area = (24 * Math.PI ** 3 * ratio ** 2 * king) / ((nm * 1e-9) ** 4 * density15 ** 2);
  const gravity =
    9.80616 * (1 - 0.0026373 * Math.cos(2 * station.latitudeDeg * DEG)) -
    3.086e-6 * (0.73737 * station.altitudeM + 5517.56);
  return (area * station.pressurePa * 6.02214e23) / (0.0289654 * gravity);
}

/** Ozone, cm² per molecule: JPL recommendation, 218 K in the ultraviolet and 293 K beyond. */
// biome-ignore format: nanometres and cross-section
const OZONE: readonly (readonly [number, number])[] = [
  [300, 3.51e-19], [301, 3.05e-19], [302, 2.69e-19], [303, 2.29e-19], [304, 2.06e-19], [305, 1.73e-19], [306, 1.56e-19],
  [307, 1.33e-19], [308, 1.15e-19], [309, 1.04e-19], [310, 8.5e-20], [311, 7.76e-20], [312, 6.53e-20], [313, 5.62e-20],
  [314, 5.05e-20], [315, 4.08e-20], [316, 3.82e-20], [317, 3.11e-20], [318, 2.94e-20], [319, 2.11e-20], [320, 2.41e-20],
  [321, 1.43e-20], [322.5, 1.57e-20], [324.5, 1.02e-20], [326.5, 6.58e-21], [330, 4.83e-21], [335, 2.04e-21],
  [365, 3.05e-23], [370, 1.3e-23], [410, 2.58e-23], [415, 2.95e-23], [495, 9.08e-22], [500, 1.21e-21], [505, 1.6e-21],
  [605, 5.14e-21], [670, 1.7e-21], [675, 1.51e-21], [775, 2.94e-22], [780, 3.18e-22], [860, 3e-23], [1000, 0],
];
/** Nitrogen dioxide, cm² per molecule: IUPAC 220 K, JPL 294 K beyond 495 nm. */
const NITROGEN_DIOXIDE: readonly (readonly [number, number])[] = [
  [300, 1.282e-19],
  [335, 3.362e-19],
  [365, 5.418e-19],
  [370, 5.593e-19],
  [410, 6.082e-19],
  [415, 5.753e-19],
  [500, 1.82e-19],
  [660, 5.66e-21],
  [675, 0],
  [1000, 0],
];

function tableAt(table: readonly (readonly [number, number])[], nm: number): number {
  const i = Math.max(
    1,
    table.findIndex(([x]) => x >= nm),
  );
  const [[x0, y0], [x1, y1]] = [table[i - 1]!, table[i]!];
  return y0 + ((y1 - y0) * (nm - x0)) / (x1 - x0);
}
/** Vertical optical depth of ozone and of nitrogen dioxide, columns in Dobson units. */
export const ozoneDepth = (nm: number, du: number): number => 2.68678e16 * du * tableAt(OZONE, nm);
export const nitrogenDioxideDepth = (nm: number, du: number): number =>
  2.68678e16 * du * tableAt(NITROGEN_DIOXIDE, nm);

/** One channel: what it would read outside the air at 1 au, and its passband as wavelengths of equal weight (one: monochromatic). */
export interface Channel {
  nm: number;
  constant: number;
  passbandNm?: readonly number[];
}
export const CHANNELS: readonly Channel[] = [
  { nm: 368, constant: 0.71 },
  { nm: 412, constant: 1.18 },
  { nm: 500, constant: 2.05 },
  { nm: 675, constant: 1.72 },
  { nm: 778, constant: 1.58 },
  { nm: 862, constant: 1.36 },
];

/** What a day is like. */
export interface DayTruth {
  seed: number;
  dayOfYear: number;
  station: Station;
  channels: readonly Channel[];
  ozoneDu: number;
  nitrogenDioxideDu: number;
  /** Aerosol optical depth at 500 nm by solar hour. */
  aerosol500: (solarHour: number) => number;
  exponent: number;
  /** Relative noise of a reading. */
  noise: number;
  fromHour: number;
  toHour: number;
  stepMinutes: number;
  /** Optical depth of cloud by solar hour. */
  cloud?: (solarHour: number) => number;
  /** Relative drift of every constant on this day. */
  drift?: number;
}

/** A day's readings with the truth beside them. */
export interface Day {
  hours: number[];
  zenithsDeg: number[];
  masses: RayRow[];
  cloudDepths: number[];
  /** By channel, then by reading. */
  signals: number[][];
  aerosolDepths: number[][];
  sunDistanceAu: number;
}

/** The readings of a day. */
export function stationDay(truth: DayTruth): Day {
  const { station, channels, dayOfYear, exponent } = truth;
  const { normal } = randomOf(truth.seed);
  const massAt = massTable(station);
  const count = Math.round(((truth.toHour - truth.fromHour) * 60) / truth.stepMinutes) + 1;
  const hours = Array.from(
    { length: count },
    (_, i) => truth.fromHour + (i * truth.stepMinutes) / 60,
  );
  const zenithsDeg = hours.map((hour) => sunZenithDeg(dayOfYear, hour, station.latitudeDeg));
  const masses = zenithsDeg.map(massAt);
  const cloudDepths = hours.map((hour) => truth.cloud?.(hour) ?? 0);
  const sunDistanceAu = sunDistance(dayOfYear);
  const aerosolDepths = channels.map(({ nm }) =>
    hours.map((hour) => truth.aerosol500(hour) * (nm / 500) ** -exponent),
  );
  const signals = channels.map(({ nm, constant, passbandNm = [nm] }, c) => {
    const gases = passbandNm.map((x) => ({
      rayleigh: rayleighDepth(x, station),
      high: ozoneDepth(x, truth.ozoneDu) + nitrogenDioxideDepth(x, truth.nitrogenDioxideDu),
      aerosol: (x / nm) ** -exponent,
    }));
    return masses.map((mass, i) => {
      const near = aerosolDepths[c]![i]!;
      const through = gases.reduce((sum, gas) => {
        const slant =
          gas.rayleigh * mass.air + gas.high * mass.ozone + gas.aerosol * near * mass.aerosol;
        return sum + Math.exp(-slant - cloudDepths[i]! * mass.aerosol);
      }, 0);
      const outside = (constant * (1 + (truth.drift ?? 0))) / sunDistanceAu ** 2;
      return outside * (through / gases.length) * (1 + truth.noise * normal());
    });
  });
  return { hours, zenithsDeg, masses, cloudDepths, signals, aerosolDepths, sunDistanceAu };
}

const tables = new Map<string, (z: number) => RayRow>();
function massTable(station: Station): (z: number) => RayRow {
  const key = `${station.altitudeM} ${Math.round(station.pressurePa / 100)} ${Math.round(station.temperatureK)}`;
  let table = tables.get(key);
  if (table === undefined) {
    table = massesAt(station);
    tables.set(key, table);
  }
  return table;
}

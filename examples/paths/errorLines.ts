/** What each published air mass is off by against the refracted ray, as lines over the apparent elevation. */
import {
  airMassHardie,
  airMassKasten,
  airMassKastenWater,
  airMassKastenYoung,
  airMassPickering,
  airMassRozenberg,
  airMassShell,
  airMassYoung,
  airMassYoungIrvine,
  exponentialLayer,
  gaussianLayer,
  refractedPath,
  standardProfile,
} from "airlight";

/** One line of the picture. */
export interface ErrorLine {
  readonly panel: string;
  readonly name: string;
  /** A wrong use of a formula, drawn dashed. */
  readonly misused: boolean;
  readonly points: { readonly elevation: number; readonly percent: number }[];
}

export const AIR = "air";
export const OTHERS = "ozone and water";

const input = {
  profile: standardProfile({
    pressurePa: 101325,
    temperatureK: 288.15,
    relativeHumidity: 0,
    altitudeM: 0,
    co2Ppm: 425,
  }),
  altitudeM: 0,
  wavelengthNm: 550,
  earthRadiusM: 6371000,
  constituents: {
    ozone: gaussianLayer({ heightM: 22000, standardDeviationM: 5000 }),
    water: exponentialLayer({ scaleHeightM: 2000 }),
  },
};
/** Elevations, dense towards the horizon. */
const elevations = Array.from({ length: 161 }, (_, i) => 40 * (i / 160) * (i / 160));
const rays = elevations.map((elevation) => refractedPath(90 - elevation, input));

type Mass = "air" | "ozone" | "water";
type Formula = (apparentZenithDeg: number, trueZenithDeg: number) => number;

function errorLine(name: string, mass: Mass, most: number, formula: Formula): ErrorLine {
  const points = rays.flatMap(({ airMass, masses, trueZenithDeg }, i) => {
    const elevation = elevations[i]!;
    const exact = mass === "air" ? airMass : masses[mass];
    const asked = Math.max(90 - elevation, name.includes("true") ? trueZenithDeg : 0);
    if (asked > most) return [];
    const percent = (formula(90 - elevation, trueZenithDeg) / exact - 1) * 100;
    return [{ elevation, percent }];
  });
  const misused = name.includes("at the true") || name.includes("of air");
  return { panel: mass === "air" ? AIR : OTHERS, name, misused, points };
}

/** All lines. */
export function errorLines(): ErrorLine[] {
  const shell = { shellHeightM: 22000, altitudeM: 0 };
  return [
    errorLine("Kasten & Young 1989", "air", 90, (z) => airMassKastenYoung(z)),
    errorLine("Young 1994 (true)", "air", 90, (_, z) => airMassYoung(z)),
    errorLine("Kasten 1965", "air", 90, (z) => airMassKasten(z)),
    errorLine("Pickering 2002", "air", 90, (z) => airMassPickering(z)),
    errorLine("Rozenberg 1966", "air", 90, (z) => airMassRozenberg(z)),
    errorLine("Hardie 1962", "air", 85, (z) => airMassHardie(z)),
    errorLine("Young & Irvine 1967 (true)", "air", 80, (_, z) => airMassYoungIrvine(z)),
    errorLine("Kasten & Young at the true angle", "air", 90, (_, z) => airMassKastenYoung(z)),
    errorLine("ozone: thin shell (true)", "ozone", 90, (_, z) => airMassShell(z, shell)),
    errorLine("water: Kasten 1965", "water", 90, (z) => airMassKastenWater(z)),
    errorLine("ozone: mass of air", "ozone", 90, (z) => airMassKastenYoung(z)),
    errorLine("water: mass of air", "water", 90, (z) => airMassKastenYoung(z)),
  ];
}

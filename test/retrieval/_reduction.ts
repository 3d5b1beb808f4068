/** The analyst's side of a simulated day: what is believed, worked out with the library. */
import {
  airColumn,
  airMassKastenWater,
  airMassKastenYoung,
  airMassShell,
  type LangleyResult,
  langleyFit,
  rayleighOpticalDepth,
  reducedSignals,
  refractionSaemundsson,
} from "../../src/index.js";
import { type Day, nitrogenDioxideDepth, ozoneDepth, type Station } from "../_stationDays.js";

/** Air masses that the library's formulas give for a true zenith angle. */
export function masses(
  zenithDeg: number,
  station: Station,
): { air: number; ozone: number; aerosol: number } {
  const apparent = zenithDeg - refractionSaemundsson(zenithDeg, station);
  const { altitudeM } = station;
  return {
    air: airMassKastenYoung(apparent),
    ozone: airMassShell(zenithDeg, { shellHeightM: 22000, altitudeM }),
    aerosol: airMassKastenWater(apparent),
  };
}

export function rayleigh(
  nm: number,
  station: Station,
  pressurePa: number = station.pressurePa,
): number {
  return rayleighOpticalDepth(nm, airColumn({ ...station, pressurePa, co2Ppm: 425 }));
}

/** Langley fit of one channel of a day between two air masses of the aerosol. */
export function morningFit(
  day: Day,
  channel: number,
  nm: number,
  station: Station,
  believed: { ozoneDu: number; nitrogenDioxideDu: number },
): LangleyResult {
  const all = day.zenithsDeg.map((z) => masses(z, station));
  const used = all.map((_, i) => i).filter((i) => all[i]!.aerosol > 2 && all[i]!.aerosol < 6);
  const of = (pick: "air" | "ozone" | "aerosol"): number[] => used.map((i) => all[i]![pick]);
  const high =
    ozoneDepth(nm, believed.ozoneDu) + nitrogenDioxideDepth(nm, believed.nitrogenDioxideDu);
  const signals = reducedSignals(
    used.map((i) => day.signals[channel]![i]!),
    {
      sunDistanceAu: day.sunDistanceAu,
      terms: [
        { opticalDepth: rayleigh(nm, station), airMasses: of("air") },
        { opticalDepth: high, airMasses: of("ozone") },
      ],
    },
  );
  return langleyFit({ airMasses: of("aerosol"), signals });
}

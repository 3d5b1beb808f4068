/** How well the forward calculation is known. */
import { propagate } from "airlight";
import { ASSUMED } from "./assumed.js";
import { type SunView, type TypicalAir, viewSun } from "./lookForward.js";
import type { Station } from "./readStation.js";

/** Standard uncertainties of a SunView. */
export interface ViewUncertainty {
  readonly illuminanceLx: number;
  readonly chromaticity: readonly [number, number];
  /** Undefined for a sun without a colour temperature. */
  readonly temperatureK: number | undefined;
}

/** Propagates the uncertainty of the air through viewSun; aerosol goes in as its depth at 500 nm, which hardly goes with the exponent. */
export function viewUncertainty(view: SunView, air: TypicalAir, station: Station): ViewUncertainty {
  const inputs = {
    depthAt500: {
      value: air.turbidity * 2 ** air.exponent,
      standardUncertainty: air.depthUncertainty,
    },
    exponent: { value: air.exponent, standardUncertainty: air.exponentUncertainty },
    pressurePa: { value: air.pressurePa, standardUncertainty: ASSUMED.pressurePa },
    ozoneDu: { value: station.ozoneDu, standardUncertainty: ASSUMED.ozoneDu },
    waterCm: { value: air.waterCm, standardUncertainty: ASSUMED.water * air.waterCm },
  };
  type Values = Readonly<Record<keyof typeof inputs, number>>;
  const known = new Map<string, SunView>();
  const at = (values: Values): SunView => {
    const key = Object.values(values).join();
    const { depthAt500, exponent, pressurePa, waterCm } = values;
    const changed = {
      ...air,
      turbidity: depthAt500 * 2 ** -exponent,
      exponent,
      pressurePa,
      waterCm,
    };
    const seen =
      known.get(key) ??
      viewSun(view.trueHeightDeg, changed, { ...station, ozoneDu: Math.max(0, values.ozoneDu) });
    known.set(key, seen);
    return seen;
  };
  const of = (pick: (seen: SunView) => number): number =>
    propagate((values: Values) => pick(at(values)), inputs).standardUncertainty;
  return {
    illuminanceLx: Math.hypot(
      of((seen) => seen.illuminanceLx),
      ASSUMED.sunlight * view.illuminanceLx,
    ),
    chromaticity: [of((seen) => seen.chromaticity[0]), of((seen) => seen.chromaticity[1])],
    temperatureK: view.colourTemperature && of((seen) => seen.colourTemperature!.temperatureK),
  };
}

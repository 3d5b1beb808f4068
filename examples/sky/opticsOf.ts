/** The clear air of the examples: optical depths at one wavelength, cut into layers. */
import {
  airColumn,
  depolarisation,
  ozoneOpticalDepth,
  rayleighOpticalDepth,
  type SkyLayer,
  standardAtmosphere,
} from "airlight";

/** A place with a clear sky. */
export interface Site {
  readonly altitudeM: number;
  readonly latitudeDeg: number;
  /** Column of ozone, DU; 0 for air without any. */
  readonly ozoneDu: number;
  readonly groundAlbedo: number;
}

/** Temperature of the ozone layer, K (common practice). */
const OZONE_K = 225;
/** Carbon dioxide, µmol/mol. */
const CO2_PPM = 425;
/** Heights that part the layers, m above sea level, from the top down. */
const CUTS_M = [35_000, 25_000, 20_000, 15_000, 10_000] as const;

/** What one wavelength meets. */
export interface Optics {
  readonly rayleighDepth: number;
  readonly ozoneDepth: number;
  readonly depolarisation: number;
  readonly layers: readonly SkyLayer[];
}

/** Optical depths at a wavelength, whole and in layers from the top down. */
export function opticsOf(wavelengthNm: number, site: Site): Optics {
  const pressurePa = standardAtmosphere(site.altitudeM).pressurePa;
  const { altitudeM, latitudeDeg } = site;
  const column = airColumn({ pressurePa, altitudeM, latitudeDeg, co2Ppm: CO2_PPM });
  const rayleighDepth = rayleighOpticalDepth(wavelengthNm, column);
  const ozoneDepth =
    site.ozoneDu === 0 ? 0 : ozoneOpticalDepth(wavelengthNm, site.ozoneDu, OZONE_K);
  const levels = [...CUTS_M.filter((m) => m > altitudeM), altitudeM];
  const air = levels.map((m) => standardAtmosphere(m).pressurePa / pressurePa);
  const ozone = levels.map((m) => ozoneAbove(m) / ozoneAbove(altitudeM));
  const layers = levels.map((_, l) => ({
    rayleighDepth: rayleighDepth * (air[l]! - (air[l - 1] ?? 0)),
    absorptionDepth: ozoneDepth * (ozone[l]! - (ozone[l - 1] ?? 0)),
  }));
  return {
    rayleighDepth,
    ozoneDepth,
    depolarisation: depolarisation(wavelengthNm, CO2_PPM),
    layers,
  };
}

/** Share of the ozone above a height (Lacis & Hansen 1974, from memory). */
function ozoneAbove(heightM: number): number {
  return 1 / (1 + Math.exp((heightM - 20_000) / 5_000));
}

/** What the explore page shows, worked out by the library from the sliders' state. */
import {
  airColumn,
  beamIrradiance,
  beamOpticalDepths,
  cie1931Observer5nm,
  clearBeam,
  correlatedColourTemperature,
  encodeSrgb,
  fitToDisplay,
  integrateSpectrum,
  moistAir,
  type PreparedSky,
  refractiveIndexCiddor,
  type Spectrum,
  solarIrradiance,
  spectrumToXyz,
  srgbHex,
  standardAtmosphere,
  tabulate,
  wavelengthGrid,
  type Xyz,
  xyzToLinearSrgb,
} from "airlight";
import { ARC_DEG, prepareArc, skyArc } from "./skyArc.js";

/** Where the sliders stand. */
export interface State {
  /** True height of the sun's centre, degrees. */
  readonly heightDeg: number;
  /** Height of the site, m. */
  readonly altitudeM: number;
  /** Ozone, Dobson units. */
  readonly ozoneDu: number;
  /** Aerosol optical depth at 500 nm. */
  readonly haze: number;
  /** Carbon dioxide, ppm. */
  readonly co2Ppm: number;
}

/** What does not depend on the state: made once. */
export interface Fixed {
  /** Wavelengths of the drawn spectrum. */
  readonly grid: Float64Array;
  /** Sunlight outside the air on them. */
  readonly outside: Spectrum;
}

/** What the page shows. */
export interface View {
  readonly ground: Spectrum;
  readonly pressurePa: number;
  readonly airMass: number;
  readonly ozoneMass: number;
  /** Of the direct sun on a plane that faces it, lx. */
  readonly illuminanceLx: number;
  /** On level ground, lx. */
  readonly levelLx: number;
  /** Between 300 and 1100 nm, W/m². */
  readonly irradiance: number;
  /** Undefined where the light is too far from any black body. */
  readonly colourTemperatureK: number | undefined;
  readonly sunColour: string;
  /** Slant optical depths at 550 nm. */
  readonly depths: { readonly air: number; readonly ozone: number; readonly aerosol: number };
  /** Sky along the arc of `ARC_DEG`: display colours, all at one exposure; undefined for a sun too low. */
  readonly skyColours: readonly string[] | undefined;
  /** Of the sky overhead, cd/m². */
  readonly zenithLuminance: number | undefined;
  /** Display colour of the sky overhead at full brightness. */
  readonly zenithColour: string | undefined;
  /** (n - 1) × 1e6 at 550 nm at the site. */
  readonly refractivity: number;
}

/** What is the same for all states. */
export function prepare(): Fixed {
  const grid = wavelengthGrid(300, 1100, 2);
  return { grid, outside: tabulate(solarIrradiance, grid) };
}

/** Display colour at full brightness: light of tristimulus values scaled to Y = 1. */
export function displayColour([X, Y, Z]: Readonly<Xyz>): string {
  if (!(Y > 0)) return "#000000";
  return srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([X / Y, 1, Z / Y]))));
}

function temperatureOf(xyz: Xyz): number | undefined {
  try {
    return correlatedColourTemperature(xyz).temperatureK;
  } catch {
    return undefined; // no colour temperature so far from the black bodies
  }
}

/** Display colour at an exposure: luminance `white` becomes the brightest white. */
function exposedColour([X, Y, Z]: Readonly<Xyz>, white: number): string {
  return srgbHex(encodeSrgb(fitToDisplay(xyzToLinearSrgb([X / white, Y / white, Z / white]))));
}

/** What the page shows of the sky. */
function skyOf(
  { heightDeg }: State,
  skies: readonly PreparedSky[],
): Pick<View, "skyColours" | "zenithLuminance" | "zenithColour"> {
  const arc = skyArc(skies, heightDeg);
  const zenith = arc?.[ARC_DEG.indexOf(0)];
  const white = Math.max(...(arc ?? []).map(([, Y]) => Y));
  return {
    skyColours: arc?.map((xyz) => exposedColour(xyz, white)),
    zenithLuminance: zenith?.[1],
    zenithColour: zenith && displayColour(zenith),
  };
}

/** Everything the page shows of a state; `skies` from `prepareArc` of the same air. */
export function compute(
  state: State,
  fixed: Fixed,
  skies: readonly PreparedSky[] = prepareArc(state),
): View {
  const { heightDeg, altitudeM, ozoneDu, haze, co2Ppm } = state;
  const { pressurePa, temperatureK } = standardAtmosphere(altitudeM);
  const beam = clearBeam({
    column: airColumn({ pressurePa, altitudeM, latitudeDeg: 45, co2Ppm }),
    trueZenithDeg: 90 - heightDeg,
    ozoneDu,
    ozoneTemperatureK: 228,
    ozoneHeightM: 22000,
    nitrogenDioxideDu: 0.1,
    waterCm: 1.4,
    aerosol: { opticalDepth: haze, referenceNm: 500, exponent: 1.3 },
  });
  const ground = tabulate((nm) => beamIrradiance(nm, beam, 1), fixed.grid);
  const xyz = spectrumToXyz(ground, cie1931Observer5nm);
  const { air, ozone, aerosol } = beamOpticalDepths(550, beam);
  const here = moistAir({ pressurePa, temperatureK, relativeHumidity: 0, co2Ppm });
  return {
    ground,
    pressurePa,
    airMass: beam.masses.air,
    ozoneMass: beam.masses.ozone,
    illuminanceLx: xyz[1],
    levelLx: xyz[1] * Math.sin((heightDeg * Math.PI) / 180),
    irradiance: integrateSpectrum(ground, 300, 1100),
    colourTemperatureK: temperatureOf(xyz),
    sunColour: displayColour(xyz),
    depths: { air, ozone, aerosol },
    ...skyOf(state, skies),
    refractivity: 1e6 * (refractiveIndexCiddor(550, here) - 1),
  };
}

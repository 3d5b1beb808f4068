/** The sentences of the report that do not depend on the readings, apart from a few numbers. */
import type { StationResult } from "./analyseStation.js";
import { MOST_AIR_MASS } from "./calibrate.js";
import { CLOUD_RULE } from "./markClouds.js";

/** The cautions. They stand in the terminal and in the report. */
export const CAUTIONS: readonly string[] = [
  "Never look at the sun, and never look towards it through any optics (telescope, binoculars, camera, the sight of an instrument): it can blind within moments, without pain.",
  "A low, red or dim sun is no exception. A computed irradiance, illuminance or colour is no proof that looking, or staying in the sun, is safe.",
  "Sunlight holds ultraviolet light that harms eyes and skin; these numbers do not say how much. Instruments are pointed with a projected image or a shadow, and people who work in the sun protect eyes and skin.",
  "Local codes and the advice of licensed practitioners go before anything written here.",
];

/** How the numbers were got, paragraph by paragraph. */
export function methodWords({
  air,
  station,
}: StationResult): readonly (readonly [string, string])[] {
  return [
    [
      "Sun",
      "True zenith angle of the sun's centre from the station itself and its distance, from an ephemeris; the ephemeris adds no refraction. Signals are reduced to 1 au by the square of the distance.",
    ],
    [
      "Air masses",
      "Each constituent has its own, on the ray refracted by the weather of the reading: air in hydrostatic balance over the standard atmosphere's shape, ozone and nitrogen dioxide in a layer 5 km wide (standard deviation) at the height of the ozone layer, aerosol and water thinning out with 2 km. The Earth is the sphere that fits it here eastwards.",
    ],
    [
      "Known gases",
      "Rayleigh depth from the pressure of each reading, gravity and the profile of the air above the station. Depths are averaged over the passbands, weighted with sunlight. A band lets through more than its mean depth says when the way is long, because its blue side is used up first; that curvature is worked out for each reading and taken off (5 nm at 368 nm: 0.3 % at eight air masses).",
    ],
    [
      "Calibration",
      `What is not known on the calibration morning is the aerosol. Signals are therefore freed of everything known, each on its own air mass, and their logarithms fitted against aerosol's air mass: the slope is its optical depth, the line at air mass 0 the constant. A fit against air's mass would need a correction for the difference, which holds only once the aerosol is known. A median line starts the fit, readings farther than three scales from it are left out, least squares finishes it. Readings beyond air mass ${MOST_AIR_MASS} are not used: there the published air masses differ by as much as the readings scatter.`,
    ],
    ["Cloud", CLOUD_RULE],
    [
      "Aerosol",
      "Optical depth is what a reading leaves after all known constituents; exponent and turbidity (depth at 1000 nm) come from a power law through the channels. Haze that thickened evenly with air mass on the calibration morning passes unseen there; the uncertainty allows for it.",
    ],
    [
      "Forward",
      `Direct light for the median air of the measured day: turbidity ${air.turbidity.toFixed(4)}, exponent ${air.exponent.toFixed(2)}, ${(air.pressurePa / 100).toFixed(1)} hPa, ozone ${station.ozoneDu} DU, the sun at ${air.distanceAu.toFixed(4)} au. Water vapour, ${air.waterCm.toFixed(1)} cm, is a guess from the humidity at the ground (density there times 2 km); it hardly touches visible light. Illuminance is on a plane facing the sun, without skylight. Display colours keep the computed chromaticity and take the greatest brightness the display can show: strip and patches tell hue, not brightness.`,
    ],
  ];
}

/** What the shape of this job cannot tell. */
export const LIMITS: readonly string[] = [
  "Ozone and nitrogen dioxide are taken as given; an error of 5 % in 300 DU of ozone is 0.0005 of depth at 500 nm and 0.0006 at 675 nm at the zenith.",
  "Passbands are taken as Gaussian and without leaks; channels within bands of water vapour or oxygen would need those gases taken off, which is not done.",
  "Light scattered into the field of view (the bright ring round the sun) is not taken off; in haze of large particles it makes depths too small.",
  "One morning gives one constant. Practice is to take the mean of many, on a high mountain.",
];

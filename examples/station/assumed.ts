/** How well the analyst claims to know what the readings cannot tell. Change these to what is true of your station. */

/** Standard uncertainties. */
export const ASSUMED = {
  /** Of a constant from one morning, relative: haze that drifts with the sun's height bends no line. From mornings at high stations. */
  hazeDrift: 0.0015,
  /** Of the barometer, Pa. */
  pressurePa: 50,
  /** Of the Rayleigh depth of a known column, relative. */
  rayleigh: 0.001,
  /** Of the ozone column, DU. */
  ozoneDu: 10,
  /** Of the nitrogen dioxide column, DU. */
  nitrogenDioxideDu: 0.05,
  /** Of the clock, s. */
  timeS: 1,
  /** Of latitude and longitude, degrees. */
  positionDeg: 0.001,
  /** Of the water column, relative: a guess from the ground. */
  water: 0.5,
  /** Of sunlight outside the air, relative. */
  sunlight: 0.01,
} as const;

/** The same in words. */
export const ASSUMED_WORDS: string =
  `Standard uncertainties taken for granted: ${(ASSUMED.hazeDrift * 100).toFixed(2)} % of every constant for haze that drifted on the one calibration morning (a morning cannot show it), ` +
  `${ASSUMED.pressurePa} Pa of pressure, ${(ASSUMED.rayleigh * 100).toFixed(1)} % of the Rayleigh depth, ${ASSUMED.ozoneDu} DU of ozone, ${ASSUMED.nitrogenDioxideDu} DU of nitrogen dioxide, ` +
  `${ASSUMED.timeS} s of time, ${ASSUMED.positionDeg}° of position, half of the water, ${(ASSUMED.sunlight * 100).toFixed(0)} % of sunlight. Noise is the scatter of the calibration. ` +
  "They add as squares; what is printed as ± is the half width of a 95 % interval. What none of them covers (light scattered into the view, leaks of the filters, the air mass of the lowest sun) is not in it.";

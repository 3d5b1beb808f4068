/** Air mass of a thin layer high above the ground, such as ozone. */
import { checkNumber, checkRecord } from "../_check.js";
import { sin, sqrt } from "../_numeric.js";
import { MEAN_EARTH_RADIUS } from "../constants.js";
import { type Degrees, type Dimensionless, type Metres, RADIANS_PER_DEGREE } from "../units.js";

/** Where the layer and the observer are. */
export interface Shell {
  /** Height of the layer above sea level, m. */
  readonly shellHeightM: Metres;
  /** Height of the observer above sea level, m. */
  readonly altitudeM: Metres;
}

/**
 * Relative air mass of a thin spherical layer, from the true zenith angle.
 *
 * Model: 1 / cos of the angle at which a straight ray crosses the layer.
 * Validity: true zenith angle 0 to 90°; layer 1 to 100 km high and above the observer; observer -500 to 20 000 m; enforced.
 * Accuracy: 1e-12 against plane trigonometry by the sine rule. A real ozone layer is thick and the ray bends: against
 * `refractedPath` through a Gaussian layer at 22 km of 5 km standard deviation, seen from sea level, within 0.01 % to 75°,
 * -0.04 % at 80°, -0.5 % at 85°, -2.4 % at 88°, -5.6 % at 90°.
 * Source: geometry; its use for ozone Komhyr 1980 (from memory). Earth radius 6371.0088 km (IUGG mean).
 *
 * @param trueZenithDeg - true (geometric) zenith angle, 0 to 90°
 * @param shell - `shellHeightM` 1000 to 100 000 m above sea level; `altitudeM` -500 to 20 000 m, below the shell
 * @returns air mass, without unit
 * @throws TypeError if an argument is of the wrong kind; RangeError if it is out of range
 * @example
 * import { airMassShell } from "airlight";
 * airMassShell(85, { shellHeightM: 22000, altitudeM: 0 }); // => 8.32911
 */
export function airMassShell(trueZenithDeg: Degrees, shell: Shell): Dimensionless {
  checkNumber(trueZenithDeg, 0, 90, "degrees", "trueZenithDeg", "airMassShell");
  checkRecord(shell, "shell", "airMassShell");
  const { shellHeightM, altitudeM } = shell;
  checkNumber(altitudeM, -500, 20_000, "m", "altitudeM", "airMassShell");
  checkNumber(
    shellHeightM,
    Math.max(1000, altitudeM + 1),
    100_000,
    "m",
    "shellHeightM",
    "airMassShell",
  );
  const sine =
    (sin(trueZenithDeg * RADIANS_PER_DEGREE) * (MEAN_EARTH_RADIUS + altitudeM)) /
    (MEAN_EARTH_RADIUS + shellHeightM);
  return 1 / sqrt((1 - sine) * (1 + sine));
}

/** All pictures of the report. */
import type { StationResult } from "./analyseStation.js";
import { drawAerosolDepth, drawExponent } from "./drawAerosol.js";
import { budgetedReading } from "./budgetedReading.js";
import { drawBudget } from "./drawBudget.js";
import { drawCalibrationLines, drawCalibrationResiduals } from "./drawCalibration.js";
import { clearSkies } from "./clearSky.js";
import { drawSky } from "./drawSky.js";
import { drawColourStrip, drawSpectra } from "./drawSun.js";
import type { PictureWidth } from "./plotting.js";
import { signalUnit } from "./resultTables.js";

/** SVG texts by the name of their file. */
export type Pictures = Readonly<
  Record<
    | "calibration-lines"
    | "calibration-residuals"
    | "aerosol-depth"
    | "aerosol-exponent"
    | "budget"
    | "sun-spectra"
    | "sun-colours"
    | "sky-spectra",
    string
  >
>;

/** Draws all of them at one width. */
export function drawPictures(result: StationResult, width: PictureWidth): Pictures {
  const { calibrations, aerosol, views, strip, air } = result;
  return {
    "calibration-lines": drawCalibrationLines(calibrations, signalUnit(result), width),
    "calibration-residuals": drawCalibrationResiduals(calibrations, width),
    "aerosol-depth": drawAerosolDepth(aerosol, calibrations, width),
    "aerosol-exponent": drawExponent(aerosol, width),
    budget: drawBudget(budgetedReading(result), width),
    "sun-spectra": drawSpectra(views, air.distanceAu, width),
    "sun-colours": drawColourStrip(strip, views, width),
    "sky-spectra": drawSky(clearSkies(result)[1]!, width),
  };
}

/** Readings back to calibration, optical depths, exponent and turbidity. @module retrieval */
export type {
  ArchiveChannel,
  ArchiveReadings,
  ArchiveResult,
  ArchiveSettings,
} from "./_archive.js";
export type { Covariance2 } from "./_weightedLine.js";
export {
  type AerosolOpticalDepth,
  aerosolOpticalDepth,
  type SunReading,
  type UncertainTerm,
} from "./aerosolOpticalDepth.js";
export { aerosolOpticalDepths } from "./aerosolOpticalDepths.js";
export { airMassPerDegree } from "./airMassPerDegree.js";
export { type AngstromCurvature, angstromCurvature } from "./angstromCurvature.js";
export { type AngstromResult, angstromFit } from "./angstromFit.js";
export { bandTransmittance } from "./bandTransmittance.js";
export { calibrationAt, type UncertainConstant } from "./calibrationAt.js";
export {
  type CalibrationDrift,
  calibrationDrift,
  type DatedCalibration,
} from "./calibrationDrift.js";
export { cloudScreening } from "./cloudScreening.js";
export {
  type CombinedCalibration,
  combinedCalibration,
  type MorningCalibration,
} from "./combinedCalibration.js";
export {
  type BandExtinction,
  type Coefficient,
  type ExtinctionTerms,
  extinctionFit,
  type StarObservation,
} from "./extinctionFit.js";
export {
  type LangleyInput,
  type LangleyResult,
  langleyFit,
  type RejectedReading,
} from "./langleyFit.js";
export { magnitudeToOpticalDepth } from "./magnitudeToOpticalDepth.js";
export {
  type ExtinctionModel,
  type ModelStar,
  modelExtinction,
  type PredictedExtinction,
} from "./modelExtinction.js";
export { opticalDepthCovariance } from "./opticalDepthCovariance.js";
export { opticalDepthCriterion } from "./opticalDepthCriterion.js";
export { opticalDepthToMagnitude } from "./opticalDepthToMagnitude.js";
export { type OzoneChannel, type OzoneColumn, type OzonePath, ozoneColumn } from "./ozoneColumn.js";
export {
  type PrecipitableWater,
  precipitableWater,
  type WaterReading,
} from "./precipitableWater.js";
export { type KnownColumn, reducedSignals, type SignalReduction } from "./reducedSignals.js";
export { type KnownTerm, residualOpticalDepth, type SlantPath } from "./residualOpticalDepth.js";
export { type OutsideSpectrum, type RemovalOptions, removeAtmosphere } from "./removeAtmosphere.js";
export { resampleWithCovariance, type UncertainSpectrum } from "./resampleWithCovariance.js";
export { screeningReasons } from "./screeningReasons.js";
export {
  type CalibrationTransfer,
  type TransferredCalibration,
  transferredCalibration,
} from "./transferredCalibration.js";
export { type SightUncertainty, zenithStandardUncertainty } from "./zenithStandardUncertainty.js";

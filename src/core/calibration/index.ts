/** Calibration certificates: corrections, deviation functions, calibrated couples, drift. */
export { CalibratedCouple, calibratedCouple, type ReferenceBy } from "./calibrated-couple";
export { Certificate, type CertificateTerms, certificate, type GivenAs, type PointsAre } from "./certificate";
export { CorrectionUncertainty, correctionUncertainty } from "./correction-uncertainty";
export { deviationDegrees, deviationUv, emfAtNominal } from "./deviation";
export {
  type DeviationFitTerms,
  type DeviationFunction,
  fitDeviation,
  HIGHEST_ORDER,
} from "./deviation-fit";
export { type Calibration, calibrationDrift, type PointDrift } from "./drift";
export type { Method } from "./interpolation";

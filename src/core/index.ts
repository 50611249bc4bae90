/**
 * The one door to the calculations: pure functions and data, in °C, mV and Ω, that
 * know no spreadsheet, no DOM and no Node. What has no valid answer is a `Refusal`.
 */
export {
  type CalibratedCouple,
  type Certificate,
  type CertificateTerms,
  calibratedCouple,
  calibrationDrift,
  certificate,
  correctionUncertainty,
  type DeviationFunction,
  deviationDegrees,
  deviationUv,
  emfAtNominal,
  fitDeviation,
} from "./calibration";
export {
  acceptanceLimit,
  type CheckRow,
  cableClassNames,
  cableDesignations,
  cableToleranceDegrees,
  cableToleranceUv,
  checkTable,
  classMet,
  classStandards,
  conformityProbability,
  type DecisionRule,
  decisionRule,
  enScore,
  guardedAcceptance,
  type LowerLimit,
  statement,
  tolerance,
  toleranceClass,
  toleranceClassNames,
  toleranceUv,
  verdict,
} from "./conformity";
export {
  degrees,
  degreesApart,
  measured,
  millivolts,
  noAnswer,
  Refusal,
  type RefusalKind,
  wrongKind,
} from "./errors";
export {
  crossings,
  diagnose,
  differential,
  type Lead,
  leadError,
  platinumResistance,
  platinumTemperature,
  releaded,
  rereferenced,
  retyped,
  thermistor,
  unreversed,
} from "./junction";
export {
  despiker,
  flagger,
  rampRate,
  type TimeGrid,
  timeConstant,
  timeGrid,
  timeline,
  unlag,
} from "./log";
export { type Publication, type PublicationId, publications } from "./publications";
export {
  ACTIVATION_ENERGY,
  envelope,
  furnaceClass,
  lethality,
  meanKinetic,
  REQUIRED_MINUTES,
  type SurveyLog,
  soak,
  survey,
  surveySummary,
  surveyTable,
  systemCheck,
  type Tolerance,
  timeAbove,
} from "./survey";
export { emfBetween, emfsBetween, seebeckAt, temperatureOf, temperaturesOf } from "./thermoelectric/convert";
export { furtherDesignations, letterDesignations, spoken, thermocouple } from "./thermoelectric/designation";
export { toIts90 } from "./thermoelectric/scale";
export { temperatureGrid } from "./thermoelectric/table";
export type { Thermocouple } from "./thermoelectric/thermocouple";
export {
  type Budget,
  type BudgetLine,
  budget,
  combinedUncertainty,
  coverageFactor,
  DEFAULT_TRIALS,
  type Distribution,
  distribution,
  distributions,
  effectiveDof,
  INFINITE_DOF,
  reportValue,
  simulateTemperature,
  standardUncertainty,
  TWO_SIGMA,
  temperatureUncertainty,
  typeA,
} from "./uncertainty";
export { celsius, fromCelsius, type TemperatureUnit, temperatureUnits, toCelsius } from "./units";

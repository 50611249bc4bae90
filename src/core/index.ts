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
export { type Publication, type PublicationId, publications } from "./publications";
export { emfBetween, emfsBetween, seebeckAt, temperatureOf, temperaturesOf } from "./thermoelectric/convert";
export { furtherDesignations, letterDesignations, spoken, thermocouple } from "./thermoelectric/designation";
export { toIts90 } from "./thermoelectric/scale";
export { temperatureGrid } from "./thermoelectric/table";
export type { Thermocouple } from "./thermoelectric/thermocouple";
export { celsius, fromCelsius, type TemperatureUnit, temperatureUnits, toCelsius } from "./units";

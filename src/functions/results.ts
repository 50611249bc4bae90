/** What a function gives back: a core value and how it is written in the unit of the call. */
import { fromCelsius, type TemperatureUnit } from "../core";

export interface ResultKind {
  /** For the catalogue. */
  readonly name: string;
  readonly unit?: string;
  /** The core's number in the call's unit. */
  write(value: number, unit: TemperatureUnit): number;
}

const asItIs = (value: number): number => value;

export const temperatureResult: ResultKind = { name: "temperature", unit: "°C", write: fromCelsius };

/** Steps of a table are round numbers in the call's unit; conversion must not blur their last digits. */
export const gridTemperatureResult: ResultKind = {
  ...temperatureResult,
  write: (value, unit) => Math.round(fromCelsius(value, unit) * 1e9) / 1e9,
};

/** Only the size of the degree counts. */
export const differenceResult: ResultKind = {
  name: "temperature difference",
  unit: "°C",
  write: (value, unit) => value / unit.degree,
};

/** Degrees of difference per year. */
export const differencePerYearResult: ResultKind = { ...differenceResult, name: "drift", unit: "°C/year" };

export const emfResult: ResultKind = { name: "EMF", unit: "mV", write: asItIs };

/** µV per degree of the call's unit. */
export const seebeckResult: ResultKind = {
  name: "Seebeck coefficient",
  unit: "µV/°C",
  write: (value, unit) => value * unit.degree,
};

export const microvoltResult: ResultKind = { name: "EMF deviation", unit: "µV", write: asItIs };

export const resistanceResult: ResultKind = { name: "resistance", unit: "Ω", write: asItIs };

/** A date serial of the workbook. */
export const dateResult: ResultKind = { name: "date", write: asItIs };

/** A time of a log, in the unit in which the log gives it. */
export const timeResult: ResultKind = { name: "time", write: asItIs };

export const durationResult: ResultKind = { name: "duration", unit: "min", write: asItIs };

export const secondsResult: ResultKind = { name: "time constant", unit: "s", write: asItIs };

/** Temperatures of functions that work in whatever degrees the sheet holds. */
export const sheetTemperatureResult: ResultKind = { name: "temperature", write: asItIs };

export const sheetDifferenceResult: ResultKind = { name: "temperature difference", write: asItIs };

export const rampRateResult: ResultKind = { name: "rate", unit: "degrees/min", write: asItIs };

/** Degrees of difference per hour. */
export const differencePerHourResult: ResultKind = { ...differenceResult, name: "drift", unit: "°C/h" };

/** 0 to 1. */
export const shareResult: ResultKind = { name: "share", write: asItIs };

export const numberResult: ResultKind = { name: "number", write: asItIs };

export const wordResult: ResultKind = { name: "text", write: asItIs };

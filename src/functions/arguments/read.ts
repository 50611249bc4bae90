/** Reads what a call was given, before any cell is worked out. */
import { celsius, Refusal, type TemperatureUnit } from "../../core";
import { type CellError, error } from "../cell";
import { failure } from "../failure";
import { asMatrix, columnsOf } from "../matrix";
import type { Argument, Arguments } from "./argument";

/** A function without the argument works in whatever degrees the sheet holds, and its messages do not say which. */
const inTheSheetsDegrees: TemperatureUnit = { ...celsius, label: "degrees" };

export const isLeftOut = (given: unknown): boolean => given === null || given === undefined;

/** Names that read badly when they are only taken apart. */
const IN_WORDS: Readonly<Record<string, string>> = {
  deviationsUv: "deviations",
  lower: "lower limit",
  upper: "upper limit",
  uEmfUv: "uncertainty of the EMF",
  uReference: "uncertainty of the reference temperature",
  uOther: "other uncertainty",
};

/** An argument's name in words: referenceTemperature → reference temperature. */
export const inWords = (name: string): string =>
  IN_WORDS[name] ??
  name
    .replace(/([a-z])([A-Z])/g, (_, before: string, after: string) => `${before} ${after.toLowerCase()}`)
    .replace(/emf\b/, "EMF");

/** Reads one argument for the whole call. */
export function readGiven<T>(
  name: string,
  argument: Argument<T>,
  given: unknown,
  unit: TemperatureUnit,
): T | CellError {
  if (isLeftOut(given)) {
    return argument.optional ? (argument.standIn as T) : error("#VALUE!", `argument missing: ${name}`);
  }
  const matrix = asMatrix(given);
  const label = inWords(name);
  if (columnsOf(matrix) === 0) return error("#VALUE!", `${label}: the range is empty`);
  const value = argument.read(matrix, label, unit);
  return value instanceof Refusal ? failure(value, unit) : value;
}

/** The unit of the call, read before anything else: messages are printed in it. */
export function unitOfCall(
  declared: Arguments,
  given: Readonly<Record<string, unknown>>,
): TemperatureUnit | CellError {
  const argument = declared.unit;
  return argument === undefined
    ? inTheSheetsDegrees
    : (readGiven("unit", argument, given.unit, celsius) as TemperatureUnit | CellError);
}

/** Declared arguments: a kind, whether it takes a range cell by cell, and what stands in when it is left out. */
import { celsius, Refusal, type TemperatureUnit } from "../core";
import { type CellError, error, readCell } from "./cell";
import { failure } from "./failure";
import type { Kind } from "./kinds/kind";
import { temperatureUnit } from "./kinds/temperature";
import { asMatrix, columnsOf, rowsOf } from "./matrix";

/** `each`: one cell or a range, broadcast with the others. `once`: one cell for the whole call. */
export type Shape = "each" | "once";

export interface Argument<T, S extends Shape = Shape, Optional extends boolean = boolean> {
  readonly kind: Kind<T>;
  readonly shape: S;
  readonly optional: Optional;
  /** The value of an argument that is left out. */
  readonly standIn?: T;
  /** `standIn` as the catalogue prints it. */
  readonly printed?: string;
}

export type Arguments = Readonly<Record<string, Argument<unknown>>>;

export type Value<A> = A extends Argument<infer T> ? T : never;
export type Values<A extends Arguments> = { readonly [K in keyof A]: Value<A[K]> };

/** What a worksheet function hands on: each declared argument by its own name. */
export type Given<A extends Arguments> = {
  readonly [K in keyof A]: A[K] extends Argument<unknown, Shape, true>
    ? unknown[][] | undefined
    : unknown[][];
};

export const each = <T>(kind: Kind<T>): Argument<T, "each", false> => ({
  kind,
  shape: "each",
  optional: false,
});

export const eachOr = <T>(kind: Kind<T>, standIn: T, printed: string): Argument<T, "each", true> => ({
  kind,
  shape: "each",
  optional: true,
  standIn,
  printed,
});

export const once = <T>(kind: Kind<T>): Argument<T, "once", false> => ({
  kind,
  shape: "once",
  optional: false,
});

export const onceOr = <T>(kind: Kind<T>, standIn: T, printed: string): Argument<T, "once", true> => ({
  kind,
  shape: "once",
  optional: true,
  standIn,
  printed,
});

/** May be left out; the function then sees undefined. */
export const onceIfGiven = <T>(kind: Kind<T>): Argument<T | undefined, "once", true> => ({
  kind,
  shape: "once",
  optional: true,
});

/** The last argument of every function that deals in temperatures. */
export const unit = onceOr(temperatureUnit, celsius, "C");

export const isLeftOut = (given: unknown): boolean => given === null || given === undefined;

/** An argument's name in words: referenceTemperature → reference temperature. */
export const inWords = (name: string): string =>
  name
    .replace(/([a-z])([A-Z])/g, (_, before: string, after: string) => `${before} ${after.toLowerCase()}`)
    .replace(/^emf\b/, "EMF");

/** The unit of the call, read before anything else: messages are printed in it. */
export function unitOfCall(
  declared: Arguments,
  given: Readonly<Record<string, unknown>>,
): TemperatureUnit | CellError {
  const argument = declared.unit;
  return argument === undefined
    ? celsius
    : (readOnce("unit", argument, given.unit, celsius) as TemperatureUnit | CellError);
}

/** Reads an argument that is one cell for the whole call. */
export function readOnce<T>(
  name: string,
  argument: Argument<T>,
  given: unknown,
  unit: TemperatureUnit,
): T | CellError {
  const label = inWords(name);
  if (isLeftOut(given)) {
    return argument.optional ? (argument.standIn as T) : error("#VALUE!", `argument missing: ${name}`);
  }
  const matrix = asMatrix(given);
  if (rowsOf(matrix) !== 1 || columnsOf(matrix) !== 1) {
    return error("#VALUE!", `${label}: one cell, not ${rowsOf(matrix)} × ${columnsOf(matrix)}`);
  }
  const reading = readCell(matrix[0]?.[0]);
  if (reading.kind === "error") return reading.error;
  if (reading.kind === "blank") {
    return error(
      "#VALUE!",
      `${label}: the cell is blank${argument.optional ? "; leave the argument out instead" : ""}`,
    );
  }
  const value = argument.kind.read(reading.value, label, unit);
  return value instanceof Refusal ? failure(value, unit) : (value as T);
}

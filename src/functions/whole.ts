/**
 * Functions of a whole call: one value, or a table that spills with a header row and
 * whose parts other cells can ask for by name (rule 10 of the contract).
 */
import { noAnswer, Refusal, type TemperatureUnit } from "../core";
import { type Arguments, type Given, readGiven, unitOfCall, type Values } from "./arguments";
import { type CellError, error } from "./cell";
import { type Declaration, declare, type WorksheetFunction } from "./declaration";
import { failure } from "./failure";
import type { ResultKind } from "./results";

type Cell = number | string | CellError;
/** An error is that of an input cell, passed through. */
export type Entry = number | string | Refusal | CellError;

/** Only input that no instrument gives can come to this; a number out of range is never shown. */
const tooLarge = noAnswer`the result is too large for a number`;

function cellOf(entry: Entry, unit: TemperatureUnit): Cell {
  if (entry instanceof Refusal) return failure(entry, unit);
  return typeof entry === "number" && !Number.isFinite(entry) ? failure(tooLarge, unit) : entry;
}

export interface Whole<A extends Arguments> extends Declaration {
  readonly arguments: A;
  /** The result's rows; numbers in the unit of the call. */
  cells(values: Values<A>, unit: TemperatureUnit): readonly (readonly Entry[])[] | Refusal;
}

/** A function that answers once for all that it is given. */
export function whole<const A extends Arguments>(
  worksheetFunction: WorksheetFunction,
  spec: Whole<A>,
): (given: Given<A>) => Cell[][] {
  declare(worksheetFunction, spec);
  return (given) => {
    const cells = given as Readonly<Record<string, unknown>>;
    const unit = unitOfCall(spec.arguments, cells);
    if (unit instanceof CustomFunctions.Error) return [[unit]];
    const values: Record<string, unknown> = {};
    for (const [name, argument] of Object.entries(spec.arguments)) {
      const value = readGiven(name, argument, cells[name], unit);
      if (value instanceof CustomFunctions.Error) return [[value]];
      values[name] = value;
    }
    const rows = spec.cells(values as Values<A>, unit);
    if (rows instanceof Refusal) return [[failure(rows, unit)]];
    if (rows.length === 0) return [[error("#N/A", "the result has no rows")]];
    return rows.map((row) => row.map((entry) => cellOf(entry, unit)));
  };
}

export const written = (entry: Entry, kind: ResultKind, unit: TemperatureUnit): Entry =>
  typeof entry === "number" ? kind.write(entry, unit) : entry;

export interface Table<A extends Arguments, C extends string> {
  readonly arguments: A;
  /** The columns in order; the keys are the header row. */
  readonly result: Readonly<Record<C, ResultKind>>;
  /** One record a row, in core units. */
  rows(values: Values<A>): readonly Readonly<Record<C, Entry>>[] | Refusal;
}

/** A table whose optional argument `column` asks for one column without its header. */
export function table<const A extends Arguments, C extends string>(
  worksheetFunction: WorksheetFunction,
  spec: Table<A, C>,
): (given: Given<A>) => Cell[][] {
  const columns = Object.keys(spec.result) as C[];
  return whole(worksheetFunction, {
    ...spec,
    cells(values, unit) {
      const rows = spec.rows(values);
      if (rows instanceof Refusal) return rows;
      const { column } = values as { column?: C };
      const asked = column === undefined ? columns : [column];
      const body = rows.map((row) => asked.map((name) => written(row[name], spec.result[name], unit)));
      return column === undefined ? [columns, ...body] : body;
    },
  });
}

export interface Metrics<A extends Arguments, M extends string> {
  readonly arguments: A;
  /** The metrics in order; the keys are the words in the first column. */
  readonly result: Readonly<Record<M, ResultKind>>;
  metrics(values: Values<A>): Readonly<Record<M, Entry>> | Refusal;
}

/** Named values, spilled as two columns; the optional argument `metric` asks for one of them. */
export function metrics<const A extends Arguments, M extends string>(
  worksheetFunction: WorksheetFunction,
  spec: Metrics<A, M>,
): (given: Given<A>) => Cell[][] {
  const names = Object.keys(spec.result) as M[];
  return whole(worksheetFunction, {
    ...spec,
    cells(values, unit) {
      const found = spec.metrics(values);
      if (found instanceof Refusal) return found;
      const { metric } = values as { metric?: M };
      if (metric !== undefined) return [[written(found[metric], spec.result[metric], unit)]];
      return [
        ["metric", "value"],
        ...names.map((name): Entry[] => [name, written(found[name], spec.result[name], unit)]),
      ];
    },
  });
}

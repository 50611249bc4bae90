/** Rows or columns of cells, and rectangles, that are read as a whole. */
import { Refusal, type TemperatureUnit, wrongKind } from "../../core";
import { type CellError, readCell } from "../cell";
import type { Kind } from "../kinds/kind";
import { columnsOf, type Matrix, rowsOf } from "../matrix";
import type { Argument } from "./argument";

type Read<T> = T | Refusal | CellError;

/** Reads a cell of a range; a blank is undefined. */
function readOne<T>(raw: unknown, kind: Kind<T>, label: string, unit: TemperatureUnit): Read<T | undefined> {
  const reading = readCell(raw);
  if (reading.kind === "error") return reading.error;
  return reading.kind === "blank" ? undefined : kind.read(reading.value, label, unit);
}

export const failed = (value: unknown): value is Refusal | CellError =>
  value instanceof Refusal || value instanceof CustomFunctions.Error;

function readAll<T>(
  cells: readonly unknown[],
  kind: Kind<T>,
  label: (index: number) => string,
  unit: TemperatureUnit,
): Read<(T | undefined)[]> {
  const values: (T | undefined)[] = [];
  for (const [index, raw] of cells.entries()) {
    const value = readOne(raw, kind, label(index), unit);
    if (failed(value)) return value;
    values.push(value as T | undefined);
  }
  return values;
}

/** The cells of a single row or column, and how a message names one of them. */
function cellsInLine(
  given: Matrix,
  label: string,
): { cells: readonly unknown[]; name: (index: number) => string } | Refusal {
  if (columnsOf(given) === 1) {
    return { cells: given.map((row) => row[0]), name: (index) => `${label}, row ${index + 1}` };
  }
  if (rowsOf(given) === 1) {
    return { cells: given[0] as readonly unknown[], name: (index) => `${label}, column ${index + 1}` };
  }
  return wrongKind`${label}: one row or one column, not ${rowsOf(given)} × ${columnsOf(given)}`;
}

/** A row or column in which a blank is no value: undefined. */
export const gappedColumn = <T>(kind: Kind<T>): Argument<readonly (T | undefined)[], "column", false> => ({
  shape: "column",
  kind,
  optional: false,
  read(given, label, unit) {
    const found = cellsInLine(given, label);
    return found instanceof Refusal ? found : readAll(found.cells, kind, found.name, unit);
  },
});

/** Reads a row or column in which no cell may be blank. */
export const withoutBlanks =
  <T>(kind: Kind<T>) =>
  (given: Matrix, label: string, unit: TemperatureUnit): Read<readonly T[]> => {
    const found = cellsInLine(given, label);
    if (found instanceof Refusal) return found;
    const values = readAll(found.cells, kind, found.name, unit);
    if (failed(values)) return values;
    const blank = values.indexOf(undefined);
    return blank < 0 ? (values as T[]) : wrongKind`${found.name(blank)}: the cell is blank`;
  };

/** A row or column without blanks. */
export const column = <T>(kind: Kind<T>): Argument<readonly T[], "column", false> => ({
  shape: "column",
  kind,
  optional: false,
  read: withoutBlanks(kind),
});

/** A row or column without blanks that remembers which of the two it was. */
export interface Line<T> {
  readonly values: readonly T[];
  /** Lies in one row. */
  readonly across: boolean;
}

export const line = <T>(kind: Kind<T>): Argument<Line<T>, "column", false> => ({
  shape: "column",
  kind,
  optional: false,
  read(given, label, unit) {
    const values = withoutBlanks(kind)(given, label, unit);
    return failed(values) ? values : { values, across: columnsOf(given) > 1 };
  },
});

/** A rectangle without blanks, row by row. */
export const block = <T>(kind: Kind<T>): Argument<readonly (readonly T[])[], "block", false> => ({
  shape: "block",
  kind,
  optional: false,
  read(given, label, unit) {
    const rows: T[][] = [];
    for (const [index, cells] of given.entries()) {
      const name = (at: number): string => `${label}, row ${index + 1}, column ${at + 1}`;
      const values = readAll(cells, kind, name, unit);
      if (failed(values)) return values;
      const blank = values.indexOf(undefined);
      if (blank >= 0) return wrongKind`${name(blank)}: the cell is blank`;
      rows.push(values as T[]);
    }
    return rows;
  },
});

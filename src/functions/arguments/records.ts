/** Rows of differing cells as people type them: a name, a number, a word … */
import { noAnswer, Refusal, type TemperatureUnit, wrongKind } from "../../core";
import { type CellError, type Reading, readCell } from "../cell";
import { type Kind, shown } from "../kinds/kind";
import { columnsOf, type Matrix } from "../matrix";
import type { Argument } from "./argument";

/** A column of the rows: what it is called, and whether a blank cell, or no such column at all, means "not given". */
export interface Field<T, Optional extends boolean = boolean> {
  readonly words: string;
  readonly kind: Kind<T>;
  readonly optional: Optional;
}

type Fields = Readonly<Record<string, Field<unknown>>>;

export type RecordOf<F extends Fields> = {
  readonly [K in keyof F]: F[K] extends Field<infer T, infer Optional>
    ? Optional extends false
      ? T
      : T | undefined
    : never;
};

const rowsOfCells: Kind<unknown> = { name: "rows", read: (cell) => cell };

/** A record for each row; undefined for one that is wholly blank. Messages name the row by its number and its first cell. */
export function records<const F extends Fields>(
  fields: F,
): Argument<readonly (RecordOf<F> | undefined)[], "block", false> {
  const columns = Object.entries(fields);
  const fewest = columns.map(([, { optional }]) => optional).lastIndexOf(false) + 1;
  const named = columns.map(([, { words }]) => words).join(", ");
  return {
    shape: "block",
    kind: rowsOfCells,
    optional: false,
    read(given, label, unit) {
      const width = columnsOf(given);
      if (width < fewest || width > columns.length)
        return wrongKind`${label}: ${fewest} to ${columns.length} columns (${named}), not ${width}`;
      return readRows(given, columns, unit) as readonly (RecordOf<F> | undefined)[] | Refusal | CellError;
    },
  };
}

type Columns = readonly (readonly [string, Field<unknown>])[];

function readRows(given: Matrix, columns: Columns, unit: TemperatureUnit) {
  const found: (Record<string, unknown> | undefined)[] = [];
  for (const [index, cells] of given.entries()) {
    const record = readRow(cells, index, columns, unit);
    if (record instanceof Refusal || record instanceof CustomFunctions.Error) return record;
    found.push(record);
  }
  return found;
}

function readRow(
  cells: readonly unknown[],
  index: number,
  columns: Columns,
  unit: TemperatureUnit,
): Record<string, unknown> | undefined | Refusal | CellError {
  const readings = cells.map(readCell);
  for (const reading of readings) if (reading.kind === "error") return reading.error;
  if (readings.every(({ kind }) => kind === "blank")) return undefined;
  const row = rowInWords(cells, index);
  const record: Record<string, unknown> = {};
  for (const [at, [key, { words, kind, optional }]] of columns.entries()) {
    const reading = readings[at];
    if (reading?.kind === "present") {
      const value = kind.read(reading.value, `${row}, ${words}`, unit);
      if (value instanceof Refusal) {
        return index === 0 && isHeader(readings) ? value.and`; leave the header row out` : value;
      }
      record[key] = value;
    } else if (!optional) {
      return noAnswer`${row}: ${words} missing`;
    }
  }
  return record;
}

/** "row 3 (drift)", as the core names it. */
function rowInWords([first]: readonly unknown[], index: number): string {
  const named = typeof first === "string" ? first.trim() : "";
  return `row ${index + 1}${named === "" ? "" : ` (${shown(named)})`}`;
}

/** A row of words alone, without a digit, heads the columns. */
const isHeader = (cells: readonly Reading[]): boolean =>
  cells.every(
    (cell) => cell.kind !== "present" || (typeof cell.value === "string" && !/\d/.test(cell.value)),
  );

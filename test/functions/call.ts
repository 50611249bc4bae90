/** Ranges in and out, written as a test reads them. */
import type { CellError } from "../../src/functions/cell";

export const one = (value: unknown): unknown[][] => [[value]];
export const columnOf = (...values: unknown[]): unknown[][] => values.map((value) => [value]);
export const rowOf = (...values: unknown[]): unknown[][] => [values];

export const errorCell = (code: string, message?: string): CellError =>
  new CustomFunctions.Error(code as CustomFunctions.ErrorCode, message);

/** A result with each error as "code message", which an assertion can print. */
export const readable = (cells: readonly (readonly unknown[])[]): unknown[][] =>
  cells.map((row) =>
    row.map((cell) =>
      cell instanceof CustomFunctions.Error
        ? `${cell.code}${cell.message === undefined ? "" : ` ${cell.message}`}`
        : cell,
    ),
  );

import type { Refusal, TemperatureUnit } from "../../core";
import { type CellError, error, readCell } from "../cell";
import type { Kind } from "../kinds/kind";
import { cellAt, columnsOf, type Matrix, rowsOf } from "../matrix";
import type { Argument } from "./argument";

const single =
  <T>(kind: Kind<T>) =>
  (given: Matrix, label: string, unit: TemperatureUnit): T | Refusal | CellError => {
    if (rowsOf(given) !== 1 || columnsOf(given) !== 1) {
      return error("#VALUE!", `${label}: one cell, not ${rowsOf(given)} × ${columnsOf(given)}`);
    }
    const reading = readCell(cellAt(given, 0, 0));
    if (reading.kind === "error") return reading.error;
    if (reading.kind === "blank") return error("#VALUE!", `${label}: the cell is blank`);
    return kind.read(reading.value, label, unit);
  };

/** One cell for the whole call. */
export const once = <T>(kind: Kind<T>): Argument<T, "once", false> => ({
  shape: "once",
  kind,
  optional: false,
  read: single(kind),
});

/** One cell for the whole call that may be blank; the function then sees undefined. */
export const onceOrBlank = <T>(kind: Kind<T>): Argument<T | undefined, "once", false> => ({
  ...once<T | undefined>(kind),
  read(given, label, unit) {
    const alone = rowsOf(given) === 1 && columnsOf(given) === 1;
    return alone && readCell(cellAt(given, 0, 0)).kind === "blank"
      ? undefined
      : single(kind)(given, label, unit);
  },
});

/** One cell or a range, cell by cell: `cellwise` reads it, and only a left-out one is read here. */
export const each = <T>(kind: Kind<T>): Argument<T, "each", false> => ({ ...once(kind), shape: "each" });

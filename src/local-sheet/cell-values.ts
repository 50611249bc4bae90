import type { Nullable } from "@univerjs/core";
import {
  ArrayValueObject,
  type BaseValueObject,
  BooleanValueObject,
  ErrorValueObject,
  NumberValueObject,
  StringValueObject,
} from "@univerjs/engine-formula";
import { WorksheetError } from "../catalogue/functions-runtime";
import type { ResultFormat } from "./result-format";

/**
 * Between the values of the grid engine and those that Excel hands to a custom function and takes from it.
 *
 * A truly empty cell becomes 0, because that is what desktop Excel hands over: whoever forgets the blank-safe form
 * `IF(ISBLANK(range),"",range)` must see here what he would see there. The engine could tell the two apart; Excel
 * cannot, and a sheet that works only here would be worse than none.
 */
function toCell(value: Nullable<BaseValueObject>): unknown {
  if (value == null || value.isNull()) return 0;
  if (value.isError()) return new WorksheetError((value as ErrorValueObject).getErrorType());
  return value.getValue();
}

/** An argument left out arrives as null, also between two commas; an empty cell is always part of an array. */
export function toArgument(value: BaseValueObject | undefined, dimensionality: string): unknown {
  if (value == null || (!value.isArray() && value.isNull())) return null;
  const matrix = value.isArray()
    ? (value as ArrayValueObject).getArrayValue().map((row) => row.map((cell) => toCell(cell)))
    : [[toCell(value)]];
  return dimensionality === "matrix" ? matrix : matrix[0]?.[0];
}

/** Called for each error of a result, so that its message can be shown: Excel shows it in the cell's error menu. */
export type ErrorListener = (row: number, column: number, error: WorksheetError) => void;

function toEngineCell(value: unknown, pattern: string | undefined): BaseValueObject {
  if (typeof value === "number") {
    return Number.isFinite(value) ? NumberValueObject.create(value, pattern) : errorValue("#NUM!");
  }
  // Made directly: the engine's own factory would turn "2026-03-02", "TRUE" or "{1,2}" into something else.
  if (typeof value === "string") return StringValueObject.create(value);
  if (typeof value === "boolean") return BooleanValueObject.create(value);
  if (value == null) return NumberValueObject.create(0);
  return errorValue("#VALUE!");
}

const errorValue = (code: string) =>
  ErrorValueObject.create(code as Parameters<typeof ErrorValueObject.create>[0]);

export function toEngineValue(
  result: unknown,
  onError: ErrorListener,
  format?: ResultFormat,
): BaseValueObject {
  const matrix = Array.isArray(result) ? result : [[result]];
  const rowCount = matrix.length;
  const columnCount = rowCount > 0 && Array.isArray(matrix[0]) ? matrix[0].length : 0;
  if (columnCount === 0) return errorValue("#VALUE!");
  const calculateValueList = matrix.map((cells: unknown, row) => {
    if (!Array.isArray(cells) || cells.length !== columnCount)
      return new Array(columnCount).fill(errorValue("#VALUE!"));
    return cells.map((cell, column) => {
      if (typeof cell === "number") return toEngineCell(cell, format?.(cell, column, columnCount));
      if (!(cell instanceof WorksheetError)) return toEngineCell(cell, undefined);
      onError(row, column, cell);
      return errorValue(cell.code);
    });
  });
  if (rowCount === 1 && columnCount === 1) return calculateValueList[0]?.[0] as BaseValueObject;
  return ArrayValueObject.create({
    calculateValueList,
    rowCount,
    columnCount,
    unitId: "",
    sheetId: "",
    row: -1,
    column: -1,
  });
}

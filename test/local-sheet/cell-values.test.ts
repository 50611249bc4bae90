import {
  ArrayValueObject,
  type BaseValueObject,
  ErrorValueObject,
  NullValueObject,
  NumberValueObject,
  StringValueObject,
} from "@univerjs/engine-formula";
import { describe, expect, it } from "vitest";
import { WorksheetError } from "../../src/catalogue/functions-runtime";
import { toArgument, toEngineValue } from "../../src/local-sheet/cell-values";

const array = (...rows: (BaseValueObject | null)[][]) =>
  ArrayValueObject.create({
    calculateValueList: rows,
    rowCount: rows.length,
    columnCount: rows[0]?.length ?? 0,
    unitId: "",
    sheetId: "",
    row: -1,
    column: -1,
  });

describe("an argument from the grid", () => {
  it("is a matrix where functions.json says matrix, also for one cell or one value", () => {
    expect(toArgument(array([NumberValueObject.create(1)]), "matrix")).toEqual([[1]]);
    expect(toArgument(NumberValueObject.create(1), "matrix")).toEqual([[1]]);
    expect(toArgument(array([NumberValueObject.create(1)]), "scalar")).toBe(1);
  });

  it("is null when it was left out, and 0 for an empty cell, as desktop Excel has it", () => {
    expect(toArgument(undefined, "matrix")).toBeNull();
    expect(toArgument(NullValueObject.create(), "matrix")).toBeNull();
    expect(toArgument(array([null, NullValueObject.create()]), "matrix")).toEqual([[0, 0]]);
  });

  it("keeps an empty text, which the blank-safe form makes of an empty cell", () => {
    expect(toArgument(array([StringValueObject.create("")]), "matrix")).toEqual([[""]]);
  });

  it("carries errors as error objects", () => {
    const error = ErrorValueObject.create("#DIV/0!" as never);
    expect(toArgument(error, "matrix")).toEqual([[new WorksheetError("#DIV/0!")]]);
  });
});

describe("a result for the grid", () => {
  const shown = (result: unknown, onError = () => {}) => {
    const value = toEngineValue(result, onError);
    return value.isArray() ? (value as ArrayValueObject).toValue() : value.getValue();
  };

  it("is one value for a 1 × 1 matrix and an array for more", () => {
    expect(shown([[5]])).toBe(5);
    expect(
      shown([
        [1, 2],
        [3, ""],
      ]),
    ).toEqual([
      [1, 2],
      [3, ""],
    ]);
  });

  it("keeps texts as they are, whatever they look like", () => {
    expect(shown([["2026-03-02", "TRUE", "{1,2}", "12"]])).toEqual([["2026-03-02", "TRUE", "{1,2}", "12"]]);
  });

  it("gives an error its code and hands its message on with its place", () => {
    const heard: unknown[] = [];
    const value = toEngineValue([[1], [new WorksheetError("#N/A", "too hot")]], (...each) =>
      heard.push(each),
    );
    expect((value as ArrayValueObject).toValue()).toEqual([[1], ["#N/A"]]);
    expect(heard).toEqual([[1, 0, new WorksheetError("#N/A", "too hot")]]);
  });

  it("never shows a number that is none, nor a row of another length", () => {
    expect(shown([[1], [Number.NaN]])).toEqual([[1], ["#NUM!"]]);
    expect(shown([[1, 2], [3]])).toEqual([
      [1, 2],
      ["#VALUE!", "#VALUE!"],
    ]);
    expect(toEngineValue([], () => {}).isError()).toBe(true);
  });
});

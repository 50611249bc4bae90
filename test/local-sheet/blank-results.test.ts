import { CellValueType, type ICellData, isNullCell, ObjectMatrix } from "@univerjs/core";
import { BaseReferenceObject } from "@univerjs/engine-formula";
import { describe, expect, it } from "vitest";
import { keepBlankResults } from "../../src/local-sheet/blank-results";

const blank: ICellData = { v: "", t: CellValueType.STRING };

/** Stands in for the engine's reader: A1 is a cell of the sheet, B1 a result that spilled. */
function reader() {
  const own = new ObjectMatrix<ICellData>({ 0: { 0: blank } });
  const spilled: ICellData = { ...blank };
  return {
    getCurrentActiveSheetData: () => ({ cellData: own }),
    getCellData: (_row: number, column: number): ICellData | undefined => (column === 0 ? blank : spilled),
  };
}

describe("a formula that gives an empty text", () => {
  it("is taken for an empty cell by the engine, which is what is put right", () => {
    expect(isNullCell(blank)).toBe(true);
    expect(BaseReferenceObject.prototype.getCellData).toBeTypeOf("function");
    expect(BaseReferenceObject.prototype.getCurrentActiveSheetData).toBeTypeOf("function");
  });

  it("stays a text, while a cell that was cleared stays empty", () => {
    const cells = reader();
    keepBlankResults(cells);
    expect(isNullCell(cells.getCellData(0, 0))).toBe(true);
    expect(isNullCell(cells.getCellData(0, 1))).toBe(false);
    expect(cells.getCellData(0, 1)).toMatchObject({ v: "", t: CellValueType.STRING });
  });

  it("is refused when a later engine reads cells in another way", () => {
    expect(() => keepBlankResults({} as never)).toThrow(/reads cells in another way/);
  });
});

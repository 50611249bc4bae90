import { CellValueType, type ICellData, type Nullable } from "@univerjs/core";

/** What the engine reads cells through, with the one member that is replaced. */
interface CellReader {
  getCellData(row: number, column: number): Nullable<ICellData>;
}

/**
 * A formula that gives "" leaves a cell that Excel hands on as the text "": not empty, and no 0. The engine takes
 * such a spilled or just calculated cell for an empty one, so that a function on a column of results would read 0
 * from it. A mark that the engine's own test of emptiness heeds keeps it a text. Cells of the sheet itself stay as
 * they are: there "" is what clearing a cell may leave.
 */
export function keepBlankResults(reader: CellReader): void {
  const read = reader.getCellData;
  if (typeof read !== "function") {
    throw new Error("The grid engine reads cells in another way: blank results may count as 0.");
  }
  reader.getCellData = function (this: SheetReader, row, column) {
    const cell = read.call(this, row, column);
    if (cell?.v !== "" || cell.t !== CellValueType.STRING || cell.f) return cell;
    const own = this.getCurrentActiveSheetData()?.cellData.getValue(row, column);
    return own === cell ? cell : { ...cell, si: "result" };
  };
}

interface SheetReader extends CellReader {
  getCurrentActiveSheetData(): Nullable<{ cellData: { getValue(row: number, column: number): unknown } }>;
}

import { FormulaDataModel, type FWorksheet } from "@univerjs/preset-sheets-core";
import { storedLook } from "../files/stored-look";
import type { Grid } from "../grid";
import { reachOf } from "../reach";
import { SpilledResults } from "../spilled-results";
import type { CellValue } from "../workbook";
import { type PrintedCell, type PrintedSheet, printedSize } from "./printed-sheet";

/** Cells looked at in one go on the way up from the last row. */
const atOnce = 50_000;

/** The sheet in front, with the texts that the grid shows. */
export function readSheet({ univer, api }: Grid): PrintedSheet {
  const workbook = api.getActiveWorkbook();
  if (!workbook) throw new Error("no workbook is open");
  const sheet = workbook.getActiveSheet();
  const spilled = new SpilledResults(univer.__getInjector().get(FormulaDataModel), workbook.getId());
  const { lastRow, lastColumn } = reachOf(sheet, spilled);
  const valuesOf = valuesReader(sheet, spilled, lastColumn + 1);
  const usedRows = lastFilledRow(lastRow, lastColumn + 1, valuesOf) + 1;
  const size = printedSize(usedRows, lastColumn + 1);
  const values = size.rows === 0 ? [] : valuesOf(0, size.rows);
  const usedColumns = values.reduce((most, row) => Math.max(most, lastFilled(row) + 1), 0);
  const columns = Math.min(usedColumns, size.columns);

  const cells = sheet.getSheet();
  const styles = workbook.getWorkbook().getStyles();
  const cellAt = (row: number, column: number): PrintedCell => {
    const value = values[row]![column];
    const shown = cells.getCell(row, column);
    const text = shown?.p?.body?.dataStream ?? (value === "" ? "" : shown?.v);
    return {
      text: String(text ?? "").replace(/\r?\n$/, ""),
      isNumber: typeof value === "number",
      look: storedLook(styles.getStyleByCell(shown)),
    };
  };
  return {
    name: sheet.getSheetName(),
    widths: Array.from({ length: columns }, (_, column) => sheet.getColumnWidth(column)),
    frozenRows: Math.max(0, sheet.getFreeze().ySplit),
    rows: values.map((_, row) => Array.from({ length: columns }, (__, column) => cellAt(row, column))),
    usedRows,
    usedColumns,
  };
}

type ValuesReader = (row: number, rows: number) => CellValue[][];

/** Values as they are, not as they are shown; an empty cell is "". */
const valuesReader =
  (sheet: FWorksheet, spilled: SpilledResults, columns: number): ValuesReader =>
  (first, rows) =>
    sheet
      .getRange(first, 0, rows, columns)
      .getRawValues()
      .map((cells, r) =>
        cells.map(
          (value, column) =>
            value ?? spilled.valueAt({ sheetId: sheet.getSheetId(), row: first + r, column }) ?? "",
        ),
      );

/** From below, because empty rows that only have a look are many at most there. */
function lastFilledRow(lastRow: number, columns: number, valuesOf: ValuesReader): number {
  const step = Math.max(1, Math.floor(atOnce / columns));
  for (let end = lastRow + 1; end > 0; end -= step) {
    const first = Math.max(0, end - step);
    const rows = valuesOf(first, end - first);
    for (let row = rows.length - 1; row >= 0; row--) if (lastFilled(rows[row]!) >= 0) return first + row;
  }
  return -1;
}

function lastFilled(row: readonly CellValue[]): number {
  let last = row.length - 1;
  while (last >= 0 && row[last] === "") last--;
  return last;
}

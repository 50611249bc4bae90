import type { FilledSheet } from "../../sheets";
import type { CellLook, StoredCell, StoredSheet, StoredValue } from "../content";
import { plannedLook } from "./looks";

/** What a formula gives: its rectangle, of which the first is its own cell. */
export type Results = (row: number, column: number) => readonly (readonly StoredValue[])[];

/** A planned sheet with the values of its formulas, as the writer of files takes it. */
export function storedSheet(sheet: FilledSheet, resultsOf: Results): StoredSheet {
  const columns = sheet.columns.map(({ width, role = "input", format }) => ({
    width,
    look: plannedLook(role, format),
  }));
  const cells = new Map<string, StoredCell>();
  const put = (row: number, column: number, content: Partial<StoredCell>) => {
    const key = `${row},${column}`;
    const usual = columns[column]?.look;
    cells.set(key, { row, column, ...(usual && { look: usual }), ...cells.get(key), ...content });
  };
  const { readings } = sheet;
  readings?.rows.forEach((values, down) => {
    values.forEach((value, across) => {
      // An empty reading stays a truly empty cell: ISBLANK must be able to tell.
      if (value !== null) put(readings.row + down, readings.column + across, { value });
    });
  });
  for (const { row, column, value, role, format } of sheet.cells) {
    const look: CellLook = plannedLook(role, format);
    put(row, column, { look, ...(value !== undefined && { value }) });
  }
  for (const { row, column, formula, spill } of sheet.cells) {
    if (formula === undefined) continue;
    resultsOf(row, column).forEach((values, down) => {
      values.forEach((value, across) => {
        put(row + down, column + across, { value });
      });
    });
    put(row, column, { formula, ...(spill && { spill }) });
  }
  return {
    name: sheet.name,
    columns: columns.map(({ width, look }) => (look.pattern ? { width, look } : { width })),
    frozenRows: sheet.frozenRows,
    ...(sheet.heights && { heights: sheet.heights }),
    cells: [...cells.values()],
  };
}

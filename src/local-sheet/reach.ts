import type { FWorksheet } from "@univerjs/preset-sheets-core";
import type { Block } from "../taskpane/workbook/address";
import type { SpilledResults } from "./spilled-results";

/**
 * From the first cell of a sheet to the last one that may show something. The engine's own answer knows nothing of
 * what spilled, because those values stand beside the cells.
 */
export function reachOf(sheet: FWorksheet, spilled: SpilledResults): Block {
  const stored = sheet.getDataRange();
  let [lastRow, lastColumn] = [stored.getLastRow(), stored.getLastColumn()];
  for (const { endRow, endColumn } of spilled.areas(sheet.getSheetId())) {
    lastRow = Math.max(lastRow, endRow);
    lastColumn = Math.max(lastColumn, endColumn);
  }
  return {
    row: 0,
    column: 0,
    lastRow: Math.min(lastRow, sheet.getMaxRows() - 1),
    lastColumn: Math.min(lastColumn, sheet.getMaxColumns() - 1),
  };
}

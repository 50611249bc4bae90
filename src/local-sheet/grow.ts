import type { FUniver } from "@univerjs/core/facade";
import { type FWorksheet, SetSelectionsOperation } from "@univerjs/preset-sheets-core";
import { LAST_COLUMN, LAST_ROW } from "./address";

/** A little more than was asked for, so that the next rows are there as well. */
const spare = 100;

/**
 * The engine's sheets end where they were told to, Excel's go on: a range beyond the end makes the sheet larger. The
 * engine itself must not be asked for such a range: it throws half-way, and gives no range of any kind from then on.
 */
export function growTo(sheet: FWorksheet, lastRow: number, lastColumn: number): void {
  if (lastRow > LAST_ROW || lastColumn > LAST_COLUMN) {
    throw new Error(`a sheet has ${LAST_ROW + 1} rows and ${LAST_COLUMN + 1} columns`);
  }
  if (lastRow >= sheet.getMaxRows()) sheet.setRowCount(Math.min(lastRow + spare, LAST_ROW) + 1);
  if (lastColumn >= sheet.getMaxColumns())
    sheet.setColumnCount(Math.min(lastColumn + spare, LAST_COLUMN) + 1);
}

interface Selections {
  unitId: string;
  subUnitId: string;
  selections: { range: { endRow: number; endColumn: number } }[];
}

/** A cell beyond the end, typed into the name box, is gone to all the same; one that Excel has not is not. */
export function growWithSelection(api: FUniver): void {
  api.addEvent(api.Event.BeforeCommandExecute, (event) => {
    if (event.id !== SetSelectionsOperation.id) return;
    const { unitId, subUnitId, selections } = event.params as Selections;
    const sheet = api.getWorkbook(unitId)?.getSheetBySheetId(subUnitId);
    for (const { range } of sheet ? selections : []) {
      if (range.endRow > LAST_ROW || range.endColumn > LAST_COLUMN) event.cancel = true;
      else growTo(sheet!, range.endRow, range.endColumn);
    }
  });
}
